package org.pofk.input;

import java.util.List;
import java.util.Optional;
import org.pofk.exact.Rational;
import org.pofk.input.TableOptions.NamesIn;
import org.pofk.input.TableOptions.Separator;
import org.pofk.text.Faults;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

/**
 * A square table of numbers with the names of its states, where it gives them. A table that can be read in two ways
 * is refused, with the way to say which is meant.
 *
 * @param names as many as there are rows, or none
 * @param cells n rows of n cells, decimal commas turned into points where semicolons separate
 */
record NamedTable(List<Node.Scalar> names, List<List<Node.Scalar>> cells) {

    static NamedTable of(Source source, TableOptions options) throws RefusedException {
        Faults faults = new Faults();
        Separator separator = options.separator().orElseGet(() -> separator(source, faults));
        faults.refuseIfAny();
        List<List<Node.Scalar>> rows = CsvTable.rows(source, separator.sign());
        if (rows.isEmpty()) {
            faults.add(Position.ofWhole(source.name()), "empty-file", "the file holds nothing");
            faults.refuseIfAny();
        }
        checkRectangle(rows, faults);
        faults.refuseIfAny();
        NamesIn names = options.names().orElseGet(() -> names(rows, separator, faults));
        faults.refuseIfAny();
        checkSquare(rows, names, faults);
        faults.refuseIfAny();
        NamedTable table = new NamedTable(names(rows, names, faults), cells(rows, names, separator));
        faults.refuseIfAny();
        return table;
    }

    /** A semicolon in the first or last line decides; when only one of them has any, the file is ambiguous. */
    private static Separator separator(Source source, Faults faults) {
        List<String> lines = source.text().lines().filter(line -> !line.isBlank()).toList();
        if (lines.isEmpty()) {
            return Separator.COMMA;
        }
        boolean first = hasOutsideQuotes(lines.get(0), ';');
        boolean last = hasOutsideQuotes(lines.get(lines.size() - 1), ';');
        if (first != last) {
            faults.add(new Position(source.name(), 1, 1), "two-readings", "the table can be read in two ways: the "
                    + (first ? "first" : "last") + " line has semicolons between its cells, the "
                    + (first ? "last" : "first") + " line has none; say separator: comma or separator: semicolon "
                    + "(--separator)");
        }
        return first || last ? Separator.SEMICOLON : Separator.COMMA;
    }

    private static boolean hasOutsideQuotes(String line, char sign) {
        return line.replaceAll("\"[^\"]*\"", "").indexOf(sign) >= 0;
    }

    private static void checkRectangle(List<List<Node.Scalar>> rows, Faults faults) {
        int width = rows.get(0).size();
        if (width == 1 && rows.get(0).get(0).text().indexOf('\t') >= 0) {
            faults.add(rows.get(0).get(0).position(), "tab",
                    "this line has tabs between its cells; separate them by commas or semicolons");
            return;
        }
        for (List<Node.Scalar> row : rows) {
            if (row.size() != width) {
                faults.add(row.get(0).position(), "ragged-table", "this line has "
                        + Words.count(row.size(), "cell", "cells") + ", but the first one has " + width
                        + "; all lines must have as many");
            }
        }
    }

    /** Where the names stand, by the shape of the table and by what can't be a number. */
    private static NamesIn names(List<List<Node.Scalar>> rows, Separator separator, Faults faults) {
        int more = rows.size() - rows.get(0).size();
        Node.Scalar corner = rows.get(0).get(0);
        if (more == 1) {
            return unlessNumbers(rows.get(0), NamesIn.ROW, separator, faults);
        }
        if (more == -1) {
            List<Node.Scalar> column = rows.stream().map(row -> row.get(0)).toList();
            return unlessNumbers(column, NamesIn.COLUMN, separator, faults);
        }
        boolean named = !isContent(corner, separator) && rows.size() > 1;
        return more == 0 && named ? NamesIn.BOTH : NamesIn.NOWHERE;
    }

    /** A first line of probabilities may be names, or one line too many. */
    private static NamesIn unlessNumbers(List<Node.Scalar> line, NamesIn names, Separator separator, Faults faults) {
        if (line.stream().allMatch(cell -> couldBeProbability(cell, separator))) {
            String what = names == NamesIn.ROW ? "row" : "column";
            faults.add(line.get(0).position(), "two-readings", "the table can be read in two ways: the first " + what
                    + " may name the states, or be a " + what + " of probabilities too many; say names: " + what
                    + " (--names " + what + ") when it names them, or take it out");
        }
        return names;
    }

    private static boolean couldBeProbability(Node.Scalar cell, Separator separator) {
        Optional<Rational> value = Numerals.read(normalized(cell, separator).text(), cell.position(), new Faults());
        return cell.isPlain() && value.filter(number -> number.signum() >= 0
                && number.compareTo(Rational.ONE) <= 0).isPresent();
    }

    private static boolean isContent(Node.Scalar cell, Separator separator) {
        return Amounts.isRest(cell) || Numerals.isNumeral(normalized(cell, separator).text());
    }

    private static void checkSquare(List<List<Node.Scalar>> rows, NamesIn names, Faults faults) {
        int height = rows.size() - names.rows();
        int width = rows.get(0).size() - names.columns();
        if (height != width || height == 0) {
            faults.add(rows.get(0).get(0).position(), "not-square", "the table has "
                    + Words.count(rows.size(), "line", "lines") + " of "
                    + Words.count(rows.get(0).size(), "cell", "cells") + "; a matrix of moves is square, with at most "
                    + "one line and one column of names besides");
        }
    }

    private static List<Node.Scalar> names(List<List<Node.Scalar>> rows, NamesIn names, Faults faults) {
        List<Node.Scalar> across = names.rows() == 0 ? List.of()
                : rows.get(0).subList(names.columns(), rows.get(0).size());
        List<Node.Scalar> down = names.columns() == 0 ? List.of()
                : rows.subList(names.rows(), rows.size()).stream().map(row -> row.get(0)).toList();
        if (names == NamesIn.BOTH) {
            checkSameNames(across, down, faults);
        }
        return across.isEmpty() ? down : across;
    }

    private static void checkSameNames(List<Node.Scalar> across, List<Node.Scalar> down, Faults faults) {
        for (int i = 0; i < across.size(); i++) {
            if (!across.get(i).name().equals(down.get(i).name())) {
                faults.add(down.get(i).position(), "names-differ", "the first column names " + down.get(i).inWords()
                        + " where the first line names " + across.get(i).inWords()
                        + "; both must name the same states in the same order");
            }
        }
    }

    private static List<List<Node.Scalar>> cells(List<List<Node.Scalar>> rows, NamesIn names, Separator separator) {
        return rows.subList(names.rows(), rows.size()).stream()
                .map(row -> row.subList(names.columns(), row.size()).stream()
                        .map(cell -> normalized(cell, separator)).toList()).toList();
    }

    private static Node.Scalar normalized(Node.Scalar cell, Separator separator) {
        return separator == Separator.SEMICOLON && Numerals.hasDecimalComma(cell.text())
                ? new Node.Scalar(cell.position(), Numerals.withDecimalPoint(cell.text()), cell.style()) : cell;
    }
}
