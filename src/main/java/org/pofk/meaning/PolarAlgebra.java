package org.pofk.meaning;

import java.util.List;
import java.util.Optional;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.ParsedFormula;
import org.pofk.text.Suggestion;

/** What formulas in k mean: exponential sums. Exact. */
final class PolarAlgebra implements Algebra<PolarSum> {
    private static final String VARIABLE = "k";

    private final Scalars scalars;
    private final ConstantReading constants;
    private final PolarArithmetic arithmetic;
    private final WholeFunctions wholeFunctions;

    PolarAlgebra(Scalars scalars) {
        this.scalars = scalars;
        this.constants = new ConstantReading(scalars);
        this.arithmetic = new PolarArithmetic(scalars);
        this.wholeFunctions = new WholeFunctions(arithmetic, scalars);
    }

    @Override
    public PolarSum constant(Scalar value, ParsedFormula part) {
        return PolarSum.of(value.isPlainZero() ? List.of() : List.of(PolarTerm.constant(value, part.span())));
    }

    @Override
    public PolarSum symbol(Formula.Symbol symbol, ParsedFormula part) {
        if (symbol.name().equals("e")) {
            return constant(scalars.e(), part);
        }
        if (!symbol.name().equals(VARIABLE)) {
            throw RefusedPart.at(part, "name-unknown", "isn't known: a formula for every step is in k"
                    + Suggestion.didYouMean(List.of(VARIABLE), symbol.name()));
        }
        return PolarSum.of(List.of(new PolarTerm(Scalars.of(1), 1, Scalars.of(1), Scalars.of(0), Scalars.of(0),
                part.span())));
    }

    @Override
    public Optional<Scalar> asConstant(PolarSum meaning) {
        if (!meaning.hasTermsOnly() || meaning.terms().size() > 1) {
            return Optional.empty();
        }
        return meaning.terms().isEmpty() ? Optional.of(Scalars.of(0)) : meaning.terms().stream().findFirst()
                .filter(term -> term.isMonomial() && term.power() == 0).map(PolarTerm::coefficient);
    }

    @Override
    public PolarSum sum(List<PolarSum> terms, ParsedFormula part) {
        return arithmetic.sum(terms).at(part.span());
    }

    @Override
    public PolarSum negation(PolarSum operand, ParsedFormula part) {
        return arithmetic.negate(operand).at(part.span());
    }

    @Override
    public PolarSum product(List<PolarSum> factors, ParsedFormula part) {
        return factors.stream().reduce(arithmetic::times).orElseThrow().at(part.span());
    }

    @Override
    public PolarSum quotient(PolarSum numerator, PolarSum denominator, ParsedFormula part) {
        return arithmetic.times(numerator, inverse(denominator, part.parts().get(1))).at(part.span());
    }

    private PolarSum inverse(PolarSum divisor, ParsedFormula part) {
        if (divisor.terms().isEmpty() && divisor.hasTermsOnly()) {
            throw RefusedPart.at(part, "division-by-zero", "is zero, and nothing can be divided by it");
        }
        divisor.terms().forEach(term -> constants.requireNotZero(term.coefficient(), part));
        return arithmetic.inverse(divisor).orElseThrow(() -> RefusedPart.at(part, "divisor-not-a-power",
                "stands below a line: in a formula for every step only numbers and powers like 2^k do"));
    }

    @Override
    public PolarSum power(PolarSum base, PolarSum exponent, ParsedFormula part) {
        Optional<Scalar> times = asConstant(exponent);
        Optional<Scalar> number = asConstant(base);
        if (times.isPresent()) {
            return wholePower(base, times.get(), part).at(part.span());
        }
        if (number.isEmpty()) {
            throw RefusedPart.at(part, "power-of-k", "has k below and above: only a number may be raised to k");
        }
        return geometric(number.get(), affine(exponent, part.parts().get(1), "an exponent"), part).at(part.span());
    }

    private PolarSum wholePower(PolarSum base, Scalar exponent, ParsedFormula part) {
        int times = exponent.whole().orElseThrow(() -> RefusedPart.at(part.parts().get(1), "exponent-not-whole",
                "isn't a whole number: what k is in may only be raised to a whole number"));
        return times >= 0 ? arithmetic.pow(base, times, part.span())
                : inverse(arithmetic.pow(base, -times, part.span()), part.parts().get(0));
    }

    private PolarSum geometric(Scalar base, Affine exponent, ParsedFormula part) {
        if (scalars.isE(base)) {
            return exponential(exponent, part);
        }
        ParsedFormula at = part.parts().get(1);
        Rational slope = exact(exponent.slope(), at);
        Rational offset = exact(exponent.offset(), at);
        return switch (scalars.isZero(base)) {
            case YES -> wholeFunctions.powerOfZero(slope, offset, part);
            case NO -> PolarSum.of(List.of(new PolarTerm(constants.power(base, offset, part), 0,
                    constants.power(base, slope, part), Scalars.of(0), Scalars.of(0), part.span())));
            case UNDECIDED -> throw RefusedPart.at(part.parts().get(0), "zero-undecided",
                    "can't be told from zero: write it in a simpler way");
        };
    }

    private static Rational exact(Scalar exponent, ParsedFormula part) {
        return exponent.face().orElseThrow(() -> RefusedPart.at(part, "exponent-not-whole",
                "isn't a fraction times k: write such a power with exp(…)"));
    }

    private PolarSum exponential(Affine exponent, ParsedFormula part) {
        return PolarSum.of(List.of(new PolarTerm(scalars.exponential(exponent.offset()), 0,
                scalars.exponential(exponent.slope()), Scalars.of(0), Scalars.of(0), part.span())));
    }

    private Affine affine(PolarSum argument, ParsedFormula part, String what) {
        return arithmetic.affine(argument).orElseThrow(() -> RefusedPart.at(part, "argument-not-linear",
                "isn't a number times k plus a number, as " + what + " must be"));
    }

    @Override
    public PolarSum call(Formula.Function function, List<PolarSum> arguments, ParsedFormula part) {
        PolarSum argument = arguments.get(0);
        ParsedFormula at = part.parts().get(0);
        return switch (function) {
            case COS -> cosine(affine(argument, at, "an angle"), part);
            case SIN -> sine(affine(argument, at, "an angle"), part);
            case EXP -> exponential(affine(argument, at, "an exponent"), part);
            case DELTA -> wholeFunctions.delta(affine(argument, at, "the argument of delta"), part);
            case BINOMIAL -> wholeFunctions.binomial(affine(argument, at, "the upper number"),
                    asConstant(arguments.get(1)), part);
            case SQRT, ARCTAN, ARCCOS -> throw RefusedPart.at(part, "function-of-k",
                    "has k in it: of k itself only cos, sin, exp, binomial and delta may be taken");
        };
    }

    private PolarSum cosine(Affine angle, ParsedFormula part) {
        if (angle.slope().real() && angle.offset().real()) {
            return PolarSum.of(List.of(new PolarTerm(Scalars.of(1), 0, Scalars.of(1), angle.slope(), angle.offset(),
                    part.span())));
        }
        PolarSum both = arithmetic.sum(List.of(exponential(turned(angle, scalars.i()), part),
                exponential(turned(angle, scalars.negate(scalars.i())), part)));
        return arithmetic.times(constant(Scalars.of(Rational.HALF), part), both);
    }

    /** sin x = cos(x − π/2). */
    private PolarSum sine(Affine angle, ParsedFormula part) {
        Scalar quarter = scalars.times(Scalars.of(Rational.HALF), scalars.pi());
        return cosine(new Affine(angle.slope(), scalars.minus(angle.offset(), quarter)), part);
    }

    private Affine turned(Affine angle, Scalar i) {
        return new Affine(scalars.times(i, angle.slope()), scalars.times(i, angle.offset()));
    }

    /** The last branch for all steps, with the others, and what it lacks itself, set right step by step. */
    @Override
    public PolarSum cases(Formula.Cases cases, List<PolarSum> branches, ParsedFormula part) {
        return new CasesReading(cases, branches, arithmetic, scalars).sum();
    }
}
