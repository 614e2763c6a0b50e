package org.pofk.cli;

import java.util.function.Consumer;
import java.util.function.Function;
import picocli.CommandLine.Mixin;

/** What every command takes that works for a while: a limit of time, and what all commands take. */
final class RunOptions {
    @Mixin
    private BudgetOptions budget;

    @Mixin
    private CommonOptions common;

    /** Does the work within the limit; what it publishes last is kept. */
    <T> Worker.Outcome<T> within(Streams streams, Consumer<Consumer<T>> work) throws UsageException {
        return within(streams, published -> "", work);
    }

    /** The same, and who waits is told what is published. */
    <T> Worker.Outcome<T> within(Streams streams, Function<T, String> soFar, Consumer<Consumer<T>> work)
            throws UsageException {
        return Worker.within(budget.limit(streams), streams.progress(), soFar, work);
    }

    /** Says that the limit was reached before anything was decided. */
    ExitCode undecided(Streams streams) {
        streams.notes().println("pofk: nothing was decided within the budget");
        return ExitCode.NOT_DECIDED;
    }
}
