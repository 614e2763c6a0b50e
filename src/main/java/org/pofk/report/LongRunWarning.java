package org.pofk.report;

import org.pofk.longrun.HighPowers;

/** Where comparing two successive powers of the matrix would have stopped at a wrong value. */
final class LongRunWarning {
    private LongRunWarning() {
    }

    static String of(HighPowers.Stop stop, int digits) {
        String habit = stop.way() == HighPowers.Way.STEP_BY_STEP
                ? "comparing each state with the one before"
                : "squaring the matrix until it no longer changes";
        String cause = switch (stop.outcome()) {
            case RIGHT -> throw new AssertionError("no warning is due at k = " + stop.k());
            case MISLED_BY_CYCLE -> "misled by a cycle";
            case MISLED_BY_SLOW_POLE -> "misled by a slow pole";
            case MISLED_BY_SIZE -> "too early for an output of this size";
        };
        return habit + " would have stopped at k = " + stop.k() + " with "
                + DecidedDigits.of(stop.value(), digits, ValueText::of) + ", " + cause;
    }
}
