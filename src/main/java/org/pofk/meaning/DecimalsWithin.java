package org.pofk.meaning;

import java.util.Collections;
import java.util.IdentityHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** The decimals a quantity is made of, each once, in order of reading. */
final class DecimalsWithin {
    private final Set<Written> found = new LinkedHashSet<>();
    private final Set<Quantity> seen = Collections.newSetFromMap(new IdentityHashMap<>());

    private DecimalsWithin() {
    }

    static List<Written> of(Quantity quantity) {
        DecimalsWithin search = new DecimalsWithin();
        search.visit(quantity);
        return List.copyOf(search.found);
    }

    private void visit(Quantity quantity) {
        if (seen.add(quantity)) {
            quantity.writtenDecimal().ifPresent(found::add);
            Parts.of(quantity).forEach(this::visit);
        }
    }
}
