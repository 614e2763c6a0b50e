package org.pofk.text;

import java.util.stream.Collectors;

/** Text as the contents of an element, or of an attribute between double quotes, in XML and HTML alike. */
public final class Xml {
    private Xml() {
    }

    /** What XML may not hold, and what a screen would obey, is written {@code \\u{1b}}; blanks of any kind stay. */
    public static String escaped(String text) {
        return text.codePoints().mapToObj(Xml::escaped).collect(Collectors.joining());
    }

    private static String escaped(int c) {
        return switch (c) {
            case '&' -> "&amp;";
            case '<' -> "&lt;";
            case '>' -> "&gt;";
            case '"' -> "&quot;";
            case '\n', '\t' -> " ";
            default -> isShown(c) ? Character.toString(c) : String.format("\\u{%x}", c);
        };
    }

    private static boolean isShown(int c) {
        boolean isObeyed = Character.isISOControl(c) || c >= 0x202a && c <= 0x202e || c >= 0x2066 && c <= 0x2069
                || c == 0x2028 || c == 0x2029;
        boolean isCharacter = (c < 0xd800 || c > 0xdfff) && (c & 0xfffe) != 0xfffe;
        return isCharacter && !isObeyed;
    }
}
