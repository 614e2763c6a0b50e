package org.pofk.claim;

import java.util.Optional;

/** The plus or minus that a number stands behind in a sum, which turns where the number becomes negative. */
record SignBefore(int at, char sign) {
    private static final String MINUS = "-\u2212";

    /** That before a stretch of a text; nothing where the number is a base or stands behind another sign. */
    static Optional<SignBefore> of(String text, int start, int end) {
        int at = before(text, start);
        int summand = at < 0 ? -1 : before(text, at);
        boolean isInSum = summand >= 0 && (MINUS + "+").indexOf(text.charAt(at)) >= 0
                && (Character.isLetterOrDigit(text.charAt(summand)) || ")}]".indexOf(text.charAt(summand)) >= 0);
        String behind = text.substring(end).strip();
        return isInSum && !behind.startsWith("^") && !behind.startsWith("!") && !behind.startsWith("**")
                ? Optional.of(new SignBefore(at, text.charAt(at))) : Optional.empty();
    }

    /** The last place before another that isn't blank, or −1. */
    private static int before(String text, int place) {
        int at = place - 1;
        while (at >= 0 && Character.isWhitespace(text.charAt(at))) {
            at--;
        }
        return at;
    }

    /** The other sign with the number's size, over the sign and the number. */
    AuthorText.Replacement turned(String text, int start, int end, String size) {
        String other = sign != '+' ? "+" : text.indexOf(MINUS.charAt(1)) >= 0 ? MINUS.substring(1) : "-";
        return new AuthorText.Replacement(at, end, other + text.substring(at + 1, start) + size);
    }
}
