package org.pofk.input;

import java.math.BigDecimal;
import java.math.MathContext;
import org.pofk.exact.Rational;

/** Numbers in messages. */
final class Numbers {
    private static final int LONGEST = 40;

    private Numbers() {
    }

    /** The exact number, or about what it is when that would fill more than a line. */
    static String shown(Rational value) {
        String exact = value.toString();
        return exact.length() <= LONGEST ? exact : "about " + new BigDecimal(value.numerator())
                .divide(new BigDecimal(value.denominator()), new MathContext(12));
    }
}
