package org.pofk.claim;

/** A transform in any of its forms, held against what is true. */
final class JudgedTransform {
    private JudgedTransform() {
    }

    static Judgement of(Statement.TransformOf stated, Claim claim, Truth truth) {
        throw new AssertionError("to come");
    }
}
