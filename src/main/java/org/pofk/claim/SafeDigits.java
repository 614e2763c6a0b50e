package org.pofk.claim;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.List;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.Written;

/**
 * A right number rounded to the safe side of it, in as many places as its author writes and further until it is as near
 * as he claims; where he claims no nearness, until rounding to the nearest goes to that side. Certified.
 */
final class SafeDigits {
    private static final int BITS = 128;
    private static final int MORE_PLACES = 8;

    private SafeDigits() {
    }

    /** The right value of a real number that is one decimal; the claim names a side. */
    static String of(Claim claim, Written written, Held number) {
        int least = Math.max(0, places(written.lastPlace()));
        Ball ball = number.right().enclose(BITS).real();
        Rational end = number.right().rational().orElse(
                claim.safeSide().orElseThrow() == Claim.SafeSide.ABOVE ? ball.upper() : ball.lower());
        RoundingMode toSide = claim.safeSide().orElseThrow() == Claim.SafeSide.ABOVE
                ? RoundingMode.CEILING : RoundingMode.FLOOR;
        for (int places = least; places <= least + MORE_PLACES; places++) {
            BigDecimal safe = rounded(end, places, toSide);
            boolean isNear = claim.within().isPresent()
                    ? isClaimed(claim, number, Rational.of(safe))
                    : safe.equals(rounded(end, places, RoundingMode.HALF_EVEN));
            if (isNear) {
                return safe.toPlainString();
            }
        }
        return rounded(end, least + 1, toSide).toPlainString();
    }

    private static boolean isClaimed(Claim claim, Held number, Rational value) {
        Held told = new Held(new StatedNumber(number.stated().text(), Quantity.of(value)), number.right());
        return Closeness.verdict(claim, List.of(told), Decision.YES) != Verdict.WRONG;
    }

    private static BigDecimal rounded(Rational value, int places, RoundingMode mode) {
        return new BigDecimal(value.numerator()).divide(new BigDecimal(value.denominator()), places, mode);
    }

    /** p of 10^−p. */
    private static int places(Rational powerOfTen) {
        BigDecimal decimal = new BigDecimal(powerOfTen.numerator())
                .divide(new BigDecimal(powerOfTen.denominator()), MathContext.DECIMAL128);
        return decimal.scale() - decimal.precision() + 1;
    }
}
