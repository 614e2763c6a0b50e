package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.stream.Stream;
import org.pofk.claim.Judgement.JudgedNumber;
import org.pofk.exact.Factoring;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Fit;
import org.pofk.meaning.Precision;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.RationalForm.Factor;
import org.pofk.meaning.RationalForm;
import org.pofk.text.RefusedException;

/**
 * A transform in any of its forms, held against what is true: refuted at a few points where that can be, else exact by
 * as many points as its degrees ask for, else rounded by the equations between its parts and the true ones.
 */
final class JudgedTransform {
    private static final String VARIABLE = "z";
    private static final List<Rational> POINTS = List.of(Rational.of(2), Rational.of(5), Rational.of(-3),
            Rational.of(13, 10), Rational.of(101, 100), Rational.of(-11, 10));

    private final RationalForm form;
    private final Statement.TransformOf stated;
    private final Truth truth;
    private final OutputTruth about;
    private final TransformTarget target;

    private JudgedTransform(RationalForm form, Statement.TransformOf stated, Truth truth) {
        this.form = form;
        this.stated = stated;
        this.truth = truth;
        this.about = truth.about(stated.output());
        this.target = stated.form() == Statement.TransformOf.Form.TRANSFORM_OVER_Z
                ? TransformTarget.overZ(about) : TransformTarget.of(about);
    }

    static Judgement of(Statement.TransformOf stated, Claim claim, Truth truth) throws RefusedException {
        return read(stated, claim, truth).judgement();
    }

    /** Whether it is right, at less cost than the judgement where it is not. */
    static boolean isRight(Statement.TransformOf stated, Claim claim, Truth truth) {
        try {
            JudgedTransform judged = read(stated, claim, truth);
            return !judged.isRefuted() && (judged.isExact() == Decision.YES || judged.isRounded());
        } catch (RefusedException unreadable) {
            return false;
        }
    }

    private static JudgedTransform read(Statement.TransformOf stated, Claim claim, Truth truth)
            throws RefusedException {
        return new JudgedTransform(RationalForm.of(stated.is().parsed(), VARIABLE, new Precision(claim.carried())),
                stated, truth);
    }

    private boolean isRounded() {
        FormEquations equations = equations();
        return equations.fits() && RightNumbers.of(equations.plain()).rounded() == Decision.YES;
    }

    private FormEquations equations() {
        return FormEquations.of(form, target, uncancelled());
    }

    private Judgement judgement() {
        boolean refuted = isRefuted();
        if (!refuted && isExact() == Decision.YES) {
            return new Judgement(Verdict.EXACT, Optional.empty(), OptionalLong.empty(), decimals(), remarks(),
                    stated.is().text());
        }
        FormEquations equations = equations();
        RightNumbers numbers = RightNumbers.of(equations.plain());
        List<JudgedNumber> judged = numbers.judged();
        List<String> remarks = remarks();
        if (!refuted && equations.fits() && numbers.rounded() != Decision.NO) {
            judged.stream().filter(number -> number.fit() == Fit.CUT_OFF).forEach(number ->
                    remarks.add(number.written().text() + " is cut off, not rounded: " + number.right()));
            return new Judgement(numbers.rounded() == Decision.YES ? Verdict.ROUNDED : Verdict.UNDECIDED,
                    Optional.empty(), OptionalLong.empty(), judged, remarks,
                    RightText.of(stated.is(), judged).orElse(stated.is().text()));
        }
        String right = Optional.of(judged).filter(each -> equations.fits() && numbers.isMended())
                .flatMap(each -> RightText.of(stated.is(), each))
                .orElseGet(() -> RightFormula.written(rightFormula(), stated.is()));
        return new Judgement(Verdict.WRONG, Optional.empty(), OptionalLong.empty(), judged, remarks, right);
    }

    /** Whether no numbers that the decimals stand for give the true value at some point. */
    private boolean isRefuted() {
        RationalForm loosened = Loosened.of(form);
        return POINTS.stream().filter(z -> !target.fraction().denominator().valueAt(z).isZero())
                .anyMatch(z -> !Spread.mayBe(loosened.valueAt(Quantity.of(z)), target.valueAt(z)));
    }

    /** Two fractions are the same when they agree at more points than the degree of their difference's numerator. */
    private Decision isExact() {
        int points = 1 + Math.max(form.numeratorDegree() + target.fraction().denominator().degree(),
                form.denominatorDegree() + target.fraction().numerator().degree());
        Decision all = Decision.YES;
        for (int z = 2; points > 0; z++) {
            Quantity point = Quantity.of(z);
            if (isPole(z)) {
                continue;
            }
            points--;
            Decision same = form.valueAt(point).minus(target.valueAt(Rational.of(z))).isZero();
            if (same == Decision.NO) {
                return same;
            }
            all = same == Decision.YES ? all : same;
        }
        return all;
    }

    private boolean isPole(int z) {
        return target.fraction().denominator().valueAt(Rational.of(z)).isZero()
                || form.summands().stream().flatMap(summand -> summand.factors().stream())
                .filter(factor -> factor.exponent() < 0).anyMatch(factor -> valueAt(factor, z).isZero() != Decision.NO);
    }

    private static Quantity valueAt(Factor factor, int z) {
        Quantity value = Quantity.ZERO;
        for (int power = factor.degree(); power >= 0; power--) {
            value = value.times(Quantity.of(z)).plus(factor.coefficients().get(power));
        }
        return value;
    }

    /** The eigenvalues that cancel in this output: an author who divides by det(zI − A) may have kept them. */
    private List<FormPole> uncancelled() {
        int degree = form.denominatorDegree();
        if (form.summands().size() != 1 || degree <= target.fraction().denominator().degree()) {
            return List.of();
        }
        Optional<Polynomial<Rational>> all = truth.characteristicPolynomial();
        return all.map(each -> each.dividedBy(about.y().denominator())).filter(each -> each.remainder().isZero())
                .map(each -> FormPole.allOf(each.quotient())).orElse(List.of());
    }

    private List<JudgedNumber> decimals() {
        return form.summands().stream().flatMap(summand -> Stream.concat(
                summand.front().decimals().stream(), summand.factors().stream()
                        .flatMap(factor -> Quantity.sum(factor.coefficients()).decimals().stream()))).distinct()
                .map(written -> new JudgedNumber(written, written.text(), Fit.RIGHT)).toList();
    }

    private List<String> remarks() {
        List<String> remarks = new ArrayList<>();
        if (stated.form() == Statement.TransformOf.Form.EXPANSION && !isExpanded()) {
            remarks.add("not a sum of partial fractions: some part has more than one pole or pair below its line");
        }
        return remarks;
    }

    /** Whether no summand has several factors below its line, powers of z apart, nor one of degree above two. */
    private boolean isExpanded() {
        return form.summands().stream().allMatch(summand -> {
            List<Factor> below = summand.factors().stream().filter(factor -> factor.exponent() < 0).toList();
            return below.size() <= 1 && below.stream().allMatch(factor -> factor.degree() <= 2);
        });
    }

    /** Factored, in fractions; in partial fractions where that is asked for and short. */
    private Formula rightFormula() {
        Formula.Symbol z = new Formula.Symbol(VARIABLE);
        Polynomial<Rational> numerator = target.fraction().numerator();
        Formula below = Formulas.factored(Factoring.of(target.fraction().denominator()), z);
        return numerator.isZero() ? Formulas.number(0)
                : Formulas.quotient(Formulas.factored(Factoring.of(numerator), z), below);
    }
}
