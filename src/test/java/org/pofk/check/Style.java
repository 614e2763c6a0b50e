package org.pofk.check;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * How an author writes numbers: exactly, or in so many significant digits or decimals.
 *
 * @param trim leaves off zeros at the end, as authors do who say how precisely they carry numbers
 */
record Style(Kind kind, int digits, boolean trim) {
    enum Kind { EXACT, SIGNIFICANT, DECIMALS }

    static final Style EXACT = new Style(Kind.EXACT, 0, false);

    static Style significant(int digits) {
        return new Style(Kind.SIGNIFICANT, digits, false);
    }

    boolean isExact() {
        return kind == Kind.EXACT;
    }

    /** The value rounded: always with a point, so that it is read as a decimal, and with two digits that count. */
    BigDecimal rounded(BigDecimal value) {
        int integerDigits = Math.max(0, value.precision() - value.scale());
        int wanted = Math.max(digits, integerDigits + 1);
        BigDecimal rounded = value.round(new MathContext(wanted, RoundingMode.HALF_EVEN));
        BigDecimal bySize = rounded.setScale(rounded.scale() + wanted - rounded.precision());
        if (kind != Kind.DECIMALS) {
            return bySize;
        }
        BigDecimal byPlace = value.setScale(digits, RoundingMode.HALF_EVEN);
        return byPlace.precision() >= 2 && byPlace.signum() != 0 ? byPlace : bySize;
    }

    /** The digits of a positive value that isn't written exactly. */
    String text(BigDecimal value) {
        BigDecimal rounded = rounded(value);
        BigDecimal shown = trim && rounded.stripTrailingZeros().scale() > 0 ? rounded.stripTrailingZeros() : rounded;
        if (shown.scale() <= 0) {
            return shown.toPlainString() + ".0";
        }
        boolean isSmall = shown.scale() - shown.precision() >= 4;
        return isSmall ? scientific(shown) : shown.toPlainString();
    }

    /** What the claim says of it, where zeros are left off. */
    String carried() {
        return digits + (kind == Kind.DECIMALS ? " decimals" : " significant");
    }

    private static String scientific(BigDecimal value) {
        int exponent = value.precision() - value.scale() - 1;
        BigDecimal mantissa = value.scaleByPowerOfTen(-exponent);
        return (mantissa.scale() <= 0 ? mantissa.toPlainString() + ".0" : mantissa.toPlainString()) + "e" + exponent;
    }
}
