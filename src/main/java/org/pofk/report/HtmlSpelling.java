package org.pofk.report;

import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.pofk.formula.Formula;
import org.pofk.formula.MathMl;
import org.pofk.formula.MathMl.Piece;
import org.pofk.text.Xml;

/**
 * Prose as HTML. A long formula is several {@code math} elements, for no line is broken within one. A name is isolated,
 * so that one in a script that runs from the right leaves the words around it in their order.
 */
final class HtmlSpelling {
    /** Digits that fit beside the margins of a telephone held upright. */
    static final int NARROW = 30;
    private static final Pattern OF_A_VARIABLE = Pattern.compile("([A-Za-z]?)\\(([kz])\\)");

    private static final Pattern RAISED = Pattern.compile("\\^([−-]?[0-9]+|[A-Za-z])");

    private HtmlSpelling() {
    }

    static String of(Prose prose) {
        return prose.parts().stream().map(part -> part.accept(new Text())).collect(Collectors.joining());
    }

    /** Terms that follow each other, a line ending between them sooner than within one. */
    static String displayed(List<List<Piece>> terms) {
        return joined(terms.stream().map(pieces -> joined(pieces.stream().map(Piece::displayed).toList(), "piece"))
                .toList(), "term");
    }

    /** Blanks where a line may end; a span around each where there are several. */
    private static String joined(List<String> all, String kind) {
        return all.size() == 1 ? all.get(0) : all.stream()
                .map(each -> "<span class=\"" + kind + "\">" + each + "</span>").collect(Collectors.joining(" "));
    }

    /** Prose as mathematics: words upright, {@code Y(z)} as a function of a variable. */
    static String inMathematics(Prose prose) {
        return prose.parts().stream().map(part -> part.accept(new InMathematics())).collect(Collectors.joining());
    }

    private static final class Text implements Prose.Visitor<String> {
        @Override
        public String words(Prose.Words words) {
            return RAISED.matcher(Xml.escaped(Typography.of(words.text()).replace(" %", Spelling.NO_BREAK + "%")))
                    .replaceAll("<sup>$1</sup>");
        }

        @Override
        public String name(Prose.Name name) {
            return "<bdi>" + Xml.escaped(name.text()) + "</bdi>";
        }

        @Override
        public String mathematics(Prose.Mathematics mathematics) {
            return joined(MathMl.terms(mathematics.formula(), NARROW).stream().flatMap(List::stream)
                    .map(Piece::inLine).toList(), "piece");
        }
    }

    private static final class InMathematics implements Prose.Visitor<String> {
        @Override
        public String words(Prose.Words words) {
            Matcher function = OF_A_VARIABLE.matcher(words.text());
            return !function.matches() ? "<mi>" + Xml.escaped(words.text().replace(' ', Spelling.NO_BREAK)) + "</mi>"
                    : (function.group(1).isEmpty() ? "" : "<mi>" + function.group(1) + "</mi>")
                    + "<mo stretchy=\"false\">(</mo><mi>" + function.group(2)
                    + "</mi><mo stretchy=\"false\">)</mo>";
        }

        @Override
        public String name(Prose.Name name) {
            return MathMl.write(new Formula.Symbol(name.text())).elements();
        }

        @Override
        public String mathematics(Prose.Mathematics mathematics) {
            return MathMl.write(mathematics.formula()).elements();
        }
    }
}
