package org.pofk.text;

import java.util.Collection;
import java.util.List;
import java.util.stream.Collectors;

/** An input that can't be accepted: every fault found in it, in order of reading, at least one. */
public final class RefusedException extends Exception {
    private static final long serialVersionUID = 1L;

    private final transient List<Fault> faults;

    public RefusedException(Collection<Fault> faults) {
        super(faults.stream().sorted(Fault.IN_ORDER_OF_READING).map(Fault::toString)
                .collect(Collectors.joining("\n")));
        this.faults = faults.stream().sorted(Fault.IN_ORDER_OF_READING).distinct().toList();
    }

    public List<Fault> faults() {
        return faults;
    }
}
