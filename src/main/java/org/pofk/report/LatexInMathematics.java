package org.pofk.report;

import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.pofk.formula.Formula;
import org.pofk.formula.Latex;
import org.pofk.formula.LatexText;

/**
 * Prose as LaTeX mathematics: words upright, {@code P(T ≤ k)} and what compares within words as mathematics. Signs
 * stand beside {@code \text}, not in it, since converters know no {@code \ensuremath}.
 */
final class LatexInMathematics implements Prose.Visitor<String> {
    private static final String SIDE = "(?:[0-9]+|[A-Za-z](?:\\([kzjmn]\\))?)";
    /** Places around {@code 0 ≤ j ≤ 5} within words. */
    private static final Pattern COMPARED = Pattern.compile("(?<![\\p{L}\\p{N}])" + SIDE + "(?: [<>=≤≥] " + SIDE
            + ")+(?![\\p{L}\\p{N}.])");
    private static final Pattern WORD = Pattern.compile("\\p{L}{2}");
    private static final Pattern SIGN = Pattern.compile("\\\\ensuremath(\\{(?:[^{}]|\\{[^{}]*})*})");

    private LatexInMathematics() {
    }

    static String of(Prose prose) {
        return prose.parts().stream().map(part -> part.accept(new LatexInMathematics())).collect(Collectors.joining());
    }

    @Override
    public String words(Prose.Words words) {
        if (!WORD.matcher(words.text()).find()) {
            return signs(words.text());
        }
        StringBuilder all = new StringBuilder();
        int end = 0;
        for (var compared : COMPARED.matcher(words.text()).results().toList()) {
            all.append(text(words.text().substring(end, compared.start()))).append(signs(compared.group()));
            end = compared.end();
        }
        return all.append(text(words.text().substring(end))).toString();
    }

    @Override
    public String name(Prose.Name name) {
        return withSignsBeside(Latex.write(new Formula.Symbol(name.text())));
    }

    @Override
    public String mathematics(Prose.Mathematics mathematics) {
        return Latex.write(mathematics.formula());
    }

    /** Single letters, numbers and signs. */
    private static String signs(String text) {
        return SIGN.matcher(LatexText.of(text)).replaceAll("$1").replaceAll("\\{(\\\\[a-z]+)} ?", "$1 ")
                .replace(" | ", " \\mid ");
    }

    private static String text(String words) {
        return withSignsBeside("\\text{" + LatexSpelling.words(words) + "}").replace("\\text{}", "");
    }

    /** Every sign outside of the text around it. */
    private static String withSignsBeside(String latex) {
        return SIGN.matcher(latex).replaceAll("}$1\\\\text{").replace("\\text{}", "");
    }
}
