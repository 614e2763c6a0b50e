package org.pofk.claim;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.claim.Judgement.JudgedNumber;
import org.pofk.formula.Formula;
import org.pofk.formula.ParsedFormula;
import org.pofk.meaning.Written;
import org.pofk.text.Span;

/** Formulas as their author wrote them, with right numbers in the places of wrong ones. */
final class RightText {
    private RightText() {
    }

    /** His own text where no decimal is another one; empty where places aren't found. */
    static Optional<String> of(FormulaText written, List<JudgedNumber> numbers) {
        Map<Written, String> decimals = new LinkedHashMap<>();
        numbers.stream().filter(number -> !number.right().equals(number.written().text()))
                .forEach(number -> decimals.put(number.written(), number.right()));
        return with(written, decimals);
    }

    /** The formula with these decimals in place of those that stand there; empty where their places aren't found. */
    static Optional<String> with(FormulaText written, Map<Written, String> decimals) {
        return decimals.isEmpty() ? Optional.of(written.text())
                : AuthorText.of(written).flatMap(text -> with(text, decimals));
    }

    private static Optional<String> with(AuthorText text, Map<Written, String> decimals) {
        Map<Span, ParsedFormula> places = new HashMap<>();
        text.tree().nodes().filter(node -> node.formula() instanceof Formula.WrittenDecimal)
                .forEach(node -> places.put(text.place(node), node));
        List<AuthorText.Replacement> replacements = new ArrayList<>();
        decimals.forEach((decimal, right) -> Optional.ofNullable(places.get(decimal.span())).ifPresent(node -> {
            // braces of LaTeX around it stay
            int before = Math.max(0, text.text(node).indexOf(decimal.text()));
            int start = AuthorText.start(node) + before;
            int end = before > 0 ? start + decimal.text().length() : AuthorText.end(node);
            replacements.add(SignBefore.of(text.text(), start, end).filter(sign -> right.startsWith("-"))
                    .map(sign -> sign.turned(text.text(), start, end, right.substring(1)))
                    .orElse(new AuthorText.Replacement(start, end,
                            right.startsWith("-") && start > 0 ? "(" + right + ")" : right)));
        }));
        return replacements.size() == decimals.size() ? text.with(replacements).map(FormulaText::text)
                : Optional.empty();
    }

    /** The decimal that a formula is and nothing else, but for a sign. */
    static boolean isSignedDecimal(Formula formula) {
        return formula instanceof Formula.WrittenDecimal
                || formula instanceof Formula.Negation negation && isSignedDecimal(negation.operand());
    }
}
