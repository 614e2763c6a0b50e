package org.pofk.exact;

/**
 * One root of a square-free rational polynomial, isolated from the others: an exact algebraic number.
 * Which root is said by its place in the canonical order of {@link Roots}.
 */
public interface Root extends EnclosedComplex {
    /** The polynomial it is a root of; monic and square-free. */
    Polynomial<Rational> polynomial();

    /** Place in {@link Roots#all()}. */
    int index();

    /** Proved, never read off a decimal. */
    boolean isReal();

    /** The place of the complex conjugate; its own for a real root. */
    int conjugateIndex();

    /** A rectangle with both radii at most 2^−bits · max(1, |root|); the imaginary part of a real root is exact zero. */
    @Override
    ComplexBall enclose(int bits);
}
