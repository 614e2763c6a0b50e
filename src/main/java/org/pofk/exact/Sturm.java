package org.pofk.exact;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToIntFunction;

/**
 * Counts the real roots of a square-free rational polynomial in an interval: the sign changes in the sequence f, f′
 * and the negated remainders that follow (Sturm 1835; Basu, Pollack and Roy, Algorithms in Real Algebraic Geometry,
 * chapter 2, from memory). Exact. About degree² products of numbers as long as degree · coefficient: for degrees up
 * to about two hundred.
 */
public final class Sturm {
    private final List<IntegerPolynomial> sequence;

    private Sturm(List<IntegerPolynomial> sequence) {
        this.sequence = sequence;
    }

    /** An {@link ArithmeticException} when the polynomial is zero or has a repeated root. */
    public static Sturm of(Polynomial<Rational> squareFree) {
        IntegerPolynomial part = PrimitiveForm.partOf(squareFree);
        Sturm sturm = new Sturm(remainders(part, part.derivative()));
        if (part.isZero() || !sturm.sequence.get(sturm.sequence.size() - 1).isConstant()) {
            throw new ArithmeticException("not square-free: " + squareFree);
        }
        return sturm;
    }

    /** How many real roots there are. */
    public int count() {
        return changesAtMinusInfinity() - changesAtInfinity();
    }

    /** How many roots lie in the closed interval; none when from is above to. */
    public int count(Rational from, Rational to) {
        if (from.compareTo(to) > 0) {
            return 0;
        }
        int atStart = sequence.get(0).signAt(from) == 0 ? 1 : 0;
        return atStart + changes(member -> member.signAt(from)) - changes(member -> member.signAt(to));
    }

    private static List<IntegerPolynomial> remainders(IntegerPolynomial first, IntegerPolynomial second) {
        List<IntegerPolynomial> sequence = new ArrayList<>(List.of(first));
        IntegerPolynomial before = first;
        IntegerPolynomial next = second.shortened();
        while (!next.isZero()) {
            sequence.add(next);
            IntegerPolynomial rest = before.pseudoDividedBy(next).remainder().negate().shortened();
            before = next;
            next = rest;
        }
        return sequence;
    }

    private int changesAtInfinity() {
        return changes(member -> member.leading().signum());
    }

    private int changesAtMinusInfinity() {
        return changes(member -> member.degree() % 2 == 0 ? member.leading().signum() : -member.leading().signum());
    }

    private int changes(ToIntFunction<IntegerPolynomial> signOf) {
        int changes = 0;
        int last = 0;
        for (IntegerPolynomial member : sequence) {
            int sign = signOf.applyAsInt(member);
            changes += sign * last < 0 ? 1 : 0;
            last = sign == 0 ? last : sign;
        }
        return changes;
    }
}
