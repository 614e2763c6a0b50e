package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.answer.DerivedOutput;

/** The outputs' values at the steps asked for. */
final class ValuesTable {
    private ValuesTable() {
    }

    static Document.Table of(List<DerivedOutput> outputs, int digits) {
        List<Prose> header = new ArrayList<>(List.of(Prose.of("k")));
        outputs.forEach(output -> header.add(Prose.name(output.output().name())));
        int rows = outputs.stream().mapToInt(output -> output.values().size()).max().orElse(0);
        return new Document.Table(Prose.of("Values at the end of step k"), header,
                IntStream.range(0, rows).mapToObj(row -> row(outputs, row, digits)).toList());
    }

    private static List<Prose> row(List<DerivedOutput> outputs, int row, int digits) {
        List<Prose> cells = new ArrayList<>(List.of(Prose.of(String.valueOf(outputs.get(0).values().get(row).k()))));
        outputs.forEach(output -> cells.add(Prose.of(ValueText.of(output.values().get(row), digits))));
        return cells;
    }
}
