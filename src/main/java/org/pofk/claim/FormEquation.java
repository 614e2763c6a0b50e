package org.pofk.claim;

import java.util.Optional;
import org.pofk.meaning.Equation;
import org.pofk.text.Span;

/**
 * What must hold between a part of a formula in z and what it should be. Exact.
 *
 * @param span the part; none where one is missing
 */
record FormEquation(About about, Optional<Span> span, Equation equation) {

    /** What a part is. */
    enum About {
        /** A factor below the line, by its coefficients over the leading one. */
        DENOMINATOR,
        /** A factor above it, likewise, or all of it. */
        NUMERATOR,
        /** What stands in front of monic factors. */
        FRONT,
        /** The numerators of partial fractions with poles in common. */
        PART,
        /** A pole that nothing stands for. */
        MISSING
    }
}
