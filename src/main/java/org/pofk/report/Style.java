package org.pofk.report;

import org.pofk.chain.Model.Convention;

/**
 * How results are shown.
 *
 * @param digits     significant digits of a decimal
 * @param angles     the unit of angles
 * @param convention whether the moves out of a state stand in a column or in a row
 */
public record Style(int digits, Angles angles, Convention convention) {

    /** The unit of an angle. */
    public enum Angles { RADIANS, DEGREES }
}
