package org.pofk.formula;

/**
 * How the formula of a claim is read, in ordinary notation or in LaTeX: what its left side may say, which of two signs
 * ± stands for, which letters are the imaginary unit.
 */
public record FormulaReading(Subject subject, PlusMinus plusMinus, ImaginaryUnit unit) {

    /** What a formula is said to be equal to; a left side that says just this is dropped, any other refused. */
    public enum Subject {
        /** A number: nothing stands on the left. */
        NUMBER,
        /** {@code p(k) =}. */
        OF_K,
        /** {@code Y(z) =}. */
        OF_Z,
        /** {@code Y(z)/z =}. */
        OF_Z_OVER_Z
    }

    /** What ± stands for; ∓ is the other. */
    public enum PlusMinus { REFUSED, PLUS, MINUS }

    /** How the imaginary unit is written. */
    public enum ImaginaryUnit { I, I_OR_J }

    /** A formula with neither ± nor j. */
    public static FormulaReading of(Subject subject) {
        return new FormulaReading(subject, PlusMinus.REFUSED, ImaginaryUnit.I);
    }

    public FormulaReading with(PlusMinus sign) {
        return new FormulaReading(subject, sign, unit);
    }

    public FormulaReading with(ImaginaryUnit letters) {
        return new FormulaReading(subject, plusMinus, letters);
    }
}
