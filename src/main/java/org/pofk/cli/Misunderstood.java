package org.pofk.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import org.pofk.text.Suggestion;
import picocli.CommandLine;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.UnmatchedArgumentException;

/** What is wrong with a command line, and what may have been meant. */
final class Misunderstood {
    private Misunderstood() {
    }

    /** A first word that is no command. */
    static UsageException command(String word, List<String> rest) {
        Optional<Planned> planned = Planned.of(word);
        if (planned.isPresent()) {
            return new UsageException("'" + word + "' isn't built yet (it " + planned.get().purpose() + ")"
                    + rest.stream().map(TakenBy::file).flatMap(Optional::stream).map(line -> "\n" + line)
                            .collect(Collectors.joining()));
        }
        return new UsageException("there is no command and no file '" + word + "'"
                + Suggestion.didYouMean(CommandName.words(), word)
                + "\nThe commands: " + String.join(", ", CommandName.words()) + "; more with  pofk help");
    }

    /** Options or files that a command can't take. */
    static UsageException of(ParameterException misunderstood) {
        CommandLine command = misunderstood.getCommandLine();
        String message = misunderstood instanceof UnmatchedArgumentException unmatched
                ? leftOver(command, unmatched.getUnmatched().get(0))
                : WrongValue.of(misunderstood).orElseGet(() -> lowerCaseFirst(misunderstood.getMessage()));
        return new UsageException(message + "\nAll options:  pofk help " + word(command));
    }

    private static String leftOver(CommandLine command, String word) {
        if (!word.startsWith("-")) {
            return "'" + word + "' is one too many for " + command.getCommandName();
        }
        String option = word.contains("=") ? word.substring(0, word.indexOf('=')) : word;
        return "there is no option '" + option + "' for " + command.getCommandName()
                + Meant.didYouMean(options(command.getCommandSpec()), option);
    }

    private static List<String> options(CommandSpec specification) {
        List<String> names = new ArrayList<>();
        specification.options().forEach(option -> names.addAll(List.of(option.names())));
        return names;
    }

    private static String word(CommandLine command) {
        String name = command.getCommandName();
        return name.substring(name.indexOf(' ') + 1);
    }

    private static String lowerCaseFirst(String sentence) {
        return sentence.substring(0, 1).toLowerCase(Locale.ROOT) + sentence.substring(1);
    }
}
