package org.pofk.claim;

/** Holds one claim against what is true. */
public final class Judging {
    private Judging() {
    }

    /** The judgement; {@code truth} is that of the model, or of another one when a slip or an earlier step is tried. */
    public static Judgement of(Claim claim, Truth truth) {
        throw new AssertionError("to come");
    }
}
