package org.pofk.meaning;

import java.util.Map;
import java.util.Optional;
import org.pofk.exact.Ball;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Rational;

/**
 * That a real number lies within ± half of zero, inclusive: what a decimal should be less what it is, or, with half = 0,
 * the difference of two sides. Certified.
 *
 * @param equation where it comes from
 */
record Condition(int equation, Quantity off, Rational half) {
    private static final int SPREAD_BITS = 128;

    static Condition within(int equation, Written decimal, Quantity right) {
        return new Condition(equation, right.minus(Quantity.of(decimal.value())), decimal.halfUnit());
    }

    static Condition zero(int equation, Quantity difference) {
        return new Condition(equation, difference, Rational.ZERO);
    }

    /** At face value. */
    Decision holds() {
        if (half.isZero()) {
            return off.isZero();
        }
        Optional<Integer> above = off.realPart().plus(Quantity.of(half)).sign();
        Optional<Integer> below = Quantity.of(half).minus(off.realPart()).sign();
        if (above.filter(sign -> sign < 0).isPresent() || below.filter(sign -> sign < 0).isPresent()) {
            return Decision.NO;
        }
        return above.isPresent() && below.isPresent() ? off.isReal() : Decision.UNDECIDED;
    }

    /**
     * For every value of the decimals in it (yes), for none (no), or not seen from an enclosure of all of them. With
     * replacements put in first.
     */
    Decision everywhere(Map<Written, Quantity> replacements) {
        try {
            ComplexBall all = off.with(replacements).spread(SPREAD_BITS);
            Ball real = all.real();
            if (real.lower().compareTo(half) > 0 || real.upper().compareTo(half.negate()) < 0
                    || !all.imaginary().containsZero()) {
                return Decision.NO;
            }
            boolean inside = real.upper().compareTo(half) <= 0 && real.lower().compareTo(half.negate()) >= 0
                    && off.conjugate() == off;
            return inside ? Decision.YES : Decision.UNDECIDED;
        } catch (ArithmeticException notEverywhereDefined) {
            return Decision.UNDECIDED;
        }
    }

    /** Whether it is seen to have a value for every value of its decimals. */
    boolean isDefinedEverywhere() {
        try {
            off.spread(SPREAD_BITS);
            return true;
        } catch (ArithmeticException notEverywhereDefined) {
            return false;
        }
    }
}
