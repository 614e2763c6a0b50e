package org.pofk.claim;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.RationalField;
import org.pofk.exact.ResidueField;
import org.pofk.exact.Root;
import org.pofk.meaning.Quantity;
import org.pofk.transform.TransferFunction;

/**
 * What a formula in z should be: Y(z), or Y(z)/z, with its poles. Exact.
 *
 * @param overZ 1 where it is Y(z)/z, 0 for Y(z)
 */
record TransformTarget(OutputTruth truth, int overZ, TransferFunction<Rational> fraction) {

    /** Y(z). */
    static TransformTarget of(OutputTruth truth) {
        return new TransformTarget(truth, 0, truth.y());
    }

    /** Y(z)/z. */
    static TransformTarget overZ(OutputTruth truth) {
        return new TransformTarget(truth, 1, new TransferFunction<>(truth.y().numerator(),
                truth.y().denominator().shiftedUp(1)));
    }

    /** This over z. */
    TransformTarget dividedByZ() {
        return overZ(truth);
    }

    Quantity valueAt(Rational z) {
        return Quantity.of(fraction.numerator().valueAt(z).dividedBy(fraction.denominator().valueAt(z)));
    }

    /** The zeros of the denominator, complex ones each by itself. */
    List<FormPole> poles() {
        List<FormPole> poles = new ArrayList<>();
        List<Factor<Rational>> factors = truth.transform().factors().factors();
        for (int i = 0; i < factors.size(); i++) {
            Polynomial<Rational> factor = factors.get(i).polynomial();
            if (!factor.coefficient(0).isZero()) {
                for (Root root : truth.closedForm().roots().get(i).all()) {
                    poles.add(new FormPole(root, Quantity.of(root), factor, factors.get(i).multiplicity()));
                }
            }
        }
        int zeros = fraction.denominator().lowestPower();
        if (zeros > 0) {
            poles.addAll(FormPole.allOf(Polynomial.monomial(RationalField.Q, Rational.ONE, zeros)));
        }
        return poles;
    }

    /** The numerator over these poles, taken as often as they are, in partial fractions; degree below theirs. */
    List<Quantity> partAt(RootCounts poles) {
        List<Quantity> denominator = poles.polynomial();
        if (denominator.stream().allMatch(each -> each.rational().isPresent())) {
            Polynomial<Rational> own = Polynomial.ofRationals(denominator.stream()
                    .map(each -> each.rational().orElseThrow()).toList());
            ResidueField<Rational> residues = new ResidueField<>(own);
            Polynomial<Rational> others = fraction.denominator().dividedExactlyBy(own);
            return QuantityPolynomials.of(residues.multiply(fraction.numerator().remainder(own),
                    residues.inverse(others.remainder(own))));
        }
        List<Quantity> sum = List.of();
        for (FormPole pole : poles.counts().keySet()) {
            Map<FormPole, Integer> others = new LinkedHashMap<>(poles.counts());
            others.remove(pole);
            List<Quantity> product = QuantityPolynomials.times(partAt(pole), new RootCounts(others).polynomial());
            sum = QuantityPolynomials.plus(sum, product);
        }
        List<Quantity> shifted = new ArrayList<>(sum);
        if (overZ == 0) {
            shifted.add(0, Quantity.ZERO);
        }
        return QuantityPolynomials.divide(shifted, denominator).remainder();
    }

    /** That of Y(z)/z at one pole other than zero: Σ R_p (z − λ)^(m−1−p). */
    private List<Quantity> partAt(FormPole pole) {
        TruePole known = truth.poles().stream().filter(each -> each.root().polynomial().equals(pole.of())
                && (each.root().index() == pole.root().index()
                || each.root().conjugateIndex() == pole.root().index())).findFirst().orElseThrow();
        List<Quantity> sum = List.of();
        for (int p = 0; p < known.multiplicity(); p++) {
            Quantity coefficient = known.coefficients().get(p);
            Quantity own = known.root().index() == pole.root().index() ? coefficient : coefficient.conjugate();
            sum = QuantityPolynomials.plus(sum, QuantityPolynomials.times(QuantityPolynomials.power(
                    QuantityPolynomials.withRoot(pole.value()), known.multiplicity() - 1 - p), own));
        }
        return sum;
    }

    /** What is left of it beyond its partial fractions. */
    List<Quantity> polynomialPart() {
        return QuantityPolynomials.of(fraction.numerator().dividedBy(fraction.denominator()).quotient());
    }
}
