package org.pofk.cli;

import java.util.Optional;

/** Which commands take a file, by what it holds. */
final class TakenBy {
    private TakenBy() {
    }

    static Optional<String> file(String name) {
        return Optional.empty();
    }
}
