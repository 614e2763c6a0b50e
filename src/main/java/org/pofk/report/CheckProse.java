package org.pofk.report;

import org.pofk.answer.Comparison;
import org.pofk.answer.SecondOpinion;
import org.pofk.answer.Simulation;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;

/** How a formula was checked besides its proof, in words. */
final class CheckProse {
    private static final int ERROR_DIGITS = 2;

    private CheckProse() {
    }

    /** All three comparisons in a line. */
    static String of(Comparison comparison) {
        return powers(comparison.exactPowers()) + "; " + doubles(comparison.doubleStepping())
                + comparison.random().map(series -> "; random runs: " + random(series)).orElse("");
    }

    static String powers(Comparison.ExactPowers powers) {
        return powers.largestDifference().isZero() ? "equal to exact powers of the matrix at k = 0 … " + powers.last()
                : "differs from exact powers of the matrix by " + small(powers.largestDifference()) + " at k = " + powers.at();
    }

    static String doubles(Comparison.DoubleStepping doubles) {
        return "double-precision stepping is at most " + small(doubles.largestDifference()) + " off";
    }

    /** To two digits, as errors are said. */
    static String small(Rational difference) {
        return Decimals.of(difference, ERROR_DIGITS).text();
    }

    private static String random(Simulation.Series series) {
        long checked = series.checked();
        return checked == 0 ? "too few hits are expected, can't tell here"
                : checked == 1
                ? "the one step checked is " + (series.inside() == 1 ? "inside" : "OUTSIDE") + " its 99.9 % interval"
                : series.inside() + " of " + checked + " steps inside their 99.9 % intervals";
    }

    static String of(SecondOpinion opinion) {
        return "Symja: the factors multiply out: " + word(opinion.factors()) + "; the expansion adds up to Y(z): "
                + word(opinion.expansion()) + " (" + SecondOpinion.NOT_CONFIRMED + ")";
    }

    private static String word(SecondOpinion.Verdict verdict) {
        return switch (verdict) {
            case CONFIRMED -> "confirmed";
            case REFUSED -> "REFUSED";
            case NOT_WITHIN_LIMIT -> "no second opinion within the limit";
            case NOT_ASKED -> "not asked, a coefficient is kept as a quotient";
        };
    }
}
