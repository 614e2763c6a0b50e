package org.pofk.report;

import java.nio.charset.StandardCharsets;
import org.pofk.text.Alphabet;
import org.pofk.text.Columns;

/**
 * How much room text takes, for fonts without serifs as wide as is usual: what is reckoned here is enough for most.
 * Widths are in thousandths of the size.
 */
final class TextWidth {
    private static final String NARROW = "ijl.,:;'|!()[]fIt ";
    private static final String WIDE = "mwMW%@—…";
    private static final Spelling SPELLING = new Spelling(Alphabet.UNICODE, StandardCharsets.UTF_8);
    /** How much wider bold letters are. */
    static final double BOLD = 1.12;
    private static final double ASCENT = 0.78;
    private static final double DESCENT = 0.22;

    private TextWidth() {
    }

    /** As it is set. */
    static String text(Prose prose) {
        return SPELLING.of(prose);
    }

    static double of(String text, int size) {
        return text.codePoints().map(TextWidth::of).sum() * size / 1000.0;
    }

    private static int of(int c) {
        String character = Character.toString(c);
        if (NARROW.contains(character) || c == Spelling.NO_BREAK) {
            return 350;
        }
        if (WIDE.contains(character)) {
            return 960;
        }
        int columns = Columns.width(character);
        return columns != 1 ? 520 * columns : Character.isUpperCase(c) ? 740 : 610;
    }

    /** Where a label's ink may be. */
    static Box box(Picture.Label label) {
        double width = of(text(label.text()), label.size()) * (label.setting() == Picture.Setting.BOLD ? BOLD : 1);
        double x = switch (label.anchor()) {
            case START -> label.at().x();
            case MIDDLE -> label.at().x() - width / 2;
            case END -> label.at().x() - width;
        };
        return new Box(x, label.at().y() - ASCENT * label.size(), width, (ASCENT + DESCENT) * label.size());
    }

    /** A name, cut off with an ellipsis where it is wider. */
    static String cut(String name, int size, double width) {
        if (of(name, size) <= width) {
            return name;
        }
        int[] characters = name.codePoints().toArray();
        int kept = characters.length;
        while (kept > 1 && of(new String(characters, 0, kept).stripTrailing() + "…", size) > width) {
            kept--;
        }
        return new String(characters, 0, kept).stripTrailing() + "…";
    }
}
