package org.pofk.report;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.stream.IntStream;

/** Labels in one column, each as near to where it is wanted as the others allow. */
final class Spread {
    private Spread() {
    }

    /** Their centers: from the top each is pushed below the one before, then from the bottom up where that is too low. */
    static List<Double> apart(List<Double> wanted, List<Double> heights, double top, double bottom) {
        List<Integer> order = IntStream.range(0, wanted.size()).boxed()
                .sorted((a, b) -> Double.compare(wanted.get(a), wanted.get(b))).toList();
        List<Double> centers = new ArrayList<>(Collections.nCopies(wanted.size(), 0.0));
        double free = top;
        for (int i : order) {
            double center = Math.max(wanted.get(i), free + heights.get(i) / 2);
            centers.set(i, center);
            free = center + heights.get(i) / 2;
        }
        double limit = bottom;
        for (int j = order.size() - 1; j >= 0; j--) {
            int i = order.get(j);
            centers.set(i, Math.min(centers.get(i), limit - heights.get(i) / 2));
            limit = centers.get(i) - heights.get(i) / 2;
        }
        return centers;
    }
}
