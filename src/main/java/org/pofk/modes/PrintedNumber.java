package org.pofk.modes;

import java.math.BigInteger;
import java.util.Optional;
import org.pofk.exact.Ball;
import org.pofk.exact.Decimal;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;

/**
 * A constant as it stands in a formula in decimals, with a proved bound on how far that is from the constant.
 * Certified.
 */
record PrintedNumber(Formula formula, Rational error) {
    private static final int SHORT_FRACTION = 8;
    private static final int BITS_A_DIGIT = 4;

    /** To so many significant digits; a value that is its decimal has no error. */
    static PrintedNumber rounded(RealValue value, int digits) {
        Optional<Rational> rational = value.rational();
        if (rational.isPresent() && rational.get().isInteger() && decimalLength(rational.get()) <= digits) {
            return exactly(value);
        }
        Decimal decimal = value.decimal(digits);
        Rational error = rational.map(r -> r.minus(decimal.value()).abs())
                .orElseGet(() -> distance(value, decimal.value(), digits));
        return new PrintedNumber(Formulas.decimal(decimal.text()), error);
    }

    /** In the exact form, which it has. */
    static PrintedNumber exactly(RealValue value) {
        return new PrintedNumber(value.exact().orElseThrow(), Rational.ZERO);
    }

    /** A number under a power of k reads well as a short fraction, and a multiple of π as it is. */
    static Optional<PrintedNumber> shortExactly(RealValue value) {
        return value.exact().filter(PrintedNumber::isShort).map(formula -> new PrintedNumber(formula, Rational.ZERO));
    }

    private static boolean isShort(Formula formula) {
        return formula instanceof Formula.Number number
                ? number.value().toString().length() <= SHORT_FRACTION && !terminates(number.value())
                : Formulas.isMultipleOfPi(formula);
    }

    private static boolean terminates(Rational value) {
        BigInteger rest = value.denominator();
        for (BigInteger prime : new BigInteger[] {BigInteger.TWO, BigInteger.valueOf(5)}) {
            while (rest.mod(prime).signum() == 0) {
                rest = rest.divide(prime);
            }
        }
        return rest.equals(BigInteger.ONE) && !value.isInteger();
    }

    private static int decimalLength(Rational integer) {
        return integer.numerator().abs().toString().length();
    }

    private static Rational distance(RealValue value, Rational printed, int digits) {
        int bits = BITS_A_DIGIT * digits + 16;
        Ball ball = value.enclosure().enclose(bits);
        while (ball.upper().minus(ball.lower()).times(Rational.of(8))
                .compareTo(ball.middle().minus(printed).abs()) > 0 && bits < 1 << 14) {
            bits *= 2;
            ball = value.enclosure().enclose(bits);
        }
        return Rational.max(ball.upper().minus(printed).abs(), ball.lower().minus(printed).abs());
    }
}
