package org.pofk.exact;

import cc.redberry.rings.Rings;
import cc.redberry.rings.poly.PolynomialFactorDecomposition;
import cc.redberry.rings.poly.univar.DistinctDegreeFactorization;
import cc.redberry.rings.poly.univar.UnivariateFactorization;
import cc.redberry.rings.poly.univar.UnivariateGCD;
import cc.redberry.rings.poly.univar.UnivariatePolynomial;
import cc.redberry.rings.poly.univar.UnivariatePolynomialZp64;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/** The only place that knows the Rings library. Loading this class loads the library, so it is named late. */
final class RingsAlgebra {
    private RingsAlgebra() {
    }

    static IntegerPolynomial product(IntegerPolynomial a, IntegerPolynomial b) {
        return back(there(a).multiply(there(b)));
    }

    /** The primitive greatest common divisor of two polynomials that aren't zero, leading coefficient positive. */
    static IntegerPolynomial greatestCommonDivisor(IntegerPolynomial a, IntegerPolynomial b) {
        return back(UnivariateGCD.PolynomialGCD(there(a.primitivePart()), there(b.primitivePart()))).primitivePart();
    }

    /** The irreducible factors of a square-free primitive polynomial, each primitive with a positive leading one. */
    static List<IntegerPolynomial> irreducibleFactors(IntegerPolynomial squareFree) {
        PolynomialFactorDecomposition<UnivariatePolynomial<cc.redberry.rings.bigint.BigInteger>> found =
                UnivariateFactorization.Factor(there(squareFree));
        List<IntegerPolynomial> factors = new ArrayList<>();
        for (UnivariatePolynomial<cc.redberry.rings.bigint.BigInteger> factor : found.factors) {
            factors.add(back(factor).primitivePart());
        }
        return factors;
    }

    /** As {@link ModularPolynomial#factorDegrees()}, for large degrees. */
    static List<Integer> factorDegrees(long prime, long[] squareFree) {
        PolynomialFactorDecomposition<UnivariatePolynomialZp64> found = DistinctDegreeFactorization
                .DistinctDegreeFactorization(UnivariatePolynomialZp64.create(prime, squareFree).monic());
        List<Integer> degrees = new ArrayList<>();
        for (int i = 0; i < found.factors.size(); i++) {
            int size = found.exponents.get(i);
            degrees.addAll(Collections.nCopies(found.factors.get(i).degree() / size, size));
        }
        return degrees;
    }

    private static UnivariatePolynomial<cc.redberry.rings.bigint.BigInteger> there(IntegerPolynomial polynomial) {
        return UnivariatePolynomial.create(Rings.Z, polynomial.coefficients().stream()
                .map(cc.redberry.rings.bigint.BigInteger::new)
                .toArray(cc.redberry.rings.bigint.BigInteger[]::new));
    }

    private static IntegerPolynomial back(UnivariatePolynomial<cc.redberry.rings.bigint.BigInteger> polynomial) {
        List<BigInteger> ascending = new ArrayList<>(polynomial.degree() + 1);
        for (int i = 0; i <= polynomial.degree(); i++) {
            ascending.add(new BigInteger(polynomial.get(i).toByteArray()));
        }
        return new IntegerPolynomial(ascending);
    }
}
