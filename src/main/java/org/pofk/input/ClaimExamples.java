package org.pofk.input;

/** How a claim of each kind looks, for messages. */
final class ClaimExamples {
    private ClaimExamples() {
    }

    /** What follows the kind, {@code is: 0.0082}. */
    static String of(ClaimKind kind) {
        return switch (kind) {
            case START, EIGENVECTOR -> "are: {STATE: 0.9, OTHER: 0.1}";
            case MATRIX -> "are: [[0.9, 0.2], [0.1, 0.8]]";
            case CHARACTERISTIC_POLYNOMIAL, MINIMAL_POLYNOMIAL -> "is: 'z^2 - 1.7 z + 0.7'";
            case TRANSFORM -> "is: 'z*(0.2 z + 0.1)/((z - 1)*(z - 0.5))'";
            case TRANSFORM_OVER_Z -> "is: '0.2/(z - 1) + 0.1/(z - 0.5)'";
            case EXPANSION -> "is: '0.2*z/(z - 1) + 0.1*z/(z - 0.5)'";
            case POLES -> "are: [1, 0.45 (twice), 0.4 ± 0.33 i]";
            case RESIDUES -> "are: {1: 0.0082, 0.45: -0.017}";
            case FORMULA -> "is: '0.2 + 0.1*0.45^k', or with 'all' are: {STATE: …, OTHER: …}";
            case PAIR -> "radius: 0.52, angle: 39.7 deg, amplitude: 0.66, phase: -119 deg";
            case LONG_RUN -> "is: 0.0082, is: none, or with 'all' are: {STATE: 0.85, OTHER: 0.15}";
            case VALUE, SUM, MEAN -> "is: 0.0082";
            case SETTLING_STEP -> "is: 12";
            case MEAN_PASSAGE -> "is: 8.462";
            case BOUND -> "at most: 0.01, or at least: 0.9";
        };
    }
}
