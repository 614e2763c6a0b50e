package org.pofk.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
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
        if (file.isEmpty() && replace) {
            throw new UsageException("--replace replaces a file that --save FILE names; there is no --save");
        }
        if (file.isPresent() && !replace && Files.exists(file.get())) {
            throw new UsageException("'" + file.get() + "' exists; --replace replaces it");
        }
    }

    /** Writes to the file, or to the answer stream where none was asked for. */
    void write(String text, Streams streams) throws UsageException, WritingException {
        write(text.getBytes(StandardCharsets.UTF_8), streams);
    }

    /** The same for what isn't text, or is UTF-8 already. */
    void write(byte[] bytes, Streams streams) throws UsageException, WritingException {
        check();
        if (file.isEmpty()) {
            streams.answer().writeBytes(bytes);
            return;
        }
        try {
            writeWhole(file.get(), bytes);
        } catch (IOException failed) {
            throw new WritingException("'" + file.get() + "' can't be written: "
                    + reason(failed, folder(file.get())), failed);
        }
        streams.notes().println("written: " + file.get());
    }

    /** Writes beside the file first, and moves it into its place when it is complete. */
    private static void writeWhole(Path file, byte[] bytes) throws IOException {
        Path draft = Files.createTempFile(folder(file), ".pofk-", ".part");
        try {
            Files.write(draft, bytes);
            Files.move(draft, file, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } finally {
            Files.deleteIfExists(draft);
        }
    }

    private static Path folder(Path file) {
        return Optional.ofNullable(file.toAbsolutePath().getParent()).orElse(Path.of(""));
    }

    /** In the system's words where it has some; they name the draft's file otherwise, which nobody knows. */
    private static String reason(IOException failed, Path folder) {
        if (failed instanceof NoSuchFileException) {
            return Files.isDirectory(folder) ? "the system takes no new file in the folder '" + folder + "'"
                    : "there is no such folder";
        }
        if (failed instanceof AccessDeniedException) {
            return "that isn't allowed there";
        }
        return failed instanceof FileSystemException named && named.getReason() != null
                ? "the system says: " + named.getReason() : String.valueOf(failed.getMessage());
    }
}
