package org.pofk.answer;

import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.longrun.LongRun;
import org.pofk.longrun.Settling;

/**
 * What is said of an output besides its formula and long run on a page that has room for little. Certified.
 *
 * @param settling from which step on it stays near its long run; empty where there is none
 * @param highest  the highest value it ever has or comes near to; empty where that isn't decided
 */
public record KeyFigures(Optional<Settling> settling, Optional<Peak> highest) {
    private static final int SETTLED_DIGITS = 6;
    public static final KeyFigures NONE = new KeyFigures(Optional.empty(), Optional.empty());

    /** Of an output whose formula and long run are known. */
    public static KeyFigures of(Chain chain, DerivedOutput output) {
        LongRun longRun = output.longRun().orElseThrow().byPoles();
        return output.closedForm().map(form -> new KeyFigures(
                Settling.of(form, longRun, Settling.digitsFor(longRun, SETTLED_DIGITS)),
                Peak.highest(chain, form, longRun))).orElse(NONE);
    }
}
