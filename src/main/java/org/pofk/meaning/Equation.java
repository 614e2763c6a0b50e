package org.pofk.meaning;

/**
 * An expression in written decimals and the exact value it should have. Both real; a complex equation is two.
 *
 * @param right without decimals that are still to be judged
 */
public record Equation(Quantity written, Quantity right) {
}
