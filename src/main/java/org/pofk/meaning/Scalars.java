package org.pofk.meaning;

import java.math.BigInteger;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.BiFunction;
import java.util.stream.Stream;
import org.pofk.exact.Ball;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Rational;

/**
 * Arithmetic with the numbers of one formula, which knows what is written alike. Exact. Constant time for each
 * operation besides that of {@link Quantity}; numbers beyond all use end in a {@link TooLargeException}.
 */
final class Scalars {
    static final int NO_REST = 0;
    private static final int MOST_BITS = 1 << 14;
    /** Heaviest number, and so the most that one step spends. */
    static final int MOST_WEIGHT = 1 << 15;
    private static final int GLANCE = 64;
    private static final BigInteger LARGEST_ROOT = BigInteger.valueOf(64);

    private final Map<List<Object>, Integer> rests = new HashMap<>();
    private final Work work;

    Scalars(Work work) {
        this.work = work;
    }

    static Scalar of(Rational value) {
        return new Scalar(Quantity.of(value), value, NO_REST, Optional.of(value), true, weight(value));
    }

    static Scalar of(long value) {
        return of(Rational.of(value));
    }

    Scalar rational(Rational value) {
        if (bits(value) > 2L * MOST_BITS) {
            throw new TooLargeException();
        }
        return of(value);
    }

    Scalar decimal(Written written) {
        work.spend(1);
        return new Scalar(Quantity.of(written), Rational.ONE, rest("decimal", written.value(), written.lastPlace()),
                Optional.of(written.value()), true, weight(written.value()));
    }

    Scalar pi() {
        return new Scalar(Quantity.pi(), Rational.ONE, rest("pi"), Optional.empty(), true, 1);
    }

    Scalar i() {
        return new Scalar(Quantity.i(), Rational.ONE, rest("i"), Optional.empty(), false, 1);
    }

    /** e, which to any power is an exponential. */
    Scalar e() {
        return exponential(of(1));
    }

    boolean isE(Scalar scalar) {
        return scalar.factor().isOne() && scalar.rest() == rest("exp", Rational.ONE, NO_REST);
    }

    /** True when the work for the whole formula has been too much. */
    boolean isExhausted() {
        return work.spent() > Work.MOST;
    }

    /** Counts a step of work that isn't an operation here. */
    void step() {
        work.spend(1);
    }

    private int rest(Object... key) {
        return rests.computeIfAbsent(List.of(key), unknown -> rests.size() + 1);
    }

    private static long bits(Rational value) {
        return (long) value.numerator().bitLength() + value.denominator().bitLength();
    }

    private static int weight(Rational value) {
        return 1 + (int) (bits(value) / 64);
    }

    private static Optional<Rational> bounded(Optional<Rational> face) {
        return face.filter(value -> bits(value) <= MOST_BITS);
    }

    /** A number made of others, rational where its expression has folded into one. */
    private Scalar made(Quantity quantity, Rational factor, int rest, Optional<Rational> face, boolean real,
            long weight) {
        work.spend(1);
        if (quantity.rational().isPresent()) {
            return rational(quantity.rational().get());
        }
        if (bits(factor) > MOST_BITS) {
            throw new TooLargeException();
        }
        return new Scalar(quantity, factor, rest, bounded(face), real, Work.within(weight, MOST_WEIGHT));
    }

    private static <T> Optional<T> both(Optional<Rational> a, Optional<Rational> b,
            BiFunction<Rational, Rational, T> f) {
        return a.flatMap(x -> b.map(y -> f.apply(x, y)));
    }

    Scalar plus(Scalar a, Scalar b) {
        if (a.isPlainZero() || b.isPlainZero()) {
            return a.isPlainZero() ? b : a;
        }
        boolean isMultiple = a.rest() == b.rest();
        Rational factor = isMultiple ? a.factor().plus(b.factor()) : Rational.ONE;
        if (factor.isZero()) {
            return of(0);
        }
        int rest = isMultiple ? a.rest()
                : rest("+", Stream.of(named(a), named(b)).sorted().toList());
        return made(a.quantity().plus(b.quantity()), factor, rest, both(a.face(), b.face(), Rational::plus),
                a.real() && b.real(), (long) a.weight() + b.weight());
    }

    /** A number for the scalar as a whole, its factor included. */
    private int named(Scalar a) {
        return a.factor().isOne() ? a.rest() : rest("·", a.factor(), a.rest());
    }

    Scalar minus(Scalar a, Scalar b) {
        return plus(a, negate(b));
    }

    Scalar negate(Scalar a) {
        return times(of(-1), a);
    }

    Scalar times(Scalar a, Scalar b) {
        if (a.isPlainZero() || b.isPlainZero()) {
            return of(0);
        }
        if (a.isPlainOne() || b.isPlainOne()) {
            return a.isPlainOne() ? b : a;
        }
        int rest = a.rest() == NO_REST ? b.rest() : b.rest() == NO_REST ? a.rest()
                : rest("*", Math.min(a.rest(), b.rest()), Math.max(a.rest(), b.rest()));
        return made(a.quantity().times(b.quantity()), a.factor().times(b.factor()), rest,
                both(a.face(), b.face(), Rational::times), a.real() && b.real(), (long) a.weight() + b.weight());
    }

    /** 1/a for what isn't zero. */
    Scalar inverse(Scalar a) {
        return pow(a, -1);
    }

    /** a to a whole power; a isn't zero where that is negative. */
    Scalar pow(Scalar a, int exponent) {
        if (exponent == 0) {
            return of(1);
        }
        if (exponent == 1 || a.isPlainZero() || a.isPlainOne()) {
            return a;
        }
        int weight = Work.within((long) a.weight() * Math.abs((long) exponent), MOST_WEIGHT);
        if (!a.factor().abs().isOne() && bits(a.factor()) * Math.abs((long) exponent) > MOST_BITS) {
            throw new TooLargeException();
        }
        int rest = a.rest() == NO_REST ? NO_REST : rest("^", a.rest(), exponent);
        boolean isShort = a.face().isPresent() && bits(a.face().get()) * Math.abs((long) exponent) <= MOST_BITS;
        return made(a.quantity().pow(exponent), a.factor().pow(exponent), rest,
                a.face().filter(value -> isShort).map(value -> value.pow(exponent)), a.real(), weight);
    }

    /**
     * a to a rational power: by main square roots, and where a is seen to be positive by its positive root of any small
     * degree; nothing for other exponents. a isn't zero where the exponent is negative.
     */
    Optional<Scalar> power(Scalar a, Rational exponent) {
        int roots = exponent.denominator().getLowestSetBit();
        BigInteger odd = exponent.denominator().shiftRight(roots);
        if (exponent.denominator().compareTo(LARGEST_ROOT) > 0
                || !odd.equals(BigInteger.ONE) && !(a.real() && isNotNegative(a))) {
            return Optional.empty();
        }
        int times = of(Rational.of(exponent.numerator())).whole().orElseThrow();
        Scalar root = root(a, odd.intValueExact());
        for (int i = 0; i < roots; i++) {
            root = squareRoot(root);
        }
        return Optional.of(pow(root, times));
    }

    /** The positive root of what is positive. */
    private Scalar root(Scalar a, int degree) {
        return degree == 1 ? a : made(a.quantity().root(degree), Rational.ONE, rest("root", degree, a.factor(), a.rest()),
                Optional.empty(), true, a.weight() + (long) degree);
    }

    Scalar squareRoot(Scalar a) {
        Optional<Rational> face = a.face().flatMap(Scalars::rationalRoot);
        return made(a.quantity().squareRoot(), Rational.ONE, rest("sqrt", a.factor(), a.rest()), face,
                a.real() && isNotNegative(a), a.weight() + 1L);
    }

    private static Optional<Rational> rationalRoot(Rational value) {
        return Quantity.of(value).squareRoot().rational();
    }

    Scalar exponential(Scalar a) {
        work.spend(a.weight());
        Ball size = a.quantity().enclose(GLANCE).modulus();
        long most = size.upper().compareTo(Rational.of(MOST_WEIGHT)) > 0
                ? MOST_WEIGHT : size.upper().floor().longValueExact();
        return made(a.quantity().exponential(), Rational.ONE, rest("exp", a.factor(), a.rest()), Optional.empty(),
                a.real(), a.weight() + 1L + most);
    }

    Scalar cosine(Scalar a) {
        if (!a.real()) {
            Scalar turned = times(i(), a);
            return times(of(Rational.HALF), plus(exponential(turned), exponential(negate(turned))));
        }
        return real(a.quantity().cosine(), "cos", a);
    }

    Scalar sine(Scalar a) {
        if (!a.real()) {
            Scalar turned = times(i(), a);
            return times(times(of(Rational.of(-1, 2)), i()),
                    minus(exponential(turned), exponential(negate(turned))));
        }
        return real(a.quantity().sine(), "sin", a);
    }

    /** The arctangent of a real number. */
    Scalar arctangent(Scalar a) {
        return real(a.quantity().arctangent(), "arctan", a);
    }

    /** The arccosine of a real number of [−1, 1]. */
    Scalar arccosine(Scalar a) {
        return real(a.quantity().arccosine(), "arccos", a);
    }

    private Scalar real(Quantity value, String function, Scalar a) {
        return made(value, Rational.ONE, rest(function, a.factor(), a.rest()), Optional.empty(), true,
                a.weight() + 1L);
    }

    /** Whether a number is zero at face value. */
    Decision isZero(Scalar a) {
        if (a.face().isPresent()) {
            return a.face().get().isZero() ? Decision.YES : Decision.NO;
        }
        work.spend(a.weight());
        return a.quantity().enclose(GLANCE).containsZero() ? a.quantity().isZero() : Decision.NO;
    }

    /** Proved at a glance for a real number, at face value. */
    boolean isNotNegative(Scalar a) {
        if (a.face().isPresent()) {
            return a.face().get().signum() >= 0;
        }
        work.spend(a.weight());
        ComplexBall value = a.quantity().enclose(GLANCE);
        return value.real().isPositive();
    }
}
