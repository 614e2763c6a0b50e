package org.pofk.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/**
 * The iteration of Aberth and Ehrlich with p and p′ at any precision, for roots that doubles can't tell apart or hold.
 * Approximate: starts only. The sum over the other roots needs few digits and is taken in doubles. Mutable: goes on
 * from where it was when asked again with more precision. Where a few points went astray, they start again around the
 * centre of the roots that nobody has found: by the sum of all of them, which the coefficients tell.
 */
final class PreciseAberth {
    private static final int MOST_ROUNDS = 100;
    private static final int FACTOR_BITS = 20;
    private static final double LARGEST_FACTOR = 0x1p40;

    /** A disc that isn't smaller than its point's size by so many bits holds nothing. */
    private static final int ASTRAY_BITS = 4;
    private static final int MOST_RESTARTS = 3;
    /** How far from the centre they start, in its size. */
    private static final double SPREAD = 0.03;

    private final BoundedHorner polynomial;
    private final double sumOfRoots;
    private final List<Point> points;

    /** One approximation. */
    private static final class Point {
        private BigInteger x;
        private BigInteger y;
        private int scale;
        private int doubt;
        private boolean isDone;

        Point(BigInteger x, BigInteger y, int scale) {
            this.x = x;
            this.y = y;
            this.scale = scale;
        }

        void startAt(Start start) {
            x = start.x();
            y = start.y();
            scale = start.scale();
            isDone = false;
        }

        boolean isAstray() {
            return doubt > exponent() - ASTRAY_BITS;
        }

        int exponent() {
            return Disc.leastExponent(x, y) - scale;
        }
    }

    /** @param whole the coefficients; {@code guesses} none to start from the polygon's circles */
    PreciseAberth(BoundedHorner polynomial, BigInteger[] whole, List<Start> guesses) {
        List<NewtonPolygon.Circle> circles = NewtonPolygon.circles(whole);
        this.polynomial = polynomial;
        this.sumOfRoots = -new Rational(whole[whole.length - 2], whole[whole.length - 1]).approximate();
        this.points = guesses.isEmpty()
                ? around(circles)
                : new ArrayList<>(guesses.stream().map(s -> new Point(s.x(), s.y(), s.scale())).toList());
    }

    private static List<Point> around(List<NewtonPolygon.Circle> circles) {
        List<Point> all = new ArrayList<>();
        for (NewtonPolygon.Circle circle : circles) {
            int exponent = (int) Math.floor(circle.logRadius());
            double radius = Math.pow(2, circle.logRadius() - exponent);
            for (int i = 0; i < circle.count(); i++) {
                double angle = 2 * Math.PI * i / circle.count() + 0.4 + all.size() * 1e-3;
                Start start = Start.of(radius * Math.cos(angle), radius * Math.sin(angle), 1);
                all.add(new Point(start.x(), start.y(), start.scale() - exponent));
            }
        }
        return all;
    }

    /** Guesses that are as good as this precision allows. */
    List<Start> starts(int precision) {
        points.forEach(point -> point.isDone = false);
        iterate(precision);
        for (int restart = 0; restart < MOST_RESTARTS && areFewAstray(); restart++) {
            startAgain(points.stream().filter(Point::isAstray).toList(), restart);
            iterate(precision);
        }
        return points.stream().map(p -> new Start(p.x, p.y, p.scale, p.doubt)).toList();
    }

    private void iterate(int precision) {
        for (int round = 0; round < MOST_ROUNDS && points.stream().anyMatch(point -> !point.isDone); round++) {
            points.stream().filter(point -> !point.isDone).forEach(point -> move(point, precision));
        }
    }

    private boolean areFewAstray() {
        long astray = points.stream().filter(Point::isAstray).count();
        return astray > 0 && 4 * astray <= points.size();
    }

    private void startAgain(List<Point> astray, int restart) {
        double found = points.stream().filter(point -> !point.isAstray())
                .mapToDouble(point -> asDouble(point.x, point.scale)).sum();
        double center = (sumOfRoots - found) / astray.size();
        double radius = Math.max(Math.abs(center), 0x1p-30) * SPREAD * (restart + 1);
        for (int i = 0; i < astray.size(); i++) {
            double angle = Math.PI * (2 * i + 0.5 + restart) / astray.size();
            Start start = Start.of(center + radius * Math.cos(angle), radius * Math.sin(angle), 1);
            astray.get(i).startAt(start);
        }
    }

    private void move(Point point, int precision) {
        if (point.x.signum() == 0 && point.y.signum() == 0) {
            point.x = BigInteger.ONE;
        }
        int scale = Math.max(point.scale, precision - point.exponent());
        point.x = point.x.shiftLeft(scale - point.scale);
        point.y = point.y.shiftLeft(scale - point.scale);
        point.scale = scale;
        Evaluation value = polynomial.at(point.x, point.y, scale, precision);
        point.doubt = value.radiusExponent().orElse(point.exponent() + 1);
        if (value.isNoise()) {
            point.isDone = true;
            return;
        }
        step(point, value);
    }

    /** z ← z − w f with f = 1 / (1 − w Σ 1/(z − z_j)), w = p/p′. */
    private void step(Point point, Evaluation value) {
        Evaluation.Correction newton = value.realSlope().signum() == 0 && value.imaginarySlope().signum() == 0
                ? new Evaluation.Correction(BigInteger.ONE.shiftLeft(point.scale), BigInteger.ZERO)
                : value.correction(point.scale);
        Factor factor = factor(point, asDouble(newton.x(), point.scale), asDouble(newton.y(), point.scale));
        BigInteger factorX = BigInteger.valueOf(Math.round(Math.scalb(factor.re, FACTOR_BITS)));
        BigInteger factorY = BigInteger.valueOf(Math.round(Math.scalb(factor.im, FACTOR_BITS)));
        BigInteger x = newton.x().multiply(factorX).subtract(newton.y().multiply(factorY)).shiftRight(FACTOR_BITS);
        BigInteger y = newton.x().multiply(factorY).add(newton.y().multiply(factorX)).shiftRight(FACTOR_BITS);
        point.x = point.x.subtract(x);
        point.y = point.y.subtract(y);
        point.isDone = Math.max(x.bitLength(), y.bitLength()) <= 3;
    }

    private record Factor(double re, double im) {
        static final Factor ONE = new Factor(1, 0);
    }

    private Factor factor(Point point, double wr, double wi) {
        double sumRe = 0;
        double sumIm = 0;
        for (Point other : points) {
            int common = Math.max(point.scale, other.scale);
            double across = asDouble(difference(point.x, point.scale, other.x, other.scale), common);
            double up = asDouble(difference(point.y, point.scale, other.y, other.scale), common);
            double largest = Math.max(Math.abs(across), Math.abs(up));
            if (largest > 0) {
                double square = (across / largest) * (across / largest) + (up / largest) * (up / largest);
                sumRe += across / largest / square / largest;
                sumIm -= up / largest / square / largest;
            }
        }
        double re = 1 - (wr * sumRe - wi * sumIm);
        double im = wr * sumIm + wi * sumRe;
        double square = re * re + im * im;
        Factor factor = new Factor(re / square, im / square);
        return Math.abs(factor.re) + Math.abs(factor.im) < LARGEST_FACTOR ? factor : Factor.ONE;
    }

    private static BigInteger difference(BigInteger a, int aScale, BigInteger b, int bScale) {
        int common = Math.max(aScale, bScale);
        return a.shiftLeft(common - aScale).subtract(b.shiftLeft(common - bScale));
    }

    private static double asDouble(BigInteger units, int scale) {
        int shift = Math.max(0, units.bitLength() - 62);
        return Math.scalb(units.shiftRight(shift).doubleValue(), shift - scale);
    }
}
