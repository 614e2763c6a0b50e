package org.pofk.answer;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.IntFunction;
import java.util.stream.Stream;
import org.apache.commons.math3.random.RandomGenerator;
import org.apache.commons.math3.random.Well19937c;
import org.pofk.chain.Chain;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Timetable;
import org.pofk.exact.Rational;

/**
 * How many of many random runs of a chain are in each state at chosen steps. Sampled, with the generator WELL19937c
 * (Panneton, L'Ecuyer and Matsumoto 2006); probabilities are taken to the nearest double.
 *
 * @param counts in place i the counts of all states at the i-th chosen step
 */
record StateCounts(List<List<Long>> counts) {

    /** @param steps ascending */
    static StateCounts of(Chain chain, List<Integer> steps, int runs, long seed) {
        List<List<Choice>> move = List.of(choices(chain.matrix()));
        return of(chain, k -> move, steps, runs, seed);
    }

    /** The same with what a timetable holds in each step, in place of the chain's own move. */
    static StateCounts of(Chain chain, Timetable timetable, List<Integer> steps, int runs, long seed) {
        List<List<Choice>> moves = timetable.moves().stream().map(StateCounts::choices).toList();
        List<List<Choice>> actions = timetable.actions().stream().map(each -> choices(each.matrix())).toList();
        Map<Timetable.Moment, List<List<Choice>>> known = new HashMap<>();
        return of(chain, k -> known.computeIfAbsent(timetable.at(k), moment -> Stream.concat(
                moment.move().stream().mapToObj(moves::get), moment.actions().stream().map(actions::get)).toList()),
                steps, runs, seed);
    }

    private static List<Choice> choices(SparseMatrix matrix) {
        return matrix.columns().stream().map(Choice::of).toList();
    }

    private static StateCounts of(Chain chain, IntFunction<List<List<Choice>>> atStep, List<Integer> steps, int runs,
            long seed) {
        RandomGenerator random = new Well19937c(seed);
        Choice start = Choice.of(startOf(chain));
        long[][] counts = new long[steps.size()][chain.size()];
        for (int run = 0; run < runs; run++) {
            int state = start.draw(random);
            int k = 0;
            for (int i = 0; i < counts.length; i++) {
                while (k < steps.get(i)) {
                    k++;
                    for (List<Choice> choices : atStep.apply(k)) {
                        state = choices.get(state).draw(random);
                    }
                }
                counts[i][state]++;
            }
        }
        return new StateCounts(Arrays.stream(counts).map(each -> Arrays.stream(each).boxed().toList()).toList());
    }

    private static List<SparseMatrix.Entry> startOf(Chain chain) {
        List<SparseMatrix.Entry> start = new ArrayList<>();
        for (int i = 0; i < chain.size(); i++) {
            if (!chain.start().get(i).isZero()) {
                start.add(new SparseMatrix.Entry(i, chain.start().get(i)));
            }
        }
        return start;
    }

    /** One of several states, each with its probability: up to which sum of probabilities each is chosen. */
    private static final class Choice {
        private final int[] states;
        private final double[] upTo;

        private Choice(int[] states, double[] upTo) {
            this.states = states;
            this.upTo = upTo;
        }

        static Choice of(List<SparseMatrix.Entry> chances) {
            double[] upTo = new double[chances.size()];
            Rational sum = Rational.ZERO;
            for (int i = 0; i < upTo.length; i++) {
                sum = sum.plus(chances.get(i).value());
                upTo[i] = sum.approximate();
            }
            // so that rounding leaves no number without a state
            upTo[upTo.length - 1] = 1;
            return new Choice(chances.stream().mapToInt(SparseMatrix.Entry::row).toArray(), upTo);
        }

        /** A sure move takes no random number. */
        int draw(RandomGenerator random) {
            if (states.length == 1) {
                return states[0];
            }
            double number = random.nextDouble();
            int place = Arrays.binarySearch(upTo, number);
            // a number that equals a bound belongs to the next state: each state owns [bound before, own bound)
            return states[place >= 0 ? place + 1 : -place - 1];
        }
    }
}
