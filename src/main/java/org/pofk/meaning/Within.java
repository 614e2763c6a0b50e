package org.pofk.meaning;

import java.util.Collections;
import java.util.IdentityHashMap;
import java.util.Set;
import java.util.function.Predicate;

/** Whether something of a kind is part of a quantity. */
final class Within {
    private final Predicate<Node> kind;
    private final Set<Quantity> seen = Collections.newSetFromMap(new IdentityHashMap<>());

    private Within(Predicate<Node> kind) {
        this.kind = kind;
    }

    /** Whether a conjugate or a real part is taken anywhere. */
    static boolean conjugation(Quantity quantity) {
        return new Within(node -> node instanceof Node.Conjugate || node instanceof Node.RealPart).isIn(quantity);
    }

    /** Whether anything is enclosed by summing a series. */
    static boolean series(Quantity quantity) {
        return new Within(node -> node instanceof Node.Exponential || node instanceof Node.Logarithm
                || node instanceof Node.Angle || node == Node.Constant.PI).isIn(quantity);
    }

    private boolean isIn(Quantity quantity) {
        return seen.add(quantity)
                && (kind.test(quantity.node()) || Parts.of(quantity).stream().anyMatch(this::isIn));
    }
}
