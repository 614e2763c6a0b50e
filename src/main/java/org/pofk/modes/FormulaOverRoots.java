package org.pofk.modes;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.stream.Stream;
import org.pofk.exact.CommonDenominator;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;
import org.pofk.formula.PlainText;
import org.pofk.transform.TransferFunction;

/**
 * The exact formula of every closed form: factors without short forms stand as sums over their roots, polynomials with
 * whole coefficients and coefficients as quotients N(λ)/D′(λ) where that is shorter. Exact.
 */
final class FormulaOverRoots {
    private static final Formula.Symbol LAMBDA = TablePair.LAMBDA;

    private FormulaOverRoots() {
    }

    static Formula of(ClosedForm form) {
        List<Formula> terms = new ArrayList<>(form.modes().stream()
                .filter(mode -> mode.pole().isEmpty()).map(ModeFormula::exact).toList());
        for (Expansion.Part<Rational> part : form.expansion().parts()) {
            int index = form.transform().factors().factors().indexOf(part.factor());
            List<Mode> modes = form.modes().stream()
                    .filter(mode -> !mode.pole().isEmpty() && mode.pole().get(0) == index).toList();
            if (modes.stream().allMatch(Mode::isExact)) {
                modes.forEach(mode -> terms.add(ModeFormula.exact(mode)));
            } else {
                terms.add(overRoots(part, form.transform().y()));
            }
        }
        return Formulas.sum(terms);
    }

    /** Σ over q(λ) = 0 of Σ_p R_p(λ) binomial(k, p) λ^(k−p). */
    private static Formula.RootSum overRoots(Expansion.Part<Rational> part, TransferFunction<Rational> y) {
        List<Formula> coefficients = coefficients(part, y);
        List<Formula> body = new ArrayList<>();
        for (int power = 0; power < coefficients.size(); power++) {
            body.add(ModeFormula.geometric(coefficients.get(power), power, LAMBDA));
        }
        return new Formula.RootSum(LAMBDA, equation(part.factor().polynomial()), Formulas.sum(body));
    }

    /** A polynomial with the same roots. */
    private static Formula equation(Polynomial<Rational> q) {
        return shortest(List.of(written(q), written(q.times(content(q.coefficients().stream()).inverse()))));
    }

    /** R_p(λ) by power p, each the shortest of the ways to write it. */
    static List<Formula> coefficients(Expansion.Part<Rational> part, TransferFunction<Rational> y) {
        boolean isSimple = part.factor().multiplicity() == 1;
        return part.coefficients().stream().map(coefficient -> isSimple
                ? shortest(List.of(quotient(coefficient), wholeQuotient(coefficient),
                        wholeQuotient(PartialFractions.unreduced(y))))
                : shortest(List.of(quotient(coefficient), wholeQuotient(coefficient)))).toList();
    }

    private static Formula quotient(Expansion.Coefficient<Rational> coefficient) {
        return Formulas.quotient(written(coefficient.numerator()), written(coefficient.denominator()));
    }

    /** Both polynomials over what their coefficients have in common: whole ones without a common divisor. */
    private static Formula wholeQuotient(Expansion.Coefficient<Rational> coefficient) {
        if (coefficient.isZero()) {
            return Formulas.number(0);
        }
        Rational factor = content(Stream.concat(coefficient.numerator().coefficients().stream(),
                coefficient.denominator().coefficients().stream())).inverse();
        return quotient(new Expansion.Coefficient<>(coefficient.numerator().times(factor),
                coefficient.denominator().times(factor)));
    }

    /** The greatest rational number of which all are whole multiples; they are not all zero. */
    private static Rational content(Stream<Rational> numbers) {
        List<Rational> all = numbers.toList();
        BigInteger divisor = all.stream().map(Rational::numerator).reduce(BigInteger.ZERO, BigInteger::gcd);
        BigInteger denominator = CommonDenominator.of(all);
        return new Rational(divisor, denominator);
    }

    private static Formula shortest(List<Formula> ways) {
        return ways.stream().min(Comparator.comparing(way -> PlainText.UNICODE.write(way).length())).orElseThrow();
    }

    private static Formula written(Polynomial<Rational> polynomial) {
        return Formulas.polynomial(polynomial, LAMBDA);
    }
}
