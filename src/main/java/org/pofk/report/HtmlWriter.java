package org.pofk.report;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.pofk.formula.MathMl;
import org.pofk.formula.MathMl.Piece;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Display;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Relation;
import org.pofk.text.Alphabet;
import org.pofk.text.Xml;

/**
 * Writes a document as a web page in one file: mathematics as MathML, no network, readable without its script, which
 * only adds fields to read values off and buttons that copy formulas. The same bytes every run.
 */
public final class HtmlWriter {
    /** Sections from which on a list of them is given. */
    private static final int LISTED_FROM = 4;

    private final Document document;
    private final HtmlExtras extras;
    private final List<String> lines = new ArrayList<>();
    private final List<String> contents = new ArrayList<>();
    private int level;
    private int tables;
    private boolean isSectionOpen;

    private HtmlWriter(Document document) {
        this.document = document;
        this.extras = new HtmlExtras(document);
    }

    /** The whole page. */
    public static String write(Document document) {
        HtmlWriter writer = new HtmlWriter(document);
        writer.writeBlocks();
        return HtmlPage.of(writer.title(), String.join("\n", writer.lines));
    }

    private String title() {
        Spelling spelling = new Spelling(Alphabet.UNICODE, StandardCharsets.UTF_8);
        return document.blocks().stream().filter(block -> block instanceof Heading heading && heading.level() == 1)
                .map(block -> spelling.of(((Heading) block).text())).map(Xml::escaped).findFirst().orElse("pofk");
    }

    private void writeBlocks() {
        List<Block> blocks = document.blocks();
        for (int i = 0; i < blocks.size(); i++) {
            if (blocks.get(i) instanceof Labelled && !Document.isListed(blocks, i)) {
                lines.add("<dl class=\"facts\">");
            }
            List<String> html = blocks.get(i).accept(new Blocks());
            lines.addAll(document.isChanged(i) ? changed(html) : html);
            if (blocks.get(i) instanceof Labelled && !Document.isListed(blocks, i + 1)) {
                lines.add("</dl>");
            }
            lines.addAll(extras.behind(i));
        }
        closeSection();
        if (contents.size() >= LISTED_FROM) {
            lines.add(firstSection(), "<nav aria-label=\"Sections\"><ul>" + String.join("", contents) + "</ul></nav>");
        }
    }

    /** With a rule in the margin for the eye and a word for the ear; a label in its list keeps its place there. */
    private static List<String> changed(List<String> html) {
        String word = "<span class=\"unseen\">Changed: </span>";
        if (html.get(0).startsWith("<dt>")) {
            return List.of("<dt class=\"changed\">" + word + html.get(0).substring("<dt>".length()));
        }
        List<String> changed = new ArrayList<>(List.of("<div class=\"changed\">" + word));
        changed.addAll(html);
        changed.add("</div>");
        return changed;
    }

    private int firstSection() {
        return (int) lines.stream().takeWhile(line -> !line.startsWith("<section")).count();
    }

    private void closeSection() {
        if (isSectionOpen) {
            lines.add("</section>");
            isSectionOpen = false;
        }
    }

    private final class Blocks implements Document.Visitor<List<String>> {
        /** Levels are entered one by one, whatever the document's; each of the second begins a section. */
        @Override
        public List<String> heading(Heading heading) {
            level = Math.min(heading.level(), level + 1);
            String text = HtmlSpelling.of(heading.text());
            if (level > 2) {
                return List.of("<h" + level + ">" + text + "</h" + level + ">");
            }
            closeSection();
            if (level == 1) {
                return List.of("<h1>" + text + "</h1>");
            }
            isSectionOpen = true;
            String id = "section-" + (contents.size() + 1);
            contents.add("<li><a href=\"#" + id + "\">" + text + "</a></li>");
            return List.of("<section aria-labelledby=\"" + id + "\">", "<h2 id=\"" + id + "\">" + text + "</h2>");
        }

        @Override
        public List<String> paragraph(Document.Paragraph paragraph) {
            boolean isCaution = Caution.isOne(paragraph);
            if (isCaution) {
                closeSection();
            }
            return List.of((isCaution ? "<p class=\"caution\">" : "<p>") + HtmlSpelling.of(paragraph.text()) + "</p>");
        }

        @Override
        public List<String> labelled(Labelled labelled) {
            return List.of("<dt>" + HtmlSpelling.of(labelled.label()) + "</dt><dd>"
                    + HtmlSpelling.of(labelled.text()) + "</dd>");
        }

        @Override
        public List<String> items(Document.Items items) {
            return List.of(items.items().stream().map(item -> "<li>" + HtmlSpelling.of(item) + "</li>")
                    .collect(Collectors.joining("\n", "<ul>\n", "\n</ul>")));
        }

        /** What stands left and its relation, then a piece a term; the script finds the whole in the attributes. */
        @Override
        public List<String> display(Display display) {
            List<List<Piece>> pieces = new ArrayList<>();
            if (!display.left().isEmpty()) {
                boolean isExact = display.relation() == Relation.EQUAL;
                pieces.add(List.of(new Piece(HtmlSpelling.inMathematics(display.left()) + "<mo form=\"infix\">"
                        + (isExact ? "=" : "≈") + "</mo>",
                        LatexInMathematics.of(display.left()) + (isExact ? " =" : " \\approx"))));
            }
            pieces.addAll(MathMl.terms(display.right(), HtmlSpelling.NARROW));
            List<String> html = new ArrayList<>(List.of("<div class=\"display\"" + extras.attributes(display) + ">",
                    "<p class=\"formula\">" + HtmlSpelling.displayed(pieces) + "</p>"));
            if (!display.condition().isEmpty()) {
                html.add("<p class=\"condition\">" + HtmlSpelling.of(display.condition()) + "</p>");
            }
            html.add("</div>");
            return html;
        }

        @Override
        public List<String> figure(Document.Figure figure) {
            return List.of("<figure><div class=\"wide\" role=\"group\" aria-label=\"Figure\" tabindex=\"0\">"
                    + SvgChart.part(figure.chart()) + "</div><figcaption>" + HtmlSpelling.of(figure.caption())
                    + "</figcaption></figure>");
        }

        @Override
        public List<String> table(Document.Table table) {
            tables++;
            return List.of(HtmlTable.of(table, "table-" + tables));
        }

        /** The line with its part marked; where something is missing a caret stands. */
        @Override
        public List<String> excerpt(Document.Excerpt excerpt) {
            String part = excerpt.line().substring(excerpt.from(), excerpt.to());
            return List.of("<pre class=\"excerpt\"><code>" + Xml.escaped(excerpt.line().substring(0, excerpt.from()))
                    + "<mark>" + (part.isEmpty() ? "‸" : Xml.escaped(part)) + "</mark>"
                    + Xml.escaped(excerpt.line().substring(excerpt.to())) + "</code></pre>");
        }
    }
}
