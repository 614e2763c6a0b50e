package org.pofk.formula;

import java.util.Optional;
import org.pofk.formula.Formula.Constant;
import org.pofk.formula.FormulaReading.ImaginaryUnit;

/** By what rules tokens are read. */
record Rules(Notation notation, Limits limits, ImaginaryUnit unit) {
    static final Rules OF_MODELS = new Rules(Notation.PLAIN, Limits.MODEL, ImaginaryUnit.I);

    /** The constant that a word stands for. */
    Optional<Constant> constant(String word) {
        return unit == ImaginaryUnit.I_OR_J && word.equals("j") ? Optional.of(Constant.I) : Words.constant(word);
    }
}
