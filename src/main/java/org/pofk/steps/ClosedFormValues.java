package org.pofk.steps;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.modes.Expansion;

/**
 * p(0) … p(last) from the partial fractions, exactly and without roots: a factor's part at k is the sum over its roots
 * of R(λ) · binomial(k, p) · λ^(k−p), and Σ λ^j follows from the factor's coefficients (Newton's identities). Nothing
 * of the matrix is used. Only where every coefficient is one polynomial; see {@link #isReduced}.
 */
public final class ClosedFormValues {
    private ClosedFormValues() {
    }

    /** False where the coefficient of a factor of high degree is kept as a quotient. */
    public static boolean isReduced(Expansion<Rational> expansion) {
        return expansion.parts().stream().flatMap(part -> part.coefficients().stream())
                .allMatch(Expansion.Coefficient::isReduced);
    }

    public static List<Rational> of(Expansion<Rational> expansion, int last) {
        List<Rational> values = new ArrayList<>(Collections.nCopies(last + 1, Rational.ZERO));
        for (int k = 0; k < expansion.impulses().size() && k <= last; k++) {
            values.set(k, expansion.impulses().get(k));
        }
        for (Expansion.Part<Rational> part : expansion.parts()) {
            List<Rational> sums = powerSums(part.factor().polynomial(), last + part.factor().polynomial().degree());
            for (int power = 0; power < part.coefficients().size(); power++) {
                addPart(values, part.coefficients().get(power), power, sums);
            }
        }
        return values;
    }

    private static void addPart(List<Rational> values, Expansion.Coefficient<Rational> coefficient, int power,
            List<Rational> sums) {
        Rational binomial = Rational.ONE;
        for (int k = power; k < values.size(); k++) {
            Rational trace = Rational.ZERO;
            for (int i = 0; i <= coefficient.numerator().degree(); i++) {
                trace = trace.plus(coefficient.numerator().coefficient(i).times(sums.get(k - power + i)));
            }
            values.set(k, values.get(k).plus(trace.times(binomial)));
            binomial = binomial.times(Rational.of(k + 1, k + 1 - power));
        }
    }

    /** Σ λ^j over the roots of a monic polynomial, j = 0 … last. */
    private static List<Rational> powerSums(Polynomial<Rational> monic, int last) {
        int degree = monic.degree();
        List<Rational> sums = new ArrayList<>(List.of(Rational.of(degree)));
        for (int j = 1; j <= last; j++) {
            Rational sum = j <= degree ? monic.coefficient(degree - j).times(Rational.of(j)) : Rational.ZERO;
            for (int i = 1; i <= Math.min(j - 1, degree); i++) {
                sum = sum.plus(monic.coefficient(degree - i).times(sums.get(j - i)));
            }
            sums.add(sum.negate());
        }
        return sums;
    }
}
