package org.pofk.input;

import java.util.Optional;
import org.pofk.text.Faults;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.exceptions.MarkedYamlEngineException;
import org.snakeyaml.engine.v2.exceptions.YamlEngineException;
import org.snakeyaml.engine.v2.exceptions.YamlVersionException;
import org.snakeyaml.engine.v2.scanner.StreamReader;

/** Says in plain words why a text isn't YAML. */
final class YamlSyntax {
    private YamlSyntax() {
    }

    static Position place(Source source, Mark mark) {
        return new Position(source.name(), mark.getLine() + 1, mark.getColumn() + 1);
    }

    /** Refuses control characters, at the first one. */
    static void refuseSpecialCharacters(Source source, Faults faults) throws RefusedException {
        String text = source.text();
        int c;
        for (int i = 0; i < text.length(); i += Character.charCount(c)) {
            c = text.codePointAt(i);
            if (!StreamReader.isPrintable(c)) {
                faults.add(Lines.at(source.name(), text, i), "control-character",
                        String.format("the character U+%04X can't stand in a text; remove it", c));
                faults.refuseIfAny();
            }
        }
    }

    /** Adds the fault that the library's exception stands for. */
    static void explain(YamlEngineException exception, Source source, Faults faults) {
        if (exception instanceof YamlVersionException) {
            faults.add(new Position(source.name(), 1, 1), "yaml-version",
                    "only YAML 1.2 is read; leave the %YAML line out");
            return;
        }
        if (!(exception instanceof MarkedYamlEngineException marked)) {
            throw new AssertionError("unexpected from the YAML library for " + source.name(), exception);
        }
        Position at = marked.getProblemMark().map(mark -> place(source, mark)).orElse(Position.ofWhole(source.name()));
        Optional<Position> began = marked.getContextMark().map(mark -> place(source, mark));
        String problem = Optional.ofNullable(marked.getProblem()).orElse("");
        explain(problem, Optional.ofNullable(marked.getContext()).orElse(""), at, began.orElse(at), faults);
    }

    private static void explain(String problem, String context, Position at, Position began, Faults faults) {
        if (problem.contains("TAB")) {
            faults.add(at, "tab", "a tab can't indent a line; use spaces");
        } else if (problem.contains("unexpected end of stream")) {
            faults.add(began, "unclosed-quote", "the quote that opens here is never closed");
        } else if (problem.contains("expected ',' or")) {
            explainBracket(problem, at, began, faults);
        } else if (problem.contains("mapping values are not allowed")) {
            faults.add(at, "misplaced-colon",
                    "a ': ' can't stand here; indent the line like its neighbours, or quote a text that holds ': '");
        } else if (problem.contains("escape") || problem.contains("hexadecimal")) {
            faults.add(at, "unknown-escape", "a backslash inside double quotes must be followed by an escape that "
                    + "YAML knows; use single quotes");
        } else if (problem.contains("cannot start any token")) {
            faults.add(at, "misplaced-character", "a value can't begin with "
                    + problem.replaceAll("^.*?('.*?').*$", "$1") + "; put it in quotes");
        } else if (context.contains("parsing a block") || problem.contains("not allowed here")) {
            faults.add(at, "indentation", "this line doesn't fit the lines above; indent entries that belong together "
                    + "equally, and give each its ':' or '-'");
        } else if (context.contains("simple key") || problem.contains("':'")) {
            faults.add(began, "missing-colon", "a ':' and a blank are missing after the key");
        } else {
            faults.add(at, "not-yaml", "this isn't YAML (" + Words.shortened(problem) + ")");
        }
    }

    private static void explainBracket(String problem, Position at, Position began, Faults faults) {
        String closing = problem.contains("']'") ? "]" : "}";
        if (problem.contains("stream end")) {
            faults.add(began, "unclosed-bracket", "the bracket that opens here is never closed; a '" + closing
                    + "' is missing");
        } else {
            faults.add(at, "missing-comma", "a ',' or '" + closing + "' is missing before this; the bracket opens at "
                    + "line " + began.line() + ", column " + began.column());
        }
    }
}
