package org.pofk.claim;

import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import org.pofk.formula.Formula;
import org.pofk.formula.FormulaParser;
import org.pofk.formula.ParsedFormula;
import org.pofk.meaning.Written;
import org.pofk.text.Places;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;
import org.pofk.text.Span;

/** Formulas as their author wrote them, with right numbers in the places of wrong ones. */
final class RightText {
    private static final String ALONE = "text";

    private RightText() {
    }

    /** The formula with these decimals in place of those that stand there; empty where their places aren't found. */
    static Optional<String> with(FormulaText written, Map<Written, String> decimals) {
        Optional<ParsedFormula> alone = alone(written);
        if (alone.isEmpty()) {
            return Optional.empty();
        }
        Map<Span, ParsedFormula> places = new HashMap<>();
        pair(written.parsed(), alone.get(), places);
        TreeMap<Integer, Replacement> replacements = new TreeMap<>();
        decimals.forEach((decimal, text) -> Optional.ofNullable(places.get(decimal.span())).ifPresent(node ->
                replacements.put(start(node), new Replacement(start(node), end(node), text))));
        StringBuilder edited = new StringBuilder(written.text());
        replacements.descendingMap().values().forEach(each -> edited.replace(each.start, each.end,
                each.text.startsWith("-") && each.start > 0 ? "(" + each.text + ")" : each.text));
        return replacements.size() == decimals.size() ? Optional.of(edited.toString()) : Optional.empty();
    }

    /** What stands there instead of the UTF-16 units from start to end. */
    private record Replacement(int start, int end, String text) {
    }

    /** The decimal that a formula is and nothing else, but for a sign. */
    static boolean isSignedDecimal(Formula formula) {
        return formula instanceof Formula.WrittenDecimal
                || formula instanceof Formula.Negation negation && isSignedDecimal(negation.operand());
    }

    /** The same formula read from its text alone, so that its places are offsets; empty where it reads otherwise. */
    private static Optional<ParsedFormula> alone(FormulaText written) {
        Places offsets = offset -> new Position(ALONE, 1, offset + 1);
        try {
            return Optional.of(FormulaParser.parse(written.text(), offsets, Set.of()))
                    .filter(parsed -> parsed.formula().equals(written.parsed().formula()));
        } catch (RefusedException unreadable) {
            return Optional.empty();
        }
    }

    private static void pair(ParsedFormula placed, ParsedFormula alone, Map<Span, ParsedFormula> places) {
        if (placed.formula() instanceof Formula.WrittenDecimal) {
            places.put(placed.span(), alone);
        }
        for (int i = 0; i < placed.parts().size(); i++) {
            pair(placed.parts().get(i), alone.parts().get(i), places);
        }
    }

    private static int start(ParsedFormula node) {
        return node.span().start().column() - 1;
    }

    private static int end(ParsedFormula node) {
        return node.span().end().column() - 1;
    }
}
