package org.pofk.modes;

import java.util.Optional;
import org.pofk.exact.EnclosedComplex;
import org.pofk.exact.Factorization.Irreducible;
import org.pofk.exact.Polynomial;
import org.pofk.exact.PolynomialQuotient;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;

/**
 * One coefficient R_p of a factor at the factor's roots: whether it is there, in short exact form where one was found,
 * and enclosed.
 */
final class CoefficientValues {
    /** Bits of all coefficients of q times its degree up to which a quotient is reduced to look for short forms. */
    private static final int REDUCED_BITS = 60_000;

    private final FactorPoles poles;
    private final Expansion.Coefficient<Rational> coefficient;
    private final Optional<Polynomial<Rational>> reduced;
    private final PolynomialQuotient quotient;
    private final Polynomial<Rational> vanishing;

    CoefficientValues(FactorPoles poles, Expansion.Coefficient<Rational> coefficient) {
        this.poles = poles;
        this.coefficient = coefficient;
        this.reduced = reduced();
        this.quotient = reduced.isPresent() && reduced.get().isConstant()
                ? PolynomialQuotient.of(reduced.get())
                : PolynomialQuotient.of(coefficient.numerator(), coefficient.denominator());
        this.vanishing = vanishing();
    }

    private Optional<Polynomial<Rational>> reduced() {
        if (coefficient.isReduced()) {
            return Optional.of(coefficient.numerator());
        }
        Polynomial<Rational> q = poles.polynomial();
        Optional<Polynomial<Rational>> constant =
                ratio(coefficient.numerator().remainder(q), coefficient.denominator().remainder(q));
        return constant.isEmpty() && poles.isSearched() && bits(q) * q.degree() <= REDUCED_BITS
                ? Optional.of(Traces.of(q).reduced(coefficient))
                : constant;
    }

    private static long bits(Polynomial<Rational> q) {
        return q.coefficients().stream().mapToLong(c -> c.numerator().bitLength() + c.denominator().bitLength()).sum();
    }

    /** The rational number c with a = c·b. */
    private static Optional<Polynomial<Rational>> ratio(Polynomial<Rational> a, Polynomial<Rational> b) {
        if (a.isZero()) {
            return Optional.of(a);
        }
        Rational ratio = a.coefficient(b.degree()).dividedBy(b.leading());
        return a.equals(b.times(ratio))
                ? Optional.of(Polynomial.constant(a.field(), ratio))
                : Optional.empty();
    }

    /** The monic divisor of q at whose roots the coefficient vanishes. */
    private Polynomial<Rational> vanishing() {
        Polynomial<Rational> q = poles.polynomial();
        Polynomial<Rational> numerator = reduced.orElseGet(() -> coefficient.numerator().remainder(q));
        if (numerator.isZero()) {
            return q;
        }
        return numerator.isConstant() || poles.factor().irreducible() == Irreducible.PROVED
                ? Polynomial.one(q.field())
                : q.greatestCommonDivisor(numerator);
    }

    /** Decides whether R_p(λ) differs from zero. */
    boolean isPresent(Root root) {
        if (vanishing.isConstant() || vanishing.degree() == poles.polynomial().degree()) {
            return vanishing.isConstant();
        }
        EnclosedComplex here = PolynomialQuotient.of(vanishing).at(root);
        EnclosedComplex elsewhere = PolynomialQuotient.of(poles.polynomial().dividedExactlyBy(vanishing)).at(root);
        for (int bits = 32; true; bits *= 2) {
            if (!here.enclose(bits).containsZero()) {
                return true;
            }
            if (!elsewhere.enclose(bits).containsZero()) {
                return false;
            }
        }
    }

    EnclosedComplex at(Root root) {
        return quotient.at(root);
    }

    /** In a form for exact arithmetic; empty where the coefficient stays a quotient. */
    Optional<ElementAtRoot> element(Root root, EnclosedComplex value) {
        return reduced.map(element -> new ElementAtRoot(poles.field(), element, root, value));
    }
}
