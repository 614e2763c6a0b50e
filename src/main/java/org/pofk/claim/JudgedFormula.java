package org.pofk.claim;

/** A formula for p(k), of one output or of every state, held against what is true. */
final class JudgedFormula {
    private JudgedFormula() {
    }

    static Judgement of(Statement.PofK stated, Claim claim, Truth truth) {
        throw new AssertionError("to come");
    }
}
