package org.pofk.check;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Elementary functions of {@link Near} numbers by their series, to some sixty digits. */
final class Elementary {
    private static final MathContext WORK = new MathContext(Near.DIGITS + 14, RoundingMode.HALF_EVEN);
    private static final BigDecimal SERIES_END = BigDecimal.ONE.movePointLeft(Near.DIGITS + 12);
    /** What a series and its rounding lose at most, relative to one. */
    private static final BigDecimal LOSS = BigDecimal.ONE.movePointLeft(Near.DIGITS - 2);
    private static final BigDecimal TWO = BigDecimal.valueOf(2);
    static final BigDecimal PI = pi();

    private Elementary() {
    }

    /** 16 arctan(1/5) − 4 arctan(1/239) (Machin 1706). */
    private static BigDecimal pi() {
        return BigDecimal.valueOf(16).multiply(arctanSeries(new BigDecimal("0.2")))
                .subtract(BigDecimal.valueOf(4).multiply(
                        arctanSeries(BigDecimal.ONE.divide(BigDecimal.valueOf(239), WORK))), WORK);
    }

    static Near piNear() {
        return new Near(PI.round(Near.CENTRE), BigDecimal.ZERO, LOSS);
    }

    static Near cos(Near x) {
        return Near.of(cosine(real(x)), BigDecimal.ZERO, x.radius().add(LOSS));
    }

    static Near sin(Near x) {
        return Near.of(cosine(real(x).subtract(PI.divide(TWO, WORK))), BigDecimal.ZERO, x.radius().add(LOSS));
    }

    /** e^z, its radius by |e^z| r e^r. */
    static Near exp(Near z) {
        BigDecimal modulus = exponential(z.real());
        BigDecimal spread = modulus.multiply(z.radius()).multiply(exponential(z.radius()), WORK)
                .add(modulus.multiply(LOSS));
        if (z.isReal()) {
            return Near.of(modulus, BigDecimal.ZERO, spread);
        }
        BigDecimal sine = cosine(z.imaginary().subtract(PI.divide(TWO, WORK)));
        return Near.of(modulus.multiply(cosine(z.imaginary())), modulus.multiply(sine), spread);
    }

    /** The main root of a real number of either sign. */
    static Near sqrt(Near x) {
        BigDecimal value = real(x);
        BigDecimal root = value.abs().sqrt(WORK);
        boolean isExact = x.isExact() && root.multiply(root).compareTo(value.abs()) == 0;
        BigDecimal spread = isExact ? BigDecimal.ZERO : x.radius().signum() == 0 ? root.ulp().add(LOSS)
                : x.radius().divide(root, WORK).add(LOSS);
        return value.signum() < 0 ? Near.of(BigDecimal.ZERO, root, spread) : Near.of(root, BigDecimal.ZERO, spread);
    }

    static Near arctan(Near x) {
        return Near.of(arctan(real(x)), BigDecimal.ZERO, x.radius().add(LOSS));
    }

    /** 2 arctan(√(1 − x²)/(1 + x)); the radius as if x were no decimal near one. */
    static Near arccos(Near x) {
        BigDecimal value = real(x);
        BigDecimal sine = BigDecimal.ONE.subtract(value.multiply(value)).sqrt(WORK);
        BigDecimal half = arctan(sine.divide(BigDecimal.ONE.add(value), WORK));
        return Near.of(TWO.multiply(half), BigDecimal.ZERO,
                x.radius().signum() == 0 ? LOSS : x.radius().divide(sine, WORK).multiply(TWO));
    }

    /** The angle in (−π, π] of a number that isn't zero; for printing. */
    static BigDecimal angle(BigDecimal x, BigDecimal y) {
        if (y.signum() == 0) {
            return x.signum() < 0 ? PI : BigDecimal.ZERO;
        }
        BigDecimal modulus = x.multiply(x).add(y.multiply(y)).sqrt(WORK);
        BigDecimal half = x.signum() >= 0 ? arctan(y.divide(modulus.add(x), WORK))
                : arctan(modulus.subtract(x).divide(y, WORK));
        return TWO.multiply(half).round(Near.CENTRE);
    }

    /** ln x for x above zero by Newton's iteration on the exponential. */
    static BigDecimal logarithm(BigDecimal x) {
        BigDecimal y = BigDecimal.valueOf(Math.log(x.doubleValue()));
        for (int i = 0; i < 4; i++) {
            y = y.add(x.divide(exponential(y), WORK).subtract(BigDecimal.ONE), WORK);
            y = y.subtract(half(x.divide(exponential(y), WORK).subtract(BigDecimal.ONE).pow(2, WORK)), WORK);
        }
        return y.round(Near.CENTRE);
    }

    private static BigDecimal half(BigDecimal x) {
        return x.divide(TWO, WORK);
    }

    private static BigDecimal real(Near x) {
        if (!x.isReal()) {
            throw new ArithmeticException("a real number is wanted: " + x);
        }
        return x.real();
    }

    private static BigDecimal cosine(BigDecimal x) {
        BigDecimal turn = TWO.multiply(PI);
        BigDecimal turns = x.divide(turn, 0, RoundingMode.HALF_EVEN);
        BigDecimal reduced = x.subtract(turns.multiply(turn)).scaleByPowerOfTen(0);
        BigDecimal small = reduced.divide(BigDecimal.valueOf(64), WORK);
        BigDecimal square = small.multiply(small, WORK).negate();
        BigDecimal term = BigDecimal.ONE;
        BigDecimal sum = BigDecimal.ZERO;
        for (int i = 1; term.abs().compareTo(SERIES_END) > 0; i += 2) {
            sum = sum.add(term);
            term = term.multiply(square, WORK).divide(BigDecimal.valueOf((long) i * (i + 1)), WORK);
        }
        for (int i = 0; i < 6; i++) {
            sum = TWO.multiply(sum).multiply(sum, WORK).subtract(BigDecimal.ONE, WORK);
        }
        return sum;
    }

    private static BigDecimal exponential(BigDecimal x) {
        int halvings = Math.max(0, x.precision() - x.scale()) * 4 + 8;
        BigDecimal small = x.divide(TWO.pow(halvings), WORK);
        BigDecimal term = BigDecimal.ONE;
        BigDecimal sum = BigDecimal.ZERO;
        for (int i = 1; term.abs().compareTo(SERIES_END) > 0; i++) {
            sum = sum.add(term);
            term = term.multiply(small, WORK).divide(BigDecimal.valueOf(i), WORK);
        }
        for (int i = 0; i < halvings; i++) {
            sum = sum.multiply(sum, WORK);
        }
        return sum;
    }

    /** Halves the angle three times: arctan x = 2 arctan(x/(1 + √(1 + x²))). */
    private static BigDecimal arctan(BigDecimal x) {
        BigDecimal reduced = x;
        for (int i = 0; i < 3; i++) {
            reduced = reduced.divide(
                    BigDecimal.ONE.add(BigDecimal.ONE.add(reduced.multiply(reduced)).sqrt(WORK)), WORK);
        }
        return arctanSeries(reduced).multiply(BigDecimal.valueOf(8), WORK);
    }

    private static BigDecimal arctanSeries(BigDecimal x) {
        BigDecimal square = x.multiply(x, WORK).negate();
        BigDecimal power = x;
        BigDecimal sum = BigDecimal.ZERO;
        for (int i = 1; power.abs().compareTo(SERIES_END) > 0; i += 2) {
            sum = sum.add(power.divide(BigDecimal.valueOf(i), WORK));
            power = power.multiply(square, WORK);
        }
        return sum;
    }
}
