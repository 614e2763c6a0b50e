package org.pofk.claim;

/** What an error is counted in. */
enum Measure {
    ABSOLUTE,
    /** In parts of the true value. */
    RELATIVE
}
