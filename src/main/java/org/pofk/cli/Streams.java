package org.pofk.cli;

import java.io.BufferedOutputStream;
import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.time.Instant;

/**
 * Where a run writes: the answer, and everything else. Both are UTF-8 whatever the machine's own encoding is. And when
 * it began, for whoever waits for it counts the start of Java too.
 *
 * @param answer standard output
 * @param notes  standard error
 * @param begun  by the system's clock
 * @param progress of what takes long
 */
public record Streams(PrintStream answer, PrintStream notes, Instant begun, Progress progress) {
    /** Says that standard error is a terminal; set by whoever starts Java, which can't tell. */
    private static final String TERMINAL = "pofk.terminal";

    /** A run that begins now and is watched by nobody. */
    public Streams(PrintStream answer, PrintStream notes) {
        this(answer, notes, Instant.now(), Progress.UNSEEN);
    }

    /** The streams of this process. */
    static Streams ofProcess() {
        PrintStream notes = utf8(new FileOutputStream(FileDescriptor.err));
        return new Streams(utf8(new ToldOutput(new FileOutputStream(FileDescriptor.out), notes)), notes,
                ProcessHandle.current().info().startInstant().orElseGet(Instant::now),
                Boolean.getBoolean(TERMINAL) || System.console() != null
                        ? Progress.onTerminal(notes) : Progress.UNSEEN);
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
