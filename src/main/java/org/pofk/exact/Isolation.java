package org.pofk.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;

/**
 * Tries to isolate all roots from guesses. Certified: n pairwise disjoint discs, each of radius n·|p/p′| around its
 * center and so with at least one root, hold exactly one root each. A disc centred on the axis holds a real root, for
 * with its root it holds the conjugate; the discs above the axis stand for their mirror images too. Each disc also
 * misses zero. n²/2 comparisons and some n evaluations.
 */
final class Isolation {
    private static final int FIRST_PRECISION = 128;
    private static final int MOST_ROUNDS = 12;
    private static final int BITS_PER_DEGREE = 4;
    /** Room that Newton's iteration needs around a disc, see {@link Isolated}. */
    private static final int ROOM = 8;

    private final BoundedHorner polynomial;
    private final List<Point> points;
    private final int room;

    /** A center on its way to a root. Mutable. */
    private static final class Point {
        private Disc disc;
        private int precision;
        private int loss;
        private boolean isSettled;
        private int gapExponent;

        Point(Start start, int precision) {
            disc = new Disc(start.x(), start.y(), start.scale(), start.doubtExponent());
            this.precision = precision;
        }
    }

    private Isolation(BoundedHorner polynomial, List<Start> starts, int precision) {
        this.polynomial = polynomial;
        this.points = starts.stream().map(start -> new Point(start, precision)).toList();
        this.room = ROOM + Evaluation.ceilingLog(polynomial.degree());
    }

    /** The roots on the axis and above it; empty when the guesses don't lead to disjoint discs. */
    static Optional<List<Isolated>> attempt(BoundedHorner polynomial, List<Start> all) {
        return attempt(polynomial, all, FIRST_PRECISION);
    }

    static Optional<List<Isolated>> attempt(BoundedHorner polynomial, List<Start> all, int precision) {
        List<Start> onAxis = all.stream().filter(Start::mayBeReal).map(Start::onAxis).toList();
        List<Start> above = all.stream().filter(s -> !s.mayBeReal() && s.isAbove()).toList();
        if (onAxis.size() + 2 * above.size() != polynomial.degree()) {
            return Optional.empty();
        }
        List<Start> starts = new ArrayList<>(onAxis);
        starts.addAll(above);
        if (starts.stream().anyMatch(s -> s.x().signum() == 0 && s.y().signum() == 0)) {
            return Optional.empty();
        }
        return new Isolation(polynomial, starts, precision).settle();
    }

    private Optional<List<Isolated>> settle() {
        int before = Integer.MAX_VALUE;
        int patience = 2;
        for (int round = 0; round < MOST_ROUNDS; round++) {
            points.stream().filter(point -> !point.isSettled).forEach(this::enclose);
            findGaps();
            int open = (int) points.stream().filter(point -> !point.isSettled).count();
            if (open == 0) {
                return Optional.of(points.stream()
                        .map(point -> new Isolated(point.disc, point.gapExponent, point.loss)).toList());
            }
            patience -= open < before ? 0 : 1;
            if (patience == 0) {
                return Optional.empty();
            }
            before = open;
            points.stream().filter(point -> !point.isSettled).forEach(this::move);
        }
        return Optional.empty();
    }

    /** Evaluates with more precision as long as rounding hides p, within what a polynomial of this degree may need. */
    private Evaluation evaluate(Point point) {
        Disc disc = point.disc;
        Evaluation value = polynomial.at(disc.x(), disc.y(), disc.scale(), point.precision);
        while ((value.isNoise() || value.slopeExponent().isEmpty())
                && point.precision < FIRST_PRECISION + BITS_PER_DEGREE * polynomial.degree()) {
            point.precision *= 2;
            value = polynomial.at(disc.x(), disc.y(), disc.scale(), point.precision);
        }
        return value;
    }

    /** Gives the point the disc that p/p′ proves. */
    private void enclose(Point point) {
        Evaluation value = evaluate(point);
        OptionalInt radius = value.radiusExponent();
        Disc disc = point.disc;
        point.disc = new Disc(disc.x(), disc.y(), disc.scale(), radius.orElse(Integer.MAX_VALUE / 4));
        point.loss = value.noise() + point.precision - value.slopeExponent().orElse(0);
    }

    /** One step of Newton's iteration, where rounding doesn't hide p. */
    private void move(Point point) {
        Evaluation value = evaluate(point);
        if (value.isNoise() || value.slopeExponent().isEmpty()) {
            return;
        }
        Disc disc = point.disc;
        int scale = Math.max(disc.scale(), point.precision - disc.leastExponent());
        Evaluation.Correction correction = value.correction(scale);
        BigInteger x = disc.x().shiftLeft(scale - disc.scale()).subtract(correction.x());
        BigInteger y = disc.isOnAxis()
                ? BigInteger.ZERO
                : disc.y().shiftLeft(scale - disc.scale()).subtract(correction.y());
        if (x.signum() != 0 || y.signum() != 0) {
            point.disc = new Disc(x, y, scale, disc.radiusExponent());
        }
    }

    /** A point is settled when its disc leaves room to every other, to its mirror image and to zero. */
    private void findGaps() {
        int[] nearest = new int[points.size()];
        int[] widest = new int[points.size()];
        for (int i = 0; i < nearest.length; i++) {
            Disc disc = points.get(i).disc;
            // the mirror image, and half the way to zero
            nearest[i] = disc.leastExponent();
            if (!disc.isOnAxis()) {
                nearest[i] = Math.min(nearest[i], disc.y().bitLength() - disc.scale());
            }
            widest[i] = disc.radiusExponent();
        }
        for (int i = 0; i < nearest.length; i++) {
            for (int j = 0; j < i; j++) {
                int distance = points.get(i).disc.distanceExponent(points.get(j).disc);
                nearest[i] = Math.min(nearest[i], distance);
                nearest[j] = Math.min(nearest[j], distance);
                if (widest[j] > distance - 2 || widest[i] > distance - 2) {
                    nearest[i] = Math.min(nearest[i], Integer.MIN_VALUE / 4);
                    nearest[j] = Math.min(nearest[j], Integer.MIN_VALUE / 4);
                }
            }
        }
        for (int i = 0; i < nearest.length; i++) {
            Point point = points.get(i);
            point.gapExponent = nearest[i] - 1;
            point.isSettled = point.disc.radiusExponent() + room <= point.gapExponent;
        }
    }
}
