package org.pofk.input;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.pofk.text.Faults;
import org.pofk.text.Position;
import org.snakeyaml.engine.v2.events.Event;
import org.snakeyaml.engine.v2.events.ScalarEvent;
import org.snakeyaml.engine.v2.exceptions.Mark;
import org.snakeyaml.engine.v2.exceptions.MarkedYamlEngineException;
import org.snakeyaml.engine.v2.exceptions.YamlEngineException;
import org.snakeyaml.engine.v2.exceptions.YamlVersionException;

/**
 * Says in plain words why a text isn't YAML, and where: the scanner stops where it can't go on, which is often a line
 * behind the one that lacks a quote, a bracket or a colon.
 */
final class YamlSyntax {
    private final Source source;
    private final Faults faults;
    private final List<String> lines;

    private YamlSyntax(Source source, Faults faults) {
        this.source = source;
        this.faults = faults;
        this.lines = source.text().lines().toList();
    }

    static Position place(Source source, Mark mark) {
        return new Position(source.name(), mark.getLine() + 1, mark.getColumn() + 1);
    }

    /**
     * Adds the fault that the library's exception stands for.
     *
     * @param last the event before it
     * @param open where the innermost list or mapping begins that has not ended
     */
    static void explain(YamlEngineException exception, Optional<Event> last, Optional<Position> open, Source source,
            Faults faults) {
        if (exception instanceof YamlVersionException) {
            faults.add(new Position(source.name(), 1, 1), "yaml-version",
                    "only YAML 1.2 is read; leave the %YAML line out");
            return;
        }
        if (!(exception instanceof MarkedYamlEngineException marked)) {
            throw new AssertionError("unexpected from the YAML library for " + source.name(), exception);
        }
        Position at = marked.getProblemMark().map(mark -> place(source, mark)).orElse(Position.ofWhole(source.name()));
        Position began = marked.getContextMark().map(mark -> place(source, mark)).orElse(at);
        String problem = Optional.ofNullable(marked.getProblem()).orElse("");
        String context = Optional.ofNullable(marked.getContext()).orElse("");
        if (context.contains("flow node") && problem.contains("stream end")) {
            faults.add(open.orElse(began), "unclosed-bracket", "the bracket that opens here is never closed");
            return;
        }
        YamlSyntax syntax = new YamlSyntax(source, faults);
        if (!syntax.isLateQuote(last, at) && !syntax.isCharacters(problem, at, began)) {
            syntax.isStructure(problem, context, at, began);
        }
    }

    /** A quote that was left open ends where the next one opens, lines later. */
    private boolean isLateQuote(Optional<Event> last, Position at) {
        Optional<ScalarEvent> quoted = last.filter(event -> event.getEventId() == Event.ID.Scalar)
                .map(ScalarEvent.class::cast).filter(scalar -> scalar.isDQuoted() || scalar.isSQuoted());
        if (quoted.isEmpty()) {
            return false;
        }
        Position start = place(source, quoted.get().getStartMark().orElseThrow());
        Position end = place(source, quoted.get().getEndMark().orElseThrow());
        if (end.line() == start.line() || end.line() != at.line()) {
            return false;
        }
        faults.add(start, "unclosed-quote", "the quote that opens here closes only in line " + end.line()
                + "; close it where its text ends");
        return true;
    }

    private boolean isCharacters(String problem, Position at, Position began) {
        if (problem.contains("TAB")) {
            faults.add(at, "tab", "a tab can't indent a line; use spaces");
        } else if (problem.contains("unexpected end of stream")) {
            faults.add(began, "unclosed-quote", "the quote that opens here is never closed");
        } else if (problem.contains("escape") || problem.contains("hexadecimal")) {
            faults.add(at, "unknown-escape", "a backslash inside double quotes must be followed by an escape that "
                    + "YAML knows; use single quotes");
        } else if (problem.contains("cannot start any token")) {
            faults.add(at, "misplaced-character", "a value can't begin with "
                    + problem.replaceAll("(?s)^.*?('.*?').*$", "$1") + "; put it in quotes");
        } else {
            return false;
        }
        return true;
    }

    private void isStructure(String problem, String context, Position at, Position began) {
        if (problem.contains("expected ',' or")) {
            explainBracket(problem, at, began);
        } else if (problem.contains("mapping values are not allowed")) {
            explainColon(at);
        } else if (context.contains("parsing a block") || problem.contains("not allowed here")) {
            faults.add(at, "indentation", "this line doesn't fit the lines above; indent entries that belong together "
                    + "equally, and give each its ':' or '-'");
        } else if (context.contains("simple key") || problem.contains("':'")) {
            faults.add(began, "missing-colon", "a ':' and a blank are missing after the key");
        } else {
            faults.add(at, "not-yaml", "this isn't YAML (" + Words.shortened(problem) + ")");
        }
    }

    /** A line that isn't indented deeper than the one with the bracket is no part of what is in the bracket. */
    private void explainBracket(String problem, Position at, Position began) {
        String closing = problem.contains("']'") ? "]" : "}";
        if (problem.contains("stream end")) {
            faults.add(began, "unclosed-bracket", "the bracket that opens here is never closed; a '" + closing
                    + "' is missing");
        } else if (leavesEntry(began.line(), at.line())) {
            faults.add(began, "unclosed-bracket", "the bracket that opens here isn't closed in its entry; a '" + closing + "' is missing");
        } else {
            faults.add(at, "missing-comma", "a ',' or '" + closing + "' is missing before this; the bracket opens at "
                    + "line " + began.line() + ", column " + began.column());
        }
    }

    private boolean leavesEntry(int opened, int line) {
        boolean isFlow = source.text().stripLeading().startsWith("{");
        return !isFlow && IntStream.rangeClosed(opened + 1, line).filter(between -> !line(between).isBlank())
                .anyMatch(between -> indentation(between) <= indentation(opened));
    }

    /** A colon stops the scanner also when the line above lacks its own and so runs on into this one. */
    private void explainColon(Position at) {
        int above = at.line() - 1;
        while (above > 0 && (line(above).isBlank() || line(above).stripLeading().startsWith("#"))) {
            above--;
        }
        Optional<Integer> item = Stream.of(above, at.line())
                .filter(line -> line > 0 && line(line).strip().matches("-\\p{L}.*:.*")).findFirst();
        if (item.isPresent()) {
            faults.add(new Position(source.name(), item.get(), indentation(item.get()) + 1), "missing-blank",
                    "a blank is missing after '-'");
            return;
        }
        boolean runsOn = above > 0 && !line(above).matches(".*:(\\s.*)?") && isFirstColon(at);
        if (runsOn) {
            faults.add(new Position(source.name(), above, indentation(above) + 1), "missing-colon",
                    "a ':' with a blank behind it is missing in this line");
        } else {
            faults.add(at, "misplaced-colon", "a ': ' can't stand here; indent the line like its neighbours, or quote "
                    + "a text that holds ': '");
        }
    }

    private boolean isFirstColon(Position at) {
        String line = line(at.line());
        return line.indexOf(':') == line.offsetByCodePoints(0, Math.min(at.column() - 1, line.codePointCount(0, line.length())));
    }

    private int indentation(int line) {
        String text = line(line);
        return text.length() - text.stripLeading().length();
    }

    private String line(int number) {
        return number <= lines.size() ? lines.get(number - 1) : "";
    }
}
