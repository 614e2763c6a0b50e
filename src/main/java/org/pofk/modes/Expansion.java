package org.pofk.modes;

import java.util.List;
import org.pofk.exact.Factorization;
import org.pofk.exact.Polynomial;

/**
 * Partial fractions without radicals: y(k) = Σ impulses + Σ over factors q, roots λ of q and powers p of
 * R_{q,p}(λ) · binomial(k, p) · λ^(k−p). Exact; written once over the coefficient field.
 *
 * @param impulses the impulse at k = i in place i, as many as there are (the last is not zero)
 */
public record Expansion<E>(List<E> impulses, List<Part<E>> parts) {

    /**
     * What one factor q^e contributes: coefficients R_0 … R_{e−1} in E[λ]/(q), degree below that of q.
     * For a simple factor of high degree (above {@link #REDUCED_UP_TO}) R_0 is kept as the quotient
     * numerator(λ)/denominator(λ), never reduced; otherwise denominator is one.
     */
    public record Part<E>(Factorization.Factor<E> factor, List<Coefficient<E>> coefficients) {
        public Part {
            coefficients = List.copyOf(coefficients);
        }
    }

    /** numerator(λ) / denominator(λ) at a root λ of the factor; the denominator vanishes at none. */
    public record Coefficient<E>(Polynomial<E> numerator, Polynomial<E> denominator) {
        public boolean isZero() {
            return numerator.isZero();
        }
    }

    /** Degree of a simple factor up to which its coefficient is reduced to one polynomial. */
    public static final int REDUCED_UP_TO = 12;

    public Expansion {
        impulses = List.copyOf(impulses);
        parts = List.copyOf(parts);
    }
}
