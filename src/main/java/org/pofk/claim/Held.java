package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Equation;
import org.pofk.meaning.Quantity;

/**
 * A number of a claim beside the one it should be.
 *
 * @param nearest what it is off from: the same, but for whole turns of an angle
 */
record Held(StatedNumber stated, Quantity right, Quantity nearest) {
    Held(StatedNumber stated, Quantity right) {
        this(stated, right, right);
    }

    /** Whether they are the same number, decimals at face value. */
    Decision isExact() {
        return error().isZero();
    }

    /** Whether each of its decimals is right to its digits. */
    Decision isRight() {
        return isExact() == Decision.YES ? Decision.YES : RightDecimals.of(equations()).areRight();
    }

    /** Stated less the nearest that is right. */
    Quantity error() {
        return stated.value().minus(nearest);
    }

    /** What its decimals have to satisfy: one equation, or two where something isn't seen to be real. */
    List<Equation> equations() {
        List<Equation> equations = new ArrayList<>(
                List.of(new Equation(stated.value().realPart(), right.realPart())));
        if (!isReal(stated.value()) || !isReal(right)) {
            equations.add(new Equation(stated.value().imaginaryPart(), right.imaginaryPart()));
        }
        return equations;
    }

    /** True where the form itself shows it. */
    private static boolean isReal(Quantity number) {
        return number.realPart() == number;
    }
}
