package org.pofk.report;

import java.util.regex.Pattern;

/** Words of ours as they are set: with a minus sign proper before a number, and no line ending inside {@code k = 50}. */
final class Typography {
    private static final Pattern HYPHEN = Pattern.compile("(?<![\\p{L}\\p{N}.,)\\]_–−-])-(?=[0-9])");
    private static final Pattern EQUATION = Pattern.compile("(?<![\\p{L}\\p{N}])(\\p{L}) ([=≥≤≡]) (?=[0-9])");

    private Typography() {
    }

    static String of(String words) {
        return EQUATION.matcher(minus(words)).replaceAll("$1" + Spelling.NO_BREAK + "$2" + Spelling.NO_BREAK);
    }

    static String minus(String words) {
        return HYPHEN.matcher(words).replaceAll("−");
    }
}
