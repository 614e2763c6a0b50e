package org.pofk.meaning;

import java.util.IdentityHashMap;
import java.util.Map;

/** Something worked out for a quantity from what it is for its parts; for a shared part once. */
abstract class Walk<R> implements Node.Visitor<R> {
    private final Map<Quantity, R> known = new IdentityHashMap<>();

    R of(Quantity quantity) {
        R found = known.get(quantity);
        if (found == null) {
            found = quantity.node().accept(this);
            known.put(quantity, found);
        }
        return found;
    }
}
