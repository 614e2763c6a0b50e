package org.pofk.exact;

/** A complex number known to lie within the rectangle of two balls. Certified. */
public record ComplexBall(Ball real, Ball imaginary) {
}
