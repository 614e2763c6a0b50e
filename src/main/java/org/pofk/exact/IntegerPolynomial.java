package org.pofk.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;

/**
 * A polynomial with integer coefficients, the working form behind rational polynomials: no denominators to reduce.
 * Canonical form: ascending power, the last one not zero. Exact. Products, divisions and greatest common divisors of
 * small degree are done here; from {@link #RINGS_DEGREE} on the Rings library does them, which takes a tenth of a
 * second to load and is worth it only then.
 */
record IntegerPolynomial(List<BigInteger> coefficients) {
    /** From this degree on the library is faster than the schoolbook even when it has to be loaded. */
    static final int RINGS_DEGREE = 64;

    /** factor · dividend = quotient · divisor + remainder, the factor positive. */
    record PseudoDivision(BigInteger factor, IntegerPolynomial quotient, IntegerPolynomial remainder) {
    }

    IntegerPolynomial {
        int length = coefficients.size();
        while (length > 0 && coefficients.get(length - 1).signum() == 0) {
            length--;
        }
        coefficients = List.copyOf(coefficients.subList(0, length));
    }

    private static IntegerPolynomial of(BigInteger[] ascending) {
        return new IntegerPolynomial(Arrays.asList(ascending));
    }

    static IntegerPolynomial ofIntegers(long... ascending) {
        return new IntegerPolynomial(Arrays.stream(ascending).mapToObj(BigInteger::valueOf).toList());
    }

    int degree() {
        return coefficients.size() - 1;
    }

    boolean isZero() {
        return coefficients.isEmpty();
    }

    boolean isConstant() {
        return coefficients.size() <= 1;
    }

    BigInteger coefficient(int power) {
        return power < coefficients.size() ? coefficients.get(power) : BigInteger.ZERO;
    }

    BigInteger leading() {
        return coefficients.get(degree());
    }

    IntegerPolynomial negate() {
        return new IntegerPolynomial(coefficients.stream().map(BigInteger::negate).toList());
    }

    /** The greatest common divisor of the coefficients with the sign of the leading one; zero for zero. */
    BigInteger content() {
        BigInteger divisor = BigInteger.ZERO;
        for (int i = degree(); i >= 0 && !divisor.equals(BigInteger.ONE); i--) {
            divisor = divisor.gcd(coefficients.get(i));
        }
        return !isZero() && leading().signum() < 0 ? divisor.negate() : divisor;
    }

    /** This over its content: coprime coefficients, the leading one positive; zero stays zero. */
    IntegerPolynomial primitivePart() {
        return isZero() ? this : dividedBy(content());
    }

    IntegerPolynomial times(BigInteger factor) {
        return new IntegerPolynomial(coefficients.stream().map(factor::multiply).toList());
    }

    /** Each coefficient over a common divisor. */
    IntegerPolynomial dividedBy(BigInteger divisor) {
        return divisor.equals(BigInteger.ONE)
                ? this
                : new IntegerPolynomial(coefficients.stream().map(coefficient -> coefficient.divide(divisor)).toList());
    }

    /** This over the positive part of its content, so that signs stay. */
    IntegerPolynomial shortened() {
        return isZero() ? this : dividedBy(content().abs());
    }

    IntegerPolynomial times(IntegerPolynomial other) {
        if (isZero() || other.isZero()) {
            return new IntegerPolynomial(List.of());
        }
        if (Math.min(degree(), other.degree()) >= RINGS_DEGREE) {
            return RingsAlgebra.product(this, other);
        }
        BigInteger[] product = new BigInteger[degree() + other.degree() + 1];
        Arrays.fill(product, BigInteger.ZERO);
        for (int i = 0; i <= degree(); i++) {
            BigInteger factor = coefficients.get(i);
            for (int j = 0; factor.signum() != 0 && j <= other.degree(); j++) {
                product[i + j] = product[i + j].add(factor.multiply(other.coefficients.get(j)));
            }
        }
        return of(product);
    }

    IntegerPolynomial plus(IntegerPolynomial other) {
        return new IntegerPolynomial(IntStream.rangeClosed(0, Math.max(degree(), other.degree()))
                .mapToObj(i -> coefficient(i).add(other.coefficient(i))).toList());
    }

    /** The sign of the value at a rational point. */
    int signAt(Rational point) {
        BigInteger value = BigInteger.ZERO;
        BigInteger scale = BigInteger.ONE;
        for (int i = degree(); i >= 0; i--) {
            value = value.multiply(point.numerator()).add(coefficients.get(i).multiply(scale));
            scale = scale.multiply(point.denominator());
        }
        return value.signum();
    }

    IntegerPolynomial derivative() {
        List<BigInteger> result = new ArrayList<>();
        for (int i = 1; i <= degree(); i++) {
            result.add(coefficients.get(i).multiply(BigInteger.valueOf(i)));
        }
        return new IntegerPolynomial(result);
    }

    /** z^degree · this(1/z). */
    IntegerPolynomial reversed() {
        List<BigInteger> all = new ArrayList<>(coefficients);
        Collections.reverse(all);
        return new IntegerPolynomial(all);
    }

    /** this(z^m), m ≥ 1. */
    IntegerPolynomial atPower(int m) {
        BigInteger[] all = new BigInteger[Math.max(0, degree() * m + 1)];
        Arrays.fill(all, BigInteger.ZERO);
        for (int i = 0; i <= degree(); i++) {
            all[i * m] = coefficients.get(i);
        }
        return of(all);
    }

    /** The largest m for which this is g(z^m); the polynomial isn't constant. */
    int commonExponent() {
        BigInteger common = BigInteger.ZERO;
        for (int power = 1; power <= degree(); power++) {
            common = coefficients.get(power).signum() == 0 ? common : common.gcd(BigInteger.valueOf(power));
        }
        return common.intValueExact();
    }

    /** The g with this = g(z^m). */
    IntegerPolynomial withExponentsOver(int m) {
        return new IntegerPolynomial(IntStream.rangeClosed(0, degree() / m)
                .mapToObj(i -> coefficients.get(i * m)).toList());
    }

    /**
     * The quotient when it has integer coefficients and nothing is left. By Gauss's lemma a primitive divisor divides
     * over Q exactly when it does here. Ends at the first coefficient that doesn't divide; degree² products at most.
     */
    Optional<IntegerPolynomial> quotientBy(IntegerPolynomial divisor) {
        int steps = degree() - divisor.degree();
        if (steps < 0) {
            return isZero() ? Optional.of(this) : Optional.empty();
        }
        BigInteger[] rest = coefficients.toArray(BigInteger[]::new);
        BigInteger[] quotient = new BigInteger[steps + 1];
        for (int shift = steps; shift >= 0; shift--) {
            BigInteger[] parts = rest[shift + divisor.degree()].divideAndRemainder(divisor.leading());
            if (parts[1].signum() != 0) {
                return Optional.empty();
            }
            quotient[shift] = parts[0];
            subtractMultiple(rest, divisor, parts[0], shift);
        }
        return Arrays.stream(rest, 0, divisor.degree()).allMatch(left -> left.signum() == 0)
                ? Optional.of(of(quotient))
                : Optional.empty();
    }

    /** Division without fractions; the factor takes in only what the leading coefficients force. */
    PseudoDivision pseudoDividedBy(IntegerPolynomial divisor) {
        int steps = degree() - divisor.degree();
        BigInteger factor = BigInteger.ONE;
        if (steps < 0) {
            return new PseudoDivision(factor, new IntegerPolynomial(List.of()), this);
        }
        BigInteger leading = divisor.leading();
        BigInteger[] rest = coefficients.toArray(BigInteger[]::new);
        BigInteger[] quotient = new BigInteger[steps + 1];
        Arrays.fill(quotient, BigInteger.ZERO);
        for (int shift = steps; shift >= 0; shift--) {
            BigInteger top = rest[shift + divisor.degree()];
            if (top.signum() == 0) {
                continue;
            }
            BigInteger scale = leading.abs().divide(leading.gcd(top));
            if (!scale.equals(BigInteger.ONE)) {
                factor = factor.multiply(scale);
                multiply(rest, scale);
                multiply(quotient, scale);
            }
            quotient[shift] = rest[shift + divisor.degree()].divide(leading);
            subtractMultiple(rest, divisor, quotient[shift], shift);
        }
        return new PseudoDivision(factor, of(quotient), of(Arrays.copyOf(rest, Math.max(0, divisor.degree()))));
    }

    private static void multiply(BigInteger[] all, BigInteger scale) {
        for (int i = 0; i < all.length; i++) {
            all[i] = all[i].multiply(scale);
        }
    }

    private static void subtractMultiple(BigInteger[] rest, IntegerPolynomial divisor, BigInteger multiple, int shift) {
        for (int i = 0; multiple.signum() != 0 && i <= divisor.degree(); i++) {
            rest[shift + i] = rest[shift + i].subtract(multiple.multiply(divisor.coefficients.get(i)));
        }
    }

    /** The primitive greatest common divisor, its leading coefficient positive; zero only for two zeros. */
    IntegerPolynomial greatestCommonDivisor(IntegerPolynomial other) {
        if (isZero() || other.isZero()) {
            return isZero() ? other.primitivePart() : primitivePart();
        }
        if (isConstant() || other.isConstant()) {
            return ofIntegers(1);
        }
        if (ModularPolynomial.provesCoprime(this, other)) {
            return ofIntegers(1);
        }
        return degree() * other.degree() >= RINGS_DEGREE * RINGS_DEGREE / 4
                ? RingsAlgebra.greatestCommonDivisor(this, other)
                : FractionFreeEuclid.greatestCommonDivisor(this, other);
    }

    /** The image modulo a prime below 2^31, coefficients in [0, prime). */
    ModularPolynomial modulo(int prime) {
        BigInteger modulus = BigInteger.valueOf(prime);
        return new ModularPolynomial(prime, coefficients.stream().mapToLong(
                coefficient -> coefficient.mod(modulus).longValueExact()).toArray());
    }

    @Override
    public String toString() {
        return "ascending " + coefficients;
    }
}
