package org.pofk.meaning;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.ParsedFormula;
import org.pofk.text.Fault;
import org.pofk.text.RefusedException;

/**
 * Reads a formula bottom up into what it means in an {@link Algebra}; parts without the variable are worked out as
 * numbers first. All faults of a formula are found, but one for a part. Exact; bounded by {@link Work}.
 */
final class Reading<T> {
    private final Algebra<T> algebra;
    private final ConstantReading constants;
    private final Precision precision;
    private final Scalars scalars;

    private Reading(Algebra<T> algebra, Scalars scalars, Precision precision) {
        this.algebra = algebra;
        this.scalars = scalars;
        this.constants = new ConstantReading(scalars);
        this.precision = precision;
    }

    static <T> T of(ParsedFormula formula, Algebra<T> algebra, Scalars scalars, Precision precision)
            throws RefusedException {
        try {
            return new Reading<>(algebra, scalars, precision).meaning(formula);
        } catch (RefusedPart refused) {
            throw new RefusedException(refused.faults());
        }
    }

    private T meaning(ParsedFormula part) {
        return meaning(part, precision);
    }

    /** @param precision that of a decimal, where this part is one */
    private T meaning(ParsedFormula part, Precision precision) {
        try {
            return part.formula().accept(new Part(part, precision));
        } catch (TooLargeException tooLarge) {
            throw RefusedPart.at(part, "formula-too-large", "is too large to be worked out: give it in fewer terms,"
                    + " smaller powers or numbers");
        }
    }

    /** @param precision that of the decimals among these parts */
    private List<T> meanings(List<ParsedFormula> parts, Precision precision) {
        List<T> meanings = new ArrayList<>();
        List<Fault> faults = new ArrayList<>();
        for (ParsedFormula part : parts) {
            try {
                meanings.add(meaning(part, precision));
            } catch (RefusedPart refused) {
                faults.addAll(refused.faults());
            }
            if (!faults.isEmpty() && scalars.isExhausted()) {
                break;
            }
        }
        if (!faults.isEmpty()) {
            throw new RefusedPart(faults);
        }
        return meanings;
    }

    /** Reads one part, its own parts by way of the reading around it. */
    private final class Part implements Formula.Visitor<T> {
        private final ParsedFormula part;
        private final Precision ofDecimal;

        Part(ParsedFormula part, Precision ofDecimal) {
            this.part = part;
            this.ofDecimal = ofDecimal;
        }

        /** That of the decimals among the operands: a product with degrees in it is an angle. */
        private Precision ofDecimals() {
            return part.parts().stream().anyMatch(each -> each.formula() == Formula.Constant.DEGREE)
                    ? precision.inDegrees() : precision;
        }

        private T constant(Scalar value) {
            return algebra.constant(value, part);
        }

        /** By numbers where all parts are numbers, else by the algebra. */
        private T either(Function<List<Scalar>, Scalar> ofNumbers, Function<List<T>, T> ofMeanings) {
            List<T> meanings = meanings(part.parts(), ofDecimals());
            List<Scalar> numbers = meanings.stream().map(algebra::asConstant).flatMap(Optional::stream).toList();
            return numbers.size() == meanings.size() ? constant(ofNumbers.apply(numbers)) : ofMeanings.apply(meanings);
        }

        @Override
        public T number(Formula.Number number) {
            return constant(scalars.rational(number.value()));
        }

        @Override
        public T decimal(Formula.WrittenDecimal decimal) {
            return constant(scalars.decimal(Written.of(decimal.text(), part.span(), ofDecimal)));
        }

        @Override
        public T symbol(Formula.Symbol symbol) {
            return algebra.symbol(symbol, part);
        }

        @Override
        public T constant(Formula.Constant constant) {
            return constant(switch (constant) {
                case PI -> scalars.pi();
                case I -> scalars.i();
                case DEGREE -> scalars.times(Scalars.of(Rational.of(1, 180)), scalars.pi());
            });
        }

        @Override
        public T negation(Formula.Negation negation) {
            return either(numbers -> scalars.negate(numbers.get(0)), parts -> algebra.negation(parts.get(0), part));
        }

        @Override
        public T sum(Formula.Sum sum) {
            return either(numbers -> numbers.stream().reduce(Scalars.of(0), scalars::plus),
                    parts -> algebra.sum(parts, part));
        }

        @Override
        public T product(Formula.Product product) {
            return either(numbers -> numbers.stream().reduce(Scalars.of(1), scalars::times),
                    parts -> algebra.product(parts, part));
        }

        @Override
        public T quotient(Formula.Quotient quotient) {
            return either(numbers -> scalars.times(numbers.get(0),
                            constants.inverse(numbers.get(1), part.parts().get(1))),
                    parts -> algebra.quotient(parts.get(0), parts.get(1), part));
        }

        @Override
        public T power(Formula.Power power) {
            return either(numbers -> constants.power(numbers.get(0), numbers.get(1), part),
                    parts -> algebra.power(parts.get(0), parts.get(1), part));
        }

        @Override
        public T call(Formula.Call call) {
            return either(numbers -> constants.call(call.function(), numbers, part),
                    parts -> algebra.call(call.function(), parts, part));
        }

        @Override
        public T rootSum(Formula.RootSum rootSum) {
            throw RefusedPart.at(part, "no-formula", "is a sum over roots: write its terms one by one");
        }

        @Override
        public T cases(Formula.Cases cases) {
            return algebra.cases(cases, meanings(part.parts(), precision), part);
        }
    }
}
