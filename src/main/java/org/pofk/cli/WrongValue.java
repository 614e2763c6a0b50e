package org.pofk.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.pofk.text.Suggestion;
import picocli.CommandLine.MissingParameterException;
import picocli.CommandLine.Model.ArgSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.OverwrittenOptionException;
import picocli.CommandLine.ParameterException;

/** What is wrong with the value of an option, in the words of somebody who types it. */
final class WrongValue {
    /** How the parser begins what a converter of ours says. */
    private static final Pattern OF_OPTION = Pattern.compile("(?s)Invalid value for option '(--[a-z-]+)'[^:]*: (.*)");

    private WrongValue() {
    }

    /** Nothing where it is no option's value that is wrong. */
    static Optional<String> of(ParameterException misunderstood) {
        if (misunderstood instanceof OverwrittenOptionException twice
                && twice.getOverwritten() instanceof OptionSpec option) {
            return Optional.of(option.longestName() + " is given twice; give it once");
        }
        if (misunderstood instanceof MissingParameterException missing
                && missing.getMissing().get(0) instanceof OptionSpec option) {
            return Optional.of(option.longestName() + " needs something after it: " + option.longestName() + " "
                    + option.paramLabel());
        }
        if (misunderstood instanceof MissingParameterException missing) {
            return Optional.of("which " + missing.getMissing().get(0).paramLabel() + "? It is missing");
        }
        if (!(misunderstood.getArgSpec() instanceof OptionSpec option)) {
            return Optional.empty();
        }
        Matcher message = OF_OPTION.matcher(misunderstood.getMessage());
        if (!message.matches()) {
            return Optional.empty();
        }
        return Optional.of(message.group(1) + ": "
                + said(option, misunderstood.getValue()).orElse(message.group(2)));
    }

    private static Class<?> type(ArgSpec option) {
        return option.typeInfo().isOptional() || option.typeInfo().isCollection()
                ? option.typeInfo().getAuxiliaryTypes()[0] : option.typeInfo().getType();
    }

    private static Optional<String> said(OptionSpec option, String value) {
        if (value == null) {
            return Optional.empty();
        }
        Class<?> type = type(option);
        if (type.isEnum()) {
            List<String> known = known(option);
            return Optional.of("'" + value + "' isn't known; " + Words.listed(known, "or")
                    + Suggestion.didYouMean(known, value));
        }
        if (type == int.class || type == long.class) {
            return Optional.of(value.matches("[-+]?\\d+") ? value + " is too large"
                    : "'" + value + "' is no whole number");
        }
        return type == Double.class ? Optional.of("'" + value + "' is no number; write for example 60")
                : Optional.empty();
    }

    private static List<String> known(OptionSpec option) {
        List<String> known = new ArrayList<>();
        option.completionCandidates().forEach(candidate -> known.add(candidate.toLowerCase(Locale.ROOT)));
        return known;
    }
}
