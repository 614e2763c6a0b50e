package org.pofk.cli;

import picocli.CommandLine.Option;

/** What every command takes. */
final class CommonOptions {
    @Option(names = {"-h", "--help"}, usageHelp = true, description = "shows this help")
    private boolean help;

    @Option(names = "--trace", description = "shows where in the program something failed")
    private boolean trace;
}
