package org.pofk.claim;

import java.util.List;
import java.util.Optional;
import org.pofk.exact.Decimal;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.formula.FormulaParser;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

/** Claims put together from numbers, each text at a place of its own. */
final class Stating {
    private int line;

    /** What is stated, as a claim about all steps. */
    static Claim claim(Statement statement) {
        return new Claim(1, "any", "any", statement, Optional.empty(), Claim.Steps.ALL, Optional.empty(), Optional.empty(),
                Optional.empty(), Optional.empty(), new Position("claims.yaml", 1, 1));
    }

    FormulaText text(String text) {
        try {
            return new FormulaText(text, FormulaText.Notation.PLAIN,
                    FormulaParser.parse(text, new Position("claims.yaml", ++line, 1)));
        } catch (RefusedException e) {
            throw new AssertionError(text, e);
        }
    }

    List<FormulaText> texts(List<String> texts) {
        return texts.stream().map(this::text).toList();
    }

    static String fraction(Rational value) {
        return value.signum() < 0 ? "-" + value.abs() : value.toString();
    }

    /** To so many digits; with an imaginary part where there is one. */
    static String decimal(Quantity value, int digits) {
        Quantity imaginary = value.imaginaryPart();
        String real = real(value.realPart(), digits);
        if (imaginary.isZero() == Decision.YES) {
            return real;
        }
        String other = real(imaginary, digits);
        return real + (other.startsWith("-") ? " - " + other.substring(1) : " + " + other) + " i";
    }

    /** With so many digits more that a rounded number has a point: without one it would have to be exact. */
    private static String real(Quantity value, int digits) {
        if (value.isZero() == Decision.YES) {
            return "0";
        }
        Decimal decimal = value.rational().map(exact -> Decimals.of(exact, digits))
                .orElseGet(() -> Decimals.of(bits -> value.enclose(bits).real(), digits));
        return decimal.exact() || decimal.text().indexOf('.') >= 0 ? decimal.text() : real(value, digits + 1);
    }

    /**
     * The last digit of the first decimal turned into the one five further; the text itself where there is none of
     * three digits behind the point, which with another digit may be another pole.
     */
    static String changed(String text) {
        int point = text.indexOf('.');
        if (point < 0 || point + 3 >= text.length() || !Character.isDigit(text.charAt(point + 3))) {
            return text;
        }
        int last = point + 1;
        while (last + 1 < text.length() && Character.isDigit(text.charAt(last + 1))) {
            last++;
        }
        char digit = (char) ('0' + (text.charAt(last) - '0' + 5) % 10);
        return text.substring(0, last) + digit + text.substring(last + 1);
    }
}
