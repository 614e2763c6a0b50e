package org.pofk.answer;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;

/** Random chains of every structure: several classes, each with a period, some left for others, some hardly ever. */
public final class RandomChains {
    private final Random random;

    public RandomChains(long seed) {
        random = new Random(seed);
    }

    public Chain next() {
        List<List<List<Integer>>> classes = new ArrayList<>();
        int size = 0;
        for (int count = 1 + random.nextInt(3); count > 0; count--) {
            List<List<Integer>> cyclic = new ArrayList<>();
            int period = random.nextInt(3) == 0 ? 1 : 1 + random.nextInt(4);
            for (int j = 0; j < period; j++) {
                int states = 1 + random.nextInt(period == 1 ? 3 : 2);
                cyclic.add(IntStream.range(size, size + states).boxed().toList());
                size += states;
            }
            classes.add(cyclic);
        }
        List<List<SparseMatrix.Entry>> columns = new ArrayList<>(Collections.nCopies(size, List.of()));
        for (int c = 0; c < classes.size(); c++) {
            boolean left = c + 1 < classes.size() && random.nextInt(3) > 0;
            for (int j = 0; j < classes.get(c).size(); j++) {
                for (int state : classes.get(c).get(j)) {
                    List<Integer> targets = classes.get(c).get((j + 1) % classes.get(c).size());
                    columns.set(state, left && random.nextBoolean()
                            ? column(targets, classes.get(c + 1 + random.nextInt(classes.size() - c - 1)))
                            : column(targets, List.of()));
                }
            }
        }
        return new Chain(Chain.Kind.CHAIN, IntStream.range(0, size).mapToObj(i -> "s" + i).toList(),
                new SparseMatrix(columns), start(size), Map.of(), List.of());
    }

    public Output output(Chain chain) {
        List<Rational> coefficients = IntStream.range(0, chain.size())
                .mapToObj(i -> random.nextInt(3) == 0 ? Rational.of(random.nextInt(7) - 2, 2) : Rational.ZERO)
                .toList();
        return new Output("reading", coefficients, Rational.ZERO, "random");
    }

    /** A move to the own class; where the class can be left, seldom or very seldom to a state of another. */
    private List<SparseMatrix.Entry> column(List<Integer> own, List<List<Integer>> others) {
        Rational leaving = others.isEmpty() ? Rational.ZERO
                : random.nextInt(3) == 0 ? Rational.of(1, 10_000_000) : Rational.of(1 + random.nextInt(4), 5);
        List<SparseMatrix.Entry> column = new ArrayList<>();
        List<Rational> shares = shares(own.size());
        for (int i = 0; i < own.size(); i++) {
            column.add(new SparseMatrix.Entry(own.get(i), shares.get(i).times(Rational.ONE.minus(leaving))));
        }
        if (!others.isEmpty()) {
            List<Integer> set = others.get(random.nextInt(others.size()));
            column.add(new SparseMatrix.Entry(set.get(random.nextInt(set.size())), leaving));
        }
        return column;
    }

    private List<Rational> start(int size) {
        if (random.nextBoolean()) {
            return shares(size);
        }
        List<Rational> start = new ArrayList<>(Collections.nCopies(size, Rational.ZERO));
        start.set(random.nextInt(size), Rational.ONE);
        return start;
    }

    private List<Rational> shares(int count) {
        int[] weights = IntStream.range(0, count).map(i -> 1 + random.nextInt(5)).toArray();
        int total = IntStream.of(weights).sum();
        return IntStream.of(weights).mapToObj(weight -> Rational.of(weight, total)).toList();
    }
}
