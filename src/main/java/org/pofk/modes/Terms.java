package org.pofk.modes;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;

/**
 * How closed forms are written as formula trees: no factor 1, no exponent 1, no sum of one term, signs in front of
 * products, fractions with the radical in the numerator (√2/10).
 */
public final class Terms {
    static final Formula K = new Formula.Symbol("k");

    private Terms() {
    }

    public static Formula number(Rational value) {
        return new Formula.Number(value);
    }

    public static Formula sum(List<Formula> terms) {
        return switch (terms.size()) {
            case 0 -> number(Rational.ZERO);
            case 1 -> terms.get(0);
            default -> new Formula.Sum(terms);
        };
    }

    /** The factors multiplied, ones left out, products within flattened, one sign in front. */
    public static Formula product(List<Formula> factors) {
        List<Formula> kept = new ArrayList<>();
        boolean negative = false;
        for (Formula factor : factors) {
            Formula rest = factor;
            if (rest instanceof Formula.Negation negation) {
                negative = !negative;
                rest = negation.operand();
            }
            if (rest instanceof Formula.Number number && number.value().signum() < 0) {
                negative = !negative;
                rest = number(number.value().negate());
            }
            if (rest instanceof Formula.Product product) {
                kept.addAll(product.factors());
            } else if (!isOne(rest)) {
                kept.add(rest);
            }
        }
        Formula product = switch (kept.size()) {
            case 0 -> number(Rational.ONE);
            case 1 -> kept.get(0);
            default -> new Formula.Product(kept);
        };
        return negative ? negated(product) : product;
    }

    /** factor · irrational, as one fraction: −3√2/10. */
    public static Formula scaled(Rational factor, Formula irrational) {
        Formula numerator = product(List.of(number(Rational.of(factor.numerator().abs())), irrational));
        Formula positive = factor.isInteger()
                ? numerator
                : new Formula.Quotient(numerator, number(Rational.of(factor.denominator())));
        return factor.signum() < 0 ? negated(positive) : positive;
    }

    /** value · factor, written over the value's denominator where it is a fraction: 2π/5 · k as 2πk/5. */
    public static Formula overDenominator(Formula value, Formula factor) {
        return value instanceof Formula.Quotient quotient
                ? new Formula.Quotient(product(List.of(quotient.numerator(), factor)), quotient.denominator())
                : product(List.of(value, factor));
    }

    /** −formula, a sign already in front taken away and a number's sign turned. */
    public static Formula negated(Formula formula) {
        if (formula instanceof Formula.Negation negation) {
            return negation.operand();
        }
        return formula instanceof Formula.Number number
                ? number(number.value().negate())
                : new Formula.Negation(formula);
    }

    /** −formula, in a sum with every sign turned. */
    static Formula opposite(Formula formula) {
        return formula instanceof Formula.Sum sum
                ? new Formula.Sum(sum.terms().stream().map(Terms::negated).toList())
                : negated(formula);
    }

    public static Formula squareRoot(Formula radicand) {
        return call(Formula.Function.SQRT, radicand);
    }

    public static Formula call(Formula.Function function, Formula... arguments) {
        return new Formula.Call(function, List.of(arguments));
    }

    public static Formula power(Formula base, Formula exponent) {
        return isOne(exponent) || isOne(base) ? base : new Formula.Power(base, exponent);
    }

    /** k − shift. */
    public static Formula kMinus(int shift) {
        return shift == 0 ? K : new Formula.Sum(List.of(K, negated(number(Rational.of(shift)))));
    }

    /** binomial(k, p): 1 for p = 0, k for p = 1. */
    public static Formula binomial(int p) {
        return switch (p) {
            case 0 -> number(Rational.ONE);
            case 1 -> K;
            default -> call(Formula.Function.BINOMIAL, K, number(Rational.of(p)));
        };
    }

    /** A polynomial written in a variable, highest power first. */
    public static Formula polynomial(Polynomial<Rational> polynomial, Formula variable) {
        List<Formula> terms = new ArrayList<>();
        for (int power = polynomial.degree(); power >= 0; power--) {
            Rational coefficient = polynomial.coefficient(power);
            if (!coefficient.isZero()) {
                terms.add(product(List.of(number(coefficient), power == 0
                        ? number(Rational.ONE)
                        : power(variable, number(Rational.of(power))))));
            }
        }
        return sum(terms);
    }

    /** π, 2π/5, −π/3: as {@link #scaled} writes them. */
    public static boolean isMultipleOfPi(Formula formula) {
        if (formula instanceof Formula.Negation negation) {
            return isMultipleOfPi(negation.operand());
        }
        if (formula instanceof Formula.Quotient quotient) {
            return quotient.denominator() instanceof Formula.Number && isMultipleOfPi(quotient.numerator());
        }
        return formula == Formula.Constant.PI || formula instanceof Formula.Product product
                && product.factors().size() == 2 && product.factors().get(0) instanceof Formula.Number
                && product.factors().get(1) == Formula.Constant.PI;
    }

    public static boolean isOne(Formula formula) {
        return formula instanceof Formula.Number number
                && number.value().numerator().equals(BigInteger.ONE) && number.value().isInteger();
    }

    public static boolean isZero(Formula formula) {
        return formula instanceof Formula.Number number && number.value().isZero();
    }
}
