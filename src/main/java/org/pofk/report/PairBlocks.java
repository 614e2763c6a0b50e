package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;
import org.pofk.formula.PlainText;
import org.pofk.modes.Derivation;
import org.pofk.modes.Derivation.PairStep;
import org.pofk.modes.RealValue;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Display;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Relation;

/** How the two terms of a conjugate pair of poles join to one that oscillates, step by step. */
final class PairBlocks {
    static final int WORKED_UP_TO = 6;
    private static final int EXACT_UP_TO = 60;
    private static final Prose BOTH = Prose.of("both terms");

    private final NumberFormula numbers;
    private final List<Block> blocks = new ArrayList<>();

    private PairBlocks(NumberFormula numbers) {
        this.numbers = numbers;
    }

    /** Nothing where all poles are real. */
    static List<Block> of(Derivation derivation, NumberFormula numbers) {
        List<PairStep> pairs = derivation.factors().stream().flatMap(step -> step.pairs().stream()).toList();
        PairBlocks all = new PairBlocks(numbers);
        pairs.stream().limit(WORKED_UP_TO).forEach(all::pair);
        if (pairs.size() > WORKED_UP_TO) {
            all.blocks.add(new Paragraph("The other " + (pairs.size() - WORKED_UP_TO) + " pairs of the table join in the"
                    + " same way."));
        }
        return all.blocks;
    }

    private void pair(PairStep pair) {
        blocks.add(new Paragraph(Prose.of(numbers.isRounded(pair.mode().modulus())
                || numbers.isRoundedAngle(pair.mode().angle()) ? "The pair λ " : "The pair λ = ").and(WayTables.pole(pair, numbers))
                .and(pair.mode().power() == 0 ? ":" : ", its fraction of power " + (pair.mode().power() + 1) + ":")));
        label("R", Prose.of(numbers.isRounded(pair.real()) || numbers.isRounded(pair.imaginary())
                ? NumberFormula.ROUNDED : "").andFormula(rectangular(pair.real(), pair.imaginary())));
        label("|R|", numbers.marked(pair.modulus()).and(", and twice that is ")
                .and(numbers.marked(pair.mode().amplitude())));
        label("arg R", argument(pair.argument()).and(", " + quadrant(sign(pair.real()), sign(pair.imaginary()))));
        blocks.add(pair.mode().accept(new ModeRounding(numbers)) ? rounded(pair)
                : new Display(BOTH, Relation.EQUAL, pair.mode().accept(new ModeTerm(numbers))));
    }

    /** An exact form that is longer than its decimals stands beside them. */
    private Prose argument(RealValue argument) {
        return argument.exact().filter(exact -> numbers.isRounded(argument) && isShort(exact))
                .map(exact -> Prose.formula(exact).and(" ")).orElse(Prose.EMPTY).and(numbers.markedAngle(argument));
    }

    /** The exact terms joined, where they are short and angles are in radians. */
    private Display rounded(PairStep pair) {
        return pair.joined().filter(exact -> isShort(exact) && numbers.style().angles() == Style.Angles.RADIANS)
                .map(exact -> new Display(BOTH, Relation.EQUAL, exact))
                .orElseGet(() -> new Display(BOTH, Relation.ROUNDED, pair.mode().accept(new ModeTerm(numbers))));
    }

    private static boolean isShort(Formula exact) {
        return PlainText.UNICODE.write(exact).length() <= EXACT_UP_TO;
    }

    private Formula rectangular(RealValue real, RealValue imaginary) {
        return Formulas.sum(List.of(numbers.of(real), Formulas.product(List.of(numbers.of(imaginary), Formula.Constant.I))));
    }

    /** Of what is certified; zero only where that is known. */
    private int sign(RealValue value) {
        return value.decimal(numbers.style().digits()).value().signum();
    }

    private static String quadrant(int real, int imaginary) {
        if (imaginary == 0) {
            return real < 0 ? "since R is real and negative" : "since R is real and positive";
        }
        String above = imaginary > 0 ? "above" : "below";
        return "since R lies " + above + " the real axis" + (real > 0 ? ", right of the imaginary axis"
                : real < 0 ? ", left of the imaginary axis" : ", on the imaginary axis");
    }

    private void label(String label, Prose text) {
        blocks.add(new Labelled(label, text));
    }
}
