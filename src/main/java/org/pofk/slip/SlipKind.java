package org.pofk.slip;

/** The kinds of slip, simplest first: where several explain a claim, they are named in this order. */
public enum SlipKind {
    SIGN_OF_A_TERM("the sign of a term is wrong"),
    SIGN_OF_A_POLE("the sign of a negative pole is lost"),
    ROUNDED_TO_THE_UNSAFE_SIDE("a number is rounded to the side that isn't safe"),
    Z_LOST("the z of the transform is lost"),
    Z_DOUBLED("the z of the transform is there twice"),
    PAIR_NOT_DOUBLED("a conjugate pair isn't doubled: amplitude |R| instead of 2|R|"),
    PAIR_DOUBLED_TWICE("a conjugate pair is doubled twice"),
    SIGN_OF_THE_PHASE("the sign of the phase is wrong"),
    SQUARE_ROOT_FORGOTTEN("a square root is forgotten"),
    ANGLE_IN_ANOTHER_QUADRANT("an angle is in the wrong quadrant"),
    DEGREES_AS_RADIANS("degrees are read as radians"),
    RADIANS_AS_DEGREES("radians are read as degrees"),
    SINE_FOR_COSINE("sine stands for cosine"),
    COSINE_FOR_SINE("cosine stands for sine"),
    INDEX_SHIFTED("the index is shifted by one step"),
    MEAN_OFF_BY_A_STEP("a mean time is off by one step"),
    JOINT_FOR_CONDITIONAL("the joint probability stands for the conditional one"),
    END_VALUE_FOR_THE_MEAN("the value at the end of the interval stands for the mean over it"),
    NEVER_IS_AVERAGED("a mean is taken over cases where it never happens"),
    COEFFICIENTS_SWAPPED("coefficients are swapped between poles"),
    TIME_FOR_STEPS("time is counted as steps"),
    LONG_RUN_FOR_THE_LARGEST("the long run stands for the largest or the smallest value"),
    IMPULSE_MISSING("an impulse at the first steps is missing"),
    TERM_MISSING("a term is missing"),
    REPEATED_POLE_AS_SIMPLE("a repeated pole is treated as simple"),
    POWER_NOT_LOWERED("k r^k stands for k r^(k-1)"),
    POWER_FOR_BINOMIAL("a power of k stands for a binomial coefficient"),
    RESIDUE_WITHOUT_A_FACTOR("a factor is left out of a residue"),
    DIGITS_TRANSPOSED("digits are transposed"),
    DECIMAL_POINT_MOVED("the decimal point is moved"),
    ROUNDED_TOO_EARLY("a number is rounded too early"),
    EIGENVECTOR_NOT_SCALED("the eigenvector isn't scaled to sum to one"),
    MATRIX_TRANSPOSED("the matrix is transposed"),
    START_MISREAD("another start is used"),
    COMPLEMENT_QUOTED("the complement is quoted"),
    OUTPUT_MISREAD("another output is meant"),
    RATE_AS_PROBABILITY("a rate is used as a probability"),
    TWO_EVENT_MOVE_FORGOTTEN("a move by two events in one step is forgotten"),
    ABSORBING_STATE_LEFT("an absorbing state is left with an exit"),
    LONG_RUN_OF_A_CYCLE("a long run is quoted where there is a cycle"),
    NOT_SUMMING_TO_ONE("the probabilities over all states don't sum to one"),
    WRONG_POLE("a pole is wrong"),
    WRONG_COEFFICIENT("a coefficient is wrong");

    private final String inWords;

    SlipKind(String inWords) {
        this.inWords = inWords;
    }

    /** In plain words: {@code the sign of the phase is wrong}. */
    public String inWords() {
        return inWords;
    }
}
