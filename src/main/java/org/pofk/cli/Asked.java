package org.pofk.cli;

import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;

/**
 * Which command is asked for, and with which arguments. {@code pofk MODEL} and {@code pofk --of lost MODEL} ask for
 * {@code derive}.
 */
record Asked(CommandName command, List<String> options) {
    private static final Pattern LOOKS_LIKE_A_FILE = Pattern.compile(".*[/\\\\].*|.*\\.(?i:ya?ml|json|csv|txt)");

    Asked {
        options = List.copyOf(options);
    }

    static Asked of(List<String> arguments) throws UsageException {
        if (arguments.isEmpty()) {
            throw new UsageException("what shall be done? For example:  pofk derive model.yaml\n"
                    + "The commands: " + String.join(", ", CommandName.words()) + "; more with  pofk help");
        }
        String first = arguments.get(0);
        List<String> rest = arguments.subList(1, arguments.size());
        if (first.equals("--help") || first.equals("-h")) {
            return new Asked(CommandName.HELP, rest);
        }
        if (first.equals("--version") || first.equals("-V")) {
            return new Asked(CommandName.VERSION, rest);
        }
        Optional<CommandName> command = CommandName.of(first);
        if (command.isPresent()) {
            return new Asked(command.get(), rest);
        }
        if (first.startsWith("-") || isFile(first)) {
            return new Asked(CommandName.DERIVE, arguments);
        }
        throw Misunderstood.command(first, rest);
    }

    private static boolean isFile(String word) {
        if (LOOKS_LIKE_A_FILE.matcher(word).matches()) {
            return true;
        }
        try {
            return Files.exists(Path.of(word));
        } catch (InvalidPathException noPath) {
            return false;
        }
    }
}
