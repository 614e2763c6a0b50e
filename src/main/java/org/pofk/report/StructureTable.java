package org.pofk.report;

import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.pofk.answer.InspectedModel;
import org.pofk.chain.Structure.CommunicatingClass;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;

/**
 * A model's states with their classes, and the long run of each state and output: a row for a limit, a row for each
 * residue of k for a cycle; {@code exact} is empty where there is neither, or where it wasn't worked out.
 */
public final class StructureTable {
    private final InspectedModel inspected;
    private final Rows rows;

    private StructureTable(InspectedModel inspected, Rows rows) {
        this.inspected = inspected;
        this.rows = rows;
    }

    /** @param digits significant digits of decimals */
    public static Document.Table of(InspectedModel inspected, int digits) {
        Rows rows = new Rows(digits, Rows.words("name", "is", "class", "kind", "period", "reached", "long run",
                "residue", "modulus", "exact", "decimal"));
        StructureTable table = new StructureTable(inspected, rows);
        table.states();
        inspected.outputs().forEach(output -> table.longRun(List.of(Prose.name(output.output().name()),
                Prose.of("output"), Prose.EMPTY, Prose.EMPTY, Prose.EMPTY, Prose.EMPTY), output.longRun().byPoles()));
        return rows.table();
    }

    private void states() {
        List<CommunicatingClass> classes = inspected.inspection().structure().classes();
        for (int i = 0; i < classes.size(); i++) {
            for (int state : classes.get(i).states()) {
                List<Prose> name = List.of(Prose.name(inspected.model().chain().states().get(state)),
                        Prose.of("state"), Prose.of(String.valueOf(i + 1)), Prose.of(kind(classes.get(i))),
                        Prose.of(String.valueOf(classes.get(i).period())),
                        Prose.of(classes.get(i).reached() ? "yes" : "no"));
                if (inspected.states().isEmpty()) {
                    rows.add(name, Rows.words("", "", "", "", ""));
                } else {
                    longRun(name, inspected.states().get(state));
                }
            }
        }
    }

    private static String kind(CommunicatingClass each) {
        return each.isAbsorbing() ? "absorbing" : each.closed() ? "closed" : "transient";
    }

    private void longRun(List<Prose> name, LongRun longRun) {
        longRun.accept(new ByResidue(rows)).forEach(cells -> rows.add(name, cells));
    }

    private record ByResidue(Rows rows) implements LongRun.Visitor<List<List<Prose>>> {
        @Override
        public List<List<Prose>> limit(LongRun.Limit limit) {
            return List.of(row("limit", 0, 1, limit.value()));
        }

        @Override
        public List<List<Prose>> cycle(LongRun.Cycle cycle) {
            return IntStream.range(0, cycle.period())
                    .mapToObj(j -> row("cycle", j, cycle.period(), cycle.values().get(j))).toList();
        }

        @Override
        public List<List<Prose>> none(LongRun.None none) {
            return List.of(Rows.words("none", "", "", "", ""));
        }

        private List<Prose> row(String word, int residue, int modulus, Rational value) {
            return Stream.concat(Rows.words(word, String.valueOf(residue), String.valueOf(modulus)).stream(),
                    rows.value(value).stream()).toList();
        }
    }
}
