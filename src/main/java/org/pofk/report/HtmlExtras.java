package org.pofk.report;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import org.pofk.formula.Latex;
import org.pofk.formula.OpenFormula;
import org.pofk.formula.PlainText;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Display;
import org.pofk.report.Document.Relation;
import org.pofk.report.Document.Sequence;
import org.pofk.text.Alphabet;
import org.pofk.text.Xml;

/**
 * What the page's script works with: each formula as it is copied, and behind the formulas of a sequence a field for a
 * step, hidden where no script runs.
 */
final class HtmlExtras {
    /** Where a spreadsheet is to have the step. */
    private static final String CELL_OF_K = "A1";

    private final Document document;

    HtmlExtras(Document document) {
        this.document = document;
    }

    /** The formula as LaTeX with its left side, as text, and for a spreadsheet where it can be said there. */
    String attributes(Display display) {
        String left = display.left().isEmpty() ? "" : LatexInMathematics.of(display.left())
                + (display.relation() == Relation.EQUAL ? " = " : " \\approx ");
        Optional<String> sheet = OpenFormula.write(display.right(), CELL_OF_K);
        return attribute("latex", left + Latex.write(display.right()))
                + attribute("text", PlainText.ASCII.write(display.right()))
                + sheet.map(formula -> attribute("sheet", "=" + formula)).orElse("");
    }

    private static String attribute(String name, String value) {
        return " data-" + name + "=\"" + Xml.escaped(value) + "\"";
    }

    /** The fields of the sequences whose first formulas end at a block. */
    List<String> behind(int block) {
        return document.sequences().stream().filter(sequence -> place(sequence) == block)
                .flatMap(sequence -> StepData.of(sequence).map(data -> field(sequence, data)).stream()).toList();
    }

    /** The last of the formulas that stand together where the sequence has its first; -1 where it has none. */
    private int place(Sequence sequence) {
        List<Block> blocks = document.blocks();
        int place = 0;
        while (place < blocks.size() && !isOf(sequence, blocks.get(place))) {
            place++;
        }
        while (place < blocks.size() && isOf(sequence, blocks.get(place))) {
            place++;
        }
        return place == 0 || !isOf(sequence, blocks.get(place - 1)) ? -1 : place - 1;
    }

    private static boolean isOf(Sequence sequence, Block block) {
        return block instanceof Display display && display.left().equals(sequence.left());
    }

    private static String leftOf(Sequence sequence) {
        return new Spelling(Alphabet.UNICODE, StandardCharsets.UTF_8).of(sequence.left())
                .replace(Spelling.NO_BREAK, ' ');
    }

    private String field(Sequence sequence, StepData data) {
        String id = "step-" + (document.sequences().indexOf(sequence) + 1);
        return "<div class=\"step\" hidden=\"hidden\"" + data.attributes() + attribute("left", leftOf(sequence))
                + "><p><label for=\"" + id + "\">"
                + HtmlSpelling.of(sequence.left()) + " at step k =</label> <input id=\"" + id
                + "\" class=\"at\" type=\"text\" inputmode=\"numeric\" autocomplete=\"off\" maxlength=\"9\"/></p>"
                + "<p><label for=\"" + id + "-target\">or the first step at which it reaches</label> <input id=\"" + id
                + "-target\" class=\"target\" type=\"text\" autocomplete=\"off\" maxlength=\"40\"/></p>"
                + "<output for=\"" + id + " " + id + "-target\"></output></div>";
    }
}
