package org.pofk.cli;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFileAttributeView;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.UUID;

/**
 * Files that appear all together, each whole, or not at all: written beside their places first, and moved there when all
 * are complete. Where a move fails, those before it are taken back. A new file has the permissions that the system gives
 * to any, one that takes an older one's place has its permissions.
 */
final class WholeFiles {
    private final List<Path> drafts = new ArrayList<>();
    private final Deque<Undo> undone = new ArrayDeque<>();

    /** Takes one move back. */
    private interface Undo {
        void run() throws IOException;
    }

    private WholeFiles() {
    }

    static void write(Map<Path, byte[]> files) throws WritingException {
        WholeFiles together = new WholeFiles();
        try {
            together.place(files);
        } finally {
            together.drafts.forEach(WholeFiles::delete);
        }
    }

    private void place(Map<Path, byte[]> files) throws WritingException {
        List<Map.Entry<Path, Path>> moves = new ArrayList<>();
        for (Map.Entry<Path, byte[]> file : files.entrySet()) {
            trying(file.getKey(), () -> moves.add(Map.entry(draft(file.getKey(), file.getValue()), file.getKey())));
        }
        for (Map.Entry<Path, Path> move : moves) {
            trying(move.getValue(), () -> moveInto(move.getKey(), move.getValue()));
        }
    }

    /** Something that may fail about one file. */
    private interface Step {
        void run() throws IOException;
    }

    private void trying(Path file, Step step) throws WritingException {
        try {
            step.run();
        } catch (IOException failed) {
            takeBack(failed);
            throw new WritingException("'" + file + "' can't be written: " + reason(failed, folder(file)), failed);
        }
    }

    private Path draft(Path file, byte[] bytes) throws IOException {
        Path draft = beside(file);
        try (OutputStream stream = Files.newOutputStream(draft, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE)) {
            stream.write(bytes);
        }
        return draft;
    }

    private Path beside(Path file) {
        Path draft = folder(file).resolve(".pofk-" + UUID.randomUUID() + ".part");
        drafts.add(draft);
        return draft;
    }

    private void moveInto(Path draft, Path file) throws IOException {
        if (Files.exists(file)) {
            Path old = beside(file);
            Files.copy(file, old, StandardCopyOption.COPY_ATTRIBUTES);
            copyPermissions(file, draft);
            undone.push(() -> Files.move(old, file, StandardCopyOption.ATOMIC_MOVE));
        } else {
            undone.push(() -> Files.deleteIfExists(file));
        }
        Files.move(draft, file, StandardCopyOption.ATOMIC_MOVE);
    }

    private static void copyPermissions(Path from, Path to) throws IOException {
        PosixFileAttributeView view = Files.getFileAttributeView(from, PosixFileAttributeView.class);
        if (view != null) {
            Files.setPosixFilePermissions(to, view.readAttributes().permissions());
        }
    }

    private void takeBack(IOException failed) {
        while (!undone.isEmpty()) {
            try {
                undone.pop().run();
            } catch (IOException more) {
                failed.addSuppressed(more);
            }
        }
    }

    private static void delete(Path draft) {
        try {
            Files.deleteIfExists(draft);
        } catch (IOException left) { // nothing depends on it, and what went wrong before is told
            return;
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
