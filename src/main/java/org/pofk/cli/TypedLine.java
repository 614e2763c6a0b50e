package org.pofk.cli;

import java.util.List;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;

/** A command line as it was typed, quoted as a shell would need it. */
final class TypedLine {
    private static final Pattern PLAIN = Pattern.compile("[\\p{L}\\p{N}_./:=,%+@^-]+");

    private TypedLine() {
    }

    static String of(String command, List<String> arguments) {
        return Stream.concat(Stream.of("pofk", command), arguments.stream().map(TypedLine::quoted))
                .collect(Collectors.joining(" "));
    }

    private static String quoted(String argument) {
        return PLAIN.matcher(argument).matches() ? argument : "'" + argument.replace("'", "'\\''") + "'";
    }
}
