package org.pofk.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/**
 * All roots at once in doubles, by the iteration of Aberth (1973) and Ehrlich (1967), with a running exponent against
 * overflow. Approximate: starts only. About 15 rounds of n² steps.
 */
final class AberthInDoubles {
    private static final int MOST_ROUNDS = 80;
    private static final double LARGEST_LOG_RADIUS = 250;
    private static final double LARGE = 0x1p300;
    private static final double SMALL = 0x1p-300;
    private static final int EXPONENT_STEP = 300;
    private static final double ROUNDING = 0x1p-52;

    private final double[] mantissas;
    private final int[] exponents;
    private final double[] re;
    private final double[] im;
    private final double[] doubt;
    private final boolean[] done;
    private double valueRe;
    private double valueIm;
    private double slopeRe;
    private double slopeIm;
    private double spread;
    private int exponent;

    private AberthInDoubles(BigInteger[] ascending, List<NewtonPolygon.Circle> circles) {
        int degree = ascending.length - 1;
        mantissas = new double[degree + 1];
        exponents = new int[degree + 1];
        for (int i = 0; i <= degree; i++) {
            int shift = Math.max(0, ascending[i].bitLength() - 62);
            double top = ascending[i].shiftRight(shift).doubleValue();
            exponents[i] = top == 0 ? Integer.MIN_VALUE / 2 : shift + Math.getExponent(top);
            mantissas[i] = top == 0 ? 0 : Math.scalb(top, -Math.getExponent(top));
        }
        re = new double[degree];
        im = new double[degree];
        doubt = new double[degree];
        done = new boolean[degree];
        place(circles);
    }

    private void place(List<NewtonPolygon.Circle> circles) {
        int next = 0;
        for (NewtonPolygon.Circle circle : circles) {
            double radius = Math.pow(2, circle.logRadius());
            for (int i = 0; i < circle.count(); i++, next++) {
                // turned by 0.4, so that no start lies on a line of symmetry
                double angle = 2 * Math.PI * i / circle.count() + 0.4 + next * 1e-3;
                re[next] = radius * Math.cos(angle);
                im[next] = radius * Math.sin(angle);
            }
        }
    }

    /** Guesses at all roots; none when the roots leave the range of doubles. */
    static List<Start> starts(BigInteger[] ascending) {
        List<NewtonPolygon.Circle> circles = NewtonPolygon.circles(ascending);
        if (circles.stream().anyMatch(circle -> Math.abs(circle.logRadius()) > LARGEST_LOG_RADIUS)) {
            return List.of();
        }
        AberthInDoubles all = new AberthInDoubles(ascending, circles);
        all.iterate();
        List<Start> starts = new ArrayList<>();
        for (int i = 0; i < all.re.length; i++) {
            double size = Math.abs(all.re[i]) + Math.abs(all.im[i]);
            if (!(size > 0 && size < Double.MAX_VALUE) || Double.isNaN(all.doubt[i])) {
                return List.of();
            }
            starts.add(Start.of(all.re[i], all.im[i], Math.max(all.doubt[i], size * ROUNDING)));
        }
        return starts;
    }

    private void iterate() {
        int left = re.length;
        for (int round = 0; round < MOST_ROUNDS && left > 0; round++) {
            for (int i = 0; i < re.length; i++) {
                if (!done[i]) {
                    move(i);
                    left -= done[i] ? 1 : 0;
                }
            }
        }
    }

    private void move(int i) {
        evaluate(re[i], im[i]);
        double size = Math.hypot(valueRe, valueIm);
        double noise = 4 * ROUNDING * spread;
        doubt[i] = re.length * (size + noise) / Math.hypot(slopeRe, slopeIm);
        done[i] = size <= noise;
        if (size > 0) {
            step(i, size);
        }
    }

    /** p and p′ by Horner's rule, both times 2^−exponent, and a sum that bounds what rounding does to p. */
    private void evaluate(double x, double y) {
        double size = Math.hypot(x, y);
        valueRe = 0;
        valueIm = 0;
        slopeRe = 0;
        slopeIm = 0;
        spread = 0;
        exponent = exponents[exponents.length - 1];
        for (int k = mantissas.length - 1; k >= 0; k--) {
            double nextSlopeRe = slopeRe * x - slopeIm * y + valueRe;
            slopeIm = slopeRe * y + slopeIm * x + valueIm;
            slopeRe = nextSlopeRe;
            double nextValueRe = valueRe * x - valueIm * y;
            valueIm = valueRe * y + valueIm * x;
            valueRe = nextValueRe;
            rescale(exponents[k]);
            valueRe += mantissas[k] == 0 ? 0 : Math.scalb(mantissas[k], exponents[k] - exponent);
            spread = spread * size + Math.abs(valueRe) + Math.abs(valueIm);
        }
    }

    /** Keeps the numbers, and the coefficient that comes next, within the range of doubles. */
    private void rescale(int nextExponent) {
        double large = Math.max(Math.abs(slopeRe) + Math.abs(slopeIm), Math.abs(valueRe) + Math.abs(valueIm));
        while (large > LARGE || nextExponent - exponent > EXPONENT_STEP) {
            shift(EXPONENT_STEP);
            large = Math.scalb(large, -EXPONENT_STEP);
        }
        while (large < SMALL && large > 0 && nextExponent <= exponent) {
            shift(-EXPONENT_STEP);
            large = Math.scalb(large, EXPONENT_STEP);
        }
    }

    private void shift(int step) {
        double factor = Math.scalb(1.0, -step);
        slopeRe *= factor;
        slopeIm *= factor;
        valueRe *= factor;
        valueIm *= factor;
        spread *= factor;
        exponent += step;
    }

    /** z ← z − 1 / (p′/p − Σ 1/(z − z_j)). */
    private void step(int i, double size) {
        double unitRe = valueRe / size;
        double unitIm = valueIm / size;
        double sumRe = (slopeRe * unitRe + slopeIm * unitIm) / size;
        double sumIm = (slopeIm * unitRe - slopeRe * unitIm) / size;
        for (int j = 0; j < re.length; j++) {
            double across = re[i] - re[j];
            double up = im[i] - im[j];
            double square = across * across + up * up;
            if (square > 0) {
                sumRe -= across / square;
                sumIm += up / square;
            }
        }
        double square = sumRe * sumRe + sumIm * sumIm;
        double stepRe = sumRe / square;
        double stepIm = -sumIm / square;
        if (Double.isFinite(stepRe) && Double.isFinite(stepIm)) {
            re[i] -= stepRe;
            im[i] -= stepIm;
            done[i] |= Math.hypot(stepRe, stepIm) < ROUNDING * Math.hypot(re[i], im[i]);
        }
    }
}
