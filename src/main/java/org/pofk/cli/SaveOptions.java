package org.pofk.cli;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Collection;
import java.util.Map;
import java.util.Optional;
import picocli.CommandLine.Option;

/** Where the answer goes: to standard output, or to a file that is written whole or not at all. */
final class SaveOptions {
    @Option(names = "--save", paramLabel = "FILE",
            description = "writes the answer to a file, whole or not at all, instead of to the screen")
    private Optional<Path> file = Optional.empty();

    @Option(names = "--replace", description = "lets a saved file replace one that exists")
    private boolean replace;

    Optional<Path> file() {
        return file;
    }

    /** Refuses a file that must not be replaced; asked before the work begins, and again when it is written. */
    void check() throws UsageException {
        if (file.isEmpty() && replace) {
            throw new UsageException("--replace replaces a file that exists; nothing is saved here");
        }
        check(file.stream().toList());
    }

    /** Refuses files of which one must not be replaced, and what is no ordinary file. */
    void check(Collection<Path> files) throws UsageException {
        for (Path each : files) {
            if (Files.isDirectory(each)) {
                throw new UsageException("'" + each + "' is a folder; name a file in it");
            }
            if (Files.exists(each) && !Files.isRegularFile(each)) {
                throw new UsageException("'" + each + "' is no ordinary file; without --save,  > " + each
                        + "  sends the answer there");
            }
            if (!replace && Files.exists(each)) {
                throw new UsageException("'" + each + "' exists; --replace replaces it");
            }
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
        } else {
            write(Map.of(file.get(), bytes), streams);
        }
    }

    /** Writes all of these files or none, in their order. */
    void write(Map<Path, byte[]> files, Streams streams) throws UsageException, WritingException {
        check(files.keySet());
        WholeFiles.write(files);
        files.keySet().forEach(each -> streams.notes().println("written: " + each));
    }
}
