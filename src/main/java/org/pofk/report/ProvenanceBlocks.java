package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Model;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;

/** What ties a report to its input. */
final class ProvenanceBlocks {
    private ProvenanceBlocks() {
    }

    static List<Block> of(Provenance provenance) {
        List<Block> blocks = new ArrayList<>(List.of(new Heading(2, "How this report was made"),
                new Labelled("program", Prose.name(provenance.program())),
                new Labelled("command line", Prose.name(provenance.commandLine()))));
        for (Model.Origin file : provenance.files()) {
            blocks.add(new Labelled(Prose.name(file.file()), Prose.of("SHA-256 ").andName(file.sha256())));
        }
        return blocks;
    }
}
