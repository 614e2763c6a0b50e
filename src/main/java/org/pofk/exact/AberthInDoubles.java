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

    /** z ← z − 1 / (p′/p − Σ 1/(z − z_j)). */
    private void move(int i) {
        double x = re[i];
        double y = im[i];
        double size = Math.hypot(x, y);
        double hr = 0;
        double hi = 0;
        double dr = 0;
        double di = 0;
        double spread = 0;
        int exponent = exponents[mantissas.length - 1];
        for (int k = mantissas.length - 1; k >= 0; k--) {
            double nextDr = dr * x - di * y + hr;
            di = dr * y + di * x + hi;
            dr = nextDr;
            double nextHr = hr * x - hi * y;
            hi = hr * y + hi * x;
            hr = nextHr;
            double large = Math.max(Math.abs(dr) + Math.abs(di), Math.abs(hr) + Math.abs(hi));
            while (large > LARGE || large < SMALL && large > 0 || exponents[k] - exponent > EXPONENT_STEP) {
                int step = large > LARGE || exponents[k] - exponent > EXPONENT_STEP ? EXPONENT_STEP : -EXPONENT_STEP;
                if (step < 0 && exponents[k] - exponent > 0) {
                    break;
                }
                double factor = Math.scalb(1.0, -step);
                dr *= factor;
                di *= factor;
                hr *= factor;
                hi *= factor;
                spread *= factor;
                large *= factor;
                exponent += step;
            }
            hr += mantissas[k] == 0 ? 0 : Math.scalb(mantissas[k], exponents[k] - exponent);
            spread = spread * size + Math.abs(hr) + Math.abs(hi);
        }
        step(i, hr, hi, dr, di, spread);
    }

    private void step(int i, double hr, double hi, double dr, double di, double spread) {
        double value = Math.hypot(hr, hi);
        double noise = 4 * ROUNDING * spread;
        doubt[i] = re.length * (value + noise) / Math.hypot(dr, di);
        if (value <= noise) {
            done[i] = true;
        }
        if (value == 0) {
            return;
        }
        double scale = 1 / value;
        double ur = hr * scale;
        double ui = hi * scale;
        double sr = (dr * ur + di * ui) * scale;
        double si = (di * ur - dr * ui) * scale;
        for (int j = 0; j < re.length; j++) {
            if (j != i) {
                double ar = re[i] - re[j];
                double ai = im[i] - im[j];
                double square = ar * ar + ai * ai;
                if (square > 0) {
                    sr -= ar / square;
                    si += ai / square;
                }
            }
        }
        double square = sr * sr + si * si;
        double stepRe = sr / square;
        double stepIm = -si / square;
        if (Double.isFinite(stepRe) && Double.isFinite(stepIm)) {
            re[i] -= stepRe;
            im[i] -= stepIm;
            done[i] |= Math.hypot(stepRe, stepIm) < ROUNDING * Math.hypot(re[i], im[i]);
        }
    }
}
