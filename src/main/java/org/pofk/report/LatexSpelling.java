package org.pofk.report;

import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.pofk.formula.Latex;
import org.pofk.formula.LatexText;

/**
 * Prose as LaTeX. Lines may be broken at blanks, and within what has none where it is long; formulas within a line that
 * are longer than a third of it are broken at their signs.
 */
final class LatexSpelling {
    private static final Pattern LONG = Pattern.compile("[^\\s~]{12,}");
    private static final Pattern RAISED =
            Pattern.compile("\\\\textasciicircum\\{}(\\\\ensuremath\\{-}|-)?([0-9]+|[A-Za-z])");
    private static final Pattern EQUATION = Pattern.compile("(?<![A-Za-z\\\\])([A-Za-z]) = (?=[0-9])");
    /** A word without parts is broken anywhere from this length on. */
    private static final int LONGEST_PLAIN = 20;
    private static final int LONGEST_FORMULA = 28;

    private LatexSpelling() {
    }

    static String of(Prose prose) {
        return prose.parts().stream().map(part -> part.accept(new Text())).collect(Collectors.joining());
    }

    /** In one line whatever its length. */
    static String unbroken(Prose prose) {
        return of(prose).replace("\\allowbreak{}", "");
    }

    /** What somebody typed: every blank is kept, and a line may be broken between any two characters. */
    static String typed(String text) {
        return text.codePoints().mapToObj(c -> c == ' ' ? "\\ " : LatexText.of(Character.toString(c)))
                .collect(Collectors.joining("\\allowbreak{}"));
    }

    static String words(String text) {
        return RAISED.matcher(EQUATION.matcher(LatexText.of(Typography.minus(text))).replaceAll("$1~=~")
                .replace(" \\%", "~\\%")).replaceAll(found ->
                Matcher.quoteReplacement("\\textsuperscript{" + (found.group(1) == null ? "" : "\\ensuremath{-}")
                        + (Character.isLetter(found.group(2).charAt(0)) ? "\\textit{" + found.group(2) + "}"
                                : found.group(2)) + "}"));
    }

    private static String breakable(String text) {
        return LONG.matcher(text).replaceAll(found -> Matcher.quoteReplacement(
                withBreaks(found.group())));
    }

    /** Places for breaks behind what parts words, or between any two characters where nothing does. */
    private static String withBreaks(String text) {
        String parted = text.replaceAll("(?<=\\\\_|[^{][-/:;]|[^{0-9][.,])(?=[^{}-])", "\\\\allowbreak{}");
        boolean isPlain = parted.equals(text) && text.matches("[^\\\\{}]*");
        if (!isPlain || text.length() < LONGEST_PLAIN) {
            return parted;
        }
        return text.codePoints().mapToObj(Character::toString).collect(Collectors.joining("\\allowbreak{}"));
    }

    private static final class Text implements Prose.Visitor<String> {
        @Override
        public String words(Prose.Words words) {
            return breakable(LatexSpelling.words(words.text()));
        }

        @Override
        public String name(Prose.Name name) {
            return breakable(LatexText.of(name.text()));
        }

        @Override
        public String mathematics(Prose.Mathematics mathematics) {
            List<String> lines = Latex.lines(mathematics.formula(), LONGEST_FORMULA);
            return "$" + String.join(" \\allowbreak ", lines) + "$";
        }
    }
}
