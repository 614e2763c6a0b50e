package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.pofk.answer.When.End;
import org.pofk.answer.When.ResidueClass;
import org.pofk.report.Document.Table;

/**
 * How a condition ends by residue of the step, as a table: residues one after the other that end alike share a row,
 * and of many rows the first {@value #ROWS_AT_MOST} are shown.
 */
final class ResidueTable {
    private static final int ROWS_AT_MOST = 12;
    private static final int NAMED_AT_MOST = 3;
    private static final String NO_STEP = "–";

    private ResidueTable() {
    }

    /** Of at least one class, by ascending residue. */
    static Table of(List<ResidueClass> classes) {
        List<Stretch> stretches = stretches(classes);
        String caption = stretches.size() <= ROWS_AT_MOST ? "By step" : "By step, the first " + ROWS_AT_MOST + " of "
                + stretches.size() + " rows; pofk when --as csv has all of them";
        return Table.ofText(caption, List.of("k", "in the end", "first", "for ever from"),
                stretches.stream().limit(ROWS_AT_MOST).map(Stretch::row).toList());
    }

    /** Where the condition is met in the end: {@code at k ≡ 8 … 11 mod 12}. */
    static String met(List<ResidueClass> classes) {
        List<Stretch> met = stretches(classes).stream().filter(each -> each.classes.get(0).end() == End.MET).toList();
        return met.isEmpty() || met.size() > NAMED_AT_MOST ? "at some steps of a cycle, see the table"
                : "at k ≡ " + met.stream().map(Stretch::residues).collect(Collectors.joining(", ")) + " mod "
                        + classes.get(0).modulus();
    }

    private static List<Stretch> stretches(List<ResidueClass> classes) {
        List<Stretch> stretches = new ArrayList<>();
        for (ResidueClass each : classes) {
            int last = stretches.size() - 1;
            if (last >= 0 && stretches.get(last).classes.get(0).end() == each.end()) {
                stretches.get(last).classes.add(each);
            } else {
                stretches.add(new Stretch(new ArrayList<>(List.of(each))));
            }
        }
        return stretches;
    }

    /** Residues one after the other whose steps end alike. */
    private record Stretch(List<ResidueClass> classes) {
        List<String> row() {
            End end = classes.get(0).end();
            return List.of(steps(), end(end),
                    shown(classes.stream().flatMap(each -> each.first().stream()).min(Long::compare)),
                    shown(end == End.MET ? forEverFrom() : Optional.empty()));
        }

        private String residues() {
            long last = classes.get(classes.size() - 1).residue();
            return classes.get(0).residue() + (classes.size() == 1 ? "" : (classes.size() == 2 ? ", " : " … ") + last);
        }

        /** {@code 3, 15, 27, …} or {@code 0 … 7, 12 … 19, …}. */
        private String steps() {
            long modulus = classes.get(0).modulus();
            long begin = classes.get(0).residue();
            if (classes.size() == 1) {
                return begin + ", " + (begin + modulus) + ", " + (begin + 2 * modulus) + ", …";
            }
            long last = classes.get(classes.size() - 1).residue();
            String between = classes.size() == 2 ? ", " : " … ";
            return begin + between + last + ", " + (begin + modulus) + between + (last + modulus) + ", …";
        }

        /** The least step of these residues from which all of them are met. */
        private Optional<Long> forEverFrom() {
            long modulus = classes.get(0).modulus();
            long lastFailed = classes.stream().mapToLong(each -> each.forEverFrom().orElseThrow() - modulus).max()
                    .orElseThrow();
            return classes.stream().map(each -> Math.max(each.residue(), lastFailed + 1
                    + Math.floorMod(each.residue() - lastFailed - 1, modulus))).min(Long::compare);
        }

        private static String shown(Optional<Long> step) {
            return step.map(String::valueOf).orElse(NO_STEP);
        }

        private static String end(End end) {
            return switch (end) {
                case MET -> "met";
                case FAILED -> "not met";
                case BOTH_FOR_EVER -> "met now and then";
                case APPROACH_NOT_DECIDED, TOO_MANY_STEPS -> "not decided";
            };
        }
    }
}
