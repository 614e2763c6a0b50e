package org.pofk.claim;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.SortedMap;
import java.util.TreeMap;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.RationalForm;
import org.pofk.meaning.Written;

/** Statements whose decimals stand for every number within a whole unit of their last place: cut off, or rounded. */
final class Loosened {
    private Loosened() {
    }

    /** The decimal with a last place twice as large. */
    static Quantity of(Written written) {
        return Quantity.of(new Written(written.text(), written.value(),
                written.lastPlace().plus(written.lastPlace()), written.span()));
    }

    static Quantity of(Quantity quantity) {
        Map<Written, Quantity> loosened = new HashMap<>();
        quantity.decimals().forEach(written -> loosened.put(written, of(written)));
        return quantity.with(loosened);
    }

    static ExponentialSum of(ExponentialSum sum) {
        SortedMap<Long, Quantity> impulses = new TreeMap<>();
        sum.impulses().forEach((k, value) -> impulses.put(k, of(value)));
        return new ExponentialSum(sum.terms().stream().map(term -> new ExponentialSum.Term(of(term.coefficient()),
                term.power(), of(term.base()), of(term.angle()), of(term.phase()), term.span())).toList(),
                impulses, sum.scope());
    }

    static RationalForm of(RationalForm form) {
        return new RationalForm(form.summands().stream().map(summand -> new RationalForm.Summand(of(summand.front()),
                summand.factors().stream().map(factor -> new RationalForm.Factor(of(factor.coefficients()),
                        factor.exponent(), factor.span())).toList(), summand.span())).toList());
    }

    private static List<Quantity> of(List<Quantity> all) {
        return all.stream().map(Loosened::of).toList();
    }
}
