package org.pofk.meaning;

import java.math.BigInteger;
import java.util.List;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.ParsedFormula;

/** The operations between numbers of a formula that aren't always there: quotients, powers, functions. Exact. */
final class ConstantReading {
    private static final int LARGEST_BINOMIAL = 2_000;
    private static final int GLANCE = 64;

    private final Scalars scalars;

    ConstantReading(Scalars scalars) {
        this.scalars = scalars;
    }

    /** 1/a; refused at {@code part} where that is zero or can't be told from it. */
    Scalar inverse(Scalar a, ParsedFormula part) {
        requireNotZero(a, part);
        return scalars.inverse(a);
    }

    void requireNotZero(Scalar a, ParsedFormula part) {
        switch (scalars.isZero(a)) {
            case YES -> throw RefusedPart.at(part, "division-by-zero", "is zero, and nothing can be divided by it");
            case UNDECIDED -> throw RefusedPart.at(part, "zero-undecided", "can't be told from zero: write it in a"
                    + " simpler way");
            case NO -> { }
        }
    }

    /** A number to the power of a number: exact exponents, and any for e. */
    Scalar power(Scalar base, Scalar exponent, ParsedFormula part) {
        if (scalars.isE(base)) {
            return scalars.exponential(exponent);
        }
        if (exponent.face().isEmpty()) {
            throw RefusedPart.at(part.parts().get(1), "exponent-not-whole", "is no fraction: an exponent is a whole"
                    + " number or a fraction, and other powers are written with exp(…)");
        }
        return power(base, exponent.face().get(), part);
    }

    /** A number to a rational power, by main roots; 0^0 is one. */
    Scalar power(Scalar base, Rational exponent, ParsedFormula part) {
        if (exponent.signum() < 0) {
            requireNotZero(base, part.parts().get(0));
        }
        if (!exponent.isInteger() && scalars.isZero(base) == Decision.YES) {
            return Scalars.of(0);
        }
        return scalars.power(base, exponent).orElseThrow(() -> RefusedPart.at(part, "exponent-not-whole",
                "is to the power " + exponent + ": besides whole numbers and halves only roots of positive numbers, up to"
                        + " the 64th, are understood; write the root as a number, or the power with exp(…)"));
    }

    Scalar call(Formula.Function function, List<Scalar> arguments, ParsedFormula part) {
        Scalar x = arguments.get(0);
        ParsedFormula at = part.parts().get(0);
        return switch (function) {
            case SQRT -> scalars.isZero(x) == Decision.YES ? Scalars.of(0) : scalars.squareRoot(x);
            case COS -> scalars.cosine(x);
            case SIN -> scalars.sine(x);
            case EXP -> scalars.exponential(x);
            case ARCTAN -> scalars.arctangent(real(x, at));
            case ARCCOS -> scalars.arccosine(cosine(real(x, at), at));
            case BINOMIAL -> binomial(x, arguments.get(1), part);
            case DELTA -> delta(x, at);
        };
    }

    private static Scalar real(Scalar x, ParsedFormula part) {
        if (!x.real()) {
            throw RefusedPart.at(part, "number-not-real", "isn't seen to be real, as the argument here must be");
        }
        return x;
    }

    private static Scalar cosine(Scalar x, ParsedFormula part) {
        Ball value = x.quantity().enclose(GLANCE).real().abs().minus(Ball.of(1, GLANCE));
        boolean isBeyond = x.face().isPresent()
                ? x.face().get().abs().compareTo(Rational.ONE) > 0 : value.isPositive();
        boolean isWithin = x.face().isPresent() ? !isBeyond : value.isNegative();
        if (!isWithin) {
            throw RefusedPart.at(part, "no-cosine", isBeyond ? "is beyond 1, and no angle has such a cosine"
                    : "can't be told from 1: write the angle");
        }
        return x;
    }

    private Scalar delta(Scalar x, ParsedFormula part) {
        return switch (scalars.isZero(x)) {
            case YES -> Scalars.of(1);
            case NO -> Scalars.of(0);
            case UNDECIDED -> throw RefusedPart.at(part, "zero-undecided", "can't be told from zero");
        };
    }

    private Scalar binomial(Scalar n, Scalar p, ParsedFormula part) {
        int from = n.whole().filter(value -> value >= 0 && value <= LARGEST_BINOMIAL).orElseThrow(
                () -> RefusedPart.at(part, "binomial-argument", "needs whole numbers from 0 to " + LARGEST_BINOMIAL));
        int chosen = p.whole().filter(value -> value >= 0).orElseThrow(
                () -> RefusedPart.at(part, "binomial-argument", "needs whole numbers from 0 on"));
        BigInteger value = chosen > from ? BigInteger.ZERO : BigInteger.ONE;
        for (int i = 1; i <= chosen && value.signum() > 0; i++) {
            value = value.multiply(BigInteger.valueOf(from - i + 1L)).divide(BigInteger.valueOf(i));
        }
        return scalars.rational(Rational.of(value));
    }
}
