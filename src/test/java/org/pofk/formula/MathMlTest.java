package org.pofk.formula;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.StringReader;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import javax.xml.parsers.DocumentBuilderFactory;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.EdgeCasesMode;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import org.junit.jupiter.api.Test;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula.Number;
import org.pofk.formula.Formula.Power;
import org.pofk.formula.Formula.Product;
import org.pofk.formula.Formula.RootSum;
import org.pofk.formula.Formula.Sum;
import org.pofk.formula.Formula.Symbol;
import org.w3c.dom.Element;
import org.w3c.dom.Node;
import org.xml.sax.InputSource;

class MathMlTest {
    private static final Formula K = new Symbol("k");

    /** The elements turned into LaTeX one by one, which brackets there are among them. */
    private static String latex(Node node) {
        List<Node> parts = IntStream.range(0, node.getChildNodes().getLength())
                .mapToObj(node.getChildNodes()::item).toList();
        String text = node.getTextContent();
        return switch (node.getNodeName()) {
            case "mn" -> text;
            case "mi" -> ((Element) node).hasAttribute("mathvariant") ? "\\mathrm{i}"
                    : isApplied(node) ? "\\" + text : LatexNames.write(text.replace('\u00a0', ' '));
            case "mo" -> switch (text) {
                case "−" -> "-";
                case "·" -> "\\cdot";
                case "°" -> "^{\\circ}";
                case "≥" -> "\\ge";
                case "≤" -> "\\le";
                case "∑" -> "\\sum";
                case "{", "\u2061", "\u2062" -> "";
                default -> text;
            };
            case "mfrac" -> (((Element) node).hasAttribute("linethickness") ? "\\binom{" : "\\frac{")
                    + latex(parts.get(0)) + "}{" + latex(parts.get(1)) + "}";
            case "msup" -> latex(parts.get(0)) + "^{" + latex(parts.get(1)) + "}";
            case "munder" -> latex(parts.get(0)) + "_{" + latex(parts.get(1)) + "}";
            case "msqrt" -> "\\sqrt{" + all(parts) + "}";
            case "mtable" -> "\\begin{cases}" + parts.stream().map(row -> latex(row.getFirstChild()) + "&"
                    + latex(row.getLastChild())).collect(Collectors.joining("\\\\")) + "\\end{cases}";
            case "mrow", "mtd" -> parts.size() == 3 && parts.get(1) instanceof Element fraction
                    && fraction.hasAttribute("linethickness") ? latex(fraction) : all(parts);
            default -> throw new AssertionError(node.getNodeName());
        };
    }

    private static boolean isApplied(Node node) {
        return node.getNextSibling() != null && node.getNextSibling().getTextContent().equals("\u2061");
    }

    private static String all(List<Node> parts) {
        return parts.stream().map(MathMlTest::latex).collect(Collectors.joining());
    }

    private static Element parsed(String xml) {
        try {
            return DocumentBuilderFactory.newInstance().newDocumentBuilder()
                    .parse(new InputSource(new StringReader(xml))).getDocumentElement();
        } catch (Exception notWellFormed) {
            throw new AssertionError(xml, notWellFormed);
        }
    }

    private static String bare(String latex) {
        return latex.replaceAll("\\\\left|\\\\right|\\\\,|[\\s\u00a0]", "").replace("\\mathit{\\pi}", "\\pi");
    }

    @Provide
    private Arbitrary<Formula> trees() {
        return FormulaTrees.upTo(4);
    }

    /** LaTeX is held against what it prints elsewhere; so MathML means what the tree means. */
    @Property(tries = 2000, edgeCases = EdgeCasesMode.NONE, seed = "20261201")
    void saysWhatLatexSaysWithTheSameBrackets(@ForAll("trees") Formula tree) {
        assertEquals(bare(Latex.write(tree)), bare(latex(parsed("<mrow>" + MathMl.write(tree).elements() + "</mrow>"))));
    }

    @Property(tries = 500, edgeCases = EdgeCasesMode.NONE, seed = "20261202")
    void piecesAreWellFormedWhateverTheWidth(@ForAll("trees") Formula tree) {
        for (int width : List.of(1, 12, 30)) {
            MathMl.terms(tree, width).stream().flatMap(List::stream).forEach(piece -> {
                assertEquals("math", parsed(piece.displayed()).getNodeName());
                assertFalse(piece.latex().isEmpty());
            });
        }
    }

    @Test
    void negativeBaseStandsInParentheses() {
        assertEquals("(-2)^{k}", bare(latex(parsed(MathMl.write(new Power(new Number(Rational.of(-2)), K)).elements()))));
    }

    @Test
    void sumOverRootsNamesThePolynomialBelowItsSign() {
        Formula sum = new RootSum(new Symbol("λ"), new Sum(List.of(new Power(new Symbol("λ"), new Number(Rational.of(3))),
                new Number(Rational.ONE))), new Power(new Symbol("λ"), K));
        assertEquals(bare(Latex.write(sum)), bare(latex(parsed("<mrow>" + MathMl.write(sum).elements() + "</mrow>"))));
    }

    @Test
    void aTermWiderThanALineIsSeveralPieces() {
        Formula wide = new Product(List.of(new Sum(List.of(new Number(Rational.parse("1234567890123456789")),
                new Number(Rational.parse("9876543210987654321")), K)), new Power(new Symbol("rest"), K)));
        assertTrue(MathMl.terms(wide, 20).get(0).size() > 2);
        assertEquals(1, MathMl.terms(wide, 90).get(0).size());
    }

    @Test
    void signsOfXmlInNamesAreEscaped() {
        assertEquals("a<b & \"c\"", parsed(MathMl.write(new Symbol("a<b & \"c\"")).inLine())
                .getElementsByTagName("mi").item(0).getTextContent().replace('\u00a0', ' '));
    }
}
