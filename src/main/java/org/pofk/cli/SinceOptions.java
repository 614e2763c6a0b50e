package org.pofk.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.pofk.chain.Model;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Option;

/** The model of an earlier issue of a report. */
final class SinceOptions {
    @Option(names = "--since", paramLabel = "OLD",
            description = "the model file of an earlier issue: the report then says what has changed in the input and"
                    + " each result before and now, and has a rule in the margin beside what differs")
    private Optional<Path> file = Optional.empty();

    /**
     * The model, and then the earlier one where it is asked for: read as the model itself is, with what the command
     * line puts in place of its words. Where one of the two has a schedule, both do: the other one in which nothing is
     * done.
     */
    List<Model> models(AnswerOptions options) throws RefusedException, UsageException {
        if (file.isEmpty()) {
            return List.of(options.modelWithSchedule());
        }
        List<Model> models = options.modelWith(file.get());
        return models.stream().noneMatch(model -> model.schedule().isPresent()) ? models
                : models.stream().map(Model::scheduled).toList();
    }
}
