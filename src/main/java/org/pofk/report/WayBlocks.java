package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.answer.DerivedOutput;
import org.pofk.exact.Factorization;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.Derivation;
import org.pofk.modes.Derivation.FactorStep;
import org.pofk.modes.TablePair;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Display;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Relation;

/** The way of one output from Y(z) to the closed form. */
final class WayBlocks {
    private static final Prose Y = Prose.of("Y(z)");
    private static final int WRITTEN_OUT_UP_TO = 40;
    private static final int READABLE_DEGREE = 12;
    private static final int READABLE_COEFFICIENT = 40;

    private final DerivedOutput output;
    private final ClosedForm form;
    private final NumberFormula numbers;
    private final List<Block> blocks = new ArrayList<>();

    private WayBlocks(DerivedOutput output, ClosedForm form, Style style) {
        this.output = output;
        this.form = form;
        this.numbers = new NumberFormula(style);
    }

    static List<Block> of(DerivedOutput output, Style style) {
        if (output.closedForm().isEmpty()) {
            return List.of();
        }
        WayBlocks way = new WayBlocks(output, output.closedForm().get(), style);
        way.write();
        return way.blocks;
    }

    /** With the formula at its end, for a reader who has not seen it before. */
    static List<Block> withClosedForm(DerivedOutput output, Style style) {
        List<Block> blocks = new ArrayList<>(of(output, style));
        blocks.addAll(ResultBlocks.formulas(output, style));
        return blocks;
    }

    private void write() {
        blocks.add(new Heading(2, Prose.of("From Y(z) to ").and(OutputProse.atStep(output.output()))));
        transform();
        Derivation derivation = form.derivation();
        if (form.transform().y().denominator().degree() <= WRITTEN_OUT_UP_TO) {
            expansion(derivation);
        }
        blocks.addAll(new WayTables(derivation, numbers).inFull());
        output.poleCheck().ifPresent(check -> blocks.add(new Paragraph(PoleProse.of(check))));
    }

    /**
     * The same worked: the pair of the table named with each term, conjugate pairs joined step by step, and the closed
     * form at the end. The comparison with eigenvalues is left to the checks.
     */
    static List<Block> worked(DerivedOutput output, Style style) {
        if (output.closedForm().isEmpty()) {
            return List.of();
        }
        WayBlocks way = new WayBlocks(output, output.closedForm().get(), style);
        way.writeWorked();
        way.blocks.add(new Paragraph("Together, exact and in decimals:"));
        way.blocks.addAll(ResultBlocks.formulas(output, style));
        return way.blocks;
    }

    /** What is done in the same way for every output. */
    static List<Block> rule(List<DerivedOutput> outputs) {
        if (outputs.stream().allMatch(output -> output.closedForm().isEmpty())) {
            return List.of();
        }
        List<Block> rule = new ArrayList<>(List.of(new Heading(2, "From Y(z) to a formula in k"), new Paragraph("Y(z)/z"
                + " is split into fractions over the poles λ of Y(z). Multiplied by the z that was kept outside, each of"
                + " them is a line of the table of transforms, and stands for a term in k.")));
        if (outputs.stream().flatMap(output -> output.closedForm().stream())
                .anyMatch(form -> form.derivation().factors().stream().anyMatch(step -> !step.pairs().isEmpty()))) {
            rule.add(new Paragraph("A complex pole λ comes with its conjugate, and the coefficient there is the"
                    + " conjugate of its own, R. So the two terms are conjugates of each other, and join to twice the"
                    + " real part of one: 2|R| |λ|^k cos(k arg λ + arg R), where the sign of arg R is that of the imaginary part of R."));
        }
        return rule;
    }

    private void writeWorked() {
        blocks.add(new Heading(3, OutputProse.atStep(output.output())));
        Derivation derivation = form.derivation();
        int longest = RationalFunction.longestCoefficient(form.transform().y());
        int degree = form.transform().y().denominator().degree();
        blocks.addAll(TransformBlocks.found(form.transform()));
        if (degree <= READABLE_DEGREE && longest <= READABLE_COEFFICIENT) {
            transform();
            split(derivation);
        } else {
            blocks.addAll(TransformBlocks.tooLong(form));
        }
        blocks.addAll(new WayTables(derivation, numbers).numbered());
        blocks.addAll(PairBlocks.of(derivation, numbers));
    }

    private void transform() {
        Formula y = RationalFunction.inZ(form.transform().y());
        Factorization<Rational> factors = form.transform().factors();
        if (form.transform().y().denominator().degree() > WRITTEN_OUT_UP_TO) {
            blocks.add(new Paragraph("Y(z) in lowest terms has a denominator of degree "
                    + form.transform().y().denominator().degree() + "; its coefficients are in the result as JSON."));
            return;
        }
        blocks.add(new Display(Y, Relation.EQUAL, y));
        if (!form.transform().y().denominator().isConstant()) {
            blocks.add(new Display(Prose.of("denominator"), Relation.EQUAL,
                    Formulas.factored(factors, RationalFunction.Z)));
        }
        boolean proved = factors.factors().stream()
                .allMatch(factor -> factor.irreducible() == Factorization.Irreducible.PROVED);
        blocks.add(new Paragraph(proved ? "No factor can be split further over the rational numbers; that is proved."
                : "That the factors can't be split further isn't proved; nothing below depends on it."));
    }

    /** Y(z)/z = impulses/z + Σ R/(z − λ)^(p+1), exact. */
    private void split(Derivation derivation) {
        List<Formula> terms = new ArrayList<>();
        for (int at = 0; at < form.expansion().impulses().size(); at++) {
            Rational value = form.expansion().impulses().get(at);
            if (!value.isZero()) {
                terms.add(Formulas.quotient(Formulas.number(value),
                        Formulas.power(RationalFunction.Z, Formulas.number(at + 1L))));
            }
        }
        derivation.factors().forEach(step -> terms.add(fraction(step)));
        blocks.add(new Display(Prose.of("Y(z)/z"), Relation.EQUAL, Formulas.sum(terms)));
    }

    /** Y(z) = impulses + z · Σ R/(z − λ)^(p+1), exact. */
    private void expansion(Derivation derivation) {
        List<Formula> fractions = new ArrayList<>();
        derivation.factors().forEach(step -> fractions.add(fraction(step)));
        List<Formula> terms = new ArrayList<>();
        for (int at = 0; at < form.expansion().impulses().size(); at++) {
            Rational value = form.expansion().impulses().get(at);
            if (!value.isZero()) {
                terms.add(at == 0 ? Formulas.number(value) : Formulas.product(List.of(Formulas.number(value),
                        Formulas.power(RationalFunction.Z, Formulas.number(Rational.of(-at))))));
            }
        }
        if (!fractions.isEmpty()) {
            terms.add(Formulas.product(List.of(RationalFunction.Z, Formulas.sum(fractions))));
        }
        blocks.add(new Display(Y, Relation.EQUAL, Formulas.sum(terms)));
    }

    private Formula fraction(FactorStep step) {
        Polynomial<Rational> factor = form.transform().factors().factors().get(step.factor()).polynomial();
        boolean isLinear = factor.degree() == 1;
        Formula pole = isLinear ? Formulas.number(factor.coefficient(0).negate()) : TablePair.LAMBDA;
        List<Formula> fractions = new ArrayList<>();
        for (int power = 0; power < step.coefficients().size(); power++) {
            Formula coefficient = step.coefficients().get(power);
            if (!Formulas.isZero(coefficient)) {
                fractions.add(Formulas.quotient(coefficient, Formulas.power(
                        Formulas.sum(List.of(RationalFunction.Z, Formulas.negated(pole))),
                        Formulas.number(power + 1L))));
            }
        }
        return isLinear ? Formulas.sum(fractions)
                : new Formula.RootSum(TablePair.LAMBDA, Formulas.polynomial(factor, TablePair.LAMBDA),
                        Formulas.sum(fractions));
    }
}
