package org.pofk.cli;

import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;

/** Makes a command's help, and what is said about a wrong {@code --as}, name the formats it writes and no others. */
final class OfferedFormats {
    private OfferedFormats() {
    }

    /** Where the command has no {@code --as}, nothing changes. */
    static void nameIn(CommandSpec command) {
        OptionSpec every = command.findOption("--as");
        if (every != null) {
            command.remove(every);
            command.add(every.toBuilder().completionCandidates(writing(every).offered()).build());
        }
    }

    /** The object that holds what is typed after the option. */
    private static WritingOptions writing(OptionSpec as) {
        try {
            return as.scope().get();
        } catch (Exception failed) { // declared for objects that are made late; this one stands in its command
            throw new AssertionError("--as belongs to no writing options", failed);
        }
    }
}
