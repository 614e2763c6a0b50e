package org.pofk.formula;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.Factorization;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula.Call;
import org.pofk.formula.Formula.Constant;
import org.pofk.formula.Formula.Function;
import org.pofk.formula.Formula.Negation;
import org.pofk.formula.Formula.Number;
import org.pofk.formula.Formula.Power;
import org.pofk.formula.Formula.Product;
import org.pofk.formula.Formula.Quotient;
import org.pofk.formula.Formula.Sum;
import org.pofk.formula.Formula.WrittenDecimal;

/**
 * Builds formulas in the form in which one would write them: no terms zero, no factors one, one sign and one number in
 * front of a product, rational numbers worked out. Nothing else is changed: decimals stay as they are, terms stay in
 * order, nothing is multiplied out, and numbers of more than a thousand digits stay apart. Exact.
 */
public final class Formulas {
    private static final int MOST_BITS = 4_096;

    private Formulas() {
    }

    public static Formula number(Rational value) {
        return new Number(value);
    }

    public static Formula number(long value) {
        return number(Rational.of(value));
    }

    /** A decimal of any sign. */
    public static Formula decimal(String text) {
        return text.startsWith("-") ? new Negation(new WrittenDecimal(text.substring(1))) : new WrittenDecimal(text);
    }

    public static Formula call(Function function, Formula... arguments) {
        return new Call(function, List.of(arguments));
    }

    public static Formula squareRoot(Formula radicand) {
        return call(Function.SQRT, radicand);
    }

    /** The sum: sums within it dissolved, zeros left out, all numbers added up where the first one stands. */
    public static Formula sum(List<Formula> terms) {
        List<Formula> kept = new ArrayList<>();
        Rational total = Rational.ZERO;
        int place = -1;
        for (Formula term : terms.stream().flatMap(term -> termsOf(term).stream()).toList()) {
            if (term instanceof Number number && areShort(total, number.value())) {
                total = total.plus(number.value());
                place = place < 0 && !total.isZero() ? kept.size() : place;
            } else {
                kept.add(term);
            }
        }
        if (!total.isZero()) {
            kept.add(place, number(total));
        }
        return switch (kept.size()) {
            case 0 -> number(Rational.ZERO);
            case 1 -> kept.get(0);
            default -> new Sum(kept);
        };
    }

    private static List<Formula> termsOf(Formula formula) {
        return formula instanceof Sum sum ? sum.terms() : List.of(formula);
    }

    /** The product: products within it dissolved, its sign and all its numbers in one in front; zero times is zero. */
    public static Formula product(List<Formula> factors) {
        List<Formula> kept = new ArrayList<>();
        Rational coefficient = Rational.ONE;
        for (Formula factor : factors) {
            Formula unsigned = factor instanceof Negation negation ? negation.operand() : factor;
            coefficient = factor instanceof Negation ? coefficient.negate() : coefficient;
            for (Formula part : unsigned instanceof Product product ? product.factors() : List.of(unsigned)) {
                if (part instanceof Number number && areShort(coefficient, number.value())) {
                    coefficient = coefficient.times(number.value());
                } else {
                    kept.add(part);
                }
            }
        }
        return scaled(coefficient, kept);
    }

    public static Formula product(Formula... factors) {
        return product(List.of(factors));
    }

    private static Formula scaled(Rational coefficient, List<Formula> factors) {
        if (coefficient.isZero() || factors.isEmpty()) {
            return number(coefficient);
        }
        List<Formula> all = new ArrayList<>(factors);
        if (!coefficient.abs().isOne()) {
            all.add(0, number(coefficient.abs()));
        }
        Formula product = all.size() == 1 ? all.get(0) : new Product(all);
        return coefficient.signum() < 0 ? new Negation(product) : product;
    }

    /** factor · irrational as one fraction with its sign in front: −3√2/10. */
    public static Formula fraction(Rational factor, Formula irrational) {
        return quotient(product(number(Rational.of(factor.numerator())), irrational),
                number(Rational.of(factor.denominator())));
    }

    /** value · factor, written over the value's denominator where it is a quotient: 2π/5 · k as 2πk/5. */
    public static Formula overDenominator(Formula value, Formula factor) {
        return value instanceof Quotient quotient
                ? new Quotient(product(quotient.numerator(), factor), quotient.denominator())
                : product(value, factor);
    }

    /** The negation; that of a negation or a number is the formula or number itself, without or with the other sign. */
    public static Formula negated(Formula formula) {
        if (formula instanceof Negation negation) {
            return negation.operand();
        }
        return formula instanceof Number number ? number(number.value().negate()) : new Negation(formula);
    }

    /** −formula, in a sum with every sign turned. */
    public static Formula opposite(Formula formula) {
        return formula instanceof Sum sum
                ? new Sum(sum.terms().stream().map(Formulas::negated).toList())
                : negated(formula);
    }

    /** The quotient: a sign stands in front; a number over a number is a fraction, unless it divides by zero. */
    public static Formula quotient(Formula numerator, Formula denominator) {
        if (denominator instanceof Number divisor && !divisor.value().isZero()) {
            if (numerator instanceof Number number) {
                return number(number.value().dividedBy(divisor.value()));
            }
            if (divisor.value().isOne()) {
                return numerator;
            }
            if (divisor.value().signum() < 0) {
                return quotient(negated(numerator), negated(denominator));
            }
        }
        if (denominator instanceof Negation negation) {
            return quotient(negated(numerator), negation.operand());
        }
        return isNegative(numerator)
                ? new Negation(new Quotient(negated(numerator), denominator))
                : new Quotient(numerator, denominator);
    }

    public static boolean isZero(Formula formula) {
        return formula instanceof Number number && number.value().isZero();
    }

    /** π, 2π/5, −π/3: as {@link #fraction} writes them. */
    public static boolean isMultipleOfPi(Formula formula) {
        if (formula instanceof Negation negation) {
            return isMultipleOfPi(negation.operand());
        }
        if (formula instanceof Quotient quotient) {
            return quotient.denominator() instanceof Number && isMultipleOfPi(quotient.numerator());
        }
        return formula == Constant.PI || formula instanceof Product product && product.factors().size() == 2
                && product.factors().get(0) instanceof Number && product.factors().get(1) == Constant.PI;
    }

    /** The factor of π in what {@link #isMultipleOfPi} takes; nothing for other formulas. */
    public static Optional<Rational> multipleOfPi(Formula formula) {
        if (formula instanceof Negation negation) {
            return multipleOfPi(negation.operand()).map(Rational::negate);
        }
        if (formula instanceof Quotient quotient && quotient.denominator() instanceof Number divisor) {
            return multipleOfPi(quotient.numerator()).map(factor -> factor.dividedBy(divisor.value()));
        }
        if (formula instanceof Product product && isMultipleOfPi(product)) {
            return Optional.of(((Number) product.factors().get(0)).value());
        }
        return formula == Constant.PI ? Optional.of(Rational.ONE) : Optional.empty();
    }

    private static boolean isNegative(Formula formula) {
        return formula instanceof Negation || formula instanceof Number number && number.value().signum() < 0;
    }

    /** The power: an exponent one goes, so does a base one; whole powers of numbers are worked out while short. */
    public static Formula power(Formula base, Formula exponent) {
        if (exponent.equals(number(1)) || base.equals(number(1))) {
            return base;
        }
        if (base instanceof Number number && exponent instanceof Number times
                && isShort(number.value(), times.value())) {
            return number(number.value().pow(times.value().numerator().intValueExact()));
        }
        return exponent.equals(number(0)) ? number(1) : new Power(base, exponent);
    }

    /** True when two numbers may be put into one: when that is no long work, or one of them is as good as nothing. */
    private static boolean areShort(Rational first, Rational second) {
        return bits(first) + bits(second) <= MOST_BITS || bits(first) <= 2 || bits(second) <= 2;
    }

    private static long bits(Rational number) {
        return (long) number.numerator().bitLength() + number.denominator().bitLength();
    }

    private static boolean isShort(Rational base, Rational exponent) {
        long bits = bits(base);
        return exponent.isInteger() && (exponent.signum() >= 0 || !base.isZero())
                && exponent.abs().times(Rational.of(bits)).compareTo(Rational.of(MOST_BITS)) <= 0;
    }

    /** The polynomial multiplied out, highest power first. */
    public static Formula polynomial(Polynomial<Rational> polynomial, Formula variable) {
        List<Formula> terms = new ArrayList<>();
        for (int power = polynomial.degree(); power >= 0; power--) {
            terms.add(product(number(polynomial.coefficient(power)), power(variable, number(power))));
        }
        return sum(terms);
    }

    /** The product of the factors, each to its power, in their order. */
    public static Formula factored(Factorization<Rational> factorization, Formula variable) {
        List<Formula> factors = new ArrayList<>(List.of(number(factorization.unit())));
        factorization.factors().forEach(factor ->
                factors.add(power(polynomial(factor.polynomial(), variable), number(factor.multiplicity()))));
        return product(factors);
    }
}
