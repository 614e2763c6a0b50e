package org.pofk.input;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.pofk.formula.Formula;
import org.pofk.formula.FormulaParser;
import org.pofk.formula.LinearForm;
import org.pofk.formula.ParsedFormula;
import org.pofk.formula.PlainText;
import org.pofk.text.Places;
import org.pofk.text.Position;
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
        List<ParsedFormula> numbers = parsed.nodes().filter(Expressions::isNumber).toList();
        Map<Position, Integer> offsets = numbers.isEmpty() ? Map.of() : offsets(text, places);
        boolean unambiguous = true;
        for (ParsedFormula number : numbers) {
            String written = written(number, text, offsets);
            if (names.contains(written)) {
                refuseDoubtful(number, written, reading);
                unambiguous = false;
            }
        }
        return unambiguous;
    }

    private static void refuseDoubtful(ParsedFormula number, String name, Reading reading) {
        reading.fault(number.position(), "state-or-number", "state or number? '" + name
                + "' is the name of a state; write \"'" + name + "'\" for the state"
                + (name.matches("[0-9]+") ? ", " + name + ".0 for the number" : "") + ", or a mapping such as {\""
                + name + "\": 1}");
    }

    private static boolean isNumber(ParsedFormula node) {
        return node.formula() instanceof Formula.Number || node.formula() instanceof Formula.WrittenDecimal;
    }

    private static Map<Position, Integer> offsets(String text, Places places) {
        Map<Position, Integer> offsets = new HashMap<>();
        for (int offset = 0; offset <= text.length(); offset++) {
            offsets.putIfAbsent(places.at(offset), offset);
        }
        return offsets;
    }

    /** The characters that the number was read from; in canonical form where places don't tell them apart. */
    private static String written(ParsedFormula number, String text, Map<Position, Integer> offsets) {
        int start = offsets.get(number.span().start());
        int end = offsets.get(number.span().end());
        return Names.canonical(end > start ? text.substring(start, end) : PlainText.ASCII.write(number.formula()));
    }
}
