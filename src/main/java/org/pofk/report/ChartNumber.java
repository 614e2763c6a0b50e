package org.pofk.report;

import org.pofk.exact.Decimal;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;

/** Numbers beside marks in a figure: as short as they can be read. */
final class ChartNumber {
    private static final int LONGEST = 7;

    private ChartNumber() {
    }

    /** The exact number where it is short, as a decimal or else as a fraction; else rounded to so many digits. */
    static String of(Rational value, int digits) {
        Decimal decimal = Decimals.of(value, LONGEST);
        String fraction = value.toString();
        if (decimal.exact()) {
            return minus(decimal.text());
        }
        return minus(fraction.length() <= LONGEST ? fraction : Decimals.of(value, digits).text());
    }

    /** Whether {@link #of} writes the number itself. */
    static boolean isExact(Rational value) {
        return Decimals.of(value, LONGEST).exact() || value.toString().length() <= LONGEST;
    }

    /** With a minus sign proper. */
    static String minus(String text) {
        return text.startsWith("-") ? "−" + text.substring(1) : text;
    }
}
