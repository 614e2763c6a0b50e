package org.pofk.modes;

import java.util.List;
import org.pofk.exact.Factorization;
import org.pofk.exact.Field;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.transform.TransferFunction;

/**
 * Partial fractions without radicals: y(k) = Σ impulses + Σ over factors q, roots λ of q and powers p of
 * R_{q,p}(λ) · binomial(k, p) · λ^(k−p). Exact; written once over the coefficient field.
 *
 * @param field    the coefficient field
 * @param impulses the impulse at k = i in place i, as many as there are (the last is not zero)
 * @param parts    one for each factor of the denominator but z, in the factors' order
 */
public record Expansion<E>(Field<E> field, List<E> impulses, List<Part<E>> parts) {

    /** Degree of a simple factor up to which its coefficient is reduced to one polynomial. */
    public static final int REDUCED_UP_TO = 12;
    /** Degree times bits of the longest coefficient of such a factor. */
    static final int REDUCED_UP_TO_BITS = 8_000;

    /**
     * What one factor q^e contributes: coefficients R_0 … R_{e−1} in E[λ]/(q), degree below that of q.
     * For a simple factor of high degree (above {@link #REDUCED_UP_TO}) or with long coefficients R_0 is kept as the quotient
     * numerator(λ)/denominator(λ), never reduced; otherwise denominator is one.
     */
    public record Part<E>(Factorization.Factor<E> factor, List<Coefficient<E>> coefficients) {
        public Part {
            coefficients = List.copyOf(coefficients);
        }

        /**
         * What this part adds to y(k): Σ_p binomial(k, p) · trace of R_p(λ) λ^(k−p) in E[λ]/(q), for k ≥ 0. Exact;
         * log k products modulo q for each power, and one inverse modulo q where a coefficient is a quotient.
         */
        public E valueAt(long k) {
            return Traces.of(factor.polynomial()).sequence(coefficients, k);
        }
    }

    /** numerator(λ) / denominator(λ) at a root λ of the factor; the denominator vanishes at none. */
    public record Coefficient<E>(Polynomial<E> numerator, Polynomial<E> denominator) {
        public boolean isZero() {
            return numerator.isZero();
        }

        /** True when the denominator is one: an element of E[λ]/(q) in canonical form. */
        public boolean isReduced() {
            return denominator.isConstant();
        }
    }

    public Expansion {
        impulses = new Polynomial<>(field, impulses).coefficients();
        parts = List.copyOf(parts);
    }

    /** y(k), exactly, for k ≥ 0; no radical and no decimal on the way. */
    public E valueAt(long k) {
        E value = k < impulses.size() ? impulses.get((int) k) : field.zero();
        for (Part<E> part : parts) {
            value = field.add(value, part.valueAt(k));
        }
        return value;
    }

    /** All terms brought back over one denominator: the transform this is the expansion of. */
    public TransferFunction<E> recombined() {
        return Recombination.of(this);
    }

    /** binomial(k, p), exactly; zero for k below p. */
    static Rational binomial(long k, int p) {
        Rational result = Rational.ONE;
        for (int i = 0; i < p; i++) {
            result = result.times(Rational.of(k - i)).dividedBy(Rational.of(i + 1));
        }
        return result;
    }
}
