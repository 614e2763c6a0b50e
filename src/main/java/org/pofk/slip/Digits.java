package org.pofk.slip;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Numbers as strings of digits: how one written wrongly compares with the right one. Exact. */
final class Digits {
    private static final String NUMBER = "[0-9]+([.][0-9]*)?([eE][-+]?[0-9]+)?";
    private static final int FARTHEST = 3;

    private Digits() {
    }

    static boolean isNumber(String text) {
        return text.matches(NUMBER);
    }

    /** Every number that two different neighbouring digits swapped give. */
    static List<String> transposed(String text) {
        List<String> results = new ArrayList<>();
        int end = mantissaEnd(text);
        for (int i = 0; i < end; i++) {
            int next = i + 1 < end && text.charAt(i + 1) == '.' ? i + 2 : i + 1;
            if (next < end && text.charAt(i) != '.' && text.charAt(i) != text.charAt(next)) {
                StringBuilder swapped = new StringBuilder(text);
                swapped.setCharAt(i, text.charAt(next));
                swapped.setCharAt(next, text.charAt(i));
                results.add(swapped.toString());
            }
        }
        return results;
    }

    private static int mantissaEnd(String text) {
        int exponent = Math.max(text.indexOf('e'), text.indexOf('E'));
        return exponent < 0 ? text.length() : exponent;
    }

    /** Whether two numbers differ in the place of the point alone: 0.50 and 0.05. */
    static boolean isPointMoved(String a, String b) {
        return new BigDecimal(a).signum() != 0 && new BigDecimal(b).signum() != 0
                && new BigDecimal(a).stripTrailingZeros().unscaledValue()
                        .equals(new BigDecimal(b).stripTrailingZeros().unscaledValue());
    }

    /** The same digits with the point up to three places to the left or right. */
    static List<String> pointMoved(String text) {
        List<String> results = new ArrayList<>();
        for (int places = 1; places <= FARTHEST; places++) {
            for (int by : new int[] {-places, places}) {
                results.add(shown(new BigDecimal(text).scaleByPowerOfTen(by)));
            }
        }
        return results;
    }

    private static String shown(BigDecimal value) {
        return value.scale() < 0 ? value.setScale(0).toPlainString() : value.toPlainString();
    }

    /**
     * What was done to the right number to give the one found: digits transposed, point moved, rounded or cut off too
     * early; nothing where they have no such thing in common.
     */
    static Optional<SlipKind> compared(String found, String right) {
        if (!isNumber(found) || !isNumber(right)) {
            return Optional.empty();
        }
        BigDecimal written = new BigDecimal(found);
        BigDecimal meant = new BigDecimal(right);
        if (written.signum() == 0 || meant.signum() == 0 || written.compareTo(meant) == 0) {
            return Optional.empty();
        }
        if (transposed(found).stream().anyMatch(each -> agrees(each, meant) && !isPointMoved(found, each))) {
            return Optional.of(SlipKind.DIGITS_TRANSPOSED);
        }
        if (pointMoved(found).stream().anyMatch(each -> agrees(each, meant))) {
            return Optional.of(SlipKind.DECIMAL_POINT_MOVED);
        }
        return isRoundedEarly(written, meant) ? Optional.of(SlipKind.ROUNDED_TOO_EARLY) : Optional.empty();
    }

    /** Whether the right number, rounded to as many digits, is this one. */
    private static boolean agrees(String digits, BigDecimal meant) {
        BigDecimal value = new BigDecimal(digits);
        return value.compareTo(meant) == 0
                || meant.scale() > value.scale()
                && meant.setScale(value.scale(), RoundingMode.HALF_EVEN).compareTo(value) == 0;
    }

    private static boolean isRoundedEarly(BigDecimal written, BigDecimal meant) {
        int digits = written.stripTrailingZeros().precision();
        if (digits >= meant.stripTrailingZeros().precision()) {
            return false;
        }
        return List.of(RoundingMode.HALF_UP, RoundingMode.DOWN).stream().anyMatch(mode ->
                meant.round(new MathContext(digits, mode)).compareTo(written) == 0);
    }
}
