package org.pofk.formula;

import java.text.Normalizer;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;

/**
 * Characters that look like one of ASCII and are another: letters of other alphabets, full-width and mathematical
 * forms (those whose compatibility decomposition is one ASCII character, Unicode Standard Annex 15), signs.
 */
final class LookAlikes {
    private static final Map<Integer, Character> OF = new HashMap<>();

    static {
        pair("аеорсухіјѕԁһкАВЕКМНОРСТХУІЈЅ", "aeopcyxijsdhkABEKMHOPCTXYIJS");
        pair("οΑΒΕΖΗΙΚΜΝΟΡΤΥΧ", "oABEZHIKMNOPTYX");
        pair("∗∶‐‑‒—―﹘﹣−–∕⁄٫‚ʼ′＾ˆ", "*:-------" + "--" + "//" + ".,''^^");
    }

    private LookAlikes() {
    }

    private static void pair(String found, String meant) {
        for (int i = 0; i < found.length(); i++) {
            OF.put((int) found.charAt(i), meant.charAt(i));
        }
    }

    /** The ASCII character that was probably meant. */
    static Optional<Character> meant(int c) {
        if (c < 0x80 || "²³¹⁰⁴⁵⁶⁷⁸⁹".indexOf(c) >= 0) {
            return Optional.empty();
        }
        if (OF.containsKey(c)) {
            return Optional.of(OF.get(c));
        }
        String compatible = Normalizer.normalize(Character.toString(c), Normalizer.Form.NFKC);
        return compatible.length() == 1 && compatible.charAt(0) > ' ' && compatible.charAt(0) < 0x7f
                ? Optional.of(compatible.charAt(0)) : Optional.empty();
    }

    /** The first letter of a word that looks like one of ASCII where it stands alone or among letters of ASCII. */
    static OptionalInt disguised(String word) {
        boolean isMixed = word.codePointCount(0, word.length()) == 1
                || word.codePoints().anyMatch(c -> c < 0x80 && Character.isLetter(c));
        return isMixed ? word.codePoints().filter(c -> meant(c).isPresent()).findFirst() : OptionalInt.empty();
    }

    /** {@code 'а' (U+0430)}, or the number alone where nothing would be seen. */
    static String described(int c) {
        boolean isVisible = switch (Character.getType(c)) {
            case Character.CONTROL, Character.FORMAT, Character.SURROGATE, Character.UNASSIGNED,
                    Character.PRIVATE_USE, Character.SPACE_SEPARATOR -> false;
            default -> true;
        };
        String number = String.format("U+%04X", c);
        if (!isVisible) {
            return "the character " + number;
        }
        return "'" + Character.toString(c) + "'" + (meant(c).isPresent() ? " (" + number + ")" : "");
    }

    /** What to do about it, to end a message with; may be empty. */
    static String wayOut(int c) {
        if (Character.getType(c) == Character.FORMAT) {
            return ": it shows nothing and can be taken out";
        }
        return meant(c).map(ascii -> ": it only looks like " + ascii + ", write " + ascii).orElse("");
    }
}
