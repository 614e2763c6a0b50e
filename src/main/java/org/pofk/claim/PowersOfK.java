package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.RationalField;
import org.pofk.meaning.Quantity;

/**
 * The polynomial in k that a pole's λ^k is multiplied by: Σ_p R_p binomial(k, p) λ^(−p) by powers of k. Exact; both
 * ways of writing agree at every k ≥ 0, for binomial(k, p) as a polynomial vanishes at k = 0 … p − 1.
 */
final class PowersOfK {
    private PowersOfK() {
    }

    /** Coefficients by ascending power of k, as many as the pole's multiplicity. */
    static List<Quantity> of(TruePole pole) {
        if (pole.multiplicity() == 1) {
            return pole.coefficients();
        }
        List<Quantity> coefficients = new ArrayList<>();
        for (int power = 0; power < pole.multiplicity(); power++) {
            List<Quantity> terms = new ArrayList<>();
            for (int p = power; p < pole.multiplicity(); p++) {
                Rational factor = binomial(p).coefficient(power);
                terms.add(pole.coefficients().get(p).times(pole.value().pow(-p)).times(factor));
            }
            coefficients.add(Quantity.sum(terms));
        }
        return coefficients;
    }

    /** k (k − 1) … (k − p + 1) / p!. */
    private static Polynomial<Rational> binomial(int p) {
        Polynomial<Rational> product = Polynomial.one(RationalField.Q);
        for (int i = 0; i < p; i++) {
            product = product.times(Polynomial.ofRationals(List.of(Rational.of(-i, i + 1), Rational.of(1, i + 1))));
        }
        return product;
    }
}
