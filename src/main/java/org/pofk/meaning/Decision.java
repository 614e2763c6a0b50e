package org.pofk.meaning;

/** Whether something holds: proved either way, or not decided within the bounds on the work. */
public enum Decision {
    YES, NO, UNDECIDED
}
