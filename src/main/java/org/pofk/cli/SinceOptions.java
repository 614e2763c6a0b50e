package org.pofk.cli;

import java.nio.file.Path;
import java.util.Optional;
import org.pofk.chain.Model;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Option;

/** The model that a report was issued of before. */
final class SinceOptions {
    @Option(names = "--since", paramLabel = "OLD",
            description = "the model of an earlier issue: what has changed in the input, each result before and now,"
                    + " a rule in the margin beside what differs")
    private Optional<Path> file = Optional.empty();

    /** Read as the model itself is, with what the command line puts in place of its words; its faults are its own. */
    Optional<Model> read(ModelOptions model) throws RefusedException, UsageException {
        return file.isEmpty() ? Optional.empty() : Optional.of(model.read(file.get()));
    }
}
