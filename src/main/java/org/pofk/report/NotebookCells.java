package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Chain;
import org.pofk.chain.Timetable;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Paragraph;

/** The cells of a notebook, one after the other. */
final class NotebookCells {
    private final List<Notebook.Cell> cells = new ArrayList<>();

    /** Nothing where there are no blocks. */
    void text(List<Block> blocks) {
        if (!blocks.isEmpty()) {
            cells.add(new Notebook.Cell(Notebook.Kind.MARKDOWN, MarkdownWriter.write(blocks)));
        }
    }

    void text(Prose paragraph) {
        text(List.of(new Paragraph(paragraph)));
    }

    void code(String source) {
        cells.add(new Notebook.Cell(Notebook.Kind.CODE, source));
    }

    void code(List<String> sources) {
        sources.forEach(this::code);
    }

    /** A chain with its timetable, and what steps it and proves its formulas. */
    void schedule(Chain chain, Timetable timetable) {
        text(Prose.of("The chain, what it moves by and when, in exact fractions:"));
        code(Python.tools("numbers"));
        code(PythonSchedule.of(chain, timetable));
        text(Prose.of("What steps it, and what proves formulas:"));
        code(PythonSchedule.tools());
    }

    /** As JSON, nbformat 4.5, nothing of it run. */
    String write() {
        return new Notebook(cells).write();
    }
}
