package org.pofk.report;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.stream.Collectors;
import org.pofk.formula.Latex;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Relation;

/** Writes blocks as Markdown with pipe tables and formulas between dollar signs, as notebooks show it. */
final class MarkdownWriter {
    /** Digits on a line of a display. */
    private static final int WIDTH = 90;

    private MarkdownWriter() {
    }

    static String write(List<Block> blocks) {
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < blocks.size(); i++) {
            text.append(i == 0 ? "" : Document.isListed(blocks, i) ? "\n" : "\n\n").append(blocks.get(i).accept(new Text()));
        }
        return text.toString();
    }

    private static final class Text implements Document.Visitor<String> {
        @Override
        public String heading(Document.Heading heading) {
            return "#".repeat(heading.level()) + " " + MarkdownSpelling.of(heading.text());
        }

        @Override
        public String paragraph(Document.Paragraph paragraph) {
            return MarkdownSpelling.of(paragraph.text());
        }

        @Override
        public String labelled(Labelled labelled) {
            return "- **" + MarkdownSpelling.of(labelled.label()) + "** " + MarkdownSpelling.of(labelled.text());
        }

        @Override
        public String items(Document.Items items) {
            return items.items().stream().map(item -> "- " + MarkdownSpelling.of(item))
                    .collect(Collectors.joining("\n"));
        }

        /** A left side with a name that can't stand in mathematics stands before it. */
        @Override
        public String display(Document.Display display) {
            boolean isSettable = MarkdownSpelling.isSettable(display.left());
            String left = isSettable ? MarkdownSpelling.inMathematics(display.left()) : "";
            String relation = display.left().isEmpty() ? "" : display.relation() == Relation.EQUAL ? " = "
                    : " \\approx ";
            String right = Latex.lines(display.right(), WIDTH).stream().map(line -> "{}" + line)
                    .collect(Collectors.joining(" \\\\\n&\\quad "));
            String condition = display.condition().isEmpty() ? ""
                    : "\n\n" + MarkdownSpelling.of(display.condition());
            return (isSettable ? "" : MarkdownSpelling.of(display.left()) + "\n\n") + "$$\n\\begin{aligned}\n" + left
                    + " &" + relation + right + "\n\\end{aligned}\n$$" + condition;
        }

        @Override
        public String excerpt(Document.Excerpt excerpt) {
            return "<code>" + MarkdownSpelling.name(excerpt.line().substring(0, excerpt.from())) + "<u>"
                    + MarkdownSpelling.name(excerpt.line().substring(excerpt.from(), excerpt.to())) + "</u>"
                    + MarkdownSpelling.name(excerpt.line().substring(excerpt.to())) + "</code>";
        }

        @Override
        public String figure(Document.Figure figure) {
            return MarkdownSpelling.of(figure.caption()) + "\n\n" + MarkdownSpelling.of(figure.chart().alternative());
        }

        @Override
        public String table(Document.Table table) {
            List<String> lines = new ArrayList<>();
            if (!table.caption().isEmpty()) {
                lines.addAll(List.of(MarkdownSpelling.of(table.caption()), ""));
            }
            lines.add(row(table.header()));
            lines.add("|" + String.join("|", Collections.nCopies(table.header().size(), ":---")) + "|");
            table.rows().forEach(row -> lines.add(row(row)));
            return String.join("\n", lines);
        }

        private static String row(List<Prose> cells) {
            return cells.stream().map(MarkdownSpelling::of).collect(Collectors.joining(" | ", "| ", " |"));
        }
    }
}
