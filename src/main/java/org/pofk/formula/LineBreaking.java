package org.pofk.formula;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import org.pofk.text.Columns;

/**
 * Breaks a formula's text before its signs, the outermost first: plus and minus outside all parentheses, then products
 * outside them, then plus and minus one parenthesis further in, and so on. Numbers and names are never broken, so a
 * line is longer than asked for where a single one of them is.
 */
final class LineBreaking {
    private static final int LAST_RANK = 9;
    private static final int STEP = 2;

    /** A place where a line may end; a small rank is to be preferred. */
    private record Break(int offset, int rank) {
    }

    private final String text;
    private final int room;
    private final List<Break> breaks;
    private final List<String> lines = new ArrayList<>();

    private LineBreaking(String text, int room) {
        this.text = text;
        this.room = room;
        this.breaks = breaks(text);
    }

    /** Lines of at most {@code width} columns, the first without the indent that it is to have room for. */
    static List<String> lines(String text, int width, int indent) {
        LineBreaking breaking = new LineBreaking(text, Math.max(1, width - indent));
        breaking.fill(0, text.length(), 0, 0);
        List<String> lines = new ArrayList<>();
        for (String line : breaking.lines) {
            lines.add(lines.isEmpty() ? line : " ".repeat(indent) + line);
        }
        return List.copyOf(lines);
    }

    private static List<Break> breaks(String text) {
        List<Break> breaks = new ArrayList<>();
        int parentheses = 0;
        boolean quoted = false;
        for (int i = 1; i < text.length(); i++) {
            char c = text.charAt(i);
            char before = text.charAt(i - 1);
            quoted ^= before == '\'';
            if (!quoted) {
                parentheses += "([{".indexOf(before) >= 0 ? 1 : ")]}".indexOf(before) >= 0 ? -1 : 0;
                if ("+-−".indexOf(c) >= 0 && before == ' ') {
                    breaks.add(new Break(i, 2 * parentheses));
                } else if ("·*".indexOf(c) >= 0 || c == '/' && before == ')'
                        || before == ' ' && text.charAt(i - 2) == ']') {
                    breaks.add(new Break(i, 2 * parentheses + 1));
                }
            }
        }
        return breaks;
    }

    /**
     * Adds the text between two offsets, broken at places of a rank, and of higher ranks only where it must be. What
     * goes on inside a term begins further in than the term.
     */
    private void fill(int from, int to, int rank, int indent) {
        if (rank > LAST_RANK || isShort(from, to, indent)) {
            lines.add(" ".repeat(indent) + text.substring(from, to).strip());
            return;
        }
        int lineStart = from;
        int lineEnd = from;
        int lineIndent = indent;
        for (int next : ends(from, to, rank)) {
            if (lineEnd > lineStart && !isShort(lineStart, next, lineIndent)) {
                fill(lineStart, lineEnd, rank + 1, lineIndent);
                lineStart = lineEnd;
                lineIndent = rank == 0 ? indent : indent + STEP;
            }
            lineEnd = next;
        }
        fill(lineStart, to, rank + 1, lineIndent);
    }

    /** Where the text between two offsets may be broken at a rank, and its end. */
    private List<Integer> ends(int from, int to, int rank) {
        int first = Collections.binarySearch(breaks, new Break(from + 1, 0), Comparator.comparing(Break::offset));
        List<Integer> ends = new ArrayList<>();
        for (int i = first < 0 ? -first - 1 : first; i < breaks.size() && breaks.get(i).offset < to; i++) {
            if (breaks.get(i).rank == rank) {
                ends.add(breaks.get(i).offset);
            }
        }
        ends.add(to);
        return ends;
    }

    private boolean isShort(int from, int to, int indent) {
        return to - from <= 2 * room && indent + Columns.width(text.substring(from, to).strip()) <= room;
    }
}
