package org.pofk.formula;

/** How the text of a factor ends, which decides what may stand behind it without a sign for a product. */
enum Ending {
    NUMBER, LETTER, NAME, CONSTANT, CLOSED, NUMBER_EXPONENT, NAME_EXPONENT, ROOT;

    /** The ending of a power whose exponent ends so. */
    Ending asExponent() {
        return switch (this) {
            case NUMBER, NUMBER_EXPONENT -> NUMBER_EXPONENT;
            case CLOSED -> CLOSED;
            default -> NAME_EXPONENT;
        };
    }

    boolean isExponent() {
        return this == NUMBER_EXPONENT || this == NAME_EXPONENT;
    }
}
