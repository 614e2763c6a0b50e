package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.text.Columns;

/** Breaks text into lines at its blanks. A word longer than a line stays whole unless it has to be cut. */
final class Wrapping {

    private Wrapping() {
    }

    /** Lines of at most {@code width} columns each; at least one line; no-break spaces have become blanks. */
    static List<String> lines(String text, int width) {
        return fill(List.of(text.strip().split(" +")), width);
    }

    /** The same with words longer than a line cut at its end. */
    static List<String> cutLines(String text, int width) {
        List<String> words = new ArrayList<>();
        for (String word : text.strip().split(" +")) {
            String rest = word;
            while (Columns.width(rest) > width) {
                int end = fitting(rest, width);
                words.add(rest.substring(0, end));
                rest = rest.substring(end);
            }
            words.add(rest);
        }
        return fill(words, width);
    }

    /** The number of UTF-16 units from the start that fit, at least one character. */
    private static int fitting(String text, int width) {
        int end = text.offsetByCodePoints(0, 1);
        while (Columns.width(text.substring(0, text.offsetByCodePoints(end, 1))) <= width) {
            end = text.offsetByCodePoints(end, 1);
        }
        return end;
    }

    private static List<String> fill(List<String> words, int width) {
        List<String> lines = new ArrayList<>();
        StringBuilder line = new StringBuilder();
        int lineWidth = 0;
        for (String word : words) {
            int wordWidth = Columns.width(word);
            if (!line.isEmpty() && lineWidth + 1 + wordWidth > width) {
                lines.add(line.toString());
                line.setLength(0);
                lineWidth = 0;
            }
            lineWidth += wordWidth + (line.isEmpty() ? 0 : 1);
            line.append(line.isEmpty() ? "" : " ").append(word);
        }
        lines.add(line.toString());
        return lines.stream().map(each -> each.replace(Spelling.NO_BREAK, ' ')).toList();
    }
}
