package org.pofk.input;

import java.util.List;
import java.util.Random;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;

/**
 * A text changed in one place.
 *
 * @param text   after the change
 * @param before the lines of the original that the change touched
 * @param first  first touched line of {@code text}, from 1
 * @param last   last touched line of {@code text}
 */
record Mutation(String text, String before, int first, int last) {
    private static final Pattern TOKEN = Pattern.compile("[\\p{L}\\p{N}_.%-]+|[^\\s\\p{L}\\p{N}]");
    private static final String SIGNS = "0123456789abcxyz.,:;/%+-*()[]{}'\"#&!|<>@`~ \t\n^_é😀";
    private static final List<String> WORDS = List.of("rest", "0", "1", "-1", "1/0", "0,5", "both", "run", "stays", "[", "}",
            "1e999", "note", "x-y", "&a ", "!!str ", "*a", "<<", "#", "---");

    static Mutation of(String original, Random random) {
        return switch (random.nextInt(5)) {
            case 0 -> character(original, random, "");
            case 1 -> between(original, random, sign(random));
            case 2 -> character(original, random, sign(random));
            case 3 -> token(original, random, "");
            default -> token(original, random, WORDS.get(random.nextInt(WORDS.size())));
        };
    }

    private static String sign(Random random) {
        int[] signs = SIGNS.codePoints().toArray();
        return Character.toString(signs[random.nextInt(signs.length)]);
    }

    private static Mutation between(String original, Random random, String inserted) {
        int at = random.nextInt(original.length());
        return replaced(original, at, at, inserted);
    }

    private static Mutation character(String original, Random random, String instead) {
        int at = random.nextInt(original.length());
        return replaced(original, at, at + 1, instead);
    }

    private static Mutation token(String original, Random random, String instead) {
        List<MatchResult> tokens = TOKEN.matcher(original).results().toList();
        MatchResult token = tokens.get(random.nextInt(tokens.size()));
        return replaced(original, token.start(), token.end(), instead);
    }

    private static Mutation replaced(String original, int start, int end, String instead) {
        String text = original.substring(0, start) + instead + original.substring(end);
        int firstLine = line(original, start);
        String before = lines(original, firstLine, line(original, end));
        return new Mutation(text, before, firstLine, line(text, start + instead.length()));
    }

    private static int line(String text, int offset) {
        return 1 + (int) text.substring(0, offset).chars().filter(c -> c == '\n').count();
    }

    private static String lines(String text, int first, int last) {
        return String.join("\n", text.lines().toList().subList(first - 1, Math.min(last, (int) text.lines().count())));
    }

    /** The touched lines, after the change. */
    String after() {
        return lines(text, first, last);
    }

    boolean touches(int line) {
        return line >= first && line <= last;
    }
}
