package org.pofk.exact;

/**
 * A real number known as closely as asked: the certified way from an algebraic number to its decimals.
 * The enclosure need not be nested from one call to the next; each contains the number.
 */
@FunctionalInterface
public interface Enclosed {
    /** A ball that contains the number, its radius at most 2^−bits times max(1, |number|). */
    Ball enclose(int bits);
}
