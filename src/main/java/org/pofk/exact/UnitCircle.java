package org.pofk.exact;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/**
 * Where the roots of a square-free rational polynomial lie with respect to the unit circle, decided exactly: no disc
 * around a root can prove that it lies on the circle. All methods take polynomials that aren't zero and throw an
 * {@link ArithmeticException} where a root is repeated.
 */
public final class UnitCircle {
    private static final IntegerPolynomial ONE = IntegerPolynomial.ofIntegers(-1, 1);
    private static final IntegerPolynomial MINUS_ONE = IntegerPolynomial.ofIntegers(1, 1);

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
     * The roots inside, on and outside; a second at degree 100. Besides the self-reciprocal part, half of which lies
     * on either side when not on the circle, no root mirrors another, and the Cauchy index of the cofactor decides
     * (Routh and Hurwitz).
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
        int inside = (single.degree() + excessOfLeftHalfPlane(toHalfPlane(single))) / 2;
        return new Counts(inside + pairs, on, single.degree() - inside + pairs);
    }

    /** (1 − s)^n · f((1 + s)/(1 − s)): the disc becomes the left half-plane. The degree stays, −1 being no root. */
    private static IntegerPolynomial toHalfPlane(IntegerPolynomial polynomial) {
        IntegerPolynomial onePlus = IntegerPolynomial.ofIntegers(1, 1);
        IntegerPolynomial oneMinus = IntegerPolynomial.ofIntegers(1, -1);
        IntegerPolynomial power = IntegerPolynomial.ofIntegers(1);
        IntegerPolynomial result = new IntegerPolynomial(List.of(polynomial.leading()));
        for (int i = polynomial.degree() - 1; i >= 0; i--) {
            power = power.times(oneMinus);
            result = result.times(onePlus).plus(power.times(new IntegerPolynomial(List.of(polynomial.coefficient(i)))));
        }
        return result;
    }

    /**
     * Roots in the left less roots in the right half-plane, when no root is mirrored at the imaginary axis: with
     * P(iω) = A(ω) + i B(ω) the argument turns by π times that number, read off as the Cauchy index of −B/A for even
     * and A/B for odd degree (Gantmacher, The Theory of Matrices, volume 2, chapter XV; from memory).
     */
    private static int excessOfLeftHalfPlane(IntegerPolynomial polynomial) {
        IntegerPolynomial real = onImaginaryAxis(polynomial, 0);
        IntegerPolynomial imaginary = onImaginaryAxis(polynomial, 1);
        return polynomial.degree() % 2 == 0
                ? -Sturm.cauchyIndex(imaginary, real)
                : Sturm.cauchyIndex(real, imaginary);
    }

    /** The terms of the powers first, first + 2, … with the signs +, −, +, …. */
    private static IntegerPolynomial onImaginaryAxis(IntegerPolynomial polynomial, int first) {
        List<BigInteger> all = new ArrayList<>();
        for (int i = 0; i <= polynomial.degree(); i++) {
            BigInteger coefficient = polynomial.coefficient(i);
            all.add((i - first) % 2 != 0 ? BigInteger.ZERO : (i - first) % 4 == 0 ? coefficient : coefficient.negate());
        }
        return new IntegerPolynomial(all);
    }
}
