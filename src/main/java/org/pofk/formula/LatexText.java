package org.pofk.formula;

import java.text.Normalizer;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/**
 * Text as LaTeX sets it with T1 fonts: letters of Latin alphabets as they are, Greek letters and signs as mathematics,
 * what LaTeX would obey by command.
 */
public final class LatexText {
    private static final String T1_LETTERS = "ĂăĄąĆćČčĎďĚěĘęĞğĹĺĽľŁłŃńŇňŊŋŐőŔŕŘřŚśŠšŞşŤťŢţŰűŮůŸŹźŽžŻżĲĳİıŒœ";
    private static final Map<Integer, String> SIGNS = Map.ofEntries(
            sign('{', "\\{"), sign('}', "\\}"), sign('$', "\\$"), sign('&', "\\&"), sign('#', "\\#"), sign('%', "\\%"),
            sign('_', "\\_"), sign('\\', "\\textbackslash{}"), sign('^', "\\textasciicircum{}"),
            sign('~', "\\textasciitilde{}"), sign('`', "\\textasciigrave{}"), sign('\u00a0', "~"),
            sign('\u2009', "\\,"), sign('\u202f', "\\,"), sign('–', "--"), sign('—', "---"), sign('…', "\\ldots{}"),
            sign('“', "``"), sign('”', "''"), sign('„', "\\quotedblbase{}"), sign('‘', "\\textquoteleft{}"),
            sign('’', "'"), sign('«', "\\guillemotleft{}"), sign('»', "\\guillemotright{}"),
            sign('§', "\\S{}"), sign('€', "\\texteuro{}"), sign('£', "\\textsterling{}"), sign('©', "\\copyright{}"),
            mathematics('−', "-"), mathematics('·', "\\cdot"), mathematics('×', "\\times"), mathematics('÷', "\\div"),
            mathematics('√', "\\surd"), mathematics('°', "^{\\circ}"), mathematics('≤', "\\le"),
            mathematics('≥', "\\ge"), mathematics('≠', "\\ne"), mathematics('≈', "\\approx"),
            mathematics('≡', "\\equiv"), mathematics('±', "\\pm"), mathematics('∞', "\\infty"),
            mathematics('→', "\\to"), mathematics('←', "\\gets"), mathematics('↔', "\\leftrightarrow"),
            mathematics('•', "\\bullet"), mathematics('∈', "\\in"), mathematics('⟨', "\\langle"),
            mathematics('⟩', "\\rangle"), mathematics('∂', "\\partial"), mathematics('∑', "\\sum"),
            mathematics('∏', "\\prod"), mathematics('¬', "\\neg"), mathematics('✓', "\\surd"),
            mathematics('✗', "\\times"), mathematics('µ', "\\mu"), mathematics('½', "\\frac{1}{2}"),
            mathematics('¼', "\\frac{1}{4}"), mathematics('ᵀ', "^{\\mathrm{T}}"), mathematics('⁻', "^{-}"));
    private static final String RAISED = "⁰¹²³⁴⁵⁶⁷⁸⁹";
    private static final String LOWERED = "₀₁₂₃₄₅₆₇₈₉";

    /** Between signs that LaTeX would make another one of. */
    private static final Pattern JOINED = Pattern.compile("(?<=[-–—])(?=[-–—])|(?<=['’”])(?=['’”])|(?<=[!?])(?=“)"
            + "|(?<=,)(?=,)|(?<=<)(?=<)|(?<=>)(?=>)");

    private LatexText() {
    }

    private static Map.Entry<Integer, String> sign(char sign, String latex) {
        return Map.entry((int) sign, latex);
    }

    private static Map.Entry<Integer, String> mathematics(char sign, String latex) {
        return Map.entry((int) sign, "\\ensuremath{" + latex + "}");
    }

    /** The text, to stand outside mathematics or in {@code \text}; what can't be set stays as it is. */
    public static String of(String text) {
        return JOINED.splitAsStream(Normalizer.normalize(text, Normalizer.Form.NFC)).map(LatexText::signs)
                .collect(Collectors.joining("{}"))
                .replaceAll("([A-Za-z])\u0303", "\\\\~{$1}").replaceAll("([A-Za-z])\u0302", "\\\\^{$1}")
                .replaceAll("([A-Za-z])\u0304", "\\\\={$1}").replaceAll("([A-Za-z])\u0301", "\\\\'{$1}")
                .replaceAll("([A-Za-z])\u0308", "\\\\\"{$1}").replaceAll("([A-Za-z])\u030c", "\\\\v{$1}");
    }

    private static String signs(String text) {
        return text.codePoints().mapToObj(LatexText::of).collect(Collectors.joining());
    }

    private static String of(int c) {
        if (SIGNS.containsKey(c)) {
            return SIGNS.get(c);
        }
        if (LatexNames.isGreek(c)) {
            return "\\ensuremath{" + LatexNames.write(Character.toString(c)).replace("\\mathit{\\pi}", "\\pi") + "}";
        }
        if (RAISED.indexOf(c) >= 0) {
            return "\\ensuremath{^{" + RAISED.indexOf(c) + "}}";
        }
        return LOWERED.indexOf(c) >= 0 ? "\\ensuremath{_{" + LOWERED.indexOf(c) + "}}"
                : c == '\n' || c == '\t' ? " " : Character.toString(c);
    }

    /** The characters of a text that can't be set, each once, in order. */
    public static List<Integer> unsettable(String text) {
        return Normalizer.normalize(text, Normalizer.Form.NFC).codePoints()
                .filter(c -> of(c).equals(Character.toString(c)) && !isSet(c)).distinct().boxed().toList();
    }

    private static boolean isSet(int c) {
        return c >= ' ' && c < 0x7f || c >= 0xc0 && c <= 0xff || T1_LETTERS.indexOf(c) >= 0;
    }
}
