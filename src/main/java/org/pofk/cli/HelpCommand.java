package org.pofk.cli;

import java.util.List;
import java.util.Optional;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;

/** {@code pofk help}: the commands; {@code pofk help WORDS}: the command that answers a word of the trade. */
@Command(description = "Explains a command, or leads from a word of the trade to the command that answers it.")
final class HelpCommand implements Work {
    private static final List<String> OVERVIEW = List.of(
            "pofk: exact, proven formulas p(k) for a chain that moves in steps",
            "",
            "  pofk derive MODEL     formulas that hold for every k, with their proof",
            "                        (also what  pofk MODEL  does)",
            "  pofk inspect MODEL    the structure: classes, periods, long run, warnings",
            "  pofk simulate MODEL   random walks with intervals, beside the exact values",
            "  pofk when MODEL       from which step a condition holds, and whether for ever",
            "  pofk passage MODEL    how long until a set of states is first entered",
            "  pofk total MODEL      steps spent in states, entries and costs, added up",
            "  pofk check CLAIMS     a derivation made by hand: which steps are right, which",
            "                        are wrong, and by which slip",
            "  pofk report MODEL     the document to hand in: results first, then the whole",
            "                        derivation, how it was checked, and what it stands on",
            "  pofk draw MODEL       p(k) over steps, its poles, or the states, as a figure",
            "  pofk new              patterns to start a model from",
            "  pofk help COMMAND     the options of a command",
            "  pofk help WORDS       from a word of the trade to the command that answers it:",
            "                        steady state, availability, mean time to failure, …",
            "  pofk version          which version this is",
            "",
            "Begin:  pofk new pump-pair --save pumps.yaml",
            "        pofk derive pumps.yaml --of lost");

    @Parameters(arity = "0..*", paramLabel = "WORDS", description = "a command, or words of the trade")
    private List<String> words = List.of();

    @Mixin
    private CommonOptions common;

    @Override
    public ExitCode run(Streams streams) throws UsageException {
        String asked = String.join(" ", words);
        Optional<CommandName> command = CommandName.of(asked);
        if (asked.isBlank()) {
            OVERVIEW.forEach(streams.answer()::println);
        } else if (command.isPresent()) {
            command.get().commandLine().usage(streams.answer());
        } else {
            explain(asked, streams);
        }
        return ExitCode.ANSWERED;
    }

    private static void explain(String asked, Streams streams) throws UsageException {
        Optional<Planned> planned = Planned.of(asked);
        Optional<TradeWords.Entry> entry = TradeWords.read().about(asked);
        if (planned.isEmpty() && entry.isEmpty()) {
            throw unknown(asked);
        }
        planned.ifPresent(command -> streams.answer().println(
                "'" + command.word() + "' isn't built yet: it " + command.purpose()));
        entry.ifPresent(found -> found.shown().forEach(streams.answer()::println));
    }

    private static UsageException unknown(String asked) {
        TradeWords known = TradeWords.read();
        return new UsageException("nothing is known about '" + asked + "'"
                + Meant.didYouMean(known.words(), asked) + "\nWhat there is:  pofk help");
    }
}
