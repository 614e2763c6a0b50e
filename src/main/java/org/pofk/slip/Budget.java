package org.pofk.slip;

/** Counts the work spent on one claim, so that the same file always gets the same answer. */
final class Budget {
    private static final int SCREENINGS = 6_000;
    private static final int JUDGEMENTS = 240;

    private int screenings = SCREENINGS;
    private int judgements = JUDGEMENTS;

    /** Whether one more candidate may be looked at; counts it. */
    boolean screening() {
        return screenings-- > 0;
    }

    /** Whether one more candidate may be judged; counts it. */
    boolean judgement() {
        return judgements-- > 0;
    }
}
