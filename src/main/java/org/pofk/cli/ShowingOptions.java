package org.pofk.cli;

import java.util.Optional;
import org.pofk.chain.Model;
import org.pofk.report.Style;
import picocli.CommandLine.Option;

/** How results are shown. */
final class ShowingOptions {
    private static final int MOST_DIGITS = 50;

    @Option(names = "--digits", paramLabel = "N", defaultValue = "6",
            description = "significant digits of a decimal, 1 to 50; ${DEFAULT-VALUE} otherwise")
    private int digits;

    @Option(names = "--angles", paramLabel = "UNIT", defaultValue = "radians",
            description = "radians or degrees; ${DEFAULT-VALUE} otherwise")
    private Style.Angles angles;

    @Option(names = "--convention", paramLabel = "WAY",
            description = "columns: x(k+1) = A x(k); rows: p(k+1) = p(k) P; otherwise as the model is written")
    private Optional<Orientation> convention = Optional.empty();

    /** Digits and angles as asked for. */
    Style style() throws UsageException {
        if (digits < 1 || digits > MOST_DIGITS) {
            throw new UsageException("--digits " + digits + " is not possible; 1 to " + MOST_DIGITS + " are");
        }
        return new Style(digits, angles);
    }

    /** The convention asked for, else that of the model. */
    Model.Convention convention(Model model) {
        return convention.map(Orientation::convention).orElse(model.convention());
    }
}
