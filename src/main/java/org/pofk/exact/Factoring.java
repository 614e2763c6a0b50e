package org.pofk.exact;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Factorization.Irreducible;

/**
 * Factors rational polynomials over Q. Exact: the product is multiplied out and compared each time. Every factor says
 * whether it is proved irreducible; above degree {@value SquareFreeFactoring#FACTORED_DEGREE}, or above degree 30 with
 * long numbers, a factor may be left whole, square-free and not proved, because full factorization grows out of reach
 * there and only the showing of exact forms needs it.
 */
public final class Factoring {
    /** By degree, then by the coefficients in ascending power, compared as numbers. */
    public static final Comparator<Polynomial<Rational>> CANONICAL_ORDER = Factoring::compare;

    /**
     * What is likely to divide; a wrong hint costs time and changes nothing.
     *
     * @param cyclotomicOrders orders of roots of unity that may occur, as the periods of classes and their divisors
     * @param divisors polynomials, not zero, that may share factors with it, as those of closed classes
     */
    public record Hints(Collection<Integer> cyclotomicOrders, List<Polynomial<Rational>> divisors) {
        public static final Hints NONE = new Hints(List.of(), List.of());

        public Hints {
            cyclotomicOrders = List.copyOf(cyclotomicOrders);
            divisors = List.copyOf(divisors);
        }
    }

    private Factoring() {
    }

    /** As {@link #of(Polynomial, Hints)} without hints. */
    public static Factorization<Rational> of(Polynomial<Rational> polynomial) {
        return of(polynomial, Hints.NONE);
    }

    /**
     * The factorization over Q. A constant is its unit without factors; zero has none: an
     * {@link ArithmeticException}. For (z − 1) · irreducible with coefficients of as many bits as the degree: 0.05 s of
     * processor time at degree 100, 0.15 s at 200, 0.5 to 1 s at 400, 6 s at 1,000.
     */
    public static Factorization<Rational> of(Polynomial<Rational> polynomial, Hints hints) {
        if (polynomial.isZero()) {
            throw new ArithmeticException("the zero polynomial has no factorization");
        }
        List<Factor<Rational>> factors = new ArrayList<>();
        int zeros = polynomial.lowestPower();
        if (zeros > 0) {
            factors.add(new Factor<>(Polynomial.ofIntegers(0, 1), zeros, Irreducible.PROVED));
        }
        for (Map.Entry<Integer, Polynomial<Rational>> part
                : SquareFree.byMultiplicity(polynomial.shiftedDown(zeros)).entrySet()) {
            for (SquareFreeFactoring.Piece piece
                    : SquareFreeFactoring.of(PrimitiveForm.partOf(part.getValue()), hints)) {
                factors.add(new Factor<>(PrimitiveForm.monic(piece.polynomial()), part.getKey(), piece.irreducible()));
            }
        }
        factors.sort((a, b) -> compare(a.polynomial(), b.polynomial()));
        return multipliedBack(new Factorization<>(polynomial.leading(), factors), polynomial);
    }

    private static Factorization<Rational> multipliedBack(Factorization<Rational> factorization,
            Polynomial<Rational> polynomial) {
        if (!factorization.expand(RationalField.Q).equals(polynomial)) {
            throw new AssertionError("the factors " + factorization + " don't multiply to " + polynomial);
        }
        return factorization;
    }

    private static int compare(Polynomial<Rational> a, Polynomial<Rational> b) {
        int sign = Integer.compare(a.degree(), b.degree());
        for (int i = 0; sign == 0 && i <= a.degree(); i++) {
            sign = a.coefficient(i).compareTo(b.coefficient(i));
        }
        return sign;
    }
}
