package org.pofk.cli;

import java.nio.file.Path;
import java.util.Arrays;
import java.util.Collection;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;

/** What an answer can be written as. */
enum Format {
    TEXT(".txt"), JSON(".json"), CSV(".csv"), HTML(".html"), LATEX(".tex"), PDF(".pdf"), NOTEBOOK(".ipynb");

    /** What any document can be written as. */
    static final Set<Format> OF_DOCUMENTS = Set.of(TEXT, HTML, LATEX, PDF);

    private final String ending;

    Format(String ending) {
        this.ending = ending;
    }

    /** The format a file's name asks for. */
    static Optional<Format> of(Path file) {
        String name = file.toString().toLowerCase(Locale.ROOT);
        return Arrays.stream(values()).filter(format -> name.endsWith(format.ending)).findFirst();
    }

    /** {@code .json}. */
    String ending() {
        return ending;
    }

    static List<String> endings(Collection<Format> formats) {
        return formats.stream().map(format -> format.ending).toList();
    }

    /** As typed: {@code json}. */
    @Override
    public String toString() {
        return name().toLowerCase(Locale.ROOT);
    }
}
