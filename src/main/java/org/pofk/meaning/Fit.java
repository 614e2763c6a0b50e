package org.pofk.meaning;

/** How a written decimal goes with its right value. */
public enum Fit {
    /** Within half a unit of the last place. */
    RIGHT,
    /** The digits of the right value, cut off instead of rounded. */
    CUT_OFF,
    WRONG
}
