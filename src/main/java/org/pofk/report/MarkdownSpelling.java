package org.pofk.report;

import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.pofk.formula.Latex;

/**
 * Prose as Markdown with HTML in it, formulas between dollar signs. Whatever Markdown, HTML or the setter of formulas
 * would obey in a name stands as a character reference, the delimiters of formulas in an element of their own.
 */
final class MarkdownSpelling {
    private static final String OBEYED_BY_MARKDOWN = "`*_{}[]<>#|&~+=!";
    private static final String DELIMITERS = "$\\";
    private static final Pattern RAISED = Pattern.compile("\\^([−-]?(?:[0-9]+|[A-Za-z]))");
    private static final Pattern NUMBERED = Pattern.compile("^(\\d+)([.)])");
    private static final Pattern SETTABLE = Pattern.compile("[\\p{L}\\p{N} .,:;()/'+=-]+");

    private MarkdownSpelling() {
    }

    static String of(Prose prose) {
        return prose.parts().stream().map(part -> part.accept(new Text())).collect(Collectors.joining());
    }

    /** Whether every name in it can stand within mathematics. */
    static boolean isSettable(Prose prose) {
        return prose.parts().stream().allMatch(part ->
                !(part instanceof Prose.Name name) || SETTABLE.matcher(name.text()).matches());
    }

    /** Prose within mathematics, its names such as {@link #isSettable} accepts. */
    static String inMathematics(Prose prose) {
        return prose.parts().stream().map(part -> part.accept(new InMathematics())).collect(Collectors.joining());
    }

    /** A text as it is. */
    static String name(String text) {
        String escaped = text.codePoints().mapToObj(MarkdownSpelling::escaped).collect(Collectors.joining());
        return (escaped.startsWith("-") ? "&#45;" + escaped.substring(1)
                : NUMBERED.matcher(escaped).replaceFirst(found -> found.group(1) + reference(found.group(2).charAt(0))));
    }

    private static String escaped(int c) {
        boolean isUnseen = Character.isISOControl(c) && !Character.isWhitespace(c) || c >= 0x202a && c <= 0x202e
                || c >= 0x2066 && c <= 0x2069 || c == 0x2028 || c == 0x2029;
        return isUnseen ? String.format("u+%04x", c)
                : Character.isISOControl(c) ? " "
                : DELIMITERS.indexOf(c) >= 0 ? "<span>" + reference(c) + "</span>"
                : OBEYED_BY_MARKDOWN.indexOf(c) >= 0 ? reference(c) : Character.toString(c);
    }

    private static String reference(int c) {
        return "&#" + c + ";";
    }

    private static final class Text implements Prose.Visitor<String> {
        @Override
        public String words(Prose.Words words) {
            String escaped = words.text().codePoints().mapToObj(c -> c == '+' || c == '=' || c == '!'
                    ? Character.toString(c) : escaped(c)).collect(Collectors.joining());
            return RAISED.matcher(escaped).replaceAll("<sup>$1</sup>");
        }

        @Override
        public String name(Prose.Name name) {
            return MarkdownSpelling.name(name.text());
        }

        @Override
        public String mathematics(Prose.Mathematics mathematics) {
            return "$" + Latex.write(mathematics.formula()) + "$";
        }
    }

    private static final class InMathematics implements Prose.Visitor<String> {
        @Override
        public String words(Prose.Words words) {
            return words.text().matches("[A-Za-z]?\\([kz]\\)") ? words.text()
                    : "\\text{" + words.text() + "}";
        }

        @Override
        public String name(Prose.Name name) {
            return "\\text{" + name.text() + "}";
        }

        @Override
        public String mathematics(Prose.Mathematics mathematics) {
            return Latex.write(mathematics.formula());
        }
    }
}
