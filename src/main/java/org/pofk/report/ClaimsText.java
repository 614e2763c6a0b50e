package org.pofk.report;

import java.util.List;
import java.util.Optional;
import org.pofk.claim.Claim;
import org.pofk.claim.FormulaText;
import org.pofk.report.Document.Excerpt;
import org.pofk.text.Position;
import org.pofk.text.Span;

/** The text of a claims file, to show a place in it. */
public record ClaimsText(List<String> lines) {

    public ClaimsText {
        lines = List.copyOf(lines);
    }

    public static ClaimsText of(String text) {
        return new ClaimsText(text.lines().toList());
    }

    /**
     * The line in which something stands, with it marked: of the formula alone where a claim holds just one. A place
     * on several lines is marked to the end of its first.
     */
    Excerpt excerpt(Span place, Claim claim) {
        int number = place.start().line();
        String line = lines.get(number - 1);
        List<FormulaText> formulas = StatedFormulas.of(claim.statement());
        Optional<Span> formula = formulas.stream().limit(formulas.size() == 1 ? 1 : 0)
                .map(only -> only.parsed().span()).filter(span -> holds(span, place.start())).findFirst();
        int from = offset(line, number, place.start());
        int to = Math.max(from, offset(line, number, place.end()));
        int begin = Math.min(from, formula.map(span -> offset(line, number, span.start()))
                .filter(start -> start > 0).orElse(firstOfText(line)));
        int end = Math.max(to, formula.map(span -> offset(line, number, span.end()))
                .orElse(line.stripTrailing().length()));
        return new Excerpt(line.substring(begin, end), from - begin, to - begin);
    }

    private static boolean holds(Span span, Position place) {
        return span.start().compareTo(place) <= 0 && place.compareTo(span.end()) <= 0;
    }

    /** Behind the dash of a list's item. */
    private static int firstOfText(String line) {
        int start = line.length() - line.stripLeading().length();
        return line.startsWith("- ", start) ? start + 2 : start;
    }

    /** Where a place is in a line; its end for a place in a later line, its beginning for one in an earlier. */
    private static int offset(String line, int number, Position place) {
        if (place.line() != number) {
            return place.line() < number ? 0 : line.stripTrailing().length();
        }
        int column = Math.min(place.column() - 1, line.codePointCount(0, line.length()));
        return line.offsetByCodePoints(0, column);
    }
}
