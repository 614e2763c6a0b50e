package org.pofk.cli;

import java.util.Arrays;
import java.util.List;

import java.util.Optional;
import java.util.function.Supplier;
import picocli.CommandLine;

/** The commands there are, in the order of the help. */
enum CommandName {
    DERIVE(DeriveCommand::new),
    INSPECT(InspectCommand::new),
    SIMULATE(SimulateCommand::new),
    CHECK(CheckCommand::new),
    WHEN(WhenCommand::new),
    PASSAGE(PassageCommand::new),
    TOTAL(TotalCommand::new),
    REPORT(ReportCommand::new),
    DRAW(DrawCommand::new),
    NEW(NewCommand::new),
    HELP(HelpCommand::new),
    VERSION(VersionCommand::new);

    private final Supplier<Work> work;

    CommandName(Supplier<Work> work) {
        this.work = work;
    }

    /** The command a word names. */
    static Optional<CommandName> of(String word) {
        return Arrays.stream(values()).filter(name -> name.word().equals(word)).findFirst();
    }

    static List<String> words() {
        return Arrays.stream(values()).map(CommandName::word).toList();
    }

    /** As typed: {@code derive}. */
    String word() {
        return Words.lowerCase(this);
    }

    /** The command with its options, ready to be parsed; made only for the command asked for, for a quick start. */
    CommandLine commandLine() {
        CommandLine command = new CommandLine(work.get()).setCommandName("pofk " + word()).setUsageHelpWidth(80)
                .setCaseInsensitiveEnumValuesAllowed(true)
                .setColorScheme(CommandLine.Help.defaultColorScheme(CommandLine.Help.Ansi.OFF));
        OfferedFormats.nameIn(command.getCommandSpec());
        return command;
    }
}
