package org.pofk.cli;

import java.nio.file.Path;
import java.util.Optional;
import org.pofk.input.FileKind;
import org.pofk.input.Source;
import org.pofk.text.RefusedException;

/** Which commands take a file, by what it holds. */
final class TakenBy {
    private TakenBy() {
    }

    /** {@code pumps.yaml is a model; pofk derive, inspect and simulate take it}; empty for what is no readable file. */
    static Optional<String> file(String name) {
        if (name.startsWith("-")) {
            return Optional.empty();
        }
        try {
            FileKind kind = FileKind.of(Source.read(Path.of(name)));
            return Optional.of("'" + name + "' is " + kind.inWords() + switch (kind) {
                case MODEL -> ": pofk derive, inspect and simulate take it";
                case MATRIX -> ": pofk derive, inspect and simulate take it, with --orientation and --start";
                case CLAIMS -> ": pofk check takes it";
                case RESULT -> ": name the model it came from";
                case OTHER -> "";
            });
        } catch (RefusedException | java.nio.file.InvalidPathException unreadable) {
            return Optional.empty();
        }
    }
}
