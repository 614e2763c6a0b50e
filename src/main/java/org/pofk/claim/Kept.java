package org.pofk.claim;

import java.util.Optional;
import java.util.function.Supplier;

/** A value worked out when first asked for, once. */
final class Kept<T> implements Supplier<T> {
    private final Supplier<T> working;
    private Optional<T> value = Optional.empty();

    Kept(Supplier<T> working) {
        this.working = working;
    }

    @Override
    public synchronized T get() {
        if (value.isEmpty()) {
            value = Optional.of(working.get());
        }
        return value.get();
    }
}
