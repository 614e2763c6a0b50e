package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Model;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;

/** What ties a report to its input. */
final class ProvenanceBlocks {
    private ProvenanceBlocks() {
    }

    static List<Block> of(Provenance provenance) {
        List<Block> blocks = new ArrayList<>(List.of(new Heading(2, "What this report stands on"),
                new Labelled("program", Prose.name(provenance.program())),
                new Labelled("command line", ModelHead.words(provenance.commandLine()))));
        blocks.add(new Paragraph("What was read, by its SHA-256:"));
        for (Model.Origin file : provenance.files()) {
            blocks.add(new Labelled(Prose.name(file.file()), Prose.name(file.sha256())));
        }
        return blocks;
    }
}
