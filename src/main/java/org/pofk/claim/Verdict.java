package org.pofk.claim;

/** What is said of a claim, from best to worst; undecided is apart. */
public enum Verdict {
    /** Identical for every k it is claimed for, proved; decimals in it mean exactly what they say. */
    EXACT,
    /** Every number in it is right to the digits written. */
    ROUNDED,
    /** Claimed as an approximation, and within what is claimed, on the side claimed. */
    APPROXIMATE,
    /** Wrong, but a correct consequence of an earlier wrong step. */
    CARRIED,
    WRONG,
    /** Not decided within the bounds on the work. */
    UNDECIDED
}
