package org.pofk.input;

/** How a claim of each kind looks, for messages: its shape, without numbers that could be taken for a proposal. */
final class ClaimExamples {
    private ClaimExamples() {
    }

    /** What follows the kind, {@code is: NUMBER}. */
    static String of(ClaimKind kind) {
        return switch (kind) {
            case START, EIGENVECTOR -> "are: {STATE: NUMBER, OTHER: NUMBER}";
            case MATRIX -> "are: [[NUMBER, NUMBER], [NUMBER, NUMBER]]";
            case CHARACTERISTIC_POLYNOMIAL, MINIMAL_POLYNOMIAL -> "is: 'POLYNOMIAL IN z'";
            case TRANSFORM, TRANSFORM_OVER_Z -> "is: 'FORMULA IN z'";
            case EXPANSION -> "is: 'SUM OF FRACTIONS IN z'";
            case POLES -> "are: [NUMBER, NUMBER (twice), NUMBER ± NUMBER i]";
            case RESIDUES -> "are: {POLE: NUMBER, OTHER: NUMBER}";
            case FORMULA -> "is: 'FORMULA IN k', or with 'all' are: {STATE: 'FORMULA IN k', OTHER: …}";
            case PAIR -> "radius: NUMBER, angle: NUMBER deg, amplitude: NUMBER, phase: NUMBER deg";
            case LONG_RUN -> "is: NUMBER, is: none, or with 'all' are: {STATE: NUMBER, OTHER: NUMBER}";
            case VALUE, SUM, MEAN -> "is: NUMBER";
            case MEAN_PASSAGE -> "is: NUMBER, is: infinite, or is: never";
            case SETTLING_STEP -> "is: STEP, or is: never";
            case BOUND -> "at most: NUMBER, or at least: NUMBER";
        };
    }
}
