package org.pofk.slip;

import java.util.List;
import java.util.stream.Collectors;
import org.pofk.claim.FormulaText;
import org.pofk.claim.MatrixText;
import org.pofk.claim.Statement;

/** A statement as its author would write it into the file: its one text, or its texts in their brackets or by name. */
final class StatementText {
    private StatementText() {
    }

    static String of(Statement statement) {
        if (statement instanceof Statement.Matrix matrix) {
            return MatrixText.of(matrix.rows().stream().map(row -> row.stream().map(FormulaText::text).toList()).toList(),
                    matrix.notation());
        }
        if (statement instanceof Statement.Residues residues) {
            return residues.coefficients().stream().map(each -> each.pole().text() + ": " + one(each.coefficients()))
                    .collect(Collectors.joining(", "));
        }
        if (statement instanceof Statement.LongRunOf longRun) {
            return longRun.parts().size() == 1 ? one(longRun.parts().get(0).values())
                    : longRun.parts().stream().map(part -> part.output().name() + ": " + one(part.values()))
                            .collect(Collectors.joining(", "));
        }
        if (statement instanceof Statement.Poles poles) {
            return poles.poles().stream().map(StatementText::pole).collect(Collectors.joining(", "));
        }
        List<StatementPart> parts = StatementPart.of(statement);
        boolean named = statement instanceof Statement.Pair || statement instanceof Statement.PofK;
        return parts.size() == 1 ? parts.get(0).text().text() : parts.stream()
                .map(part -> (named ? part.name() + ": " : "") + part.text().text()).collect(Collectors.joining(", "));
    }

    /** With its multiplicity. */
    static String pole(Statement.Poles.Pole pole) {
        return pole.value().text() + switch (pole.multiplicity()) {
            case 1 -> "";
            case 2 -> " (twice)";
            default -> " (" + pole.multiplicity() + " times)";
        };
    }

    private static String one(List<FormulaText> texts) {
        return texts.size() == 1 ? texts.get(0).text() : list(texts);
    }

    private static String list(List<FormulaText> texts) {
        return texts.stream().map(FormulaText::text).collect(Collectors.joining(", ", "[", "]"));
    }
}
