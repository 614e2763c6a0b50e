package org.pofk.meaning;

import java.util.Collections;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import org.pofk.meaning.ExponentialSum.Scope;
import org.pofk.text.Span;

/**
 * A sum of terms and impulses while it is read: an {@link ExponentialSum} that knows what is written alike. Canonical
 * form: no two terms of one shape, in the order in which the first of each stands; no coefficient and no impulse zero
 * as written.
 */
record PolarSum(List<PolarTerm> terms, SortedMap<Long, Scalar> impulses, Scope scope) {

    PolarSum {
        terms = List.copyOf(terms);
        impulses = Collections.unmodifiableSortedMap(new TreeMap<>(impulses));
    }

    static PolarSum of(List<PolarTerm> terms) {
        return new PolarSum(terms, new TreeMap<>(), Scope.ALL);
    }

    /** True when it is one term, without impulses, at every step. */
    boolean isOneTerm() {
        return terms.size() == 1 && hasTermsOnly();
    }

    boolean hasTermsOnly() {
        return impulses.isEmpty() && scope.equals(Scope.ALL);
    }

    /** The same, with this place for its term where it is only one. */
    PolarSum at(Span span) {
        return isOneTerm() ? of(List.of(terms.get(0).at(span))) : this;
    }

    ExponentialSum finished() {
        SortedMap<Long, Quantity> values = new TreeMap<>();
        impulses.forEach((step, value) -> values.put(step, value.quantity()));
        return new ExponentialSum(terms.stream().map(term -> new ExponentialSum.Term(term.coefficient().quantity(),
                term.power(), term.base().quantity(), term.angle().quantity(), term.phase().quantity(),
                term.span())).toList(), values, scope);
    }
}
