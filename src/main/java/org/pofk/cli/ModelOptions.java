package org.pofk.cli;

import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Which model is read, and what the command line puts in place of the file's own words. */
final class ModelOptions {
    @Parameters(paramLabel = "MODEL", description = "a model file (YAML or JSON), or a matrix in a CSV file")
    private Path file;

    @Option(names = "--set", paramLabel = "NAME=VALUE",
            description = "gives a parameter another value than the file does; repeatable")
    private Map<String, String> values = new LinkedHashMap<>();

    @Option(names = "--start", paramLabel = "STATE", description = "starts in this state, whatever the file says")
    private Optional<String> start = Optional.empty();

    @Option(names = "--orientation", paramLabel = "WAY",
            description = "for a CSV file: rows or columns, which of the two sums to one")
    private Optional<Orientation> orientation = Optional.empty();

    /** Which of the two sums to one. */
    enum Orientation {
        ROWS, COLUMNS;

        @Override
        public String toString() {
            return Words.lowerCase(this);
        }
    }
}
