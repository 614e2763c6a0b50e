package org.pofk.transform;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
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
 * graph says of likely divisors helps: roots of unity whose order divides the period of a class, the poles of
 * single states, and for large denominators the characteristic polynomials of the classes. Exact.
 */
final class DenominatorFactors {
    /** Up to this degree full factorization is quicker than working out what the classes have for polynomials. */
    private static final int EASY_DEGREE = 24;

    private final Chain chain;
    private final List<CommunicatingClass> classes;
    private final Factoring.Hints hints;
    private Optional<Factoring.Hints> ofClasses = Optional.empty();
    private final Map<Polynomial<Rational>, Factorization<Rational>> known = new HashMap<>();

    DenominatorFactors(Chain chain) {
        this.chain = chain;
        this.classes = Structure.of(chain).classes();
        Set<Integer> orders = new TreeSet<>();
        Set<Rational> single = new TreeSet<>();
        for (CommunicatingClass each : classes) {
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
        return known.computeIfAbsent(monic, unseen -> Factoring.of(unseen, hintsFor(unseen)));
    }

    /** With several classes a denominator falls apart: every factor belongs to the states of one of them. */
    private Factoring.Hints hintsFor(Polynomial<Rational> monic) {
        long large = classes.stream().filter(each -> each.states().size() > 1).count();
        if (monic.degree() <= EASY_DEGREE || large < 2) {
            return hints;
        }
        ofClasses = Optional.of(ofClasses.orElseGet(this::withClasses));
        return ofClasses.get();
    }

    private Factoring.Hints withClasses() {
        List<Polynomial<Rational>> divisors = new ArrayList<>(hints.divisors());
        CharacteristicPolynomial.of(chain).ifPresent(all -> all.parts().stream()
                .filter(part -> part.states().states().size() > 1)
                .forEach(part -> divisors.add(part.polynomial())));
        return new Factoring.Hints(hints.cyclotomicOrders(), divisors.stream().distinct().toList());
    }
}
