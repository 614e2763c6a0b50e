package org.pofk.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/**
 * Circles around zero on which the roots of a polynomial roughly lie, from the upper convex hull of
 * (i, log |c_i|) (D. A. Bini 1996, from memory). Approximate: starts only.
 */
final class NewtonPolygon {
    private NewtonPolygon() {
    }

    /** {@code count} roots at about radius 2^logRadius. */
    record Circle(int count, double logRadius) {
    }

    /** @param ascending lowest and highest coefficient not zero */
    static List<Circle> circles(BigInteger[] ascending) {
        List<Integer> hull = new ArrayList<>();
        double[] sizes = new double[ascending.length];
        for (int i = 0; i < ascending.length; i++) {
            if (ascending[i].signum() != 0) {
                sizes[i] = Logarithms.approximate(ascending[i]);
                while (hull.size() > 1 && isBelow(hull, sizes, i)) {
                    hull.remove(hull.size() - 1);
                }
                hull.add(i);
            }
        }
        List<Circle> circles = new ArrayList<>();
        for (int k = 1; k < hull.size(); k++) {
            int from = hull.get(k - 1);
            int to = hull.get(k);
            circles.add(new Circle(to - from, (sizes[from] - sizes[to]) / (to - from)));
        }
        return circles;
    }

    private static boolean isBelow(List<Integer> hull, double[] sizes, int next) {
        int before = hull.get(hull.size() - 2);
        int last = hull.get(hull.size() - 1);
        return (sizes[last] - sizes[before]) * (next - before) <= (sizes[next] - sizes[before]) * (last - before);
    }
}
