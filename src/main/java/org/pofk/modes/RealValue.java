package org.pofk.modes;

import java.util.Optional;
import org.pofk.exact.Enclosed;
import org.pofk.formula.Formula;

/**
 * A real constant of a closed form: its short exact form where there is one, and its decimals as far as asked.
 * Certified; exact when {@code exact} is present.
 */
public record RealValue(Optional<Formula> exact, Enclosed enclosure) {
}
