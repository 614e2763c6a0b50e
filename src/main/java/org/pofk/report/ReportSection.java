package org.pofk.report;

import java.util.List;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Labelled;

/**
 * The place an answer has in a report: a line or two on the first page, and a section of its own.
 *
 * @param place      whether it is a result of its own or a check of what others state
 * @param title      of the section
 * @param keyFigures for the first page
 * @param blocks     of the section, headings in it from the third level on
 * @param proofs     of the formulas in it
 */
public record ReportSection(Place place, Prose title, List<Labelled> keyFigures, List<Block> blocks,
        List<Proved> proofs, Standing standing) {

    /** Where in the report the section stands. */
    public enum Place { RESULTS, CHECKS }

    /** What is to be said of the whole section when the program ends. */
    public enum Standing { ANSWERED, NOT_DECIDED, CLAIM_WRONG }

    public ReportSection {
        keyFigures = List.copyOf(keyFigures);
        blocks = List.copyOf(blocks);
        proofs = List.copyOf(proofs);
    }

    /** One without formulas of its own. */
    public ReportSection(Place place, Prose title, List<Labelled> keyFigures, List<Block> blocks, Standing standing) {
        this(place, title, keyFigures, blocks, List.of(), standing);
    }

    /** For what a budget left no time. */
    public static ReportSection notReached(Place place, Prose title) {
        return new ReportSection(place, title, List.of(new Labelled(title, Prose.of(MissingBlocks.NOT_DECIDED))),
                List.of(new Document.Paragraph("Not decided within the budget.")), Standing.NOT_DECIDED);
    }
}
