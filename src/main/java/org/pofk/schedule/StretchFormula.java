package org.pofk.schedule;

import org.pofk.modes.ClosedForm;

/**
 * An output within a cycle, as a formula in the steps i since step {@code from} of the cycle: from there to step
 * {@code to}, just before whatever is done there, the chain moves by one matrix. Exact.
 *
 * @param cycle the first cycle, or what the cycles tend to
 */
public record StretchFormula(Cycle cycle, int from, int to, ClosedForm closedForm) {

    /** Which cycle. */
    public enum Cycle { FIRST, LONG_RUN }
}
