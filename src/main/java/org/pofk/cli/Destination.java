package org.pofk.cli;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.report.Chart;
import org.pofk.report.Document;
import org.pofk.report.LatexFigures;
import org.pofk.report.LatexLayout;
import org.pofk.report.PngChart;
import org.pofk.text.RefusedException;

/** As what an answer is written, and where to. */
final class Destination {
    private static final int LAST_OF_A_TABLE = 20;
    /** Of a PNG, in pixels: 300 an inch on a page. */
    private static final int FIGURE_WIDTH = 1800;

    private final List<Target> targets;
    private final DocumentForms forms;
    private final Optional<Pdflatex> pdflatex;
    private final SaveOptions save;

    /** A format, and the file it goes to; to the screen where there is none. What can't be made a PDF stays LaTeX. */
    record Target(Format format, Optional<Path> file) {
    }

    Destination(List<Target> targets, DocumentForms forms, Optional<Pdflatex> pdflatex, SaveOptions save) {
        this.targets = List.copyOf(targets);
        this.forms = forms;
        this.pdflatex = pdflatex;
        this.save = save;
    }

    /** Whether the answer is to be written in this format. */
    boolean takes(Format asked) {
        return targets.stream().anyMatch(target -> target.format == asked);
    }

    /** The steps asked for; the first ones where none were and a table of values is to be written. */
    List<Integer> steps(Optional<StepList> asked) {
        return asked.map(StepList::steps).orElse(takes(Format.CSV)
                ? IntStream.rangeClosed(0, LAST_OF_A_TABLE).boxed().toList() : List.of());
    }

    /** Writes the answer in every format asked for, or, where one of them fails, nothing. */
    void write(Answer answer, Streams streams) throws RefusedException, UsageException, WritingException {
        Map<Path, byte[]> files = new LinkedHashMap<>();
        for (Target target : targets) {
            byte[] bytes = bytes(target.format, answer.written(target.format, forms));
            if (target.file.isEmpty()) {
                streams.answer().writeBytes(bytes);
            } else {
                files.put(target.file.get(), bytes);
            }
            if (target.format == Format.LATEX && forms.layout().figures() == LatexLayout.Figures.IN_FILES) {
                files.putAll(figures(answer.document(), target.file.orElseThrow(), streams));
            }
        }
        save.write(files, streams);
        Optional<Path> article = targets.stream().filter(target -> target.format == Format.PDF)
                .flatMap(target -> target.file.stream()).findFirst();
        if (pdflatex.isEmpty() && article.isPresent()) {
            throw new WritingException("pdflatex isn't installed, so there is no PDF; the article for it is '"
                    + article.get() + "'. Where it is installed:  pdflatex " + article.get().getFileName() + "  , twice");
        }
    }

    /** The figures of an article beside it. */
    private Map<Path, byte[]> figures(Document document, Path article, Streams streams) throws WritingException {
        Map<Path, byte[]> files = new LinkedHashMap<>();
        for (Map.Entry<String, Chart> figure : LatexFigures.files(document, forms.layout()).entrySet()) {
            files.put(article.resolveSibling(figure.getKey() + ".png"), PngChart.of(figure.getValue(), FIGURE_WIDTH));
            if (pdflatex.isPresent()) {
                files.put(article.resolveSibling(figure.getKey() + ".pdf"),
                        pdflatex.get().page(LatexFigures.page(figure.getValue())));
            }
        }
        if (pdflatex.isEmpty() && !files.isEmpty()) {
            streams.notes().println("pofk: pdflatex isn't installed: the figures are PNG alone");
        }
        return files;
    }

    private byte[] bytes(Format format, String text) throws WritingException {
        return format == Format.PDF && pdflatex.isPresent() ? pdflatex.get().pdf(text)
                : text.getBytes(StandardCharsets.UTF_8);
    }
}
