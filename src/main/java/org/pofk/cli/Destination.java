package org.pofk.cli;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.text.RefusedException;

/** As what an answer is written, and where to. */
final class Destination {
    private static final int LAST_OF_A_TABLE = 20;

    private final List<Target> targets;
    private final DocumentForms forms;
    private final SaveOptions save;

    /** A format, and the file it goes to; to the screen where there is none. */
    record Target(Format format, Optional<Path> file) {
    }

    Destination(List<Target> targets, DocumentForms forms, SaveOptions save) {
        this.targets = List.copyOf(targets);
        this.forms = forms;
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
            byte[] bytes = answer.written(target.format, forms).getBytes(StandardCharsets.UTF_8);
            if (target.file.isEmpty()) {
                streams.answer().writeBytes(bytes);
            } else {
                files.put(target.file.get(), bytes);
            }
        }
        save.write(files, streams);
    }
}
