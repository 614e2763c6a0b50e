package org.pofk.formula;

/**
 * One token of a formula's text.
 *
 * @param text  numbers and signs as written, names in NFC without their quotes, superscripts as plain digits,
 *              relations as {@code = < <= > >= !=}
 * @param start UTF-16 offset of its first character
 * @param end   UTF-16 offset after its last character
 */
record Token(Kind kind, String text, int start, int end) {

    enum Kind {
        NUMBER, NAME, QUOTED, PLUS, MINUS, TIMES, DIVIDE, POWER, SUPERSCRIPT, OPEN, CLOSE, COMMA, ROOT, DEGREE,
        BRACE_OPEN, BRACE_CLOSE, FOR, SEMICOLON, RELATION, END
    }

    boolean is(Kind other) {
        return kind == other;
    }

    /** True when an operand may begin here without a sign. */
    boolean beginsOperand() {
        return switch (kind) {
            case NUMBER, NAME, QUOTED, OPEN, ROOT, DEGREE, BRACE_OPEN -> true;
            default -> false;
        };
    }
}
