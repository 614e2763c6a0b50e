package org.pofk.report;

import java.util.List;
import org.pofk.text.Columns;

/** A line of text with a row of carets below a part of it. */
final class TextExcerpt {
    private TextExcerpt() {
    }

    /**
     * Two lines of at most {@code width} columns, unless the part alone is longer; {@code cut} stands where an end of
     * the line is left out.
     */
    static List<String> lines(String before, String part, String behind, int width, String cut) {
        int room = Math.max(0, width - Math.max(1, Columns.width(part)));
        boolean fits = Columns.width(before) + Columns.width(behind) <= room;
        int right = fits ? Integer.MAX_VALUE : Math.max(room / 2, room - Columns.width(before));
        String shownBehind = Columns.width(behind) <= right ? behind
                : head(behind, right - Columns.width(cut)) + cut;
        int left = fits ? Integer.MAX_VALUE : room - Columns.width(shownBehind);
        String shownBefore = Columns.width(before) <= left ? before
                : cut + tail(before, left - Columns.width(cut));
        return List.of(shownBefore + part + shownBehind,
                " ".repeat(Columns.width(shownBefore)) + "^".repeat(Math.max(1, Columns.width(part))));
    }

    private static String head(String text, int width) {
        int end = 0;
        while (end < text.length() && Columns.width(text.substring(0, text.offsetByCodePoints(end, 1))) <= width) {
            end = text.offsetByCodePoints(end, 1);
        }
        return text.substring(0, end);
    }

    private static String tail(String text, int width) {
        int start = text.length();
        while (start > 0 && Columns.width(text.substring(text.offsetByCodePoints(start, -1))) <= width) {
            start = text.offsetByCodePoints(start, -1);
        }
        return text.substring(start);
    }
}
