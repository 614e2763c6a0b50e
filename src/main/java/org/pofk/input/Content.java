package org.pofk.input;

import org.pofk.claim.FormulaText.Notation;
import org.pofk.text.Places;

/** What a claim states, or a part of it, as it stands in the file, and the notation of the formulas in it. */
record Content(Node node, Notation notation) {

    /** A text in it with the place of each of its characters. */
    record Text(String text, Places places, Notation notation) {
    }

    /** Whether it is one text of LaTeX, which may hold a list or a matrix. */
    boolean isLatexText() {
        return notation == Notation.LATEX && node.asScalar().isPresent();
    }

    /** A part of it. */
    Content part(Node inner) {
        return new Content(inner, notation);
    }
}
