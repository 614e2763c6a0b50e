package org.pofk.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * Tries to isolate all roots from guesses. Certified: n pairwise disjoint discs, each of radius n·|p/p′| around its
 * center and so with at least one root, hold exactly one root each. A disc centred on the axis holds a real root, for
 * with its root it holds the conjugate; the discs above the axis stand for their mirror images too. Each disc also
 * misses zero. n²/2 comparisons and some n evaluations.
 */
final class Isolation {
    private static final int MOST_ROUNDS = 10;
    /** Bits below its largest term at which p is known in the end: enough for one step from a start in doubles. */
    private static final int FIRST_ACCURACY = 110;
    private static final int LEAST_PRECISION = 64;
    private static final int BITS_PER_DEGREE = 8;
    /** Relative size of a disc that needs no closer look at p, however small p is; doubled from round to round. */
    private static final int FINE = 48;
    /** Makes a sum of exponents fall when one of the points leaves it. */
    private static final int FAR = 1 << 20;
    /** Room that Newton's iteration needs around a disc, see {@link Isolated}. */
    private static final int ROOM = 8;

    private final BoundedHorner polynomial;
    private final List<Point> points;
    private final int room;
    private final int leastPrecision;
    private int precision;
    private int round;

    /** A center on its way to a root. Mutable. */
    private static final class Point {
        private Disc disc;
        private Optional<Evaluation> value = Optional.empty();
        private boolean isSettled;
        private int gapExponent;

        Point(Start start) {
            disc = new Disc(start.x(), start.y(), start.scale(), start.doubtExponent());
        }
    }

    private Isolation(BoundedHorner polynomial, List<Start> starts, int leastPrecision) {
        this.polynomial = polynomial;
        this.points = starts.stream().map(Point::new).toList();
        this.room = ROOM + Evaluation.ceilingLog(polynomial.degree());
        this.leastPrecision = leastPrecision;
        this.precision = firstPrecision();
    }

    /** The roots on the axis and above it; empty when the guesses don't lead to disjoint discs. */
    static Optional<List<Isolated>> attempt(BoundedHorner polynomial, List<Start> all) {
        return attempt(polynomial, all, LEAST_PRECISION);
    }

    /**
     * The same, p evaluated with that many bits at least: what guesses found with them need, for roots much closer to
     * each other than the precision chosen here would tell apart.
     */
    static Optional<List<Isolated>> attempt(BoundedHorner polynomial, List<Start> all, int leastPrecision) {
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
        return new Isolation(polynomial, starts, leastPrecision).settle();
    }

    private Optional<List<Isolated>> settle() {
        findGaps();
        // guesses that doubt themselves are no use: save the evaluations
        boolean isHopeless = open().count() > Math.max(2, points.size() / 4);
        points.forEach(point -> point.isSettled = false);
        long before = Long.MAX_VALUE;
        for (round = 0; round < MOST_ROUNDS && !isHopeless; round++) {
            open().forEach(this::enclose);
            findGaps();
            if (open().findAny().isEmpty()) {
                return Optional.of(points.stream().map(Isolation::isolated).toList());
            }
            long radii = open().mapToLong(point -> point.disc.radiusExponent() + FAR).sum();
            isHopeless = radii >= before;
            before = radii;
            open().forEach(this::move);
        }
        return Optional.empty();
    }

    private Stream<Point> open() {
        return points.stream().filter(point -> !point.isSettled);
    }

    private static Isolated isolated(Point point) {
        Evaluation value = point.value.orElseThrow();
        return new Isolated(point.disc, point.gapExponent, value.loss()).after(value);
    }

    /**
     * Gives the point the disc that p/p′ proves, with more precision as long as rounding hides them, within what a
     * polynomial of this degree may need. The next point, often a neighbour, starts with what this one needed.
     */
    private void enclose(Point point) {
        int most = FIRST_ACCURACY + BITS_PER_DEGREE * polynomial.degree() << round;
        Disc disc = point.disc;
        Evaluation value = polynomial.at(disc.x(), disc.y(), disc.scale(), precision);
        while (isHidden(value, disc) && precision < most) {
            precision += precision / 2;
            value = polynomial.at(disc.x(), disc.y(), disc.scale(), precision);
        }
        int radius = value.radiusExponent().orElse(Integer.MAX_VALUE / 4);
        point.disc = new Disc(disc.x(), disc.y(), disc.scale(), radius);
        point.value = Optional.of(value);
        precision = value.slopeExponent().isPresent()
                ? Math.max(leastPrecision, value.loss() + FIRST_ACCURACY + room)
                : firstPrecision();
    }

    private int firstPrecision() {
        return Math.max(leastPrecision, FIRST_ACCURACY + room);
    }

    private boolean isHidden(Evaluation value, Disc disc) {
        return value.slopeExponent().isEmpty()
                || value.isNoise() && value.radiusExponent().orElseThrow() > disc.leastExponent() - (FINE << round);
    }

    /** One step of Newton's iteration, where rounding doesn't hide p. */
    private void move(Point point) {
        Evaluation value = point.value.orElseThrow();
        if (value.isNoise() || value.slopeExponent().isEmpty()) {
            return;
        }
        Disc disc = point.disc;
        int scale = Math.max(disc.scale(), FIRST_ACCURACY - disc.leastExponent());
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
