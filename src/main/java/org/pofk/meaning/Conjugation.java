package org.pofk.meaning;

import java.util.Collections;
import java.util.IdentityHashMap;
import java.util.Set;

/** Whether a conjugate or a real part is taken anywhere within a quantity. */
final class Conjugation {
    private final Set<Quantity> seen = Collections.newSetFromMap(new IdentityHashMap<>());

    private Conjugation() {
    }

    static boolean within(Quantity quantity) {
        return new Conjugation().isIn(quantity);
    }

    private boolean isIn(Quantity quantity) {
        Node node = quantity.node();
        return seen.add(quantity) && (node instanceof Node.Conjugate || node instanceof Node.RealPart
                || Parts.of(quantity).stream().anyMatch(this::isIn));
    }
}
