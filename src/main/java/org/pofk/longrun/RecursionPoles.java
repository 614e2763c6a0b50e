package org.pofk.longrun;

import java.util.List;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.transform.StateTransform;

/**
 * What can be said of a recursion as a whole: the poles of its state as it starts, counted with their multiplicities by
 * where they lie. Exact.
 *
 * @param order   degree of the least recurrence that the whole state satisfies
 * @param inside  poles inside the unit circle, those at zero included
 * @param on      on it
 * @param outside outside
 * @param growth  how the state grows, in one line; empty when it stays bounded
 */
public record RecursionPoles(int order, int inside, int on, int outside, Optional<String> growth) {

    public static RecursionPoles of(Chain recursion) {
        StateTransform state = StateTransform.of(recursion);
        List<PlacedFactor> factors = state.factors().factors().stream().map(PlacedFactor::of).toList();
        Optional<String> growth = factors.stream().anyMatch(PlacedFactor::grows)
                ? Optional.of(GrowthRate.of(factors).inWords())
                : Optional.empty();
        Polynomial<Rational> recurrence = state.recurrence();
        return new RecursionPoles(recurrence.degree(),
                factors.stream().mapToInt(each -> each.counts().inside() * each.factor().multiplicity()).sum(),
                factors.stream().mapToInt(each -> each.counts().on() * each.factor().multiplicity()).sum(),
                factors.stream().mapToInt(each -> each.counts().outside() * each.factor().multiplicity()).sum(),
                growth);
    }
}
