package org.pofk.formula;

import java.util.List;
import java.util.stream.Stream;
import org.pofk.text.Position;
import org.pofk.text.Span;

/**
 * A formula with the place of every part of it in the text it was read from.
 *
 * @param span  from its first character to its last, its own parentheses included
 * @param parts the operands in the order in which the formula holds them: terms, factors, numerator and denominator,
 *              base and exponent, arguments; so {@code parts.get(i).formula()} is the i-th operand of {@code formula}
 */
public record ParsedFormula(Formula formula, Span span, List<ParsedFormula> parts) {

    public ParsedFormula {
        parts = List.copyOf(parts);
    }

    /** Where it begins. */
    public Position position() {
        return span.start();
    }

    /** This formula and all its parts, each before its own parts. */
    public Stream<ParsedFormula> nodes() {
        return Stream.concat(Stream.of(this), parts.stream().flatMap(ParsedFormula::nodes));
    }

    /** The names used, in order of reading, each as often as it stands there. */
    public List<ParsedFormula> symbols() {
        return nodes().filter(node -> node.formula instanceof Formula.Symbol).toList();
    }
}
