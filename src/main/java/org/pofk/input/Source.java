package org.pofk.input;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;
import org.pofk.text.Fault;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

/**
 * A text to be read. Canonical form: decoded strictly from UTF-8, without a byte order mark.
 *
 * @param name   the source's name as the user gave it
 * @param sha256 of the bytes, in hexadecimal
 */
public record Source(String name, String text, String sha256) {
    /** Files above this are refused: 16 MiB. */
    public static final int LARGEST = 16 << 20;

    /** A text that stands in no file. */
    public static Source ofText(String name, String text) {
        return new Source(name, text, sha256(text.getBytes(StandardCharsets.UTF_8)));
    }

    /** The text of a file; refused when it is missing, a folder, unreadable, above 16 MiB or not UTF-8. */
    public static Source read(Path file) throws RefusedException {
        return read(file, file.toString());
    }

    /** The same under another name. */
    static Source read(Path file, String name) throws RefusedException {
        byte[] bytes = bytes(file, name);
        return new Source(name, StrictUtf8.decode(bytes, name), sha256(bytes));
    }

    /** The last part of the name. */
    String fileName() {
        return name.substring(Math.max(name.lastIndexOf('/'), name.lastIndexOf('\\')) + 1);
    }

    private static byte[] bytes(Path file, String name) throws RefusedException {
        if (Files.isDirectory(file)) {
            throw refusal(name, "folder", "this is a folder, not a file; name the file in it");
        }
        byte[] bytes;
        try (InputStream stream = Files.newInputStream(file)) {
            bytes = stream.readNBytes(LARGEST + 1);
        } catch (NoSuchFileException missing) {
            throw refusal(name, "missing-file", "there is no such file");
        } catch (IOException unreadable) {
            throw refusal(name, "unreadable-file", "the file can't be read; check that you may read it");
        }
        if (bytes.length > LARGEST) {
            throw refusal(name, "file-too-large", "the file is larger than 16 MiB, the most that is read");
        }
        return bytes;
    }

    private static RefusedException refusal(String name, String code, String message) {
        return new RefusedException(List.of(new Fault(Position.ofWhole(name), code, message)));
    }

    private static String sha256(byte[] bytes) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
        } catch (NoSuchAlgorithmException impossible) {
            throw new AssertionError("every Java platform has SHA-256", impossible);
        }
    }
}
