package org.pofk.meaning;

import java.util.List;
import java.util.SortedMap;
import org.pofk.formula.ParsedFormula;
import org.pofk.text.RefusedException;
import org.pofk.text.Span;

/**
 * What a formula in k means: Σ coefficient · k^power · base^k · cos(angle · k + phase) plus impulses. Terms of the same
 * shape, as far as that is seen from how they are written, are one; bases that are equal but written differently may
 * still stand apart, so {@link #order} is a bound.
 *
 * @param terms    in the order of writing
 * @param impulses what is added at single steps
 */
public record ExponentialSum(List<Term> terms, SortedMap<Long, Quantity> impulses) {

    /**
     * One term; {@code angle} and {@code phase} are zero where nothing oscillates, and real always; {@code base} and
     * {@code coefficient} are real unless the author writes complex numbers. {@code base} is never zero: 0^k is an
     * impulse.
     */
    public record Term(Quantity coefficient, int power, Quantity base, Quantity angle, Quantity phase, Span span) {
    }

    /**
     * The meaning of a formula in {@code k}, with decimals as precise as written or {@code carried}. Refused, with the
     * place: what is no exponential sum, as k!, 1/k or a logarithm.
     */
    public static ExponentialSum of(ParsedFormula formula, Precision precision) throws RefusedException {
        throw new AssertionError("to come");
    }

    /** The number of values that decide whether it vanishes beyond its impulses. */
    public int order() {
        throw new AssertionError("to come");
    }

    /** The value at a step, at face value or spread as the quantity is. */
    public Quantity valueAt(long k) {
        throw new AssertionError("to come");
    }
}
