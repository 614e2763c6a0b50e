package org.pofk.cli;

import java.util.function.Consumer;
import picocli.CommandLine.Mixin;

/** What every command takes that works for a while: a limit of time, and what all commands take. */
final class RunOptions {
    @Mixin
    private BudgetOptions budget;

    @Mixin
    private CommonOptions common;

    /** Does the work within the limit; what it publishes last is kept. */
    <T> Worker.Outcome<T> within(Streams streams, Consumer<Consumer<T>> work) throws UsageException {
        return Worker.within(budget.limit(streams), streams.notes(), work);
    }

    /** Says that the limit was reached before anything was decided. */
    ExitCode undecided(Streams streams) {
        streams.notes().println("pofk: nothing was decided within the budget");
        return ExitCode.NOT_DECIDED;
    }
}
