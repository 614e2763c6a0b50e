package org.pofk.longrun;

import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import org.pofk.chain.Structure;
import org.pofk.exact.Cyclotomic;
import org.pofk.exact.Factorization;
import org.pofk.exact.Rational;
import org.pofk.transform.TransferFunction;

/**
 * The long run read off the denominator of Y(z): what lies on the unit circle stays, what lies inside dies out, and
 * anything outside, or repeated on the circle, grows. Exact.
 */
public final class LongRunByPoles {
    private LongRunByPoles() {
    }

    /**
     * A chain's poles on the unit circle are simple, and roots of unity whose order divides the period of a closed
     * class (Perron and Frobenius; Seneta 1981, section 1.3, from memory).
     */
    public static LongRun ofChain(Structure structure, TransferFunction<Rational> y) {
        TreeSet<Integer> orders = new TreeSet<>();
        structure.closedClasses().stream().filter(each -> each.reached()).mapToInt(each -> each.period()).distinct()
                .forEach(period -> addDivisors(period, orders));
        return periodic(y, Cyclotomic.ordersDividing(y.denominator(), orders));
    }

    /** @param denominator that of y, factored */
    public static LongRun ofRecursion(TransferFunction<Rational> y, Factorization<Rational> denominator) {
        List<PlacedFactor> factors = denominator.factors().stream().map(PlacedFactor::of).toList();
        if (factors.stream().anyMatch(PlacedFactor::grows)) {
            return new LongRun.None(LongRun.Reason.GROWS, Optional.empty(), GrowthRate.of(factors).inWords());
        }
        List<Integer> orders = Cyclotomic.ordersDividing(y.denominator());
        int rootsOfUnity = orders.stream().mapToInt(Cyclotomic::totient).sum();
        if (factors.stream().mapToInt(each -> each.counts().on()).sum() == rootsOfUnity) {
            return periodic(y, orders);
        }
        Rational average = orders.contains(1) ? UnitCirclePart.values(y, 1).get(0) : Rational.ZERO;
        return new LongRun.None(LongRun.Reason.RECURS_WITHOUT_PERIOD, Optional.of(average),
                "recurs without a period: poles on the unit circle that are no roots of unity");
    }

    private static LongRun periodic(TransferFunction<Rational> y, List<Integer> orders) {
        List<List<Rational>> parts = orders.stream().map(order -> UnitCirclePart.values(y, order)).toList();
        return PeriodicValues.sum(parts).longRun();
    }

    private static void addDivisors(int period, TreeSet<Integer> orders) {
        for (int divisor = 1; (long) divisor * divisor <= period; divisor++) {
            if (period % divisor == 0) {
                orders.add(divisor);
                orders.add(period / divisor);
            }
        }
    }
}
