package org.pofk.text;

import java.util.ArrayList;
import java.util.List;

/** Collects the faults of one input so that all are shown at once. Mutable; lives for one reading. */
public final class Faults {
    private final List<Fault> found = new ArrayList<>();

    public void add(Position position, String code, String message) {
        found.add(new Fault(position, code, message));
    }

    public void addAll(List<Fault> faults) {
        found.addAll(faults);
    }

    public boolean isEmpty() {
        return found.isEmpty();
    }

    /** How many there are so far. */
    public int count() {
        return found.size();
    }

    public List<Fault> list() {
        return List.copyOf(found);
    }

    /** Ends the reading when something was found. */
    public void refuseIfAny() throws RefusedException {
        if (!found.isEmpty()) {
            throw new RefusedException(found);
        }
    }
}
