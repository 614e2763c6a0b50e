package org.pofk.formula;

import org.pofk.text.Places;
import org.pofk.text.RefusedException;

/**
 * Reads a formula in LaTeX as people write it, to the tree that {@link FormulaParser} gives for the same formula in
 * ordinary notation, with the place of every part in the LaTeX text. What is read is what the text prints as; where
 * that has two readings, or where something isn't known, the text is refused in its place. Linear in the length.
 */
public final class LatexReader {

    private LatexReader() {
    }

    /** Reads a text whose characters stand at {@code places}; a left side that says what is expected is dropped. */
    public static ParsedFormula parse(String text, Places places, FormulaReading reading) throws RefusedException {
        Limits.CLAIM.require(text, places);
        Cursor cursor = new Cursor(text, places, LatexTokens.read(text, places, reading),
                new Rules(Notation.LATEX, Limits.CLAIM, reading.unit()));
        LeftSide.drop(cursor, reading.subject());
        return FormulaParser.whole(cursor);
    }
}
