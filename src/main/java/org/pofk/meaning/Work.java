package org.pofk.meaning;

/**
 * Counts the work of reading one formula, in operations with numbers and glances at their parts, so that hostile
 * text ends at once.
 * Mutable; lives for one reading.
 */
final class Work {
    /** Most steps of one reading: some tenths of a second. */
    static final long MOST = 20_000;

    private long spent;

    long spent() {
        return spent;
    }

    void spend(long steps) {
        spent += steps;
        if (spent > MOST) {
            throw new TooLargeException();
        }
    }

    /** A size within its bound. */
    static int within(long size, int bound) {
        if (size > bound) {
            throw new TooLargeException();
        }
        return (int) size;
    }
}
