package org.pofk.cli;

import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

@Command(description = "x")
final class InspectCommand implements Work {
    @Mixin
    private ModelOptions model;

    @Mixin
    private CommonOptions common;

    @Override
    public ExitCode run(Streams streams) {
        return ExitCode.ANSWERED;
    }
}
