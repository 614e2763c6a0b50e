package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Model.Convention;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.Rational;

/** The states, the matrix in the reader's convention and the start as Python. */
final class PythonChain {
    private static final int SQUARE_UP_TO = 12;

    private PythonChain() {
    }

    static String of(Chain chain, Convention convention) {
        List<String> lines = new ArrayList<>();
        lines.add("states = [" + chain.states().stream().map(Python::text).collect(Collectors.joining(", ")) + "]");
        lines.addAll(chain.size() <= SQUARE_UP_TO ? square(chain, convention) : moves(chain));
        lines.add("start = " + Python.numbers(chain.start()));
        if (chain.kind() == Chain.Kind.CHAIN) {
            lines.addAll(List.of(
                    "require(\"what leaves every state adds up to one, nothing is negative\",",
                    "        all(weight > 0 for _, _, weight in moves) and",
                    "        all(sum(weight for source, _, weight in moves if source == state) == 1",
                    "            for state in range(len(states))))",
                    "require(\"the start adds up to one\", sum(start) == 1 and min(start) >= 0)"));
        }
        return String.join("\n", lines);
    }

    private static List<String> square(Chain chain, Convention convention) {
        boolean columns = convention == Convention.COLUMNS;
        String name = columns ? "A" : "P";
        List<String> lines = new ArrayList<>(List.of(name + " = [  # " + (columns
                ? "columns: from, rows: to" : "rows: from, columns: to")));
        for (int down = 0; down < chain.size(); down++) {
            int row = down;
            lines.add("    " + Python.numbers(IntStream.range(0, chain.size()).mapToObj(across -> columns
                    ? chain.matrix().at(row, across) : chain.matrix().at(across, row)).toList()) + ",");
        }
        lines.add("]");
        lines.add("moves = [(source, target, " + name + (columns ? "[target][source]" : "[source][target]") + ")");
        lines.add("         for source in range(len(states)) for target in range(len(states))");
        lines.add("         if " + name + (columns ? "[target][source]" : "[source][target]") + " != 0]");
        return lines;
    }

    /** One move a line: from, to, weight. */
    private static List<String> moves(Chain chain) {
        List<String> lines = new ArrayList<>(List.of("moves = [(int(source), int(target), Fraction(weight))"
                + " for source, target, weight in (line.split() for line in \"\"\""));
        for (int source = 0; source < chain.size(); source++) {
            for (Entry entry : chain.matrix().columns().get(source)) {
                Rational weight = entry.value();
                lines.add(source + " " + entry.row() + " " + weight);
            }
        }
        lines.add("\"\"\".strip().splitlines())]");
        return lines;
    }
}
