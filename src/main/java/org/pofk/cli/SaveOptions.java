package org.pofk.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.Optional;
import picocli.CommandLine.Option;

/** Where the answer goes: to standard output, or to a file that is written whole or not at all. */
final class SaveOptions {
    @Option(names = "--save", paramLabel = "FILE",
            description = "writes the answer to a file, whole or not at all, instead of to the screen")
    private Optional<Path> file = Optional.empty();

    @Option(names = "--replace", description = "lets --save replace a file that exists")
    private boolean replace;

    Optional<Path> file() {
        return file;
    }

    /** Refuses a file that must not be replaced; asked before the work begins, and again when it is written. */
    void check() throws UsageException {
        if (file.isPresent() && !replace && Files.exists(file.get())) {
            throw new UsageException("'" + file.get() + "' exists; --replace replaces it");
        }
    }

    /** Writes to the file, or to the answer stream where none was asked for. */
    void write(String text, Streams streams) throws UsageException, WritingException {
        if (file.isEmpty()) {
            streams.answer().print(text);
            return;
        }
        check();
        try {
            writeWhole(file.get(), text);
        } catch (IOException failed) {
            throw new WritingException("'" + file.get() + "' can't be written: " + reason(failed), failed);
        }
        streams.notes().println("written: " + file.get());
    }

    /** Writes beside the file first, and moves it into its place when it is complete. */
    private static void writeWhole(Path file, String text) throws IOException {
        Path folder = Optional.ofNullable(file.toAbsolutePath().getParent()).orElse(Path.of(""));
        Path draft = Files.createTempFile(folder, ".pofk-", ".part");
        try {
            Files.writeString(draft, text, StandardCharsets.UTF_8);
            Files.move(draft, file, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } finally {
            Files.deleteIfExists(draft);
        }
    }

    private static String reason(IOException failed) {
        return failed instanceof java.nio.file.NoSuchFileException ? "there is no such folder"
                : failed instanceof java.nio.file.AccessDeniedException ? "that isn't allowed there"
                : String.valueOf(failed.getMessage());
    }
}
