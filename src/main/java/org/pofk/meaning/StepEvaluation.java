package org.pofk.meaning;

import java.util.Optional;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.NotSeparatedException;
import org.pofk.exact.Rational;
import org.pofk.formula.ParsedFormula;

/**
 * The value of a formula at one step, or at one point, straight from its tree in ball arithmetic: what
 * {@link ExponentialSum} and {@link RationalForm} give at that place, without reading the formula as such first. For
 * sifting many formulas. Certified: each value lies in the ball, which is as fine as fixed-point arithmetic with that
 * many bits makes it; nothing where the formula has no value there, or where more bits are needed to divide.
 */
public final class StepEvaluation {
    private StepEvaluation() {
    }

    /** At a step k, with every decimal all that it stands for; exponents but those of e are exact. */
    public static Optional<ComplexBall> spread(ParsedFormula formula, Precision precision, long k, int bits) {
        return spread(formula, "k", precision, Rational.of(k), bits);
    }

    /** At a step k, with every decimal what its digits denote. */
    public static Optional<ComplexBall> atFaceValue(ParsedFormula formula, long k, int bits) {
        return atFaceValue(formula, "k", Rational.of(k), bits);
    }

    /** With the variable of this name at a point, and every decimal all that it stands for. */
    public static Optional<ComplexBall> spread(ParsedFormula formula, String variable, Precision precision,
            Rational point, int bits) {
        return evaluated(formula, new DirectEvaluation(variable, point, new DecimalBalls.Spread(precision, bits)));
    }

    /** With the variable of this name at a point, and every decimal what its digits denote. */
    public static Optional<ComplexBall> atFaceValue(ParsedFormula formula, String variable, Rational point, int bits) {
        return evaluated(formula, new DirectEvaluation(variable, point, new DecimalBalls.FaceValue(bits)));
    }

    private static Optional<ComplexBall> evaluated(ParsedFormula formula, DirectEvaluation evaluation) {
        try {
            return Optional.of(formula.formula().accept(evaluation));
        } catch (NoValueException | NotSeparatedException none) {
            return Optional.empty();
        }
    }
}
