package org.pofk.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The figures of a document in LaTeX: in the text, or in files of their own. */
public final class LatexFigures {
    /**
     * All these commands are known to LaTeX, which passes their definitions over; to a converter that doesn't know them
     * they say that a number stands behind its equation, that of a figure's files it takes the PNG, and that places
     * for the end of a line are nothing.
     */
    static final List<String> FOR_CONVERTERS = List.of(
            "% For converters to other formats; LaTeX has these commands and passes over what they would be.",
            "\\providecommand{\\tag}[1]{\\qquad\\text{(#1)}}", "\\providecommand{\\empty}{.png}",
            "\\providecommand{\\allowbreak}{}");

    private LatexFigures() {
    }

    /** The charts by the names of their files, without endings, in the order of the document. */
    public static Map<String, Chart> files(Document document, LatexLayout layout) {
        Map<String, Chart> files = new LinkedHashMap<>();
        document.blocks().stream().filter(Document.Figure.class::isInstance).map(Document.Figure.class::cast)
                .forEach(figure -> files.put(layout.file(files.size() + 1), figure.chart()));
        return files;
    }

    /** A figure by itself: a page of its size, for {@code pdflatex}. */
    public static String page(Chart chart) {
        List<String> lines = new ArrayList<>(List.of("\\documentclass{article}", "\\usepackage[utf8]{inputenc}",
                "\\usepackage[T1]{fontenc}", "\\usepackage{lmodern}", "\\usepackage{amsmath}",
                "\\usepackage{" + TikzChart.PACKAGE + "}", "\\begin{document}", "\\setbox0=\\hbox{%"));
        lines.addAll(TikzChart.lines(chart));
        lines.addAll(List.of("}", "\\pdfpagewidth=\\wd0 \\pdfpageheight=\\dimexpr\\ht0+\\dp0\\relax",
                "\\hoffset=0pt \\voffset=0pt \\pdfhorigin=0pt \\pdfvorigin=0pt \\shipout\\box0", "\\end{document}"));
        return String.join("\n", lines) + "\n";
    }

    static List<String> inside(Document.Figure figure) {
        List<String> lines = new ArrayList<>(List.of("", "\\begin{center}",
                "\\begin{minipage}{\\linewidth}\\centering"));
        lines.addAll(TikzChart.lines(figure.chart()));
        lines.addAll(List.of("\\par\\smallskip", LatexSpelling.of(figure.caption()),
                "\\end{minipage}", "\\end{center}"));
        return lines;
    }

    static List<String> inFile(Document.Figure figure, LatexLayout layout, int number) {
        return List.of("", "\\begin{figure}[!htbp]", "\\centering",
                "\\includegraphics[width=0.85\\linewidth]{" + layout.file(number) + "\\empty}",
                "\\caption{" + LatexSpelling.of(figure.caption()) + "}", "\\label{" + layout.figure(number) + "}",
                "\\end{figure}");
    }
}
