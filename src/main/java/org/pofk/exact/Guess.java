package org.pofk.exact;

/** An approximate complex number: a start from which a root is found and proved, never a result. */
public record Guess(double real, double imaginary) {
}
