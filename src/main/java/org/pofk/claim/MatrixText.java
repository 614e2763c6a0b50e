package org.pofk.claim;

import java.util.List;
import java.util.stream.Collectors;

/** A matrix as its author would write it: rows in brackets, or a pmatrix where he writes LaTeX. */
public final class MatrixText {
    private MatrixText() {
    }

    /** The rows as written, in the notation of the entries. */
    public static String of(List<List<String>> rows, FormulaText.Notation notation) {
        return notation == FormulaText.Notation.LATEX
                ? rows.stream().map(row -> String.join(" & ", row))
                        .collect(Collectors.joining(" \\\\ ", "\\begin{pmatrix} ", " \\end{pmatrix}"))
                : rows.stream().map(row -> "[" + String.join(", ", row) + "]")
                        .collect(Collectors.joining(", ", "[", "]"));
    }
}
