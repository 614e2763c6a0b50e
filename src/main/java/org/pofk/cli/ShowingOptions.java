package org.pofk.cli;

import java.util.Optional;
import picocli.CommandLine.Option;

/** How results are shown. */
final class ShowingOptions {
    private static final int MOST_DIGITS = 50;

    @Option(names = "--digits", paramLabel = "N", defaultValue = "6",
            description = "significant digits of a decimal, 1 to 50; ${DEFAULT-VALUE} otherwise")
    private int digits;

    @Option(names = "--angles", paramLabel = "UNIT", defaultValue = "radians",
            description = "radians or degrees; ${DEFAULT-VALUE} otherwise")
    private Angles angles;

    @Option(names = "--convention", paramLabel = "WAY",
            description = "columns: x(k+1) = A x(k); rows: p(k+1) = p(k) P; otherwise as the model is written")
    private Optional<Convention> convention = Optional.empty();

    /** The unit of an angle. */
    enum Angles {
        RADIANS, DEGREES;

        @Override
        public String toString() {
            return Words.lowerCase(this);
        }
    }

    /** Whether the moves out of a state stand in a column or in a row. */
    enum Convention {
        COLUMNS, ROWS;

        @Override
        public String toString() {
            return Words.lowerCase(this);
        }
    }

    int digits() throws UsageException {
        if (digits < 1 || digits > MOST_DIGITS) {
            throw new UsageException("--digits " + digits + " is not possible; 1 to " + MOST_DIGITS + " are");
        }
        return digits;
    }

    Angles angles() {
        return angles;
    }

    Optional<Convention> convention() {
        return convention;
    }
}
