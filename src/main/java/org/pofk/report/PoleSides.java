package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.exact.Ball;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;
import org.pofk.exact.UnitCircle;

/**
 * On which side of the unit circle each root of a factor lies: how many lie on it is decided exactly, then enclosures
 * are refined until only so many can't be told from it.
 */
final class PoleSides {
    private static final int FIRST_BITS = 64;

    private PoleSides() {
    }

    static List<Chart.Side> of(Polynomial<Rational> squareFree, List<Root> roots) {
        int on = UnitCircle.rootsOn(squareFree);
        for (int bits = FIRST_BITS; ; bits *= 2) {
            List<Chart.Side> sides = new ArrayList<>();
            for (Root root : roots) {
                Ball beyond = root.enclose(bits).modulus().minus(Ball.of(1, bits));
                sides.add(beyond.containsZero() ? Chart.Side.ON
                        : beyond.isNegative() ? Chart.Side.INSIDE : Chart.Side.OUTSIDE);
            }
            if (sides.stream().filter(Chart.Side.ON::equals).count() == on) {
                return sides;
            }
        }
    }
}
