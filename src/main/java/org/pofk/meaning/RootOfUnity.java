package org.pofk.meaning;

import java.math.BigInteger;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import org.pofk.exact.Cyclotomic;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;

/**
 * The root of unity ζ = e^(2πi/N) in a {@link Tower}, with the square roots that its powers give: Σ (a/p) ζ_p^a is √p for
 * a prime p ≡ 1 modulo 4 and i√p for p ≡ 3 (Gauss 1811), and ζ₈ + 1/ζ₈ = √2. Exact.
 */
final class RootOfUnity {
    private final Tower tower;
    private final int order;
    private final int index;

    private RootOfUnity(Tower tower, int order, int index) {
        this.tower = tower;
        this.order = order;
        this.index = index;
    }

    /** Empty for the orders 1 and 2. The square roots in its field are made known. */
    static Optional<RootOfUnity> of(BigInteger order, Tower tower, SquareRoots squareRoots) {
        if (order.bitLength() > 16) {
            throw new BeyondTowerException();
        }
        int n = order.intValueExact();
        int degree = Cyclotomic.totient(n);
        if (degree > Monomial.MOST_DEGREE) {
            throw new BeyondTowerException();
        }
        if (degree == 1) {
            return Optional.empty();
        }
        Quantity value = Quantity.i().times(Quantity.pi()).times(Rational.of(2, n)).exponential();
        RootOfUnity root = new RootOfUnity(tower, n, tower.add(new Tower.Generator(degree, rule(n), value, 0)));
        root.tellSquareRoots(squareRoots);
        return Optional.of(root);
    }

    private static Element rule(int order) {
        Polynomial<Rational> polynomial = Cyclotomic.polynomial(order);
        Map<Long, BigInteger> coefficients = new HashMap<>();
        for (int power = 0; power < polynomial.degree(); power++) {
            coefficients.put(Monomial.power(0, power), polynomial.coefficient(power).numerator().negate());
        }
        return Element.over(coefficients, BigInteger.ONE);
    }

    int order() {
        return order;
    }

    int index() {
        return index;
    }

    /** ζ^exponent, of any sign. */
    Element power(long exponent) {
        int reduced = (int) Math.floorMod(exponent, (long) order);
        if (order % 2 == 0 && reduced >= order / 2) {
            return power(reduced - order / 2).negate();
        }
        return tower.pow(Element.power(index, 1), reduced);
    }

    private void tellSquareRoots(SquareRoots squareRoots) {
        if (order % 8 == 0) {
            squareRoots.know(BigInteger.TWO, power(order / 8).plus(power(-order / 8)));
        }
        for (int p = 3; p <= order; p += 2) {
            boolean divides = order % p == 0 && Cyclotomic.totient(p) == p - 1;
            if (divides && (p % 4 == 1 || order % 4 == 0)) {
                Element sum = gaussSum(p);
                squareRoots.know(BigInteger.valueOf(p),
                        p % 4 == 1 ? sum : tower.times(sum, power(-order / 4)));
            }
        }
    }

    private Element gaussSum(int p) {
        Element sum = Element.ZERO;
        for (int a = 1; a < p; a++) {
            boolean square = BigInteger.valueOf(a).modPow(BigInteger.valueOf((p - 1) / 2), BigInteger.valueOf(p))
                    .equals(BigInteger.ONE);
            Element power = power((long) a * (order / p));
            sum = sum.plus(square ? power : power.negate());
        }
        return sum;
    }
}
