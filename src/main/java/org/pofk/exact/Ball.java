package org.pofk.exact;

import java.math.BigInteger;
import java.util.OptionalInt;

/**
 * A real number known to lie within (center ± radius) · 2^−scale. Certified: every operation returns a ball that
 * holds all results of operands in its balls, rounding outward.
 *
 * <p>Fixed-point: a result has the larger scale of its operands (a function that of its argument), so numbers don't
 * grow from one operation to the next. Bring an exact operand to the scale wanted first ({@link #of},
 * {@link #roundedTo}): 1 at scale 0 divided by 3 at scale 0 is good to one unit only.
 */
public record Ball(BigInteger center, BigInteger radius, int scale) {

    public Ball {
        if (radius.signum() < 0) {
            throw new IllegalArgumentException("negative radius " + radius);
        }
    }

    /** An exact dyadic or a rational to within 2^−scale. */
    public static Ball of(Rational value, int scale) {
        BigInteger numerator = value.numerator().shiftLeft(Math.max(scale, 0));
        BigInteger denominator = value.denominator().shiftLeft(Math.max(-scale, 0));
        BigInteger[] parts = numerator.divideAndRemainder(denominator);
        return new Ball(parts[0], BigInteger.valueOf(parts[1].abs().signum()), scale);
    }

    /** A whole number, exactly. */
    public static Ball of(long value, int scale) {
        return of(Rational.of(value), scale);
    }

    /** center · 2^−scale, exactly. */
    public static Ball exact(BigInteger center, int scale) {
        return new Ball(center, BigInteger.ZERO, scale);
    }

    /** The smallest ball with a whole center that holds low · 2^−scale … high · 2^−scale. */
    public static Ball between(BigInteger low, BigInteger high, int scale) {
        BigInteger center = low.add(high).shiftRight(1);
        return new Ball(center, high.subtract(center), scale);
    }

    /** π to within 2^−scale; Machin's formula, O(scale²). */
    public static Ball pi(int scale) {
        return ElementaryFunctions.pi(scale);
    }

    public boolean isExact() {
        return radius.signum() == 0;
    }

    public Rational lower() {
        return dyadic(center.subtract(radius));
    }

    public Rational upper() {
        return dyadic(center.add(radius));
    }

    public Rational middle() {
        return dyadic(center);
    }

    private Rational dyadic(BigInteger units) {
        return scale >= 0
                ? new Rational(units, BigInteger.ONE.shiftLeft(scale))
                : Rational.of(units.shiftLeft(-scale));
    }

    public boolean contains(Rational value) {
        return lower().compareTo(value) <= 0 && value.compareTo(upper()) <= 0;
    }

    public boolean containsZero() {
        return center.abs().compareTo(radius) <= 0;
    }

    public boolean isPositive() {
        return center.compareTo(radius) > 0;
    }

    public boolean isNegative() {
        return center.negate().compareTo(radius) > 0;
    }

    /** The sign of every number in the ball (0 for the exact zero); empty when they differ. */
    public OptionalInt sign() {
        return containsZero() && !isExact() ? OptionalInt.empty() : OptionalInt.of(center.signum());
    }

    /** Whether the two have a number in common; if not they are in the order of their centers. */
    public boolean overlaps(Ball other) {
        return minus(other).containsZero();
    }

    /** Proved: radius ≤ 2^−bits · max(1, |x|) for every x in the ball. */
    public boolean isWithin(int bits) {
        BigInteger one = scale >= 0 ? BigInteger.ONE.shiftLeft(scale) : BigInteger.ZERO;
        BigInteger least = center.abs().subtract(radius).max(one);
        return bits >= 0
                ? radius.shiftLeft(bits).compareTo(least) <= 0
                : radius.compareTo(least.shiftLeft(-bits)) <= 0;
    }

    /** The same number in units of 2^−scale: exact when finer, rounded outward when coarser. */
    public Ball roundedTo(int newScale) {
        int dropped = scale - newScale;
        if (dropped <= 0) {
            return dropped == 0 ? this : new Ball(center.shiftLeft(-dropped), radius.shiftLeft(-dropped), newScale);
        }
        if (center.signum() == 0 && radius.signum() == 0) {
            return new Ball(center, radius, newScale);
        }
        boolean centerFits = center.getLowestSetBit() < 0 || center.getLowestSetBit() >= dropped;
        BigInteger nearest = centerFits
                ? center.shiftRight(dropped)
                : center.shiftRight(dropped - 1).add(BigInteger.ONE).shiftRight(1);
        BigInteger spread = shiftRightUp(radius, dropped);
        return new Ball(nearest, centerFits ? spread : spread.add(BigInteger.ONE), newScale);
    }

    /** This with its radius widened by units · 2^−scale. */
    Ball widened(BigInteger units) {
        return new Ball(center, radius.add(units), scale);
    }

    /** This ball times 2^power; only the scale changes. */
    public Ball timesPowerOfTwo(int power) {
        return new Ball(center, radius, scale - power);
    }

    public Ball plus(Ball other) {
        int common = Math.max(scale, other.scale);
        Ball a = roundedTo(common);
        Ball b = other.roundedTo(common);
        return new Ball(a.center.add(b.center), a.radius.add(b.radius), common);
    }

    public Ball minus(Ball other) {
        return plus(other.negate());
    }

    public Ball negate() {
        return new Ball(center.negate(), radius, scale);
    }

    public Ball times(Ball other) {
        BigInteger spread = center.abs().multiply(other.radius)
                .add(other.center.abs().multiply(radius)).add(radius.multiply(other.radius));
        return new Ball(center.multiply(other.center), spread, Math.addExact(scale, other.scale))
                .roundedTo(Math.max(scale, other.scale));
    }

    public Ball times(long factor) {
        BigInteger exact = BigInteger.valueOf(factor);
        return new Ball(center.multiply(exact), radius.multiply(exact.abs()), scale);
    }

    /** Quotient; a {@link NotSeparatedException} when the divisor may be zero. */
    public Ball dividedBy(Ball other) {
        BigInteger nearest = other.center.abs().subtract(other.radius);
        if (nearest.signum() <= 0) {
            throw new NotSeparatedException("the divisor may be zero");
        }
        int common = Math.max(scale, other.scale);
        int shift = common + other.scale - scale;
        BigInteger up = BigInteger.ONE.shiftLeft(Math.max(shift, 0));
        BigInteger down = BigInteger.ONE.shiftLeft(Math.max(-shift, 0));
        BigInteger[] parts = center.multiply(up).divideAndRemainder(other.center.multiply(down));
        BigInteger spread = divideUp(
                radius.multiply(other.center.abs()).add(center.abs().multiply(other.radius)).multiply(up),
                other.center.abs().multiply(nearest).multiply(down));
        return new Ball(parts[0], spread.add(BigInteger.valueOf(parts[1].abs().signum())), common);
    }

    /** Quotient by a whole number that isn't zero. */
    public Ball dividedBy(long divisor) {
        BigInteger exact = BigInteger.valueOf(divisor);
        BigInteger[] parts = center.divideAndRemainder(exact);
        BigInteger spread = radius.signum() == 0 ? radius : divideUp(radius, exact.abs());
        return new Ball(parts[0], parts[1].signum() == 0 ? spread : spread.add(BigInteger.ONE), scale);
    }

    /** |x|. */
    public Ball abs() {
        if (containsZero()) {
            return between(BigInteger.ZERO, center.abs().add(radius), scale);
        }
        return center.signum() < 0 ? negate() : this;
    }

    /** x^exponent, any sign; x^0 is one. */
    public Ball pow(long exponent) {
        Ball one = of(1, Math.max(scale, 0));
        if (exponent < 0) {
            return one.dividedBy(pow(Math.negateExact(exponent)));
        }
        return BinaryPowering.of(one, this, exponent, Ball::times);
    }

    /** √x for a number known not to be negative: what lies below zero in the ball is left out. */
    public Ball sqrt() {
        return root(2);
    }

    /** The n-th root, n ≥ 1, of a number known not to be negative: what lies below zero in the ball is left out. */
    public Ball root(int n) {
        if (isNegative()) {
            throw new ArithmeticException("root of a negative number");
        }
        if (scale < 0) {
            return roundedTo(0).root(n);
        }
        int shift = Math.multiplyExact(scale, n - 1);
        BigInteger least = center.subtract(radius).max(BigInteger.ZERO).shiftLeft(shift);
        BigInteger most = center.add(radius).shiftLeft(shift);
        BigInteger low = IntegerRoots.floor(least, n);
        return n == 2 && low.signum() > 0 && !isExact()
                ? between(low, aboveSquareRoot(low, most.subtract(least)), scale)
                : between(low, IntegerRoots.ceiling(most, n), scale);
    }

    /** At least √(a + more), low the whole part of √a: √(a + more) ≤ √a + more / (2 √a). */
    private static BigInteger aboveSquareRoot(BigInteger low, BigInteger more) {
        return low.add(more.divide(low.shiftLeft(1))).add(BigInteger.TWO);
    }

    public Ball arctan() {
        return ElementaryFunctions.arctan(this);
    }

    /** The angle in [0, π]; what lies outside [−1, 1] in the ball is left out. */
    public Ball arccos() {
        Ball sine = of(1, Math.max(scale, 0)).minus(times(this));
        return argument(sine.sqrt(), this);
    }

    /**
     * The angle of x + iy: in (−π, π] as long as the rectangle misses the negative real axis. A rectangle that meets
     * the axis (and not zero) gives angles around π, those beyond π standing for the ones just above −π: a caller who
     * needs the main value must know whether y is zero. A {@link NotSeparatedException} when x and y may both be zero.
     */
    public static Ball argument(Ball y, Ball x) {
        return ElementaryFunctions.argument(y, x);
    }

    public Ball cos() {
        return ElementaryFunctions.cos(this);
    }

    public Ball sin() {
        return ElementaryFunctions.sin(this);
    }

    /** e^x; an {@link ArithmeticException} where x is beyond some half a million. */
    public Ball exp() {
        return ExponentialFunction.of(this);
    }

    /** The natural logarithm of a number known to be positive; a {@link NotSeparatedException} when it may be zero. */
    public Ball log() {
        return LogarithmFunction.of(this);
    }

    static BigInteger shiftRightUp(BigInteger value, int shift) {
        return value.negate().shiftRight(shift).negate();
    }

    static BigInteger divideUp(BigInteger value, BigInteger positive) {
        BigInteger[] parts = value.divideAndRemainder(positive);
        return parts[1].signum() > 0 ? parts[0].add(BigInteger.ONE) : parts[0];
    }

    /** {@code 0.333333 ± 2^-64}, the center only roughly. */
    @Override
    public String toString() {
        return middle().approximate() + (isExact() ? "" : " ± 2^" + (radius.bitLength() - scale));
    }
}
