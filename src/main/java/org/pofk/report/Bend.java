package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.report.Picture.Point;

/** A cubic Bézier curve in the plane, for drawing only. Sampled at parameters of equal distance. */
final class Bend {
    static final int SAMPLES = 40;
    private static final int HALVINGS = 30;

    private final double[] x;
    private final double[] y;

    /** From the coordinates of its four points. */
    Bend(double[] x, double[] y) {
        this.x = x.clone();
        this.y = y.clone();
    }

    /** From a to b, leaving the straight line to the left by a part of its length. */
    static Bend between(double ax, double ay, double bx, double by, double part) {
        double controlX = (ax + bx) / 2 + (by - ay) * part;
        double controlY = (ay + by) / 2 - (bx - ax) * part;
        return new Bend(new double[] {ax, (ax + 2 * controlX) / 3, (bx + 2 * controlX) / 3, bx},
                new double[] {ay, (ay + 2 * controlY) / 3, (by + 2 * controlY) / 3, by});
    }

    double xAt(double t) {
        return at(x, t);
    }

    double yAt(double t) {
        return at(y, t);
    }

    private static double at(double[] c, double t) {
        double s = 1 - t;
        return s * s * s * c[0] + 3 * s * s * t * c[1] + 3 * s * t * t * c[2] + t * t * t * c[3];
    }

    /** The part between two parameters (de Casteljau). */
    Bend part(double from, double to) {
        return new Bend(part(x, from, to), part(y, from, to));
    }

    private static double[] part(double[] c, double from, double to) {
        double[] rest = after(c, from);
        double[] reversed = after(new double[] {rest[3], rest[2], rest[1], rest[0]}, 1 - (to - from) / (1 - from));
        return new double[] {reversed[3], reversed[2], reversed[1], reversed[0]};
    }

    private static double[] after(double[] c, double t) {
        double a = c[0] + (c[1] - c[0]) * t;
        double b = c[1] + (c[2] - c[1]) * t;
        double d = c[2] + (c[3] - c[2]) * t;
        double ab = a + (b - a) * t;
        double bd = b + (d - b) * t;
        return new double[] {ab + (bd - ab) * t, bd, d, c[3]};
    }

    /** Without what lies in the box around its beginning and that around its end. */
    Bend outside(Box start, Box end) {
        double from = crossing(start, 0, 0.5);
        double to = crossing(end, 1, 0.5);
        return part(from, to);
    }

    /** Where it leaves a box in which the first parameter's point lies and the second's doesn't. */
    private double crossing(Box box, double inside, double outside) {
        double low = inside;
        double high = outside;
        for (int i = 0; i < HALVINGS; i++) {
            double middle = (low + high) / 2;
            if (box.contains(xAt(middle), yAt(middle))) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return high;
    }

    List<Point> controls() {
        List<Point> points = new ArrayList<>();
        for (int i = 0; i < 4; i++) {
            points.add(new Point(x[i], y[i]));
        }
        return points;
    }

    /** Points along it, both ends too. */
    List<Point> samples() {
        List<Point> points = new ArrayList<>();
        for (int i = 0; i <= SAMPLES; i++) {
            points.add(new Point(xAt(i / (double) SAMPLES), yAt(i / (double) SAMPLES)));
        }
        return points;
    }
}
