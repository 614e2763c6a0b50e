package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.answer.DerivedOutput;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.PlainText;
import org.pofk.longrun.HighPowers;
import org.pofk.longrun.LongRunChecks;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.DecimalForm;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Display;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Relation;
import org.pofk.transform.RecurrenceProof;
import org.pofk.transform.Transform;

/** What was found about one output: the formula, from where on it holds and why, the long run, how it was checked. */
final class ResultBlocks {
    private static final int ERROR_DIGITS = 2;
    /** A formula above this is no longer read by anybody. */
    private static final int EXACT_SHOWN_UP_TO = 1200;

    /** A coefficient and its power of z must fit in a line of eighty columns. */
    private static final int COEFFICIENT_SHOWN_UP_TO = 50;

    private final DerivedOutput output;
    private final Prose left;
    private final Style style;
    private final String states;
    private final List<Block> blocks = new ArrayList<>();

    private ResultBlocks(DerivedOutput output, Prose left, Style style) {
        this(output, left, style, "states");
    }

    private ResultBlocks(DerivedOutput output, Prose left, Style style, String states) {
        this.output = output;
        this.left = left;
        this.style = style;
        this.states = states;
    }

    static List<Block> of(DerivedOutput output, Style style) {
        ResultBlocks result = new ResultBlocks(output, OutputProse.atStep(output.output()), style);
        result.write(new Heading(2, OutputProse.title(output.output())));
        return result.blocks;
    }

    /** The same under another heading, with what the formula is called. */
    static List<Block> of(DerivedOutput output, Heading heading, Prose left, Style style) {
        ResultBlocks result = new ResultBlocks(output, left, style);
        result.write(heading);
        return result.blocks;
    }

    private void write(Heading heading) {
        blocks.add(heading);
        output.closedForm().ifPresent(this::formulas);
        output.transform().ifPresent(this::holds);
        output.longRun().ifPresent(this::longRun);
        output.absent().ifPresent(found -> blocks.add(new Labelled("eigenvalues", AbsentProse.of(found))));
        output.comparison().ifPresent(comparison -> label("checked", CheckProse.of(comparison)));
        output.secondOpinion().ifPresent(opinion -> label("second opinion", CheckProse.of(opinion)));
        if (!output.isDecided()) {
            undecided();
        }
    }

    private void label(String label, String text) {
        blocks.add(new Labelled(label, text));
    }

    /** The formulas alone. */
    static List<Block> formulas(DerivedOutput output, Style style) {
        return formulas(output, OutputProse.atStep(output.output()), style);
    }

    /** The formula in decimals alone, with what it promises. */
    static List<Block> decimals(DerivedOutput output, Style style) {
        ResultBlocks result = new ResultBlocks(output, OutputProse.atStep(output.output()), style);
        output.closedForm().ifPresent(form -> result.decimals(form.decimalForm(style.digits())));
        return result.blocks;
    }

    /** The formulas alone, with what they are called. */
    static List<Block> formulas(DerivedOutput output, Prose left, Style style) {
        ResultBlocks result = new ResultBlocks(output, left, style);
        output.closedForm().ifPresent(result::formulas);
        return result.blocks;
    }

    /**
     * The formulas, from where on they hold and why.
     *
     * @param states what the components are of the state vector whose output it is
     */
    static List<Block> proved(DerivedOutput output, Prose left, String states, Style style) {
        ResultBlocks result = new ResultBlocks(output, left, style, states);
        output.closedForm().ifPresent(result::formulas);
        output.transform().ifPresent(result::holds);
        return result.blocks;
    }

    private void formulas(ClosedForm form) {
        DecimalForm decimals = form.decimalForm(style.digits());
        Formula exact = form.exactFormula().orElseGet(form::formulaOverRoots);
        boolean isSame = decimals.formula().equals(Optional.of(exact));
        if (!isSame && decimals.formula().isPresent()) {
            blocks.add(new Display(left,
                    isExact(decimals) ? Relation.EQUAL : Relation.ROUNDED, decimals.formula().get()));
        }
        int length = PlainText.UNICODE.write(exact).length();
        if (length <= EXACT_SHOWN_UP_TO || decimals.formula().isEmpty()) {
            blocks.add(new Display(left, Relation.EQUAL, exact));
        } else {
            label("exact", "over the roots of the denominator's factors; with " + length
                    + " characters too long to be shown, its parts are in the result as JSON");
        }
        if (style.angles() == Style.Angles.DEGREES) {
            AnglesProse.of(form, style).ifPresent(angles -> blocks.add(new Labelled("in degrees", angles)));
        }
        if (!isSame && !isExact(decimals)) {
            label("decimals", promise(decimals) + tooSmall(decimals));
        }
    }

    /** Values among those listed of which the decimals leave less than a digit. */
    private String tooSmall(DecimalForm decimals) {
        Rational bound = decimals.errorBound().times(Rational.of(10));
        boolean isLost = decimals.formula().isPresent() && output.values().stream()
                .map(value -> CourseChart.near(value).abs()).anyMatch(near -> !near.isZero()
                        && near.compareTo(bound) < 0);
        return isLost ? "; take values below " + Decimals.of(bound, ERROR_DIGITS).text()
                + " from the exact formula or from --at" : "";
    }

    private void decimals(DecimalForm decimals) {
        decimals.formula().ifPresent(formula -> blocks.add(new Display(left,
                isExact(decimals) ? Relation.EQUAL : Relation.ROUNDED, formula)));
        label("decimals", promise(decimals) + tooSmall(decimals));
        label("exact", "too long for this page; it stands below");
    }

    private static boolean isExact(DecimalForm decimals) {
        return decimals.formula().isPresent() && decimals.errorBound().isZero() && decimals.upTo().isEmpty();
    }

    private static String promise(DecimalForm decimals) {
        String reason = decimals.reason().map(why -> "; " + why).orElse("");
        if (decimals.formula().isEmpty()) {
            return "none" + reason;
        }
        return "certified within " + Decimals.of(decimals.errorBound(), ERROR_DIGITS).text()
                + decimals.upTo().map(last -> " for every k up to " + last).orElse(" for every k")
                + ", computed as printed" + reason;
    }

    private void holds(Transform transform) {
        RecurrenceProof proof = transform.proof();
        int order = transform.recurrence().degree();
        if (proof.order() == 0) {
            label("holds", "for every k ≥ 0: nothing that the start reaches takes part");
            return;
        }
        String from = "for every k ≥ 0" + output.closedForm().filter(form -> form.withoutImpulsesFrom() > 0)
                .map(form -> ", without the delta terms from k = " + form.withoutImpulsesFrom() + " on").orElse("");
        label("holds", from + ": " + switch (proof.method()) {
            case CHARACTERISTIC -> "the sequence needs a recurrence of order " + order + ", and "
                    + states(proof.order()) + ", so it is their characteristic polynomial (Cayley–Hamilton); " + terms(proof.comparedSteps())
                    + " compared";
            case WINDOWS -> (proof.comparedSteps() == 1 ? "the one exact term compared "
                    : "all " + terms(proof.comparedSteps()) + " compared ")
                    + RecurrenceProse.satisfied(proof.comparedSteps(), order) + ", and " + states(proof.order())
                            + " (Cayley–Hamilton)";
            case VECTOR -> "a recurrence of order " + order + " of the matrix takes the start itself to zero, and so"
                    + " every output";
        });
    }

    private static String terms(int count) {
        return count == 1 ? "1 exact term" : count + " exact terms";
    }

    private String states(int count) {
        return count == 1 ? "one state takes part" : count + " " + states + " take part";
    }

    private void longRun(LongRunChecks checks) {
        LongRunProse prose = new LongRunProse(style.digits());
        label("long run", prose.of(checks.byPoles()));
        checks.highPowers().stream().flatMap(verdict -> verdict.habits().stream())
                .filter(stop -> stop.outcome() != HighPowers.Outcome.RIGHT).findFirst()
                .ifPresent(stop -> label("beware", LongRunWarning.of(stop, style.digits())));
    }

    private void undecided() {
        if (output.transform().isEmpty()) {
            label("not decided", "within the budget; nothing about this output is proven yet");
            return;
        }
        Transform transform = output.transform().get();
        int longest = RationalFunction.longestCoefficient(transform.y());
        if (longest <= COEFFICIENT_SHOWN_UP_TO) {
            blocks.add(new Display(Prose.of("Y(z)"), Relation.EQUAL, RationalFunction.inZ(transform.y())));
            label("not decided", "within the budget; the transform Y(z) above is proven");
        } else {
            label("not decided", "within the budget; the transform Y(z) is proven, but its coefficients have up to "
                    + longest + " characters, too long to be shown; they are in the result as JSON");
        }
    }
}
