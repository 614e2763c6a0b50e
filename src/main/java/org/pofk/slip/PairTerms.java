package org.pofk.slip;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.pofk.exact.Ball;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;
import org.pofk.modes.Mode;
import org.pofk.modes.ModeFormula;
import org.pofk.modes.RealValue;

/**
 * What a conjugate pair adds, in other shapes than A r^k cos(θ k + φ): R λ^k with λ = r e^(iθ) and R = A/2 e^(iφ), and
 * its conjugate, in k and in z; and both together over a real polynomial in z. Guesses to be judged: a number is taken
 * to be a short fraction or the root of one where it is so near.
 */
final class PairTerms {
    private static final int BITS = 256;
    private static final Formula.Symbol Z = new Formula.Symbol("z");

    private final Mode.Oscillating mode;
    private final Function<RealValue, Formula> number;
    private final Enclosed poleReal;
    private final Enclosed poleImaginary;
    private final Enclosed real;
    private final Enclosed imaginary;

    /** @param number a number as the author would write it */
    PairTerms(Mode.Oscillating mode, Function<RealValue, Formula> number) {
        this.mode = mode;
        this.number = number;
        Enclosed half = mode.amplitude().enclosure().times(Enclosed.of(Rational.HALF));
        this.poleReal = mode.modulus().enclosure().times(mode.angle().enclosure().map(Ball::cos));
        this.poleImaginary = mode.modulus().enclosure().times(mode.angle().enclosure().map(Ball::sin));
        this.real = half.times(mode.phase().enclosure().map(Ball::cos));
        this.imaginary = half.times(mode.phase().enclosure().map(Ball::sin));
    }

    /** Each of the two complex terms in k. */
    List<Formula> inSteps() {
        List<Formula> terms = new ArrayList<>();
        for (int side : new int[] {1, -1}) {
            terms.add(Formulas.product(List.of(complex(real, imaginary, side), ModeFormula.binomial(mode.power()),
                    Formulas.power(complex(poleReal, poleImaginary, side), ModeFormula.kMinus(mode.power())))));
        }
        return terms;
    }

    /** Each of the two complex fractions in z, times a power of z. */
    List<Formula> inZ(int powerOfZ) {
        List<Formula> terms = new ArrayList<>();
        for (int side : new int[] {1, -1}) {
            Formula above = Formulas.product(complex(real, imaginary, side), power(powerOfZ));
            Formula pole = complex(poleReal, poleImaginary, side);
            terms.add(new Formula.Quotient(above, Formulas.power(
                    Formulas.sum(List.of(Z, Formulas.opposite(pole))), Formulas.number(mode.power() + 1))));
        }
        return terms;
    }

    /** Both as one real fraction in z, times a power of z, where the pole is simple. */
    Optional<Formula> together(int powerOfZ) {
        if (mode.power() > 0) {
            return Optional.empty();
        }
        Enclosed two = Enclosed.of(Rational.TWO);
        Enclosed size = mode.modulus().enclosure();
        Enclosed linear = real.times(two);
        Enclosed constant = real.times(poleReal).plus(imaginary.times(poleImaginary)).times(two).negate();
        Formula above = Formulas.sum(List.of(Formulas.product(written(linear), Z), written(constant)));
        Formula below = Formulas.sum(List.of(Formulas.power(Z, Formulas.number(2)), Formulas.product(
                written(poleReal.times(two).negate()), Z), written(size.times(size))));
        return Optional.of(new Formula.Quotient(Formulas.product(above, power(powerOfZ)), below));
    }

    /** The real and imaginary parts of the pole and of its coefficient: numbers that complex notation is made of. */
    static List<TrueNumber> numbers(Mode.Oscillating mode, FormulaSurvey.Role role) {
        PairTerms terms = new PairTerms(mode, value -> value.exact().orElse(Formulas.number(0)));
        return switch (role) {
            case COEFFICIENT -> List.of(trueNumber(terms.real), trueNumber(terms.imaginary));
            case POLE -> List.of(trueNumber(terms.poleReal), trueNumber(terms.poleImaginary));
            default -> List.of();
        };
    }

    private static TrueNumber trueNumber(Enclosed value) {
        return new TrueNumber(guessed(value).exact(), value);
    }

    private static Formula power(int powerOfZ) {
        return Formulas.power(Z, Formulas.number(powerOfZ));
    }

    private Formula complex(Enclosed re, Enclosed im, int side) {
        return Formulas.sum(List.of(written(re),
                Formulas.product(written(side > 0 ? im : im.negate()), Formula.Constant.I)));
    }

    private Formula written(Enclosed value) {
        return number.apply(guessed(value));
    }

    private static RealValue guessed(Enclosed value) {
        Ball ball = value.enclose(BITS);
        Optional<Rational> own = SimplestFraction.shortIn(ball);
        if (own.isPresent()) {
            return RealValue.of(own.get());
        }
        Optional<Formula> root = SimplestFraction.shortIn(ball.times(ball)).map(square ->
                Formulas.squareRoot(Formulas.number(square)));
        return new RealValue(root.map(size -> ball.isNegative() ? Formulas.negated(size) : size), value);
    }
}
