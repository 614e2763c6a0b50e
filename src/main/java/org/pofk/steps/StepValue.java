package org.pofk.steps;

import java.util.Optional;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;

/**
 * An output's value at one step.
 *
 * @param exact     empty where stepping so far would take too long; the value is certified then
 * @param enclosure of the value
 */
public record StepValue(int k, Optional<Rational> exact, Enclosed enclosure) {
}
