package org.pofk.exact;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;

/**
 * Isolates the roots of a whole-number polynomial of degree 3 and more: guesses, cheap ones first, until
 * {@link Isolation} proves one set of them. Certified: it ends on the proof.
 */
final class RootIsolation {
    private static final int FIRST_PRECISION = 128;
    /** From here on it is made sure that the polynomial has no repeated root, on which the search would not end. */
    private static final int SUSPICIOUS_PRECISION = 1024;

    private RootIsolation() {
    }

    /**
     * @param polynomial square-free, not zero at zero
     * @param guesses    asked for where the polynomial's own coefficients lead to no good guesses in doubles
     */
    static RealAndAbove of(Polynomial<Rational> polynomial, Supplier<List<Guess>> guesses) {
        BigInteger[] whole = PrimitiveForm.partOf(polynomial).coefficients().toArray(BigInteger[]::new);
        BoundedHorner horner = new BoundedHorner(whole);
        List<Start> starts = AberthInDoubles.starts(whole);
        Optional<List<Isolated>> isolated = Isolation.attempt(horner, starts);
        if (isolated.isEmpty()) {
            List<Start> guessed = GuessedStarts.of(horner, guesses.get());
            starts = guessed.isEmpty() ? starts : guessed;
            isolated = Isolation.attempt(horner, guessed);
        }
        if (isolated.isEmpty()) {
            isolated = Isolation.attempt(horner, TridiagonalStarts.of(polynomial));
        }
        PreciseAberth precise = new PreciseAberth(horner, whole, starts);
        for (int precision = FIRST_PRECISION; isolated.isEmpty(); precision *= 2) {
            if (precision == SUSPICIOUS_PRECISION) {
                requireSquareFree(polynomial);
            }
            if (precision > Raising.MOST_BITS) {
                throw new AssertionError("roots not isolated at " + precision + " bits: " + polynomial);
            }
            isolated = Isolation.attempt(horner, precise.starts(precision), precision);
        }
        return located(horner, isolated.get());
    }

    private static void requireSquareFree(Polynomial<Rational> polynomial) {
        if (!polynomial.greatestCommonDivisor(polynomial.derivative()).isConstant()) {
            throw new IllegalArgumentException("not square-free: " + polynomial);
        }
    }

    private static RealAndAbove located(BoundedHorner horner, List<Isolated> isolated) {
        return new RealAndAbove(
                isolated.stream().filter(one -> one.disc().isOnAxis()).map(one -> locate(horner, one)).toList(),
                isolated.stream().filter(one -> !one.disc().isOnAxis()).map(one -> locate(horner, one)).toList());
    }

    private static EnclosedComplex locate(BoundedHorner horner, Isolated one) {
        return new RefinedRoot(horner, one);
    }
}
