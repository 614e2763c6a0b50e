package org.pofk.formula;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Stream;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula.Call;
import org.pofk.formula.Formula.Cases;
import org.pofk.formula.Formula.Constant;
import org.pofk.formula.Formula.Negation;
import org.pofk.formula.Formula.Number;
import org.pofk.formula.Formula.Power;
import org.pofk.formula.Formula.Product;
import org.pofk.formula.Formula.Quotient;
import org.pofk.formula.Formula.RootSum;
import org.pofk.formula.Formula.Sum;
import org.pofk.formula.Formula.Symbol;
import org.pofk.formula.Formula.WrittenDecimal;
import org.pofk.text.Faults;
import org.pofk.text.RefusedException;
import org.pofk.text.Suggestion;

/** Evaluates formulas to linear forms, collecting every fault; a part with a fault has no value. */
final class LinearEvaluation {
    /** Longest number, numerator and denominator together. */
    private static final int MOST_BITS = 1 << 17;
    /** Most word operations of one formula, counting the square of each number's length: well under a second. */
    private static final long MOST_EFFORT = 50_000_000;

    private final Map<String, LinearForm> names;
    private final Faults faults = new Faults();
    private long effort;

    private LinearEvaluation(Map<String, LinearForm> names) {
        this.names = names;
    }

    static LinearForm of(ParsedFormula formula, Map<String, LinearForm> names) throws RefusedException {
        LinearEvaluation evaluation = new LinearEvaluation(names);
        Optional<LinearForm> value = evaluation.value(formula);
        evaluation.faults.refuseIfAny();
        return value.orElseThrow(() -> new AssertionError("no value and no fault: " + formula));
    }

    private Optional<LinearForm> value(ParsedFormula node) {
        return node.formula().accept(new Node(node));
    }

    private static String shown(ParsedFormula node) {
        return Words.shortened(PlainText.UNICODE.write(node.formula()));
    }

    private Optional<LinearForm> fault(ParsedFormula node, String code, String message) {
        faults.add(node.position(), code, message);
        return Optional.empty();
    }

    private Optional<LinearForm> notLinear(ParsedFormula node) {
        return fault(node, "not-linear", "'" + shown(node) + "' isn't linear: only numbers and parameters may multiply,"
                + " divide or be raised");
    }

    /** The value unless a number in it, or the work for all numbers so far, has grown beyond all use. */
    private Optional<LinearForm> bounded(ParsedFormula node, LinearForm form) {
        boolean isBounded = Stream.concat(Stream.of(form.constant()), form.coefficients().values().stream())
                .allMatch(this::isBounded);
        return isBounded ? Optional.of(form) : tooLarge(node);
    }

    private boolean isBounded(Rational number) {
        long words = bits(number) / Integer.SIZE;
        effort += words * words;
        return bits(number) <= MOST_BITS && effort <= MOST_EFFORT;
    }

    private Optional<LinearForm> tooLarge(ParsedFormula node) {
        return fault(node, "number-too-large", "the value of '" + shown(node)
                + "' is a fraction of too many digits to work with");
    }

    private static long bits(Rational number) {
        return (long) number.numerator().bitLength() + number.denominator().bitLength();
    }

    /** Evaluates one node, its parts by way of the enclosing evaluation. */
    private final class Node implements Formula.Visitor<Optional<LinearForm>> {
        private final ParsedFormula node;

        Node(ParsedFormula node) {
            this.node = node;
        }

        private Optional<LinearForm> exact(Rational number) {
            return Optional.of(LinearForm.constant(number));
        }

        private Optional<LinearForm> noExactValue() {
            return fault(node, "no-exact-value", "'" + shown(node) + "' has no exact value as a fraction");
        }

        /** The values of all parts, or nothing when one of them has a fault; all are evaluated all the same. */
        private Optional<List<LinearForm>> parts() {
            List<LinearForm> values = new ArrayList<>();
            node.parts().forEach(part -> value(part).ifPresent(values::add));
            return values.size() == node.parts().size() ? Optional.of(values) : Optional.empty();
        }

        @Override
        public Optional<LinearForm> number(Number number) {
            return bounded(node, LinearForm.constant(number.value()));
        }

        @Override
        public Optional<LinearForm> decimal(WrittenDecimal decimal) {
            return bounded(node, LinearForm.constant(Rational.of(new BigDecimal(decimal.text()))));
        }

        @Override
        public Optional<LinearForm> symbol(Symbol symbol) {
            LinearForm known = names.get(symbol.name());
            return known != null ? Optional.of(known) : fault(node, "name-unknown", "'" + Words.shortened(symbol.name())
                    + "' isn't known here" + Suggestion.didYouMean(names.keySet(), symbol.name()));
        }

        /** A constant, unless the model has a name that is written like it. */
        @Override
        public Optional<LinearForm> constant(Constant constant) {
            LinearForm known = names.get(Words.nameOf(constant));
            return known != null ? Optional.of(known) : noExactValue();
        }

        @Override
        public Optional<LinearForm> negation(Negation negation) {
            return parts().map(parts -> parts.get(0).times(Rational.of(-1)));
        }

        @Override
        public Optional<LinearForm> sum(Sum sum) {
            return parts().flatMap(parts -> {
                Rational constant = Rational.ZERO;
                Map<String, Rational> coefficients = new LinkedHashMap<>();
                for (LinearForm part : parts) {
                    constant = constant.plus(part.constant());
                    part.coefficients().forEach((name, value) -> coefficients.merge(name, value, Rational::plus));
                    boolean isBounded = Stream.concat(Stream.of(constant),
                            part.coefficients().keySet().stream().map(coefficients::get))
                            .allMatch(LinearEvaluation.this::isBounded);
                    if (!isBounded) {
                        return tooLarge(node);
                    }
                }
                return Optional.of(new LinearForm(constant, coefficients));
            });
        }

        @Override
        public Optional<LinearForm> product(Product product) {
            return parts().flatMap(parts -> {
                Optional<LinearForm> result = exact(Rational.ONE);
                for (LinearForm part : parts) {
                    result = result.flatMap(before -> times(before, part));
                }
                return result;
            });
        }

        private Optional<LinearForm> times(LinearForm left, LinearForm right) {
            if (right.isConstant()) {
                return bounded(node, left.times(right.constant()));
            }
            return left.isConstant() ? bounded(node, right.times(left.constant())) : notLinear(node);
        }

        @Override
        public Optional<LinearForm> quotient(Quotient quotient) {
            return parts().flatMap(parts -> {
                LinearForm divisor = parts.get(1);
                if (!divisor.isConstant()) {
                    return notLinear(node);
                }
                return divisor.constant().isZero()
                        ? fault(node.parts().get(1), "division-by-zero", "'" + shown(node) + "' divides by zero")
                        : bounded(node, parts.get(0).times(divisor.constant().inverse()));
            });
        }

        @Override
        public Optional<LinearForm> power(Power power) {
            return parts().flatMap(parts -> {
                LinearForm exponent = parts.get(1);
                if (exponent.equals(LinearForm.constant(Rational.ONE))) {
                    return Optional.of(parts.get(0));
                }
                if (!parts.get(0).isConstant() || !exponent.isConstant()) {
                    return notLinear(node);
                }
                return exponent.constant().isInteger()
                        ? integerPower(parts.get(0).constant(), exponent.constant().numerator())
                        : noExactValue();
            });
        }

        private Optional<LinearForm> integerPower(Rational base, BigInteger exponent) {
            if (base.isZero() && exponent.signum() < 0) {
                return fault(node, "division-by-zero", "'" + shown(node) + "' divides by zero");
            }
            if (base.isZero() || base.abs().isOne()) {
                return exact(base.pow(exponent.signum() == 0 ? 0 : exponent.testBit(0) ? 1 : 2));
            }
            return exponent.bitLength() > 31 || bits(base) * exponent.abs().longValue() > 2L * MOST_BITS
                    ? tooLarge(node) : bounded(node, LinearForm.constant(base.pow(exponent.intValueExact())));
        }

        @Override
        public Optional<LinearForm> call(Call call) {
            return parts().flatMap(parts -> parts.stream().allMatch(LinearForm::isConstant)
                    ? ExactFunctions.value(call.function(), parts.stream().map(LinearForm::constant).toList())
                            .map(LinearForm::constant).or(this::noExactValue)
                    : notLinear(node));
        }

        @Override
        public Optional<LinearForm> rootSum(RootSum sum) {
            return noExactValue();
        }

        @Override
        public Optional<LinearForm> cases(Cases cases) {
            return fault(node, "not-linear", "a formula that differs from step to step has no single value");
        }
    }
}
