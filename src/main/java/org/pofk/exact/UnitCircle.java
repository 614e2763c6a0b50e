package org.pofk.exact;

import java.util.List;

/**
 * Where the roots of a square-free rational polynomial lie with respect to the unit circle, decided exactly: no disc
 * around a root can prove that it lies on the circle. All methods take polynomials that aren't zero and throw an
 * {@link ArithmeticException} where a root is repeated.
 */
public final class UnitCircle {
    private static final IntegerPolynomial ONE = IntegerPolynomial.ofIntegers(-1, 1);
    private static final IntegerPolynomial MINUS_ONE = IntegerPolynomial.ofIntegers(1, 1);
    private static final int FIRST_BITS = 32;

    /** How many roots have modulus below, equal to and above one. */
    public record Counts(int inside, int on, int outside) {
    }

    private UnitCircle() {
    }

    /**
     * The monic divisor whose roots λ are those with 1/λ a root too. It holds all roots on the circle, since there
     * 1/λ is the conjugate; the cofactor has none, so discs around its roots clear the circle after finitely many
     * refinements. One gcd.
     */
    public static Polynomial<Rational> selfReciprocalPart(Polynomial<Rational> squareFree) {
        return PrimitiveForm.monic(selfReciprocalPart(PrimitiveForm.partOf(squareFree)));
    }

    private static IntegerPolynomial selfReciprocalPart(IntegerPolynomial part) {
        return part.greatestCommonDivisor(part.reversed());
    }

    /**
     * How many roots lie on the circle: 1 and −1 by division, the pairs e^(±iθ) as real roots w = 2 cos θ in [−2, 2]
     * of the trace polynomial, by {@link Sturm}.
     */
    public static int rootsOn(Polynomial<Rational> squareFree) {
        return onCircle(selfReciprocalPart(PrimitiveForm.partOf(squareFree)));
    }

    private static int onCircle(IntegerPolynomial selfReciprocal) {
        IntegerPolynomial rest = without(without(selfReciprocal, ONE), MINUS_ONE);
        int real = selfReciprocal.degree() - rest.degree();
        return rest.isConstant()
                ? real
                : real + 2 * Sturm.of(tracePolynomial(rest)).count(Rational.of(-2), Rational.of(2));
    }

    private static IntegerPolynomial without(IntegerPolynomial polynomial, IntegerPolynomial factor) {
        return polynomial.quotientBy(factor).orElse(polynomial);
    }

    /** The t with z^m · t(z + 1/z) the given polynomial of degree 2m, which reads the same in both directions. */
    static Polynomial<Rational> tracePolynomial(IntegerPolynomial palindrome) {
        int m = palindrome.degree() / 2;
        Polynomial<Rational> w = Polynomial.ofIntegers(0, 1);
        Polynomial<Rational> before = Polynomial.ofIntegers(2);
        Polynomial<Rational> power = w;
        Polynomial<Rational> trace = Polynomial.ofRationals(List.of(Rational.of(palindrome.coefficient(m))));
        for (int k = 1; k <= m; k++) {
            trace = trace.plus(power.times(Rational.of(palindrome.coefficient(m + k))));
            Polynomial<Rational> next = power.shiftedUp(1).minus(before);
            before = power;
            power = next;
        }
        return trace;
    }

    /**
     * The roots inside, on and outside. The self-reciprocal part has those on the circle, what it has besides lies half
     * on either side; the cofactor has none on it, so discs around its roots clear the circle. Cost: {@link Roots}.
     */
    public static Counts count(Polynomial<Rational> squareFree) {
        IntegerPolynomial part = PrimitiveForm.partOf(squareFree);
        if (!SquareFree.is(squareFree)) {
            throw new ArithmeticException("not square-free: " + squareFree);
        }
        IntegerPolynomial mirrored = selfReciprocalPart(part);
        IntegerPolynomial single = part.quotientBy(mirrored).orElseThrow();
        int on = onCircle(mirrored);
        int pairs = (mirrored.degree() - on) / 2;
        int inside = (int) Roots.of(PrimitiveForm.monic(single)).all().stream().filter(UnitCircle::isInside).count();
        return new Counts(inside + pairs, on, single.degree() - inside + pairs);
    }

    /** Whether a root that is known not to lie on the circle lies inside: refined until its modulus differs from one. */
    private static boolean isInside(Root root) {
        for (int bits = FIRST_BITS; ; bits *= 2) {
            Ball beyond = root.enclose(bits).modulus().minus(Ball.of(1, 0));
            if (!beyond.containsZero()) {
                return beyond.isNegative();
            }
            if (bits > Raising.MOST_BITS) {
                throw new AssertionError("on the unit circle to within 2^-" + bits + ": " + root);
            }
        }
    }
}
