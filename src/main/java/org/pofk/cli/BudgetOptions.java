package org.pofk.cli;

import java.time.Duration;
import java.time.Instant;
import java.util.Optional;
import picocli.CommandLine.Option;

/** How long the work may take. */
final class BudgetOptions {
    @Option(names = "--budget", paramLabel = "SECONDS",
            description = "ends after this time, with exit code 4; writes what is proven by then, a"
                    + " figure only whole")
    private Optional<Double> seconds = Optional.empty();

    /**
     * What is left of the limit, none where none was asked for. The time since the run began counts, but never for
     * more than half, however the system's clock was set meanwhile.
     */
    Optional<Duration> limit(Streams streams) throws UsageException {
        if (seconds.isEmpty()) {
            return Optional.empty();
        }
        double asked = seconds.get();
        if (!(asked > 0 && asked <= Integer.MAX_VALUE)) {
            throw new UsageException("--budget takes a number of seconds above zero, like --budget 60");
        }
        Duration limit = Duration.ofNanos((long) (asked * 1e9));
        Duration left = limit.minus(Duration.between(streams.begun(), Instant.now()));
        Duration least = limit.dividedBy(2);
        return Optional.of(left.compareTo(least) < 0 ? least : left.compareTo(limit) > 0 ? limit : left);
    }
}
