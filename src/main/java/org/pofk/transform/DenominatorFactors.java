package org.pofk.transform;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import org.pofk.chain.Chain;
import org.pofk.chain.Structure;
import org.pofk.chain.Structure.CommunicatingClass;
import org.pofk.exact.Factoring;
import org.pofk.exact.Factorization;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;

/**
 * The factors of denominators that come from one chain, each different polynomial factored once. What the chain's
 * graph says of likely divisors helps: roots of unity whose order divides the period of a class, and the poles of
 * single states. Exact.
 */
final class DenominatorFactors {
    private final Factoring.Hints hints;
    private final Map<Polynomial<Rational>, Factorization<Rational>> known = new HashMap<>();

    DenominatorFactors(Chain chain) {
        Set<Integer> orders = new TreeSet<>();
        Set<Rational> single = new TreeSet<>();
        for (CommunicatingClass each : Structure.of(chain).classes()) {
            for (int order = 1; order <= each.period(); order++) {
                if (each.period() % order == 0) {
                    orders.add(order);
                }
            }
            if (each.states().size() == 1) {
                single.add(chain.matrix().at(each.states().get(0), each.states().get(0)));
            }
        }
        List<Polynomial<Rational>> divisors = new ArrayList<>();
        single.forEach(value -> divisors.add(Polynomial.ofRationals(List.of(value.negate(), Rational.ONE))));
        hints = new Factoring.Hints(orders, divisors);
    }

    Factorization<Rational> of(Polynomial<Rational> monic) {
        return known.computeIfAbsent(monic, unseen -> Factoring.of(unseen, hints));
    }
}
