package org.pofk.input;

import java.util.List;

/** Wording that messages share. */
final class Words {
    private static final int LONGEST_QUOTE = 60;

    private Words() {
    }

    /** At most sixty characters of a text from a file, on one line. */
    static String shortened(String text) {
        String line = text.replaceAll("\\s+", " ").strip();
        return line.codePointCount(0, line.length()) <= LONGEST_QUOTE ? line
                : line.substring(0, line.offsetByCodePoints(0, LONGEST_QUOTE)) + "…";
    }

    /** {@code 'a', 'b' and 'c'}. */
    static String quotedList(List<String> names) {
        List<String> quoted = names.stream().map(name -> "'" + name + "'").toList();
        return list(quoted, "and");
    }

    /** {@code a, b or c}. */
    static String choice(List<String> words) {
        return list(words, "or");
    }

    /** {@code a, b and c}. */
    static String list(List<String> words) {
        return list(words, "and");
    }

    private static String list(List<String> words, String last) {
        int n = words.size();
        return n == 1 ? words.get(0)
                : String.join(", ", words.subList(0, n - 1)) + " " + last + " " + words.get(n - 1);
    }

    /** {@code 1 row}, {@code 3 rows}. */
    static String count(int n, String one, String several) {
        return n + " " + (n == 1 ? one : several);
    }
}
