package org.pofk.cli;

import java.time.Duration;
import java.util.Optional;
import picocli.CommandLine.Option;

/** How long the work may take. */
final class BudgetOptions {
    @Option(names = "--budget", paramLabel = "SECONDS",
            description = "after this time, writes what is proven so far and ends with exit code 4")
    private Optional<Double> seconds = Optional.empty();

    /** The limit, none where none was asked for. */
    Optional<Duration> limit() throws UsageException {
        if (seconds.isEmpty()) {
            return Optional.empty();
        }
        double asked = seconds.get();
        if (!(asked > 0 && asked <= Integer.MAX_VALUE)) {
            throw new UsageException("--budget takes a number of seconds above zero, like --budget 60");
        }
        return Optional.of(Duration.ofNanos((long) (asked * 1e9)));
    }
}
