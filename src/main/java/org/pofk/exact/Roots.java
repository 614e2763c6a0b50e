package org.pofk.exact;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Supplier;

/**
 * All roots of a square-free rational polynomial, each in a disc of its own. Canonical order: real roots descending,
 * then the roots of the upper half-plane by ascending angle (descending modulus where angles are equal), then their
 * conjugates in the same order. Certified. Angles count as equal when they differ by less than 2^−64: that two are
 * equal can't be found by refinement, and the order has to end (ties beyond modulus: descending real part, then
 * imaginary part).
 *
 * <p>About 15 rounds of n² steps in doubles, then n²/2 steps in some 128 bits for each doubling of the bits asked for.
 */
public record Roots(List<Root> all) {

    public Roots {
        all = List.copyOf(all);
    }

    /** The roots; none for a constant that isn't zero. An {@link IllegalArgumentException} when a root is repeated. */
    public static Roots of(Polynomial<Rational> squareFree) {
        return of(squareFree, List::of);
    }

    /**
     * The same, faster where all roots are known approximately among {@code guesses} (eigenvalues in doubles): the
     * roots of a characteristic polynomial of some fifty states can't be told from its coefficients in doubles.
     */
    public static Roots of(Polynomial<Rational> squareFree, Supplier<List<Guess>> guesses) {
        if (squareFree.isZero()) {
            throw new IllegalArgumentException("every number is a root of zero");
        }
        Polynomial<Rational> monic = squareFree.monic();
        RealAndAbove found = isolate(monic, guesses);
        List<EnclosedComplex> real = CanonicalOrder.descending(found.real());
        List<EnclosedComplex> above = CanonicalOrder.byAngle(found.above());
        List<Root> roots = new ArrayList<>();
        for (EnclosedComplex each : real) {
            int index = roots.size();
            roots.add(new Placed(monic, index, true, index, each));
        }
        for (EnclosedComplex each : above) {
            int index = roots.size();
            roots.add(new Placed(monic, index, false, index + above.size(), each));
        }
        for (EnclosedComplex each : above) {
            int index = roots.size();
            roots.add(new Placed(monic, index, false, index - above.size(), each.conjugate()));
        }
        return new Roots(roots);
    }

    private static RealAndAbove isolate(Polynomial<Rational> monic, Supplier<List<Guess>> guesses) {
        if (monic.coefficient(0).isZero()) {
            return withZero(monic.shiftedDown(1), guesses);
        }
        return switch (monic.degree()) {
            case 0 -> new RealAndAbove(List.of(), List.of());
            case 1 -> new RealAndAbove(List.of(EnclosedComplex.of(monic.coefficient(0).negate())), List.of());
            case 2 -> QuadraticRoots.of(monic);
            default -> RootIsolation.of(monic, guesses);
        };
    }

    private static RealAndAbove withZero(Polynomial<Rational> rest, Supplier<List<Guess>> guesses) {
        if (rest.coefficient(0).isZero()) {
            throw new IllegalArgumentException("zero is a repeated root");
        }
        RealAndAbove others = isolate(rest, guesses);
        List<EnclosedComplex> real = new ArrayList<>(others.real());
        real.add(EnclosedComplex.of(Rational.ZERO));
        return new RealAndAbove(real, others.above());
    }

    private record Placed(Polynomial<Rational> polynomial, int index, boolean isReal, int conjugateIndex,
            EnclosedComplex location) implements Root {
        @Override
        public ComplexBall enclose(int bits) {
            return location.enclose(bits);
        }

        /** {@code root 3 of degree 5: 0.31 + i (0.2)}; the polynomial itself may be long. */
        @Override
        public String toString() {
            return "root " + index + " of degree " + polynomial.degree() + ": " + enclose(64);
        }
    }
}
