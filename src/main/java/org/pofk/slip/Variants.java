package org.pofk.slip;

import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.exact.Rational;

/** The model with other values for its parameters, for the slips that put one number in the place of another. */
@FunctionalInterface
public interface Variants {
    /** A model without parameters. */
    Variants NONE = (parameter, value) -> Optional.empty();

    /** The chain with another value for one parameter; nothing where that makes no chain. */
    Optional<Chain> with(String parameter, Rational value);
}
