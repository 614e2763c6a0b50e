package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.LongPredicate;
import org.pofk.answer.When.End;
import org.pofk.answer.When.ResidueClass;
import org.pofk.exact.LeastCommonMultiple;

/**
 * When several constraints hold together, residue class by residue class of the long run's period: beyond a bound a
 * class stays as it ends; before it, stretches of steps are enclosed at once and halved until each is inside or outside
 * for certain.
 */
public final class WhenSearch {
    private static final long MOST_CLASSES = 120;
    private static final long FARTHEST = Long.MAX_VALUE / 8;
    private static final int MOST_STRETCHES = 200_000;

    private final List<Constraint> constraints;
    private final Possible possible;
    private int stretches;

    /**
     * At which steps there is anything to ask; where there isn't, nothing holds.
     *
     * @param from from this step on all are, or none
     * @param ends whether none is
     */
    record Possible(LongPredicate at, long from, boolean ends) {
        static final Possible ALWAYS = new Possible(k -> true, 0, false);
        static final Possible NEVER = new Possible(k -> false, 0, true);
    }

    /** At every step. */
    public WhenSearch(List<Constraint> constraints) {
        this(constraints, Possible.ALWAYS);
    }

    WhenSearch(List<Constraint> constraints, Possible possible) {
        this.constraints = List.copyOf(constraints);
        this.possible = possible;
    }

    /** The period of the long run, times what the phases of the decaying modes need to come round, while that is few. */
    public long modulus(long least) {
        long modulus = least;
        for (Constraint constraint : constraints) {
            long period = constraint.period();
            modulus = LeastCommonMultiple.of(modulus, period);
            modulus = constraint.stride(modulus, Math.max(modulus * 2, MOST_CLASSES));
        }
        return modulus;
    }


    /** One a residue, in order. */
    public List<ResidueClass> classes(long modulus) {
        List<ResidueClass> classes = new ArrayList<>();
        for (long residue = 0; residue < modulus; residue++) {
            stretches = 0;
            try {
                classes.add(residueClass(new Stretches(residue, modulus)));
            } catch (TooMuchWorkException tooMuch) {
                classes.add(new ResidueClass(residue, modulus, End.TOO_MANY_STEPS, Optional.empty(), Optional.empty()));
            }
        }
        return classes;
    }

    private ResidueClass residueClass(Stretches steps) throws TooMuchWorkException {
        Constraint.Ending ending = ending(steps.residue, steps.modulus);
        long from = steps.atLeast(ending.from());
        Optional<Long> first = steps.first(0, from);
        return switch (ending.end()) {
            case MET -> {
                Optional<Long> lastFailed = steps.last(0, from);
                yield steps.answered(End.MET, Optional.of(first.orElse(from)),
                        Optional.of(lastFailed.map(step -> step + steps.modulus).orElse(steps.residue)));
            }
            case FAILED, APPROACH_NOT_DECIDED, TOO_MANY_STEPS -> steps.answered(ending.end(), first, Optional.empty());
            case BOTH_FOR_EVER -> {
                Optional<Long> found = first;
                for (long to = from; found.isEmpty(); to = 2 * to + steps.modulus) {
                    found = steps.first(to, 2 * to + steps.modulus);
                }
                yield steps.answered(End.BOTH_FOR_EVER, found, Optional.empty());
            }
        };
    }

    /** How they end together: one that fails is enough, and of one that comes and goes the others must all be met. */
    private Constraint.Ending ending(long residue, long modulus) throws TooMuchWorkException {
        if (possible.ends) {
            return new Constraint.Ending(End.FAILED, possible.from);
        }
        Constraint.Ending together = new Constraint.Ending(End.MET, possible.from);
        for (Constraint constraint : constraints) {
            Constraint.Ending own = constraint.ending(residue, modulus);
            long from = Math.max(own.from(), together.from());
            if (own.end() == End.FAILED) {
                return new Constraint.Ending(End.FAILED, from);
            }
            together = new Constraint.Ending(together.end() == End.MET ? own.end()
                    : own.end() == End.MET ? together.end() : End.APPROACH_NOT_DECIDED, from);
        }
        return together;
    }

    /** The steps of one class: k ≡ residue modulo modulus. */
    private final class Stretches {
        private final long residue;
        private final long modulus;

        private Stretches(long residue, long modulus) {
            this.residue = residue;
            this.modulus = modulus;
        }

        private ResidueClass answered(End end, Optional<Long> first, Optional<Long> forEverFrom) {
            return new ResidueClass(residue, modulus, end, first, forEverFrom);
        }

        /** The least step of the class not below k. */
        private long atLeast(long k) {
            return k + Math.floorMod(residue - k, modulus);
        }

        /** The first step that meets the condition among those from … to. */
        private Optional<Long> first(long from, long to) throws TooMuchWorkException {
            long low = atLeast(from);
            return low > to ? Optional.empty() : search(low, to - Math.floorMod(to - residue, modulus), true);
        }

        /** The last step that fails it. */
        private Optional<Long> last(long from, long to) throws TooMuchWorkException {
            long low = atLeast(from);
            return low > to ? Optional.empty() : search(low, to - Math.floorMod(to - residue, modulus), false);
        }

        /** The first met from the left, or the last failed from the right. */
        private Optional<Long> search(long low, long high, boolean met) throws TooMuchWorkException {
            if (++stretches > MOST_STRETCHES || high > FARTHEST) {
                throw new TooMuchWorkException();
            }
            Band.Relation relation = low == high ? at(low) : over(low, high);
            if (relation != Band.Relation.EITHER) {
                boolean inside = relation == Band.Relation.INSIDE;
                return inside != met ? Optional.empty() : Optional.of(met ? low : high);
            }
            long middle = low + (high - low) / modulus / 2 * modulus;
            Optional<Long> near = met ? search(low, middle, true) : search(middle + modulus, high, false);
            return near.isPresent() ? near
                    : met ? search(middle + modulus, high, true) : search(low, middle, false);
        }

        private Band.Relation over(long low, long high) throws TooMuchWorkException {
            Band.Relation together = low < possible.from ? Band.Relation.EITHER : Band.Relation.INSIDE;
            for (Constraint constraint : constraints) {
                together = together.and(constraint.over(residue, low, high, modulus));
            }
            return together;
        }

        private Band.Relation at(long k) throws TooMuchWorkException {
            if (!possible.at.test(k)) {
                return Band.Relation.OUTSIDE;
            }
            Band.Relation together = Band.Relation.INSIDE;
            for (Constraint constraint : constraints) {
                together = together.and(constraint.at(residue, k));
            }
            return together;
        }
    }
}
