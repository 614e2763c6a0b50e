package org.pofk.modes;

import java.util.Optional;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;

/**
 * A closed form with its numbers written as decimals, and the proved bound on how far the formula as printed is from
 * p(k). Certified.
 *
 * @param formula    the formula as printed; empty where more than 30 digits would be needed, or no number of digits
 *                   is enough
 * @param errorBound proved: |printed(k) − p(k)| ≤ errorBound for every k it holds for, at most 10^−digits; zero where
 *                   there is no formula
 * @param upTo       the last k the bound holds for, empty when it holds for every k ≥ 0
 * @param reason     why there is no formula, or why it stops; empty otherwise
 */
public record DecimalForm(Optional<Formula> formula, Rational errorBound, Optional<Long> upTo,
        Optional<String> reason) {

    /** True when every number in the formula is exactly the one meant: the formula equals p(k) at every k. */
    public boolean isExact() {
        return formula.isPresent() && errorBound.isZero();
    }
}
