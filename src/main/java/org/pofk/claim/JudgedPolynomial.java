package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.claim.Statement.MatrixPolynomial.Which;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Precision;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.RationalForm;
import org.pofk.meaning.Written;
import org.pofk.meaning.WrittenPolynomial;
import org.pofk.text.RefusedException;

/**
 * The characteristic or the minimal polynomial of the matrix, up to a constant factor, in whatever form it is written.
 * Exact where the coefficients are; otherwise each decimal is held against what it should be in the form it stands in,
 * in a product factor by factor.
 */
final class JudgedPolynomial {
    private final Statement.MatrixPolynomial stated;
    private final Truth truth;
    private final Holding holding;
    private final Precision precision;

    private JudgedPolynomial(Statement.MatrixPolynomial stated, Claim claim, Truth truth) {
        this.stated = stated;
        this.truth = truth;
        this.holding = new Holding(claim);
        this.precision = new Precision(claim.carried());
    }

    static Judgement of(Statement.MatrixPolynomial stated, Claim claim, Truth truth) throws RefusedException {
        return new JudgedPolynomial(stated, claim, truth).judgement();
    }

    private Judgement judgement() throws RefusedException {
        WrittenPolynomial written = WrittenPolynomial.of(stated.is().parsed(), precision);
        Optional<Polynomial<Rational>> meant = stated.which() == Which.MINIMAL
                ? Optional.of(truth.minimalPolynomial()) : truth.characteristicPolynomial();
        if (meant.isEmpty()) {
            holding.undecided("the characteristic polynomial is too large to be worked out");
            return holding.judgement(texts -> "");
        }
        Polynomial<Rational> right = meant.get();
        if (written.degree() != right.degree()) {
            holding.wrong("the " + word() + " polynomial has degree " + right.degree() + ", not "
                    + Math.max(written.degree(), 0));
            remarkOther(written);
        } else if (isProportional(written.coefficients(), right)) {
            hold(written.coefficients(), right);
        } else {
            holdParts(written, right);
        }
        List<Written> decimals = written.coefficients().stream().flatMap(c -> c.decimals().stream()).distinct().toList();
        return holding.judgement(texts -> Optional.of(stated.is()).filter(text -> written.degree() == right.degree())
                .flatMap(text -> texts.mended(text, decimals))
                .orElseGet(() -> printed(right, written.variable(), decimals)));
    }

    private String word() {
        return stated.which() == Which.MINIMAL ? "minimal" : "characteristic";
    }

    /** The one polynomial given for the other. */
    private void remarkOther(WrittenPolynomial written) {
        Optional<Polynomial<Rational>> other = stated.which() == Which.MINIMAL
                ? truth.characteristicPolynomial() : Optional.of(truth.minimalPolynomial());
        if (other.filter(each -> each.degree() == written.degree() && isProportional(written.coefficients(), each))
                .isPresent()) {
            holding.remark(stated.which() == Which.MINIMAL
                    ? "this is the characteristic polynomial; some eigenvalue has several eigenvectors"
                    : "this is the minimal polynomial");
        }
    }

    private static boolean isProportional(List<Quantity> coefficients, Polynomial<Rational> right) {
        Quantity leading = coefficients.get(coefficients.size() - 1);
        for (int power = 0; power < right.degree(); power++) {
            Quantity wanted = leading.times(right.coefficient(power));
            if (coefficients.get(power).minus(wanted).isZero() != Decision.YES) {
                return false;
            }
        }
        return true;
    }

    /** The factors of a product each by itself, else the coefficients. */
    private void holdParts(WrittenPolynomial written, Polynomial<Rational> right) throws RefusedException {
        List<RationalForm.Summand> summands =
                RationalForm.of(stated.is().parsed(), written.variable(), precision).summands();
        List<RationalForm.Factor> factors = summands.size() == 1 ? summands.get(0).factors() : List.of();
        Optional<List<FactorRoots.Matched>> matched = factors.size() > 1
                || factors.size() == 1 && factors.get(0).exponent() > 1 ? FactorRoots.of(factors, right) : Optional.empty();
        if (matched.isEmpty()) {
            hold(written.coefficients(), right);
        } else {
            matched.get().forEach(each -> hold(each.factor().coefficients(), each.right()));
        }
    }

    private void hold(List<Quantity> coefficients, Polynomial<Rational> right) {
        List<Quantity> values = new ArrayList<>();
        for (int power = 0; power <= right.degree(); power++) {
            values.add(Quantity.of(right.coefficient(power)));
        }
        hold(coefficients, values);
    }

    /** Each coefficient against the leading one times what stands there in the monic polynomial. */
    private void hold(List<Quantity> coefficients, List<Quantity> monic) {
        Quantity leading = coefficients.get(coefficients.size() - 1);
        for (int power = 0; power < monic.size() - 1; power++) {
            Quantity wanted = leading.times(monic.get(power));
            Quantity own = coefficients.get(power);
            holding.hold(leading.decimals().isEmpty() ? new Held(new StatedNumber(stated.is(), own), wanted)
                    : new Held(new StatedNumber(stated.is(), own.minus(wanted)), Quantity.ZERO));
        }
    }

    private String printed(Polynomial<Rational> right, String variable, List<Written> decimals) {
        Formula.Symbol symbol = new Formula.Symbol(variable);
        List<Formula> terms = new ArrayList<>();
        for (int power = right.degree(); power >= 0; power--) {
            terms.add(Formulas.product(number(right.coefficient(power), decimals),
                    Formulas.power(symbol, Formulas.number(power))));
        }
        Formula sum = Formulas.sum(terms);
        return RightFormula.written(sum, stated.is());
    }

    private static Formula number(Rational value, List<Written> decimals) {
        return decimals.isEmpty() || value.isInteger() ? Formulas.number(value)
                : Formulas.decimal(RightNumber.of(Quantity.of(value), decimals));
    }
}
