package org.pofk.meaning;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalLong;
import java.util.TreeSet;
import java.util.function.LongFunction;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Rational;

/**
 * Whether a formula in k and a sequence of rationals are the same for every step of a range, at face value.
 *
 * <p>The formula without its impulses is a sum of m functions k^p λ^k; it obeys a recurrence of order m whose
 * characteristic polynomial is the product of the z − λ. The sequence obeys one of order n. Their difference obeys the
 * one with the product of both polynomials, of order m + n and monic: once m + n values in a row are zero, so are all
 * that follow. So the steps are compared up to the first m + n in a row without an impulse; at an impulse later on the
 * difference is the impulse itself. At most (m + n)·(1 + number of impulses) steps are compared. Exact: each value is
 * compared by an enclosure first, and where that holds the true value, by {@link Quantity#isZero}.
 */
public final class SameSequence {
    private static final int GLANCE = 128;

    private final ExponentialSum sum;
    private final LongFunction<Rational> values;
    private final List<Long> open = new ArrayList<>();

    /**
     * What came out.
     *
     * @param same      undecided only where no step was found to differ and at least one can't be told
     * @param differsAt a step at which they differ, for {@link Decision#NO} only: the first one, unless an earlier one
     *                  can't be told
     */
    public record Answer(Decision same, OptionalLong differsAt) {
    }

    private SameSequence(ExponentialSum sum, LongFunction<Rational> values) {
        this.sum = sum;
        this.values = values;
    }

    /**
     * Compares for the steps {@code from} ≥ 0 … {@code to}; steps for which the formula says nothing count as
     * different.
     *
     * @param recurrenceOrder the order n of a recurrence with constant coefficients that all values from step 0 on obey
     */
    public static Answer decide(ExponentialSum sum, LongFunction<Rational> values, int recurrenceOrder, long from,
            OptionalLong to) {
        TreeSet<Long> special = new TreeSet<>(sum.impulses().keySet());
        special.addAll(sum.scope().silent());
        sum.scope().last().ifPresent(last -> special.add(Math.max(from, last + 1)));
        long end = to.orElse(Long.MAX_VALUE);
        long wanted = (long) sum.order() + recurrenceOrder;
        List<Long> compared = new ArrayList<>();
        long k = from;
        for (long inRow = 0; k <= end && inRow < wanted; k++) {
            compared.add(k);
            inRow = special.contains(k) ? 0 : inRow + 1;
        }
        long next = k;
        List<Long> later = special.stream().filter(step -> step >= next && step <= end).toList();
        return new SameSequence(sum, values).decide(compared, later);
    }

    /** Compared steps that decide about the terms, and the special ones after these. */
    private Answer decide(List<Long> compared, List<Long> later) {
        OptionalLong differing = compared.stream().mapToLong(Long::longValue).filter(this::differsAtAGlance)
                .findFirst();
        Answer terms = among(open, this::difference);
        if (terms.same == Decision.NO || differing.isPresent()) {
            return terms.same == Decision.NO ? terms : new Answer(Decision.NO, differing);
        }
        if (terms.same == Decision.UNDECIDED) {
            return terms;
        }
        OptionalLong silent = later.stream().mapToLong(Long::longValue).filter(k -> !sum.scope().includes(k))
                .findFirst();
        Answer impulses = among(later.stream().filter(k -> silent.isEmpty() || k < silent.getAsLong()).toList(),
                sum.impulses()::get);
        return impulses.same != Decision.NO && silent.isPresent() ? new Answer(Decision.NO, silent) : impulses;
    }

    /** Whether the difference is zero at each of these steps. */
    private static Answer among(List<Long> steps, LongFunction<Quantity> difference) {
        Decision same = Decision.YES;
        for (long k : steps) {
            switch (difference.apply(k).isZero()) {
                case NO -> {
                    return new Answer(Decision.NO, OptionalLong.of(k));
                }
                case UNDECIDED -> same = Decision.UNDECIDED;
                case YES -> { }
            }
        }
        return new Answer(same, OptionalLong.empty());
    }

    /** Whether an enclosure proves a difference; notes the step where it doesn't. */
    private boolean differsAtAGlance(long k) {
        if (!sum.scope().includes(k)) {
            return true;
        }
        Rational value = values.apply(k);
        ComplexBall enclosed = sum.valueAt(k).enclose(GLANCE);
        boolean holds = enclosed.real().contains(value) && enclosed.imaginary().containsZero();
        if (holds) {
            open.add(k);
        }
        return !holds;
    }

    private Quantity difference(long k) {
        return sum.valueAt(k).minus(Quantity.of(values.apply(k)));
    }
}
