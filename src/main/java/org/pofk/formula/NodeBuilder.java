package org.pofk.formula;

import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import org.pofk.text.RefusedException;
import org.pofk.text.Span;

/** Builds the nodes of one formula and refuses when there are too many of them, or too many above each other. */
final class NodeBuilder {
    private final Cursor cursor;
    /** The height of every tree built so far: a long chain of divisions nests without nesting its text. */
    private final Map<ParsedFormula, Integer> heights = new IdentityHashMap<>();
    private int depth;

    NodeBuilder(Cursor cursor) {
        this.cursor = cursor;
    }

    /** Goes one level further into the text; to be matched by {@link #leave}. */
    void enter() throws RefusedException {
        if (++depth > deepest()) {
            throw tooDeep();
        }
    }

    void leave() {
        depth--;
    }

    ParsedFormula leaf(Formula formula, Token token) throws RefusedException {
        return node(formula, List.of(), cursor.spanOf(token));
    }

    /** A node from its first part to its last. */
    ParsedFormula node(Formula formula, List<ParsedFormula> parts) throws RefusedException {
        return node(formula, parts, parts.get(0).span().to(parts.get(parts.size() - 1).span()));
    }

    ParsedFormula node(Formula formula, List<ParsedFormula> parts, Span span) throws RefusedException {
        int height = 1 + parts.stream().mapToInt(heights::get).max().orElse(0);
        if (height > deepest()) {
            throw tooDeep();
        }
        return kept(new ParsedFormula(formula, span, parts), height);
    }

    /** The same node with its parentheses. */
    ParsedFormula enclosed(ParsedFormula inner, Span span) throws RefusedException {
        return kept(new ParsedFormula(inner.formula(), span, inner.parts()), heights.get(inner));
    }

    private ParsedFormula kept(ParsedFormula node, int height) throws RefusedException {
        heights.put(node, height);
        if (heights.size() > FormulaParser.MOST_NODES) {
            throw cursor.refused(cursor.peek(), "formula-too-large",
                    "the formula has more than " + FormulaParser.MOST_NODES + " parts");
        }
        return node;
    }

    private int deepest() {
        return cursor.rules().limits().deepest();
    }

    private RefusedException tooDeep() {
        return cursor.refused(cursor.peek(), "formula-too-deep",
                "the formula is nested more than " + deepest() + " deep");
    }
}
