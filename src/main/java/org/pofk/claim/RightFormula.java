package org.pofk.claim;

import java.math.BigDecimal;
import java.util.Optional;
import java.util.stream.Stream;
import org.pofk.formula.Formula;
import org.pofk.formula.Latex;
import org.pofk.formula.ParsedFormula;
import org.pofk.formula.PlainText;
import org.pofk.modes.ClosedForm;

/** The right formula for a p(k), as its author would have written it. */
final class RightFormula {
    private static final int DIGITS = 6;
    private static final int MOST_DIGITS = 12;

    private RightFormula() {
    }

    /** His own with right decimals where these make it right, else ours. */
    static String of(FormulaText text, OutputTruth truth, ModeEquations modes, RightNumbers numbers) {
        return Optional.of(numbers.judged()).filter(judged -> modes.fits() && numbers.isMended())
                .flatMap(judged -> RightText.of(text, judged)).orElseGet(() -> ofTruth(text, truth));
    }

    /** The closed form: exact where he writes no decimals and it is short, else in decimals as precise as his. */
    static String ofTruth(FormulaText text, OutputTruth truth) {
        ClosedForm form = truth.closedForm();
        Formula exact = form.exactFormula().orElseGet(form::formulaOverRoots);
        Formula right = hasDecimals(text.parsed())
                ? form.decimalForm(digits(text.parsed())).formula().orElse(exact)
                : exact;
        return written(right, text);
    }

    /** A formula of ours in the author's notation. */
    static String written(Formula formula, FormulaText like) {
        if (like.notation() == FormulaText.Notation.LATEX) {
            return Latex.write(formula);
        }
        boolean isPlain = like.text().chars().allMatch(c -> c < 128);
        return (isPlain ? PlainText.ASCII : PlainText.UNICODE).write(formula);
    }

    private static boolean hasDecimals(ParsedFormula parsed) {
        return parsed.nodes().anyMatch(node -> node.formula() instanceof Formula.WrittenDecimal);
    }

    /** As many as the longest decimal has. */
    private static int digits(ParsedFormula parsed) {
        int most = parsed.nodes().flatMap(node -> node.formula() instanceof Formula.WrittenDecimal decimal
                ? Stream.of(new BigDecimal(decimal.text()).precision())
                : Stream.empty()).max(Integer::compare).orElse(DIGITS);
        return Math.min(MOST_DIGITS, Math.max(1, most));
    }
}
