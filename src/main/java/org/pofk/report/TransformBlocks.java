package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Factorization.Irreducible;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;
import org.pofk.formula.PlainText;
import org.pofk.modes.ClosedForm;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Display;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Relation;
import org.pofk.report.Document.Table;
import org.pofk.transform.Transform;

/**
 * Where Y(z) comes from: D(z) Y(z) is a polynomial, for the recurrence makes all below z vanish, and its coefficient of
 * z^m is the sum of D_i y(i−m) over i ≥ m.
 */
final class TransformBlocks {
    private static final int TERMS_SHOWN_UP_TO = 12;
    private static final int WRITTEN_OUT_UP_TO = 6;
    private static final int NUMBER_SHOWN_UP_TO = 40;
    private static final int FACTOR_SHOWN_UP_TO = 60;

    private final Polynomial<Rational> recurrence;
    private final List<Rational> terms;

    private TransformBlocks(Transform transform) {
        this.recurrence = transform.recurrence();
        this.terms = OutputSequence.of(transform).first();
    }

    /** First terms, recurrence and numerator, as far as they can be read. */
    static List<Block> found(Transform transform) {
        TransformBlocks all = new TransformBlocks(transform);
        return all.terms.isEmpty() ? List.of() : all.blocks();
    }

    private List<Block> blocks() {
        int order = terms.size();
        String first = order == 1 ? "the first term" : "the first " + order + " terms";
        List<Block> blocks = new ArrayList<>(List.of(new Paragraph("No matrix in z is inverted for Y(z): " + first
                + " of the sequence, as the model steps them, and the shortest recurrence it obeys, D(z) with y(k+i) in"
                + " place of z^i, are enough. The product N(z) = D(z) Y(z) has no power below z, for what would stand there is the"
                + " recurrence at some k, which is zero.")));
        if (order > TERMS_SHOWN_UP_TO || longest() > NUMBER_SHOWN_UP_TO) {
            blocks.add(new Paragraph("Here D has the degree " + order + ", and its coefficients and terms are too many or"
                    + " too long to be read."));
            return blocks;
        }
        blocks.add(new Labelled(order == 1 ? "y(0)" : "y(0) … y(" + (order - 1) + ")",
                terms.stream().map(Rational::toString).collect(Collectors.joining(", "))));
        blocks.add(new Display(Prose.of("D(z)"), Relation.EQUAL, RationalFunction.inZ(recurrence)));
        if (order <= WRITTEN_OUT_UP_TO) {
            blocks.add(new Table(Prose.of("N(z), power by power"), List.of(Prose.of("of"), Prose.of("D times the terms"),
                    Prose.of("is")), IntStream.range(0, order).mapToObj(i -> row(order - i)).toList()));
        }
        return blocks;
    }

    private int longest() {
        return IntStream.range(0, terms.size()).map(i -> Math.max(terms.get(i).toString().length(),
                recurrence.coefficient(i).toString().length())).max().orElse(0);
    }

    /** The coefficient of z^power. */
    private List<Prose> row(int power) {
        Prose sum = Prose.EMPTY;
        Rational value = Rational.ZERO;
        for (int i = recurrence.degree(); i >= power; i--) {
            Rational factor = recurrence.coefficient(i);
            if (!factor.isZero()) {
                sum = sum.and(factor.signum() < 0 ? " − " : sum.isEmpty() ? "" : " + ").and(factor.abs().isOne()
                        ? Prose.EMPTY : Prose.formula(Formulas.number(factor.abs())).and("·"))
                        .and("y(" + (i - power) + ")");
                value = value.plus(factor.times(terms.get(i - power)));
            }
        }
        return List.of(Prose.formula(Formulas.power(RationalFunction.Z, Formulas.number(power))),
                sum, Prose.formula(Formulas.number(value)));
    }

    /** What can be read of a transform that can't: its factors, and where the rest is. */
    static List<Block> tooLong(ClosedForm form) {
        boolean isReduced = form.expansion().parts().stream().allMatch(JsonOutput::isReduced);
        return List.of(new Paragraph("Y(z) in lowest terms has a denominator of degree "
                + form.transform().y().denominator().degree() + " and coefficients of up to "
                + RationalFunction.longestCoefficient(form.transform().y()) + " characters, which can't be read; they are"
                + " in the result of derive as JSON. " + (isReduced ? "So are the coefficients R of the expansion, as"
                        + " polynomials in λ." : "A coefficient R of the expansion that is null there is the numerator of"
                        + " Y(z)/z over the derivative of its denominator, both at λ.")),
                new Table(Prose.of("Factors of the denominator"), List.of(Prose.of("factor"), Prose.of("degree"),
                        Prose.of("times"), Prose.of("irreducible over the rational numbers")),
                        form.transform().factors().factors().stream().map(TransformBlocks::factor).toList()));
    }

    private static List<Prose> factor(Factor<Rational> factor) {
        Formula written = RationalFunction.inZ(factor.polynomial());
        return List.of(PlainText.UNICODE.write(written).length() <= FACTOR_SHOWN_UP_TO ? Prose.formula(written)
                        : Prose.of("too long to be shown"),
                Prose.of(String.valueOf(factor.polynomial().degree())), Prose.of(String.valueOf(factor.multiplicity())),
                Prose.of(factor.irreducible() == Irreducible.PROVED ? "proved" : "not proved"));
    }
}
