package org.pofk.answer;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import org.pofk.answer.When.End;
import org.pofk.answer.When.Reason;
import org.pofk.answer.When.ResidueClass;
import org.pofk.chain.Chain;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;
import org.pofk.transform.Sequence;

/**
 * Answers {@link When}, residue class by residue class of the long run's period: what is left of p(k) beside its long
 * run decays, so that beyond a bound a class stays where its limit is; before it, stretches of steps are enclosed at
 * once and halved until each is inside or outside for certain, single steps in the end by exact values.
 */
final class WhenSearch {
    private static final int LEAST_BITS = 160;
    private static final int BITS_A_DIGIT = 4;
    private static final int[] CLOSER_BITS = {512, 2_048, 8_192};
    private static final long EXACT_UP_TO = 20_000;
    private static final long MOST_CLASSES = 120;
    private static final long FARTHEST = Long.MAX_VALUE / 8;
    private static final int MOST_STRETCHES = 200_000;
    private static final long UNDECIDED_SEARCHED_UP_TO = 1_000_000;

    /** Thrown where the work is bounded; caught where the class is answered. */
    private static final class TooMuchWork extends Exception {
        private static final long serialVersionUID = 1;
    }

    private final Chain chain;
    private final ClosedForm form;
    private final List<Rational> limits;
    private final When.Condition condition;
    private final Supplier<Sequence> exact;
    private final int digits;
    private final DecayingSum sum;
    private final long firstWithoutImpulses;
    private int stretches;

    WhenSearch(Chain chain, ClosedForm form, LongRun longRun, When.Condition condition) {
        this.chain = chain;
        this.form = form;
        this.limits = LongRunValues.of(longRun);
        this.condition = condition;
        this.exact = new Supplier<>() {
            private Optional<Sequence> known = Optional.empty();

            @Override
            public Sequence get() {
                if (known.isEmpty()) {
                    known = Optional.of(Sequence.of(chain, form.transform()));
                }
                return known.get();
            }
        };
        this.digits = digits();
        this.sum = DecayingSum.of(form, LEAST_BITS + BITS_A_DIGIT * digits);
        this.firstWithoutImpulses = form.withoutImpulsesFrom();
    }

    /** Places that tell the bound from every value of the long run that differs from it, with one to spare. */
    private int digits() {
        int needed = 2;
        for (Rational limit : limits) {
            Rational distance = condition.around(limit).distanceFromZero();
            while (!distance.isZero() && distance.times(Rational.of(10).pow(needed - 1)).compareTo(Rational.ONE) < 0) {
                needed++;
            }
        }
        return needed;
    }

    When answer() {
        if (limits.isEmpty()) {
            return new When(condition, firstWithin(ExactSteps.FEW), Optional.empty(), List.of(), false,
                    Reason.NO_LONG_RUN);
        }
        List<ResidueClass> classes = new ArrayList<>();
        long modulus = modulus();
        for (long residue = 0; residue < modulus; residue++) {
            classes.add(residueClass(residue, modulus));
        }
        return WhenSummary.of(condition, classes);
    }

    /** The period of the long run, times what the phases of the decaying modes need to come round, while that is few. */
    private long modulus() {
        return sum.stride(limits.size(), Math.max(limits.size() * 2L, MOST_CLASSES));
    }

    private ResidueClass residueClass(long residue, long modulus) {
        Band band = condition.around(limits.get((int) (residue % limits.size())));
        stretches = 0;
        try {
            return residueClass(new Stretches(band, residue, modulus));
        } catch (TooMuchWork tooMuch) {
            return new ResidueClass(residue, modulus, End.TOO_MANY_STEPS, Optional.empty(), Optional.empty());
        }
    }

    private ResidueClass residueClass(Stretches steps) throws TooMuchWork {
        Ending ending = ending(steps);
        Optional<Long> first = steps.first(0, ending.from);
        return switch (ending.end) {
            case MET -> {
                Optional<Long> lastFailed = steps.last(0, ending.from);
                yield steps.answered(End.MET, Optional.of(first.orElse(ending.from)),
                        Optional.of(lastFailed.map(step -> step + steps.modulus).orElse(steps.residue)));
            }
            case FAILED, APPROACH_NOT_DECIDED, TOO_MANY_STEPS -> steps.answered(ending.end, first, Optional.empty());
            case BOTH_FOR_EVER -> {
                Optional<Long> found = first;
                for (long to = ending.from; found.isEmpty(); to = 2 * to + steps.modulus) {
                    found = steps.first(to, 2 * to + steps.modulus);
                }
                yield steps.answered(End.BOTH_FOR_EVER, found, Optional.empty());
            }
        };
    }

    /** How a class ends, and a step of it from which it does. */
    private record Ending(End end, long from) {
    }

    private Ending ending(Stretches steps) throws TooMuchWork {
        if (!steps.band.distanceFromZero().isZero()) {
            BigInteger from = DecayBound.of(DecayingMode.of(form), digits)
                    .settledFrom(BigInteger.valueOf(firstWithoutImpulses));
            if (from.bitLength() > Long.SIZE - 8) {
                throw new TooMuchWork();
            }
            return new Ending(steps.band.contains(Rational.ZERO) ? End.MET : End.FAILED,
                    steps.atLeast(from.longValueExact()));
        }
        EventualSign sign = EventualSign.of(form, (int) (steps.residue % 2), firstWithoutImpulses);
        boolean below = steps.band.low().isEmpty();
        return switch (sign.kind()) {
            case ZERO -> new Ending(End.MET, steps.atLeast(firstWithoutImpulses));
            case POSITIVE -> new Ending(below ? End.FAILED : End.MET, steps.atLeast(sign.from()));
            case NEGATIVE -> new Ending(below ? End.MET : End.FAILED, steps.atLeast(sign.from()));
            case BOTH_FOR_EVER -> new Ending(End.BOTH_FOR_EVER, steps.atLeast(firstWithoutImpulses));
            case UNDECIDED -> new Ending(End.APPROACH_NOT_DECIDED, steps.atLeast(UNDECIDED_SEARCHED_UP_TO));
        };
    }

    private Optional<Long> firstWithin(long last) {
        for (long k = 0; k <= last; k++) {
            if (condition.kind() != When.Condition.Kind.SETTLED
                    && condition.around(Rational.ZERO).contains(exact.get().at(k))) {
                return Optional.of(k);
            }
        }
        return Optional.empty();
    }

    /** The steps of one class: k ≡ residue modulo modulus. */
    private final class Stretches {
        private final Band band;
        private final long residue;
        private final long modulus;
        private final Rational limit;

        private Stretches(Band band, long residue, long modulus) {
            this.band = band;
            this.residue = residue;
            this.modulus = modulus;
            this.limit = limits.get((int) (residue % limits.size()));
        }

        private ResidueClass answered(End end, Optional<Long> first, Optional<Long> forEverFrom) {
            return new ResidueClass(residue, modulus, end, first, forEverFrom);
        }

        /** The least step of the class not below k. */
        private long atLeast(long k) {
            return k + Math.floorMod(residue - k, modulus);
        }

        /** The first step that meets the condition among those from … to. */
        private Optional<Long> first(long from, long to) throws TooMuchWork {
            long low = atLeast(from);
            return low > to ? Optional.empty() : search(low, to - Math.floorMod(to - residue, modulus), true);
        }

        /** The last step that fails it. */
        private Optional<Long> last(long from, long to) throws TooMuchWork {
            long low = atLeast(from);
            return low > to ? Optional.empty() : search(low, to - Math.floorMod(to - residue, modulus), false);
        }

        /** The first met from the left, or the last failed from the right. */
        private Optional<Long> search(long low, long high, boolean met) throws TooMuchWork {
            if (++stretches > MOST_STRETCHES || high > FARTHEST) {
                throw new TooMuchWork();
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

        private Band.Relation over(long low, long high) {
            return low < firstWithoutImpulses ? Band.Relation.EITHER : band.of(sum.over(low, high, modulus));
        }

        private Band.Relation at(long k) throws TooMuchWork {
            if (k >= firstWithoutImpulses) {
                Band.Relation relation = band.of(sum.over(k, k, modulus));
                for (int i = 0; relation == Band.Relation.EITHER && i < CLOSER_BITS.length; i++) {
                    relation = band.of(DecayingSum.of(form, CLOSER_BITS[i]).over(k, k, modulus));
                }
                if (relation != Band.Relation.EITHER) {
                    return relation;
                }
            }
            if (k > EXACT_UP_TO) {
                throw new TooMuchWork();
            }
            return band.contains(exact.get().at(k).minus(limit)) ? Band.Relation.INSIDE : Band.Relation.OUTSIDE;
        }
    }
}
