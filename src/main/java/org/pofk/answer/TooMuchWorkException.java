package org.pofk.answer;

/** Thrown where the work of a search is bounded; caught where the search is answered. */
public final class TooMuchWorkException extends Exception {
    private static final long serialVersionUID = 1;
}
