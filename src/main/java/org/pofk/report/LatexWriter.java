package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.pofk.formula.Latex;
import org.pofk.formula.LatexText;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Relation;
import org.pofk.text.Fault;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

/**
 * Writes documents as LaTeX: an article that compiles as it is, or a part for {@code \input} in an article of others.
 * Any name is set as it is written; one with a character that LaTeX's T1 fonts don't have is refused. The same bytes
 * every run.
 */
public final class LatexWriter {
    private static final List<String> PACKAGES = List.of("amsmath", "array", "booktabs", "longtable");
    /** Digits on a line of a display: 82 of them fill it, the number of the equation stands at its end. */
    private static final int WIDTH = 76;
    /** Where only a few lines are left of the page, the next one is begun. */
    private static final String TOGETHER = "\\vspace{0pt plus 8\\baselineskip}\\pagebreak[2]"
            + "\\vspace{0pt plus -8\\baselineskip}";
    private static final int LONGEST_UNDERLINED = 30;

    private LatexWriter() {
    }

    /** A whole article. */
    public static String article(Document document, LatexLayout layout) throws RefusedException {
        List<String> lines = new ArrayList<>(List.of("\\documentclass[11pt,a4paper]{article}",
                "\\usepackage[utf8]{inputenc}", "\\usepackage[T1]{fontenc}", "\\usepackage{lmodern}",
                "\\usepackage[margin=25mm]{geometry}"));
        packages(document, layout).forEach(each -> lines.add("\\usepackage{" + each + "}"));
        lines.addAll(changes(document));
        if (layout.figures() == LatexLayout.Figures.INSIDE) { // a converter would take it for words
            lines.addAll(PdfTitle.lines(document));
        }
        lines.addAll(List.of("\\allowdisplaybreaks", "\\setlength{\\parindent}{0pt}",
                "\\setlength{\\parskip}{6pt plus 2pt}", "\\setlength{\\emergencystretch}{4em}",
                "\\begin{document}"));
        lines.addAll(body(document, layout));
        lines.add("\\end{document}");
        return String.join("\n", lines) + "\n";
    }

    /** The contents alone, to be put into another document. */
    public static String fragment(Document document, LatexLayout layout) throws RefusedException {
        List<String> lines = new ArrayList<>(List.of("% To be put into a document by \\input; needs"
                + " \\usepackage[T1]{fontenc} and the packages " + String.join(", ", packages(document, layout)) + "."));
        if (!document.changed().isEmpty()) {
            lines.add("\\ifdefined\\pofkchangedbox\\else");
            lines.addAll(changes(document));
            lines.add("\\fi");
        }
        lines.addAll(body(document, layout));
        return String.join("\n", lines) + "\n";
    }

    /** What the document needs; the one for figures only where there are some. */
    private static List<String> packages(Document document, LatexLayout layout) {
        String forFigures = layout.figures() == LatexLayout.Figures.INSIDE ? TikzChart.PACKAGE : "graphicx";
        boolean hasFigures = document.blocks().stream().anyMatch(Document.Figure.class::isInstance);
        return hasFigures ? Stream.concat(PACKAGES.stream(), Stream.of(forFigures)).toList() : PACKAGES;
    }

    /** What rules in the margin need, where there are any. */
    private static List<String> changes(Document document) {
        return document.changed().isEmpty() ? List.of() : LatexChanges.DEFINITIONS;
    }

    private static List<String> body(Document document, LatexLayout layout) throws RefusedException {
        List<String> lines = new ArrayList<>(layout.figures() == LatexLayout.Figures.INSIDE ? List.of()
                : LatexFigures.FOR_CONVERTERS);
        Lines writer = new Lines(layout);
        for (int i = 0; i < document.blocks().size(); i++) {
            boolean isChanged = document.isChanged(i);
            Block block = document.blocks().get(i);
            boolean isBoxed = isChanged && !(block instanceof Document.Table) && !writer.floats(block);
            boolean isFirst = !(block instanceof Labelled) || !isOfOneList(document, i);
            boolean isLast = !(block instanceof Labelled) || !isOfOneList(document, i + 1);
            if (isBoxed && isFirst) {
                lines.addAll(List.of("", "\\begin{pofkchanged}"));
            }
            if (block instanceof Labelled && isFirst) {
                lines.addAll(List.of("", "\\begin{description}"));
            }
            List<String> latex = isHeadingOfTable(document.blocks(), i)
                    ? Stream.concat(Stream.of("", TOGETHER), block.accept(writer).stream()).toList()
                    : block.accept(writer);
            lines.addAll(isChanged ? LatexChanges.table(latex) : latex);
            if (block instanceof Labelled && isFirst) {
                lines.add("\\setlength{\\itemsep}{0pt}"); // in front of the label a converter takes it for the text
            }
            if (block instanceof Labelled && isLast) {
                lines.add("\\end{description}");
            }
            if (isBoxed && isLast) {
                lines.add("\\end{pofkchanged}");
            }
        }
        requireSettable(lines);
        return lines;
    }

    /** There LaTeX would end a page, between a heading and a table that begins the next one. */
    private static boolean isHeadingOfTable(List<Block> blocks, int place) {
        boolean hasTable = place + 1 < blocks.size() && blocks.get(place + 1) instanceof Document.Table;
        return hasTable && blocks.get(place) instanceof Document.Heading;
    }

    /** Whether a label and the one before it stand in one list: both have changed, or neither has. */
    private static boolean isOfOneList(Document document, int place) {
        return Document.isListed(document.blocks(), place)
                && document.isChanged(place - 1) == document.isChanged(place);
    }

    /** Refuses what the fonts don't have; everything else is in ASCII or a letter that they have. */
    private static void requireSettable(List<String> lines) throws RefusedException {
        List<Integer> unsettable = lines.stream().flatMap(line -> LatexText.unsettable(line).stream()).distinct()
                .toList();
        if (!unsettable.isEmpty()) {
            throw new RefusedException(List.of(new Fault(Position.ofWhole("LaTeX"), "character",
                    "these characters can't be set: " + String.join(", ", unsettable.stream()
                            .map(LatexWriter::named).toList()) + "; rename what holds them, or write another format")));
        }
    }

    private static String named(int c) {
        return (Character.isISOControl(c) ? "" : "'" + Character.toString(c) + "' ") + String.format("U+%04X", c);
    }

    private static final class Lines implements Document.Visitor<List<String>> {
        private final LatexLayout layout;
        private int equations;
        private int figures;

        private Lines(LatexLayout layout) {
            this.layout = layout;
        }

        /** Whether LaTeX finds a place for the block, where it may stand in no box. */
        boolean floats(Block block) {
            return block instanceof Document.Figure && layout.figures() == LatexLayout.Figures.IN_FILES;
        }

        @Override
        public List<String> heading(Document.Heading heading) {
            String command = switch (heading.level()) {
                case 1 -> "section";
                case 2 -> "subsection";
                default -> "subsubsection";
            };
            return List.of("", "\\" + command + "*{" + LatexSpelling.of(heading.text()) + "}");
        }

        @Override
        public List<String> paragraph(Document.Paragraph paragraph) {
            return List.of("", LatexSpelling.of(paragraph.text()), "");
        }

        @Override
        public List<String> labelled(Labelled labelled) {
            return List.of("\\item[{" + LatexSpelling.of(labelled.label()) + "}] " + LatexSpelling.of(labelled.text()));
        }

        @Override
        public List<String> items(Document.Items items) {
            return Stream.of(Stream.of("", "\\begin{itemize}"),
                    items.items().stream().map(item -> "\\item {}" + LatexSpelling.of(item)),
                    Stream.of("\\end{itemize}")).flatMap(each -> each).toList();
        }

        /** Aligned at its relation; a long left side stands on a line of its own. */
        @Override
        public List<String> display(Document.Display display) {
            String left = LatexInMathematics.of(display.left());
            String relation = display.left().isEmpty() ? "" : display.relation() == Relation.EQUAL ? " = "
                    : " \\approx ";
            int leftWidth = left.replaceAll("\\\\[a-z]+|[{}]", "").length();
            boolean standsAlone = leftWidth > WIDTH / 3;
            int width = standsAlone ? WIDTH - 4 : WIDTH - leftWidth - 4;
            List<String> right = Latex.lines(display.right(), width);
            List<String> lines = new ArrayList<>();
            if (standsAlone) {
                lines.add("&" + left + relation);
            }
            for (int i = 0; i < right.size(); i++) {
                String start = i == 0 && !standsAlone ? left + " &" + relation : "&\\quad ";
                lines.add(start + right.get(i));
            }
            if (!display.condition().isEmpty()) {
                lines.add("&\\qquad " + LatexInMathematics.of(display.condition()));
            }
            return numbered(lines);
        }

        /** One equation: its number and its label stand on the last line. */
        private List<String> numbered(List<String> lines) {
            equations++;
            boolean isTagged = layout.figures() == LatexLayout.Figures.IN_FILES;
            String environment = isTagged ? "{align*}" : "{align}";
            String between = isTagged ? " \\\\" : " \\nonumber \\\\";
            String number = (isTagged ? " \\tag{" + equations + "}" : "") + " \\label{" + layout.equation(equations) + "}";
            List<String> all = new ArrayList<>(List.of("\\begin" + environment));
            for (int i = 0; i < lines.size(); i++) {
                all.add(lines.get(i) + (i + 1 < lines.size() ? between : number));
            }
            all.add("\\end" + environment);
            return all;
        }

        /** In typewriter, the part that is meant underlined, or bold where it may go on over lines. */
        @Override
        public List<String> excerpt(Document.Excerpt excerpt) {
            String part = excerpt.line().substring(excerpt.from(), excerpt.to());
            String marked = part.isEmpty() ? "\\underline{\\ }" : part.length() <= LONGEST_UNDERLINED
                    ? "\\underline{" + LatexText.of(part) + "}" : "\\textbf{" + LatexSpelling.typed(part) + "}";
            return List.of("", "\\begin{quote}\\ttfamily\\raggedright{}"
                    + LatexSpelling.typed(excerpt.line().substring(0, excerpt.from())) + marked
                    + LatexSpelling.typed(excerpt.line().substring(excerpt.to())) + "\\end{quote}");
        }

        @Override
        public List<String> figure(Document.Figure figure) {
            figures++;
            return layout.figures() == LatexLayout.Figures.INSIDE ? LatexFigures.inside(figure)
                    : LatexFigures.inFile(figure, layout, figures);
        }

        @Override
        public List<String> table(Document.Table table) {
            List<String> lines = new ArrayList<>(List.of(""));
            if (!table.caption().isEmpty()) {
                lines.addAll(List.of(LatexSpelling.of(table.caption()) + "\\nopagebreak", ""));
            }
            lines.addAll(LatexTable.lines(table, layout));
            return lines;
        }
    }
}
