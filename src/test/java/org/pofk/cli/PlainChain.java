package org.pofk.cli;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import java.util.stream.IntStream;
import org.pofk.answer.Gauss;
import org.pofk.chain.Chain;
import org.pofk.exact.Rational;

/**
 * A matrix and a start, stepped and solved by fractions and elimination alone: what answers are held against.
 *
 * @param rows entry [i][j] is the move from j to i
 */
record PlainChain(List<List<Rational>> rows, List<Rational> start) {

    static PlainChain of(Chain chain) {
        List<List<Rational>> rows = new ArrayList<>();
        for (int i = 0; i < chain.size(); i++) {
            int to = i;
            rows.add(IntStream.range(0, chain.size()).mapToObj(from -> chain.matrix().at(to, from)).toList());
        }
        return new PlainChain(rows, chain.start());
    }

    int size() {
        return start.size();
    }

    PlainChain from(List<Rational> other) {
        return new PlainChain(rows, other);
    }

    PlainChain from(int state) {
        return from(indicator(Set.of(state)));
    }

    /** One in the states of a set, zero elsewhere. */
    List<Rational> indicator(Set<Integer> set) {
        return IntStream.range(0, size()).mapToObj(i -> set.contains(i) ? Rational.ONE : Rational.ZERO).toList();
    }

    List<Rational> stepped(List<Rational> state) {
        List<Rational> next = new ArrayList<>();
        for (List<Rational> row : rows) {
            Rational sum = Rational.ZERO;
            for (int j = 0; j < size(); j++) {
                if (!row.get(j).isZero() && !state.get(j).isZero()) {
                    sum = sum.plus(row.get(j).times(state.get(j)));
                }
            }
            next.add(sum);
        }
        return next;
    }

    /** x(0) … x(last). */
    List<List<Rational>> states(int last) {
        List<List<Rational>> states = new ArrayList<>(List.of(start));
        while (states.size() <= last) {
            states.add(stepped(states.get(states.size() - 1)));
        }
        return states;
    }

    /** The same where what is in some states is taken out at the end of each step, k = 0 included. */
    List<List<Rational>> without(Set<Integer> taken, int last) {
        List<List<Rational>> states = new ArrayList<>();
        List<Rational> state = start;
        for (int k = 0; k <= last; k++) {
            state = zeroed(state, taken);
            states.add(state);
            state = stepped(state);
        }
        return states;
    }

    private static List<Rational> zeroed(List<Rational> state, Set<Integer> taken) {
        return IntStream.range(0, state.size()).mapToObj(i -> taken.contains(i) ? Rational.ZERO : state.get(i)).toList();
    }

    /** P(T = 0), …, P(T = last) of the first step in a set, before those that are avoided. */
    List<Rational> law(Set<Integer> into, Set<Integer> avoiding, int last) {
        Set<Integer> taken = new TreeSet<>(into);
        taken.addAll(avoiding);
        List<List<Rational>> open = without(taken, last);
        List<Rational> law = new ArrayList<>(List.of(Gauss.dot(indicator(into), start)));
        for (int k = 1; k <= last; k++) {
            law.add(Gauss.dot(indicator(into), stepped(open.get(k - 1))));
        }
        return law;
    }

    /** Σ f(k), Σ k f(k) and Σ k² f(k) of the first passage, from each state. */
    record Moments(List<Rational> ever, List<Rational> first, List<Rational> second) {
    }

    /** By the fundamental matrix N = (I − Q)⁻¹ of the states from which the set can be entered: N r, N² r, 2N³ r − N² r. */
    Moments moments(Set<Integer> into, Set<Integer> avoiding) {
        List<Integer> open = IntStream.range(0, size()).filter(i -> !into.contains(i) && !avoiding.contains(i)
                && reaches(i, into, avoiding)).boxed().toList();
        List<Rational> ever = new ArrayList<>(indicator(into));
        List<Rational> first = new ArrayList<>(Collections.nCopies(size(), Rational.ZERO));
        List<Rational> second = new ArrayList<>(first);
        if (!open.isEmpty()) {
            List<List<Rational>> n = Gauss.inverse(open.stream().map(i -> open.stream().map(j ->
                    (i.equals(j) ? Rational.ONE : Rational.ZERO).minus(rows.get(j).get(i))).toList()).toList());
            List<Rational> entering = open.stream().map(i -> into.stream().map(s -> rows.get(s).get(i))
                    .reduce(Rational.ZERO, Rational::plus)).toList();
            List<Rational> once = Gauss.times(n, entering);
            List<Rational> twice = Gauss.times(n, once);
            List<Rational> thrice = Gauss.times(n, twice);
            for (int i = 0; i < open.size(); i++) {
                ever.set(open.get(i), once.get(i));
                first.set(open.get(i), twice.get(i));
                second.set(open.get(i), thrice.get(i).times(Rational.TWO).minus(twice.get(i)));
            }
        }
        return new Moments(ever, first, second);
    }

    private boolean reaches(int from, Set<Integer> into, Set<Integer> avoiding) {
        Set<Integer> seen = new TreeSet<>(Set.of(from));
        List<Integer> open = new ArrayList<>(seen);
        while (!open.isEmpty()) {
            int state = open.remove(open.size() - 1);
            for (int next = 0; next < size(); next++) {
                if (!rows.get(next).get(state).isZero() && !avoiding.contains(next) && seen.add(next)) {
                    open.add(next);
                }
            }
        }
        return seen.stream().anyMatch(into::contains);
    }

    /** The closed classes by their least state. */
    Map<Integer, Set<Integer>> closed() {
        List<Set<Integer>> reached = IntStream.range(0, size()).mapToObj(this::reachedFrom).toList();
        Map<Integer, Set<Integer>> closed = new TreeMap<>();
        for (int i = 0; i < size(); i++) {
            int own = i;
            if (reached.get(i).stream().allMatch(j -> reached.get(j).contains(own))) {
                closed.put(Collections.min(reached.get(i)), reached.get(i));
            }
        }
        return closed;
    }

    private Set<Integer> reachedFrom(int from) {
        return IntStream.range(0, size()).filter(to -> reaches(from, Set.of(to), Set.of())).boxed()
                .collect(java.util.stream.Collectors.toCollection(TreeSet::new));
    }

    /** The long-run average of x(k): of each closed class its π, by how likely the chain ends there. */
    List<Rational> average() {
        List<Rational> average = new ArrayList<>(Collections.nCopies(size(), Rational.ZERO));
        closed().values().forEach(members -> {
            Rational weight = Gauss.dot(start, moments(members, Set.of()).ever());
            List<Integer> all = List.copyOf(members);
            List<Rational> stationary = stationary(all);
            for (int i = 0; i < all.size(); i++) {
                average.set(all.get(i), weight.times(stationary.get(i)));
            }
        });
        return average;
    }

    /** π of a closed class: A π = π with one equation replaced by Σ π = 1. */
    List<Rational> stationary(List<Integer> members) {
        int n = members.size();
        List<List<Rational>> system = new ArrayList<>();
        for (int i = 0; i < n - 1; i++) {
            int row = members.get(i);
            system.add(members.stream().map(j -> rows.get(row).get(j)
                    .minus(row == j ? Rational.ONE : Rational.ZERO)).toList());
        }
        system.add(Collections.nCopies(n, Rational.ONE));
        return Gauss.inverse(system).stream().map(row -> row.get(n - 1)).toList();
    }

    /** What x(k) tends to for k ≡ 0, 1, … modulo a number of steps. */
    List<List<Rational>> limits(int period) {
        List<List<Rational>> power = new ArrayList<>();
        for (int j = 0; j < size(); j++) {
            power.add(from(j).states(period).get(period));
        }
        List<List<Rational>> turned = IntStream.range(0, size()).mapToObj(i -> power.stream()
                .map(column -> column.get(i)).toList()).toList();
        return states(period - 1).stream().map(state -> new PlainChain(turned, state).average()).toList();
    }
}
