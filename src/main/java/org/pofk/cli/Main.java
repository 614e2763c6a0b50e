package org.pofk.cli;

import java.util.List;

/** Where the process starts and, alone in the program, where it ends. */
public final class Main {
    private Main() {
    }

    public static void main(String[] arguments) {
        WarmUp.beginFor(arguments);
        System.exit(CommandLineRun.of(List.of(arguments), Streams.ofProcess()));
    }
}
