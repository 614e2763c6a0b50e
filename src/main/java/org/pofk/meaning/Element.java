package org.pofk.meaning;

import java.math.BigInteger;
import java.util.HashMap;
import java.util.Map;
import org.pofk.exact.LeastCommonMultiple;
import org.pofk.exact.Rational;

/**
 * A polynomial with rational coefficients in the generators of a {@link Tower}. Exact. Canonical form: monomials by
 * {@link Monomial} key, no coefficient zero, the denominator positive and coprime to all of them together.
 */
record Element(Map<Long, BigInteger> coefficients, BigInteger denominator) {
    static final Element ZERO = new Element(Map.of(), BigInteger.ONE);
    static final Element ONE = of(Rational.ONE);

    Element {
        coefficients = Map.copyOf(coefficients);
    }

    static Element of(Rational value) {
        return value.isZero() ? ZERO : new Element(Map.of(Monomial.ONE, value.numerator()), value.denominator());
    }

    /** One generator to a power. */
    static Element power(int generator, int exponent) {
        return new Element(Map.of(Monomial.power(generator, exponent), BigInteger.ONE), BigInteger.ONE);
    }

    /** In canonical form what is given by any coefficients over a positive denominator. */
    static Element over(Map<Long, BigInteger> coefficients, BigInteger denominator) {
        Map<Long, BigInteger> kept = new HashMap<>(coefficients);
        kept.values().removeIf(coefficient -> coefficient.signum() == 0);
        BigInteger common = denominator;
        for (BigInteger coefficient : kept.values()) {
            if (common.equals(BigInteger.ONE)) {
                return new Element(kept, denominator);
            }
            common = common.gcd(coefficient);
        }
        BigInteger divisor = common;
        kept.replaceAll((monomial, coefficient) -> coefficient.divide(divisor));
        return new Element(kept, denominator.divide(divisor));
    }

    boolean isZero() {
        return coefficients.isEmpty();
    }

    boolean isRational() {
        return isZero() || coefficients.size() == 1 && coefficients.containsKey(Monomial.ONE);
    }

    /** The coefficient of the monomial one. */
    Rational constant() {
        return new Rational(coefficients.getOrDefault(Monomial.ONE, BigInteger.ZERO), denominator);
    }

    Element plus(Element other) {
        BigInteger common = LeastCommonMultiple.of(denominator, other.denominator);
        BigInteger first = common.divide(denominator);
        BigInteger second = common.divide(other.denominator);
        Map<Long, BigInteger> sum = new HashMap<>();
        coefficients.forEach((monomial, c) -> sum.put(monomial, c.multiply(first)));
        other.coefficients.forEach((monomial, c) -> sum.merge(monomial, c.multiply(second), BigInteger::add));
        return over(sum, common);
    }

    Element times(Rational factor) {
        Map<Long, BigInteger> images = new HashMap<>();
        coefficients.forEach((monomial, c) -> images.put(monomial, c.multiply(factor.numerator())));
        return over(images, denominator.multiply(factor.denominator()));
    }

    Element negate() {
        return times(Rational.of(-1));
    }

    /** Without its denominator. */
    Element numerator() {
        return new Element(coefficients, BigInteger.ONE);
    }

    /** The highest power of a generator in it. */
    int degreeIn(int generator) {
        return coefficients.keySet().stream().mapToInt(monomial -> Monomial.exponent(monomial, generator)).max()
                .orElse(0);
    }

    /** Σ |coefficient|, the denominator left out. */
    BigInteger length() {
        return coefficients.values().stream().map(BigInteger::abs).reduce(BigInteger.ZERO, BigInteger::add);
    }

    int bitLength() {
        return coefficients.values().stream().mapToInt(BigInteger::bitLength).max().orElse(0)
                + denominator.bitLength();
    }
}
