package org.pofk.report;

import org.pofk.answer.HighPowers;
import org.pofk.exact.Decimals;

/** Where comparing two successive powers of A would have stopped at a wrong value. */
final class LongRunWarning {
    private LongRunWarning() {
    }

    static String of(HighPowers.Stop stop, int digits) {
        String habit = stop.way() == HighPowers.Way.STEP_BY_STEP
                ? "comparing each state with the one before"
                : "squaring A until it no longer changes";
        String cause = stop.outcome() == HighPowers.Outcome.MISLED_BY_CYCLE ? "a cycle" : "a slow pole";
        return habit + " would have stopped at k = " + stop.k() + " with "
                + (stop.value().containsZero() ? "0" : Decimals.of(stop.value().middle(), digits).text()) + ", misled by " + cause;
    }
}
