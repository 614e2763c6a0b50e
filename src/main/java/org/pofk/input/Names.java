package org.pofk.input;

import java.text.Normalizer;
import java.util.regex.Pattern;

/** Names of states, sets, outputs and parameters: text in Unicode NFC, trimmed, compared as text. */
final class Names {
    private static final Pattern SYMBOL = Pattern.compile("[\\p{L}_][\\p{L}\\p{M}\\p{Nd}_]*");

    private Names() {
    }

    /** The name in canonical form. */
    static String canonical(String text) {
        String stripped = text.strip();
        return isAscii(stripped) || Normalizer.isNormalized(stripped, Normalizer.Form.NFC) ? stripped
                : Normalizer.normalize(stripped, Normalizer.Form.NFC);
    }

    private static boolean isAscii(String text) {
        for (int i = 0; i < text.length(); i++) {
            if (text.charAt(i) > 0x7F) {
                return false;
            }
        }
        return true;
    }

    /** Letters, digits and underscores, no digit first: what may stand in an expression without quotes. */
    static boolean isSymbol(String name) {
        return SYMBOL.matcher(name).matches();
    }

    /** Holds something that can't be shown on one line: a control character, a line break, half a character. */
    static boolean isUnprintable(String name) {
        return name.codePoints().anyMatch(c -> Character.isISOControl(c)
                || Character.getType(c) == Character.LINE_SEPARATOR
                || Character.getType(c) == Character.PARAGRAPH_SEPARATOR
                || Character.getType(c) == Character.SURROGATE);
    }
}
