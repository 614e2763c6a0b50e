package org.pofk.report;

import org.pofk.exact.Decimal;
import org.pofk.exact.Decimals;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;

/** Numbers beside marks in a figure: as short as they can be read. */
final class ChartNumber {
    private static final int LONGEST = 7;
    private static final int LONG_BITS = 1024;

    private ChartNumber() {
    }

    /** The exact number where it is short, as a decimal or else as a fraction; else rounded to so many digits. */
    static String of(Rational value, int digits) {
        if (isLong(value)) {
            return minus(Decimals.of(Enclosed.of(value), digits).text());
        }
        Decimal decimal = Decimals.of(value, LONGEST);
        String fraction = value.toString();
        if (decimal.exact()) {
            return minus(decimal.text());
        }
        return minus(fraction.length() <= LONGEST ? fraction : Decimals.of(value, digits).text());
    }

    /** Whether {@link #of} writes the number itself. */
    static boolean isExact(Rational value) {
        return !isLong(value) && (Decimals.of(value, LONGEST).exact() || value.toString().length() <= LONGEST);
    }

    /** A fraction that is never short, without writing it. */
    private static boolean isLong(Rational value) {
        return value.numerator().bitLength() + value.denominator().bitLength() > LONG_BITS;
    }

    /** With a minus sign proper. */
    static String minus(String text) {
        return text.startsWith("-") ? "−" + text.substring(1) : text;
    }
}
