package org.pofk.input;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.pofk.formula.Formula;
import org.pofk.formula.FormulaParser;
import org.pofk.formula.LinearForm;
import org.pofk.formula.ParsedFormula;
import org.pofk.text.Places;
import org.pofk.text.RefusedException;

/** Expressions in a model file: parsed and evaluated at their place in it. */
final class Expressions {
    private Expressions() {
    }

    /** Whether a text must be read as an expression: a plain number need not. */
    static boolean isExpression(String text) {
        return !Numerals.isMeantAsNumeral(text);
    }

    /** The expression, or faults and nothing; a bare number that is also a name is a fault. */
    static Optional<ParsedFormula> parse(Node.Scalar scalar, Set<String> names, Reading reading) {
        Places places = scalar.places();
        try {
            ParsedFormula parsed = FormulaParser.parse(scalar.text(), places, names);
            return isUnambiguous(parsed, scalar.text(), places, names, reading) ? Optional.of(parsed)
                    : Optional.empty();
        } catch (RefusedException refused) {
            reading.faults().addAll(refused.faults());
            return Optional.empty();
        }
    }

    /** The names used, in order of reading. */
    static List<String> symbols(ParsedFormula parsed) {
        return parsed.symbols().stream().map(Expressions::name).toList();
    }

    /** The name that a symbol stands for. */
    static String name(ParsedFormula symbol) {
        return ((Formula.Symbol) symbol.formula()).name();
    }

    static Optional<LinearForm> evaluate(ParsedFormula parsed, Map<String, LinearForm> names, Reading reading) {
        try {
            return Optional.of(LinearForm.evaluate(parsed, names));
        } catch (RefusedException refused) {
            reading.faults().addAll(refused.faults());
            return Optional.empty();
        }
    }

    private static boolean isUnambiguous(ParsedFormula parsed, String text, Places places, Set<String> names,
            Reading reading) {
        if (names.stream().noneMatch(Numerals::isNumeral)) {
            return true;
        }
        List<ParsedFormula> doubtful = parsed.nodes()
                .filter(node -> isNumber(node) && names.contains(written(node, text, places))).toList();
        for (ParsedFormula number : doubtful) {
            String name = written(number, text, places);
            reading.fault(number.position(), "state-or-number", "state or number? '" + name
                    + "' is the name of a state; write \"'" + name + "'\" for the state"
                    + (name.matches("[0-9]+") ? ", " + name + ".0 for the number" : "") + ", or a mapping such as {\""
                    + name + "\": 1}");
        }
        return doubtful.isEmpty();
    }

    private static boolean isNumber(ParsedFormula node) {
        return node.formula() instanceof Formula.Number || node.formula() instanceof Formula.WrittenDecimal;
    }

    /** The characters of {@code text} that the node was read from; all of it where places don't tell them apart. */
    private static String written(ParsedFormula node, String text, Places places) {
        int start = 0;
        while (start < text.length() && !places.at(start).equals(node.span().start())) {
            start++;
        }
        int end = start;
        while (end < text.length() && !places.at(end).equals(node.span().end())) {
            end++;
        }
        return Names.canonical(text.substring(start, end));
    }
}
