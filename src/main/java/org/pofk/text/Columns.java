package org.pofk.text;

/**
 * How many columns of a screen a text takes: two for a letter of the East Asian wide scripts, none for a mark that is
 * set on the letter before it, one for all else. The wide ranges are those of Unicode Standard Annex 11 in blocks
 * (from memory; single narrow characters inside a wide block aren't told apart).
 */
public final class Columns {

    private Columns() {
    }

    public static int width(CharSequence text) {
        return text.codePoints().map(Columns::width).sum();
    }

    private static int width(int codePoint) {
        return switch (Character.getType(codePoint)) {
            case Character.NON_SPACING_MARK, Character.ENCLOSING_MARK, Character.FORMAT, Character.CONTROL -> 0;
            default -> isWide(codePoint) ? 2 : 1;
        };
    }

    private static boolean isWide(int c) {
        return c >= 0x1100 && (c <= 0x115f
                || c >= 0x2e80 && c <= 0x303e
                || c >= 0x3041 && c <= 0xa4cf
                || c >= 0xac00 && c <= 0xd7a3
                || c >= 0xf900 && c <= 0xfaff
                || c >= 0xfe30 && c <= 0xfe6f
                || c >= 0xff01 && c <= 0xff60
                || c >= 0xffe0 && c <= 0xffe6
                || c >= 0x1f300 && c <= 0x1f64f
                || c >= 0x1f900 && c <= 0x1f9ff
                || c >= 0x20000 && c <= 0x3fffd);
    }

    /** The text with blanks behind it up to the width given. */
    public static String left(String text, int width) {
        return text + " ".repeat(Math.max(0, width - width(text)));
    }

    /** The text with blanks before it up to the width given. */
    public static String right(String text, int width) {
        return " ".repeat(Math.max(0, width - width(text))) + text;
    }
}
