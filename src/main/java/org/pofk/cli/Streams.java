package org.pofk.cli;

import java.io.BufferedOutputStream;
import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;

/**
 * Where a run writes: the answer, and everything else. Both are UTF-8 whatever the machine's own encoding is.
 *
 * @param answer standard output
 * @param notes  standard error
 */
public record Streams(PrintStream answer, PrintStream notes) {

    /** The streams of this process. */
    static Streams ofProcess() {
        PrintStream notes = utf8(new FileOutputStream(FileDescriptor.err));
        return new Streams(utf8(new ToldOutput(new FileOutputStream(FileDescriptor.out), notes)), notes);
    }

    private static PrintStream utf8(OutputStream bytes) {
        return new PrintStream(new BufferedOutputStream(bytes, 1 << 16), false, StandardCharsets.UTF_8);
    }

    /** Sends what is held back, and says whether everything arrived. */
    boolean flush() {
        notes.flush();
        boolean arrived = !answer.checkError();
        notes.flush();
        return arrived;
    }
}
