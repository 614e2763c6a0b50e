package org.pofk.report;

/**
 * How results are shown.
 *
 * @param digits significant digits of a decimal
 * @param angles the unit of angles
 */
public record Style(int digits, Angles angles) {

    /** The unit of an angle. */
    public enum Angles { RADIANS, DEGREES }
}
