package org.pofk.input;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.pofk.exact.Rational;
import org.pofk.text.Faults;
import org.pofk.text.Position;

/**
 * Numbers as people write them in a file: {@code 0.7}, {@code 1/3}, {@code 30%}, {@code 2.3e-6}; each stands for
 * exactly the number written. Exact.
 */
final class Numerals {
    private static final int LARGEST_EXPONENT = 400;
    private static final Pattern DECIMAL =
            Pattern.compile("([+-]?(?:\\d+\\.?\\d*|\\.\\d+))(?:[eE]([+-]?\\d+))?(\\s*%)?");
    private static final Pattern FRACTION = Pattern.compile("([+-]?\\d+)\\s*/\\s*(\\d+)");
    private static final Pattern PERCENT_FRACTION = Pattern.compile("[^/]*\\d\\s*%?\\s*/\\s*\\d[\\d.]*\\s*%?");
    private static final Pattern DECIMAL_COMMA = Pattern.compile("([+-]?\\d+),(\\d+(?:[eE][+-]?\\d+)?\\s*%?)");

    private Numerals() {
    }

    /** Whether this has the shape of a number, readable or not. */
    static boolean isNumeral(String text) {
        return DECIMAL.matcher(text).matches() || FRACTION.matcher(text).matches();
    }

    /** Whether this is meant as a number, readable or not, and not as an expression. */
    static boolean isMeantAsNumeral(String written) {
        String text = written.strip();
        return text.isEmpty() || isNumeral(text) || hasDecimalComma(text) || isPercentFraction(text);
    }

    private static boolean isPercentFraction(String text) {
        return text.contains("%") && PERCENT_FRACTION.matcher(text).matches();
    }

    /** A number with a decimal comma, and nothing else. */
    static boolean hasDecimalComma(String text) {
        return DECIMAL_COMMA.matcher(text).matches();
    }

    /** {@code 0,5} as {@code 0.5}. */
    static String withDecimalPoint(String text) {
        return text.replace(',', '.');
    }

    /** The number, or a fault and nothing. */
    static Optional<Rational> read(String written, Position at, Faults faults) {
        String text = written.strip();
        Matcher decimal = DECIMAL.matcher(text);
        if (decimal.matches()) {
            return decimal(decimal, text, at, faults);
        }
        Matcher fraction = FRACTION.matcher(text);
        if (fraction.matches()) {
            return fraction(fraction, text, at, faults);
        }
        faults.add(at, code(text), complaint(text));
        return Optional.empty();
    }

    /** The fault of what isn't a number at all. */
    static void refuse(Node.Scalar scalar, Faults faults) {
        String text = scalar.text().strip();
        faults.add(scalar.position(), code(text), complaint(text));
    }

    /** Half a unit of the last written decimal place; zero for fractions, which are not rounded. */
    static Rational lastPlace(String written) {
        Matcher decimal = DECIMAL.matcher(written.strip());
        if (!decimal.matches()) {
            return Rational.ZERO;
        }
        int scale = new BigDecimal(decimal.group(1)).scale() - exponent(decimal).orElse(0)
                + (decimal.group(3) == null ? 0 : 2);
        return Rational.HALF.times(Rational.of(10).pow(-scale));
    }

    private static Optional<Rational> decimal(Matcher decimal, String text, Position at, Faults faults) {
        Optional<Integer> exponent = exponent(decimal);
        if (exponent.isEmpty()) {
            faults.add(at, "exponent-out-of-range", "'" + Words.shortened(text)
                    + "' has an exponent outside -400 to 400");
            return Optional.empty();
        }
        BigDecimal digits = new BigDecimal(decimal.group(1));
        int percent = decimal.group(3) == null ? 0 : 2;
        return Optional.of(Rational.of(digits.scaleByPowerOfTen(exponent.get() - percent)));
    }

    /** The written exponent, zero when there is none; nothing when it is out of range. */
    private static Optional<Integer> exponent(Matcher decimal) {
        if (decimal.group(2) == null) {
            return Optional.of(0);
        }
        BigInteger exponent = new BigInteger(decimal.group(2));
        return exponent.abs().compareTo(BigInteger.valueOf(LARGEST_EXPONENT)) > 0
                ? Optional.empty() : Optional.of(exponent.intValue());
    }

    private static Optional<Rational> fraction(Matcher fraction, String text, Position at, Faults faults) {
        BigInteger denominator = new BigInteger(fraction.group(2));
        if (denominator.signum() == 0) {
            faults.add(at, "division-by-zero", "'" + Words.shortened(text) + "' divides by zero");
            return Optional.empty();
        }
        return Optional.of(new Rational(new BigInteger(fraction.group(1)), denominator));
    }

    private static String code(String text) {
        if (text.isEmpty()) {
            return "number-missing";
        }
        if (hasDecimalComma(text)) {
            return "decimal-comma";
        }
        return isPercentFraction(text) ? "percent-sign" : "number-unreadable";
    }

    private static String complaint(String text) {
        String found = "'" + Words.shortened(text) + "'";
        return switch (code(text)) {
            case "number-missing" -> "a number is missing here; write 0 where nothing happens";
            case "decimal-comma" -> found + " has a decimal comma; write "
                    + Words.shortened(withDecimalPoint(text));
            case "percent-sign" -> found + " has a percent sign inside a fraction; write one or the other";
            default -> found + " isn't a number; write for example 0.05, 1/20, 5% or 5e-2";
        };
    }
}
