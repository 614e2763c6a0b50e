package org.pofk.steps;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.chain.Reach;
import org.pofk.chain.SparseMatrix;

/**
 * At which steps a chain can be in a set of states: which states carry probability at k follows from which do at k − 1,
 * so from some step on they repeat. Exact: a matter of moves, not of numbers. Cost: entries times steps until then.
 *
 * @param steps  in place k whether it can be at step k, up to the first repetition
 * @param from   from this step on, places repeat
 * @param period with this period
 */
public record PossibleSteps(List<Boolean> steps, int from, int period) {
    /** More steps until the first repetition are not looked at. */
    private static final int MOST_STEPS = 20_000;

    /** Every step is possible. */
    public static final PossibleSteps ALWAYS = new PossibleSteps(List.of(true), 0, 1);

    public PossibleSteps {
        steps = List.copyOf(steps);
    }

    /** Empty where the repetition comes too late to be looked for. */
    public static Optional<PossibleSteps> of(Chain chain, Iterable<Integer> states) {
        BitSet wanted = new BitSet();
        states.forEach(wanted::set);
        BitSet leading = new BitSet();
        Reach.into(chain.matrix(), wanted.stream().boxed().toList()).forEach(leading::set);
        BitSet here = new BitSet();
        for (int i = leading.nextSetBit(0); i >= 0; i = leading.nextSetBit(i + 1)) {
            here.set(i, !chain.start().get(i).isZero());
        }
        Map<BitSet, Integer> seen = new HashMap<>();
        List<Boolean> steps = new ArrayList<>();
        while (steps.size() <= MOST_STEPS) {
            Optional<Integer> before = Optional.ofNullable(seen.put(here, steps.size()));
            if (before.isPresent()) {
                return Optional.of(leastPeriod(steps, before.get(), steps.size() - before.get()));
            }
            steps.add(here.intersects(wanted));
            here = moved(chain.matrix(), here, leading);
        }
        return Optional.empty();
    }

    private static BitSet moved(SparseMatrix matrix, BitSet from, BitSet leading) {
        BitSet to = new BitSet();
        for (int state = from.nextSetBit(0); state >= 0; state = from.nextSetBit(state + 1)) {
            matrix.columns().get(state).forEach(entry -> to.set(entry.row()));
        }
        to.and(leading);
        return to;
    }

    /** With the least period, and the first step from which it holds; {@code steps} go up to the first repetition. */
    public static PossibleSteps leastPeriod(List<Boolean> steps, int from, int period) {
        int least = period;
        for (int candidate = period - 1; candidate >= 1; candidate--) {
            least = period % candidate == 0 && repeats(steps, from, candidate) ? candidate : least;
        }
        int first = from;
        while (first > 0 && steps.get(first - 1).equals(steps.get(first - 1 + least))) {
            first--;
        }
        return new PossibleSteps(steps.subList(0, first + least), first, least);
    }

    private static boolean repeats(List<Boolean> steps, int from, int period) {
        for (int k = from + period; k < steps.size(); k++) {
            if (!steps.get(k).equals(steps.get(k - period))) {
                return false;
            }
        }
        return true;
    }

    /** Whether it can be at step k. */
    public boolean at(long k) {
        return steps.get((int) (k < from ? k : from + (k - from) % period));
    }

    /** True when it can be at every step. */
    public boolean always() {
        return !steps.contains(false);
    }

    /** True when it can be at no step. */
    public boolean isNever() {
        return !steps.contains(true);
    }

    /** True when it never can be from some step on. */
    public boolean endsForEver() {
        return !steps.subList(from, from + period).contains(true);
    }

    /** The steps before the repetition at which it can't be, ascending. */
    public List<Integer> impossibleBefore() {
        return impossible(0, from);
    }

    /** The residues modulo the period of the steps from {@link #from} on at which it can't be, ascending. */
    public List<Integer> impossibleResidues() {
        return impossible(from, from + period).stream().map(k -> k % period).sorted().toList();
    }

    private List<Integer> impossible(int first, int end) {
        List<Integer> found = new ArrayList<>();
        for (int k = first; k < end; k++) {
            if (!steps.get(k)) {
                found.add(k);
            }
        }
        return found;
    }
}
