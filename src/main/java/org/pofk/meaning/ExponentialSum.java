package org.pofk.meaning;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalLong;
import java.util.SortedMap;
import java.util.SortedSet;
import java.util.TreeMap;
import java.util.TreeSet;
import org.pofk.exact.Rational;
import org.pofk.formula.ParsedFormula;
import org.pofk.text.RefusedException;
import org.pofk.text.Span;

/**
 * What a formula in k means: Σ coefficient · k^power · base^k · cos(angle · k + phase) plus impulses.
 *
 * <p>Products are multiplied out; terms whose power, base, angle and phase are written alike (the same at face value,
 * decimals to the same last place, factors in any order) are one, but for real bases in decimals at two places, which
 * may stand for two near numbers. Bases that are equal may so stand apart, and {@link #order} is a bound. r^k cos(θk + φ) stays one term, with its numbers as written; sin x
 * is cos(x − π/2); a product of two cosines is two terms. binomial(n, p) is its polynomial in k.
 *
 * @param terms    in the order of writing; no coefficient is zero as written
 * @param impulses what is added at single steps k ≥ 0; none is zero as written
 * @param scope    the steps for which anything is said: all of them unless the formula is given by cases
 */
public record ExponentialSum(List<Term> terms, SortedMap<Long, Quantity> impulses, Scope scope) {

    /**
     * One term; {@code angle} and {@code phase} are zero where nothing oscillates, and real always; {@code base} and
     * {@code coefficient} are real unless the author writes complex numbers. {@code base} is never zero: 0^k is an
     * impulse.
     *
     * @param span the largest part of the text that means this term alone; where terms were multiplied out, the part
     *             that tells it from its neighbours; where several were taken together, from the first to the last
     */
    public record Term(Quantity coefficient, int power, Quantity base, Quantity angle, Quantity phase, Span span) {

        /** The value at a step. */
        public Quantity valueAt(long k) {
            Quantity value = coefficient.times(power(k)).times(raised(base, k));
            return oscillates() ? value.times(Quantity.of(k).times(angle).plus(phase).cosine()) : value;
        }

        /** False where no angle is written. */
        public boolean oscillates() {
            return angle.rational().filter(Rational::isZero).isEmpty();
        }

        /** k^power, 0^0 being one. */
        private Quantity power(long k) {
            return Quantity.of(k).pow(power);
        }

        private static Quantity raised(Quantity base, long k) {
            int block = 1 << 30;
            Quantity rest = base.pow((int) (k % block));
            return k < block ? rest : base.pow(block).pow(Math.toIntExact(k / block)).times(rest);
        }
    }

    /**
     * The steps for which a formula says something.
     *
     * @param silent steps for which it doesn't, beyond those after the last
     * @param last   the last one for which it does, where there is one
     */
    public record Scope(SortedSet<Long> silent, OptionalLong last) {
        public static final Scope ALL = new Scope(Collections.emptySortedSet(), OptionalLong.empty());

        public Scope {
            silent = Collections.unmodifiableSortedSet(new TreeSet<>(silent));
        }

        public boolean includes(long k) {
            return k >= 0 && !silent.contains(k) && (last.isEmpty() || k <= last.getAsLong());
        }

        /** The steps that are in both. */
        public Scope and(Scope other) {
            if (equals(ALL) || other.equals(ALL)) {
                return equals(ALL) ? other : this;
            }
            SortedSet<Long> both = new TreeSet<>(silent);
            both.addAll(other.silent);
            boolean isFirst = last.isPresent()
                    && (other.last.isEmpty() || last.getAsLong() <= other.last.getAsLong());
            return new Scope(both, isFirst ? last : other.last);
        }
    }

    public ExponentialSum {
        terms = List.copyOf(terms);
        impulses = Collections.unmodifiableSortedMap(new TreeMap<>(impulses));
    }

    /**
     * The meaning of a formula in {@code k}, with decimals as precise as written or {@code carried}; exponents are
     * exact. Refused, with the place: what is no exponential sum, as k!, 1/k or a logarithm, and what is too large.
     */
    public static ExponentialSum of(ParsedFormula formula, Precision precision) throws RefusedException {
        return of(formula, precision, new Work());
    }

    static ExponentialSum of(ParsedFormula formula, Precision precision, Work work) throws RefusedException {
        Scalars scalars = new Scalars(work);
        return Reading.of(formula, new PolarAlgebra(scalars), scalars, precision).finished();
    }

    /**
     * The number of values that decide whether it vanishes beyond its impulses: at most Σ (power + 1), doubled where
     * a term oscillates, over terms that differ in base or angle.
     */
    public int order() {
        Map<List<Object>, Integer> orders = new HashMap<>();
        terms.forEach(term -> orders.merge(List.of(alike(term.base()), alike(term.angle())),
                (term.power() + 1) * (term.oscillates() ? 2 : 1), Math::max));
        return orders.values().stream().mapToInt(Integer::intValue).sum();
    }

    /** The number where it is written as a rational one, else the quantity, which is equal to itself only. */
    private static Object alike(Quantity quantity) {
        return quantity.rational().<Object>map(value -> value).orElse(quantity);
    }

    /** The value at a step k ≥ 0, at face value or spread as the quantity is. */
    public Quantity valueAt(long k) {
        List<Quantity> values = new ArrayList<>();
        terms.forEach(term -> values.add(term.valueAt(k)));
        values.add(impulses.getOrDefault(k, Quantity.ZERO));
        return Quantity.sum(values);
    }
}
