package org.pofk.check;

import java.util.Optional;

/**
 * A piece of a claim's text with its part in it, so that slips are put in by exchanging pieces of text.
 *
 * @param term   the term it stands in, from 0
 * @param number what is printed here, where that is a number
 */
record Token(Role role, int term, String plain, String latex, Optional<Printed> number) {

    /** What a piece of text is in a formula. */
    enum Role {
        SIGN, COEFFICIENT, TIMES, BASE, POWER, EXPONENT, K, BINOMIAL, FUNCTION, ANGLE, DEGREES, PHASE_SIGN, PHASE,
        IMPULSE, OPEN, CLOSE, FRONT, Z, POLE_SIGN, POLE, MULTIPLICITY, OTHER
    }

    /** A positive number as it is printed. */
    record Printed(Real value, Style style) {
    }

    static Token of(Role role, int term, String text) {
        return new Token(role, term, text, text, Optional.empty());
    }

    static Token of(Role role, int term, String plain, String latex) {
        return new Token(role, term, plain, latex, Optional.empty());
    }

    /** A positive number; exact where the style is and the number can be, otherwise in decimals. */
    static Token number(Role role, int term, Real value, Style style) {
        boolean isBase = role == Role.BASE;
        Optional<Printed> printed = Optional.of(new Printed(value, style));
        boolean isExact = style.isExact() && value.exact().isPresent() || isWhole(value);
        if (isExact) {
            Real.Exact exact = value.exact().orElseThrow();
            return new Token(role, term, isBase ? exact.plainBase() : exact.plain(),
                    isBase ? exact.latexBase() : exact.latex(), printed);
        }
        Style decimals = style.isExact() ? Style.significant(10) : style;
        String text = decimals.text(value.value());
        return new Token(role, term, text, latex(text), printed);
    }

    private static boolean isWhole(Real value) {
        return value.exact().filter(exact -> exact.plain().chars().allMatch(Character::isDigit)).isPresent();
    }

    private static String latex(String decimal) {
        int e = decimal.indexOf('e');
        return e < 0 ? decimal : decimal.substring(0, e) + " \\cdot 10^{" + decimal.substring(e + 1) + "}";
    }

    /** The same piece with another text, as a slip of the pen makes it. */
    Token as(String text) {
        return new Token(role, term, text, latex(text), Optional.empty());
    }

    Token in(int otherTerm) {
        return new Token(role, otherTerm, plain, latex, number);
    }

    boolean isDecimal() {
        return plain.matches("[0-9]+\\.[0-9]+(e-?[0-9]+)?");
    }
}
