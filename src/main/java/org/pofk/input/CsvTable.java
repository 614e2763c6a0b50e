package org.pofk.input;

import java.util.ArrayList;
import java.util.List;
import org.pofk.text.Faults;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

/**
 * The cells of a comma- or semicolon-separated text, line by line; blank lines are left out. A cell may be quoted
 * with ", a quote in it doubled (RFC 4180). Linear.
 */
final class CsvTable {
    private final Source source;
    private final char separator;
    private final Faults faults = new Faults();
    private final List<List<Node.Scalar>> rows = new ArrayList<>();
    private List<Node.Scalar> row = new ArrayList<>();
    private int at;
    private int line = 1;
    private int column = 1;

    private CsvTable(Source source, char separator) {
        this.source = source;
        this.separator = separator;
    }

    static List<List<Node.Scalar>> rows(Source source, char separator) throws RefusedException {
        ControlCharacters.refuse(source, new Faults());
        CsvTable table = new CsvTable(source, separator);
        while (table.at < source.text().length()) {
            table.readCell();
        }
        table.endRow();
        table.faults.refuseIfAny();
        return table.rows;
    }

    private void readCell() throws RefusedException {
        Position start = here();
        boolean quoted = current() == '"';
        String text = quoted ? quoted(start) : plain();
        row.add(new Node.Scalar(start, text.strip(), quoted ? Node.Style.QUOTED : Node.Style.PLAIN));
        if (at < source.text().length() && current() == separator) {
            step();
            if (at == source.text().length()) {
                row.add(new Node.Scalar(here(), "", Node.Style.PLAIN));
            }
        } else if (at < source.text().length()) {
            endLine();
        }
    }

    private String plain() {
        int start = at;
        while (at < source.text().length() && current() != separator && !isLineEnd()) {
            step();
        }
        return source.text().substring(start, at);
    }

    private String quoted(Position start) throws RefusedException {
        StringBuilder text = new StringBuilder();
        step();
        while (true) {
            if (at == source.text().length()) {
                faults.add(start, "unclosed-quote", "the quote that opens here is never closed");
                faults.refuseIfAny();
            }
            boolean quote = current() == '"';
            boolean doubled = quote && at + 1 < source.text().length() && source.text().charAt(at + 1) == '"';
            if (doubled) {
                step();
            } else if (quote) {
                break;
            }
            text.append(current());
            step();
        }
        step();
        Position behind = here();
        if (!plain().isBlank()) {
            faults.add(behind, "text-after-quote",
                    "a quoted cell must end with its quote; a quote inside it is written twice");
        }
        return text.toString();
    }

    private void endLine() {
        boolean pair = current() == '\r' && at + 1 < source.text().length() && source.text().charAt(at + 1) == '\n';
        at += pair ? 2 : 1;
        line++;
        column = 1;
        endRow();
    }

    private void endRow() {
        boolean blank = row.isEmpty() || row.size() == 1 && row.get(0).isAbsent();
        if (!blank) {
            rows.add(List.copyOf(row));
        }
        row = new ArrayList<>();
    }

    /** One character on, inside a cell. */
    private void step() {
        char c = source.text().charAt(at++);
        if (c == '\n') {
            line++;
            column = 1;
        } else if (!Character.isLowSurrogate(c)) {
            column++;
        }
    }

    private char current() {
        return source.text().charAt(at);
    }

    private boolean isLineEnd() {
        return current() == '\n' || current() == '\r';
    }

    private Position here() {
        return new Position(source.name(), line, column);
    }
}
