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

    private HtmlSpelling() {
    }

    static String of(Prose prose) {
        return prose.parts().stream().map(part -> part.accept(new Text())).collect(Collectors.joining());
    }

    /** Pieces that follow each other, with blanks where a line may end. */
    static String displayed(List<Piece> pieces) {
        return pieces.stream().map(piece -> "<span class=\"piece\">" + piece.displayed() + "</span>")
                .collect(Collectors.joining(" "));
    }

    /** Prose as mathematics: words upright, {@code Y(z)} as a function of a variable. */
    static String inMathematics(Prose prose) {
        return prose.parts().stream().map(part -> part.accept(new InMathematics())).collect(Collectors.joining());
    }

    private static final class Text implements Prose.Visitor<String> {
        @Override
        public String words(Prose.Words words) {
            return Xml.escaped(words.text().replace(" %", Spelling.NO_BREAK + "%"));
        }

        @Override
        public String name(Prose.Name name) {
            return "<bdi>" + Xml.escaped(name.text()) + "</bdi>";
        }

        @Override
        public String mathematics(Prose.Mathematics mathematics) {
            List<Piece> pieces = MathMl.pieces(mathematics.formula(), NARROW);
            String whole = MathMl.write(mathematics.formula()).inLine();
            return pieces.size() == 1 ? whole : pieces.stream()
                    .map(piece -> "<span class=\"piece\">" + piece.inLine() + "</span>").collect(Collectors.joining(" "));
        }
    }

    private static final class InMathematics implements Prose.Visitor<String> {
        @Override
        public String words(Prose.Words words) {
            Matcher function = OF_A_VARIABLE.matcher(words.text());
            return !function.matches() ? "<mtext>" + Xml.escaped(words.text()).replace(' ', Spelling.NO_BREAK) + "</mtext>"
                    : (function.group(1).isEmpty() ? "" : "<mi>" + function.group(1) + "</mi>")
                    + "<mrow><mo>(</mo><mi>" + function.group(2) + "</mi><mo>)</mo></mrow>";
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
