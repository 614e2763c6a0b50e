package org.pofk.longrun;

import java.math.BigInteger;
import java.util.List;
import org.pofk.exact.Ball;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.exact.UnitCircle;

/**
 * When a sum of decaying modes stays below 10^−digits: Σ a · k^p/p! · r^(k−p) from upper bounds a and r < 1, rounded up
 * throughout. Each term falls from k + 1 ≥ p/(1 − r) on, so the first k there at which the sum is small enough is found
 * by halving. Certified.
 */
public final class DecayBound {
    private static final int LEAST_BITS = 128;
    private static final int BITS_A_DIGIT = 4;
    private static final int MOST_BITS = 1 << 17;

    private record Term(BigInteger amplitude, BigInteger modulus, int power) {
    }

    private final List<Term> terms;
    private final int digits;
    private final int bits;

    private DecayBound(List<Term> terms, int digits, int bits) {
        this.terms = terms;
        this.digits = digits;
        this.bits = bits;
    }

    /**
     * The precision is raised until every modulus is bounded below one. A mode that doesn't decay is a fault of ours: no
     * precision would tell a pole on the unit circle from one inside, so the factor of a pole so near is asked, exactly.
     */
    public static DecayBound of(List<DecayingMode> modes, int digits) {
        int bits = LEAST_BITS + BITS_A_DIGIT * digits;
        while (bits <= MOST_BITS) {
            int tried = bits;
            List<Term> terms = modes.stream().map(mode -> new Term(above(mode.amplitude(), tried),
                    above(mode.modulus(), tried), mode.power())).toList();
            if (terms.stream().allMatch(term -> term.modulus.compareTo(BigInteger.ONE.shiftLeft(tried)) < 0)) {
                int largest = terms.stream().mapToInt(term -> term.amplitude.bitLength() - tried).max().orElse(0);
                if (bits > largest + BITS_A_DIGIT * digits + LEAST_BITS / 2) {
                    return new DecayBound(terms, digits, bits);
                }
            }
            modes.forEach(mode -> requireDecay(mode, tried));
            bits *= 2;
        }
        throw new AssertionError("a mode doesn't decay, as far as " + MOST_BITS + " bits tell: " + modes);
    }

    private static void requireDecay(DecayingMode mode, int bits) {
        Ball modulus = mode.modulus().enclose(bits);
        boolean isInside = modulus.upper().compareTo(Rational.ONE) < 0;
        if (!isInside && (modulus.lower().compareTo(Rational.ONE) > 0 || UnitCircle.rootsOn(mode.factor()) > 0)) {
            throw new AssertionError("a mode doesn't decay, or a factor with poles on the unit circle was not split off: "
                    + mode.factor());
        }
    }

    /** The least multiple of 2^−bits seen to be at least the value. */
    private static BigInteger above(Enclosed value, int bits) {
        return ceiling(value.enclose(bits).upper(), bits);
    }

    private static BigInteger ceiling(Rational value, int bits) {
        return value.negate().times(Rational.of(BigInteger.ONE.shiftLeft(bits))).floor().negate();
    }

    /** The first k, not below the given one, from which the bound is small enough for ever. */
    public BigInteger settledFrom(BigInteger least) {
        BigInteger low = terms.stream().map(this::fallingFrom).reduce(least, BigInteger::max);
        if (isSmallAt(low)) {
            return low;
        }
        BigInteger step = BigInteger.ONE;
        while (!isSmallAt(low.add(step))) {
            step = step.shiftLeft(1);
        }
        BigInteger tooEarly = low.add(step.shiftRight(1));
        BigInteger enough = low.add(step);
        while (enough.subtract(tooEarly).compareTo(BigInteger.ONE) > 0) {
            BigInteger middle = tooEarly.add(enough).shiftRight(1);
            if (isSmallAt(middle)) {
                enough = middle;
            } else {
                tooEarly = middle;
            }
        }
        return isSmallAt(tooEarly) ? tooEarly : enough;
    }

    /** From k + 1 ≥ p/(1 − r), and k ≥ p, on a term falls. */
    private BigInteger fallingFrom(Term term) {
        BigInteger one = BigInteger.ONE.shiftLeft(bits);
        Rational steps = new Rational(BigInteger.valueOf(term.power).shiftLeft(bits), one.subtract(term.modulus));
        return ceiling(steps, 0).max(BigInteger.valueOf(term.power));
    }

    private boolean isSmallAt(BigInteger k) {
        BigInteger sum = terms.stream().map(term -> above(term, k)).reduce(BigInteger.ZERO, BigInteger::add);
        return sum.multiply(BigInteger.TEN.pow(digits)).compareTo(BigInteger.ONE.shiftLeft(bits)) <= 0;
    }

    private BigInteger above(Term term, BigInteger k) {
        BigInteger value = productAbove(term.amplitude, powerAbove(term.modulus, k.subtract(
                BigInteger.valueOf(term.power))));
        for (int i = 1; i <= term.power; i++) {
            value = value.multiply(k).add(BigInteger.valueOf(i - 1)).divide(BigInteger.valueOf(i));
        }
        return value;
    }

    private BigInteger powerAbove(BigInteger base, BigInteger exponent) {
        BigInteger result = BigInteger.ONE.shiftLeft(bits);
        BigInteger square = base;
        for (int i = 0; i < exponent.bitLength(); i++) {
            if (exponent.testBit(i)) {
                result = productAbove(result, square);
            }
            square = productAbove(square, square);
        }
        return result;
    }

    private BigInteger productAbove(BigInteger a, BigInteger b) {
        return a.multiply(b).negate().shiftRight(bits).negate();
    }
}
