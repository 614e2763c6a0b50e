package org.pofk.claim;

import org.pofk.formula.ParsedFormula;

/** A formula of a claim as its author wrote it, and as it was read. */
public record FormulaText(String text, Notation notation, ParsedFormula parsed) {

    /** What the author writes in. */
    public enum Notation { PLAIN, LATEX }
}
