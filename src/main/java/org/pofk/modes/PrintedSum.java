package org.pofk.modes;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;

/** A formula in decimals as it grows term by term, with the bound on what it is off so far. */
final class PrintedSum {
    private final List<Formula> terms = new ArrayList<>();
    private Rational error = Rational.ZERO;

    /** Counts a number's error with its weight, and hands on how the number is written; empty stays empty. */
    Optional<Formula> add(Optional<PrintedNumber> number, Optional<Rational> weight) {
        Rational own = number.map(PrintedNumber::error).orElse(Rational.ZERO);
        if (!own.isZero()) {
            error = error.plus(own.times(weight.orElseThrow(
                    () -> new AssertionError("rounded where no rounding is bounded: " + number))));
        }
        return number.map(PrintedNumber::formula);
    }

    void term(Formula term) {
        terms.add(term);
    }

    Formula formula() {
        return Formulas.sum(terms);
    }

    Rational error() {
        return error;
    }
}
