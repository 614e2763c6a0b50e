package org.pofk.cli;

import java.util.List;
import java.util.Locale;

/** How the values of an option are typed, and listed. */
final class Words {
    private Words() {
    }

    /** {@code RADIANS} is typed {@code radians}. */
    static String lowerCase(Enum<?> value) {
        return value.name().toLowerCase(Locale.ROOT);
    }

    /** {@code text, json and html}, with any word before the last. */
    static String listed(List<String> words, String beforeLast) {
        int last = words.size() - 1;
        return last < 1 ? String.join("", words)
                : String.join(", ", words.subList(0, last)) + " " + beforeLast + " " + words.get(last);
    }
}
