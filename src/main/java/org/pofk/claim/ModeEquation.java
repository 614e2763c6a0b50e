package org.pofk.claim;

import java.util.List;
import java.util.Optional;
import org.pofk.meaning.Equation;
import org.pofk.meaning.ExponentialSum.Term;

/**
 * What must hold between what terms of a formula in k say and one true mode. Exact.
 *
 * @param pole  the true pole it is about; none for an impulse and for what stands for no pole
 * @param power the power of k, or the step of an impulse
 * @param terms the terms it is about; none where a mode is missing
 */
record ModeEquation(About about, Optional<TruePole> pole, long power, List<Term> terms, Equation equation) {
    /** What of a mode is meant. */
    enum About {
        BASE, ANGLE, COEFFICIENT, PHASE,
        /** An impulse at one step. */
        IMPULSE,
        /** A term that stands for no true mode. */
        NOTHING
    }

    ModeEquation {
        terms = List.copyOf(terms);
    }

    /** Whether no numbers that the decimals stand for make it hold. Certified when true. */
    boolean isRefuted() {
        return !Spread.mayBe(equation.written(), equation.right());
    }
}
