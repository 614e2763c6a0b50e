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
    private static final List<String> PACKAGES = List.of("amsmath", "booktabs", "longtable");
    /** Digits on a line of a display. */
    private static final int WIDTH = 76;
    private static final int LONGEST_UNDERLINED = 30;

    private LatexWriter() {
    }

    /** A whole article. */
    public static String article(Document document) throws RefusedException {
        List<String> lines = new ArrayList<>(List.of("\\documentclass[11pt,a4paper]{article}",
                "\\usepackage[utf8]{inputenc}", "\\usepackage[T1]{fontenc}", "\\usepackage{lmodern}",
                "\\usepackage[margin=25mm]{geometry}"));
        packages(document).forEach(each -> lines.add("\\usepackage{" + each + "}"));
        lines.addAll(List.of("\\allowdisplaybreaks", "\\setlength{\\parindent}{0pt}",
                "\\setlength{\\parskip}{6pt plus 2pt}", "\\setlength{\\emergencystretch}{4em}",
                "\\begin{document}"));
        lines.addAll(body(document));
        lines.add("\\end{document}");
        return String.join("\n", lines) + "\n";
    }

    /** The contents alone, to be put into another document. */
    public static String fragment(Document document) throws RefusedException {
        List<String> lines = new ArrayList<>(List.of("% To be put into a document by \\input; needs"
                + " \\usepackage[T1]{fontenc} and the packages " + String.join(", ", packages(document)) + "."));
        lines.addAll(body(document));
        return String.join("\n", lines) + "\n";
    }

    /** What the document needs; the one for figures only where there are some. */
    private static List<String> packages(Document document) {
        boolean hasFigures = document.blocks().stream().anyMatch(Document.Figure.class::isInstance);
        return hasFigures ? Stream.concat(PACKAGES.stream(), Stream.of(TikzChart.PACKAGE)).toList() : PACKAGES;
    }

    private static List<String> body(Document document) throws RefusedException {
        List<String> lines = new ArrayList<>();
        List<Block> blocks = document.blocks();
        for (int i = 0; i < blocks.size(); i++) {
            boolean continues = i > 0 && blocks.get(i - 1) instanceof Labelled && blocks.get(i) instanceof Labelled;
            boolean goesOn = i + 1 < blocks.size() && blocks.get(i + 1) instanceof Labelled;
            if (blocks.get(i) instanceof Labelled && !continues) {
                lines.addAll(List.of("", "\\begin{description}", "\\setlength{\\itemsep}{0pt}"));
            }
            lines.addAll(blocks.get(i).accept(new Lines()));
            if (blocks.get(i) instanceof Labelled && !goesOn) {
                lines.add("\\end{description}");
            }
        }
        requireSettable(lines);
        return lines;
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
            String left = LatexSpelling.inMathematics(display.left());
            String relation = display.left().isEmpty() ? "" : display.relation() == Relation.EQUAL ? " = "
                    : " \\approx ";
            int leftWidth = left.replaceAll("\\\\[a-z]+|[{}]", "").length();
            boolean standsAlone = leftWidth > WIDTH / 3;
            int width = standsAlone ? WIDTH - 4 : WIDTH - leftWidth - 4;
            List<String> right = Latex.lines(display.right(), width);
            List<String> lines = new ArrayList<>(List.of("\\begin{align*}"));
            if (standsAlone) {
                lines.add("&" + left + relation + "\\\\");
            }
            for (int i = 0; i < right.size(); i++) {
                String start = i == 0 && !standsAlone ? left + " &" + relation : "&\\quad ";
                lines.add(start + "{}" + right.get(i) + (i + 1 < right.size() ? " \\\\" : ""));
            }
            if (!display.condition().isEmpty()) {
                int last = lines.size() - 1;
                lines.set(last, lines.get(last) + " \\\\");
                lines.add("&\\qquad \\text{" + LatexSpelling.of(display.condition()) + "}");
            }
            lines.add("\\end{align*}");
            return lines;
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
            List<String> lines = new ArrayList<>(List.of("", "\\begin{center}",
                    "\\begin{minipage}{\\linewidth}\\centering"));
            lines.addAll(TikzChart.lines(figure.chart()));
            lines.addAll(List.of("\\par\\smallskip", LatexSpelling.of(figure.caption()),
                    "\\end{minipage}", "\\end{center}"));
            return lines;
        }

        @Override
        public List<String> table(Document.Table table) {
            List<String> lines = new ArrayList<>(List.of(""));
            if (!table.caption().isEmpty()) {
                lines.addAll(List.of(LatexSpelling.of(table.caption()) + "\\nopagebreak", ""));
            }
            lines.addAll(LatexTable.lines(table));
            return lines;
        }
    }
}
