package org.pofk.cli;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** What came of a command line. */
record Run(int exitCode, String answer, String notes) {

    static Run of(String... arguments) {
        return of(List.of(arguments));
    }

    static Run of(List<String> arguments) {
        ByteArrayOutputStream answer = new ByteArrayOutputStream();
        ByteArrayOutputStream notes = new ByteArrayOutputStream();
        int code = CommandLineRun.of(arguments, new Streams(new PrintStream(answer, false, StandardCharsets.UTF_8),
                new PrintStream(notes, false, StandardCharsets.UTF_8)));
        return new Run(code, answer.toString(StandardCharsets.UTF_8).replace(System.lineSeparator(), "\n"),
                notes.toString(StandardCharsets.UTF_8).replace(System.lineSeparator(), "\n"));
    }
}
