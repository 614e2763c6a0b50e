package org.pofk.claim;

import java.util.Comparator;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.pofk.formula.Formula;
import org.pofk.formula.FormulaParser;
import org.pofk.formula.FormulaReading;
import org.pofk.formula.FormulaReading.ImaginaryUnit;
import org.pofk.formula.FormulaReading.PlusMinus;
import org.pofk.formula.FormulaReading.Subject;
import org.pofk.formula.LatexReader;
import org.pofk.formula.ParsedFormula;
import org.pofk.text.Places;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;
import org.pofk.text.Span;

/**
 * A formula as its author wrote it, to be edited where its parts stand: what isn't touched keeps his notation. Offsets
 * are UTF-16 units of the text; every part is known by its node in {@link #tree}, which is read from the text alone,
 * and by its place in the file.
 */
public final class AuthorText {
    private static final String ALONE = "text";
    private static final List<FormulaReading> READINGS = readings();

    private final FormulaText written;
    private final ParsedFormula tree;
    private final FormulaReading reading;
    private final Map<ParsedFormula, ParsedFormula> inFile = new IdentityHashMap<>();

    /** A stretch of the text and what stands there instead. */
    public record Replacement(int start, int end, String text) {
    }

    private AuthorText(FormulaText written, ParsedFormula tree, FormulaReading reading) {
        this.written = written;
        this.tree = tree;
        this.reading = reading;
        pair(tree, written.parsed());
    }

    /** Nothing where the text alone isn't read as it was in its file. */
    public static Optional<AuthorText> of(FormulaText written) {
        for (FormulaReading reading : READINGS) {
            Optional<ParsedFormula> alone = parsed(written.text(), written.notation(), reading)
                    .filter(tree -> tree.formula().equals(written.parsed().formula()));
            if (alone.isPresent()) {
                return Optional.of(new AuthorText(written, bare(written.text(), alone.get()), reading));
            }
        }
        return Optional.empty();
    }

    /** With every single number without the parentheses it stands in alone, so that it is what is replaced. */
    private static ParsedFormula bare(String text, ParsedFormula node) {
        if (!node.parts().isEmpty()) {
            return new ParsedFormula(node.formula(), node.span(),
                    node.parts().stream().map(part -> bare(text, part)).toList());
        }
        int start = start(node);
        int end = end(node);
        boolean number = node.formula() instanceof Formula.WrittenDecimal || node.formula() instanceof Formula.Number;
        while (number && text.charAt(start) == '(' && text.charAt(end - 1) == ')') {
            start++;
            end--;
        }
        return new ParsedFormula(node.formula(), new Span(new Position(ALONE, 1, start + 1),
                new Position(ALONE, 1, end + 1)), List.of());
    }

    /** How a text of a claim may have been read: its file says what it is, this only that it was so read. */
    private static List<FormulaReading> readings() {
        return Stream.of(Subject.values()).flatMap(subject -> Stream.of(PlusMinus.values()).flatMap(sign ->
                Stream.of(ImaginaryUnit.values()).map(unit -> FormulaReading.of(subject).with(sign).with(unit))))
                .toList();
    }

    private void pair(ParsedFormula alone, ParsedFormula placed) {
        inFile.put(alone, placed);
        for (int i = 0; i < alone.parts().size(); i++) {
            pair(alone.parts().get(i), placed.parts().get(i));
        }
    }

    public FormulaText.Notation notation() {
        return written.notation();
    }

    public String text() {
        return written.text();
    }

    /** The whole formula; its spans are columns of the text alone. */
    public ParsedFormula tree() {
        return tree;
    }

    public static int start(ParsedFormula node) {
        return node.span().start().column() - 1;
    }

    public static int end(ParsedFormula node) {
        return node.span().end().column() - 1;
    }

    public String text(ParsedFormula node) {
        return text().substring(start(node), end(node));
    }

    /** The place in the file of a node, or of one put together from some. */
    public Span place(ParsedFormula node) {
        return inFile.containsKey(node) ? inFile.get(node).span()
                : place(node.parts().get(0)).to(place(node.parts().get(node.parts().size() - 1)));
    }

    public Span place() {
        return written.parsed().span();
    }

    /** The last character before an offset that isn't blank, or −1. */
    public int before(int offset) {
        int at = offset - 1;
        while (at >= 0 && Character.isWhitespace(text().charAt(at))) {
            at--;
        }
        return at;
    }

    /** The text with other stretches in place of some, which don't overlap; nothing where that is no formula. */
    public Optional<FormulaText> with(List<Replacement> replacements) {
        return read(replaced(text(), 0, replacements));
    }

    /** The text of one part with the replacements in it. */
    public String edited(ParsedFormula node, List<Replacement> replacements) {
        return replaced(text(node), start(node), replacements);
    }

    /** From the last to the first, so that offsets stay; what is put in before a stretch comes after its replacement. */
    private static String replaced(String text, int offset, List<Replacement> replacements) {
        StringBuilder edited = new StringBuilder(text);
        replacements.stream().sorted(Comparator.comparingInt(Replacement::start).thenComparingInt(Replacement::end)
                .reversed()).forEach(each ->
                edited.replace(each.start() - offset, each.end() - offset, each.text()));
        return edited.toString();
    }

    /** Another text in the same notation. */
    public Optional<FormulaText> read(String text) {
        return parsed(text, notation(), reading).map(parsed -> new FormulaText(text, notation(), parsed));
    }

    private static Optional<ParsedFormula> parsed(String text, FormulaText.Notation notation,
            FormulaReading reading) {
        Places alone = offset -> new Position(ALONE, 1, offset + 1);
        try {
            return Optional.of(notation == FormulaText.Notation.LATEX ? LatexReader.parse(text, alone, reading)
                    : FormulaParser.parse(text, alone, Set.of(), reading));
        } catch (RefusedException refused) {
            return Optional.empty();
        }
    }

    /** Whether a name stands anywhere in a part. */
    public static boolean varies(ParsedFormula node) {
        return node.formula() instanceof Formula.Symbol || node.parts().stream().anyMatch(AuthorText::varies);
    }
}
