package org.pofk.report;

import org.pofk.answer.Settling;
import org.pofk.exact.Decimals;

/** How an output approaches its long run, in words. */
final class SettlingProse {
    private SettlingProse() {
    }

    static String of(Settling settling, int digits) {
        return "stays within 1e-" + settling.digits() + " of it from k = " + settling.from() + " on"
                + settling.slowest().map(modulus -> "; slowest part decays like "
                        + Decimals.of(modulus, digits).text() + "^k"
                        + (settling.tied() > 1 ? ", shared by " + settling.tied() + " modes" : "")).orElse("");
    }
}
