package org.pofk.transform;

import cc.redberry.rings.Rings;
import cc.redberry.rings.bigint.BigInteger;
import cc.redberry.rings.poly.PolynomialFactorDecomposition;
import cc.redberry.rings.poly.PolynomialMethods;
import cc.redberry.rings.poly.univar.UnivariatePolynomial;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.pofk.exact.Factorization;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Factorization.Irreducible;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;

/** The factors of a transform's denominator over the rationals. Exact. */
final class DenominatorFactors {
    private DenominatorFactors() {
    }

    static Factorization<Rational> of(Polynomial<Rational> monic) {
        List<Factor<Rational>> factors = new ArrayList<>();
        if (monic.degree() > 0) {
            PolynomialFactorDecomposition<UnivariatePolynomial<cc.redberry.rings.Rational<BigInteger>>> found =
                    PolynomialMethods.Factor(toRings(monic));
            for (int i = 0; i < found.size(); i++) {
                factors.add(new Factor<>(fromRings(found.get(i)).monic(), found.getExponent(i), Irreducible.PROVED));
            }
        }
        factors.sort(Comparator.comparing(Factor::polynomial, DenominatorFactors::compare));
        return new Factorization<>(Rational.ONE, factors);
    }

    private static int compare(Polynomial<Rational> a, Polynomial<Rational> b) {
        int order = Integer.compare(a.degree(), b.degree());
        for (int i = 0; i < a.degree() && order == 0; i++) {
            order = a.coefficient(i).compareTo(b.coefficient(i));
        }
        return order;
    }

    private static UnivariatePolynomial<cc.redberry.rings.Rational<BigInteger>> toRings(Polynomial<Rational> monic) {
        List<cc.redberry.rings.Rational<BigInteger>> coefficients = new ArrayList<>();
        for (Rational coefficient : monic.coefficients()) {
            coefficients.add(new cc.redberry.rings.Rational<>(Rings.Z, new BigInteger(coefficient.numerator()),
                    new BigInteger(coefficient.denominator())));
        }
        return UnivariatePolynomial.create(Rings.Q,
                coefficients.<cc.redberry.rings.Rational<BigInteger>>toArray(Rings.Q::createArray));
    }

    private static Polynomial<Rational> fromRings(UnivariatePolynomial<cc.redberry.rings.Rational<BigInteger>> found) {
        List<Rational> coefficients = new ArrayList<>();
        for (int i = 0; i <= found.degree(); i++) {
            cc.redberry.rings.Rational<BigInteger> value = found.get(i);
            coefficients.add(new Rational(new java.math.BigInteger(value.numerator().toByteArray()),
                    new java.math.BigInteger(value.denominator().toByteArray())));
        }
        return Polynomial.ofRationals(coefficients);
    }
}
