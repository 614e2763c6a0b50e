package org.pofk.report;

import java.util.List;
import org.pofk.chain.Model;

/**
 * What ties a report to where it comes from.
 *
 * @param program     with its version, {@code pofk 1.0}
 * @param commandLine as typed
 * @param files       what was read, each once, in the order it was read
 */
public record Provenance(String program, String commandLine, List<Model.Origin> files) {
    public Provenance {
        files = List.copyOf(files);
    }
}
