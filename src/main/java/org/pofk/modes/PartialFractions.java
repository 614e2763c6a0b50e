package org.pofk.modes;

import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.pofk.exact.Factorization;
import org.pofk.exact.Field;
import org.pofk.exact.Polynomial;
import org.pofk.exact.ResidueField;
import org.pofk.transform.TransferFunction;

/**
 * Partial fractions of Y(z)/z over any coefficient field, without a root being computed: the coefficients of a factor
 * q^e are the Taylor coefficients at a root λ of what is left of Y(z)/z beside (z − λ)^e, taken in E[λ]/(q)
 * (full partial fraction decomposition; Bronstein and Salvy 1993, from memory). The q-adic digits of the numerator
 * are not these. Exact. A factor of degree d and multiplicity e costs about e² products and one inverse modulo q;
 * a simple factor of high degree costs nothing, its coefficient stays the quotient N(λ)/D′(λ).
 */
public final class PartialFractions<E> {
    private final Field<E> field;
    private final Polynomial<E> denominator;
    private final Factorization<E> factors;
    private final Map<Polynomial<E>, Polynomial<Polynomial<E>>> inverses = new HashMap<>();

    private PartialFractions(Polynomial<E> denominator, Factorization<E> factors) {
        this.field = denominator.field();
        this.denominator = denominator;
        this.factors = factors;
    }

    /**
     * The expansion of Y, whose denominator has the factors given (z among them where Y has a pole at zero).
     * Y ≡ 0 has neither impulses nor parts.
     */
    public static <E> Expansion<E> of(TransferFunction<E> y, Factorization<E> factors) {
        if (y.numerator().degree() > y.denominator().degree()) {
            throw new AssertionError("a transform of a sequence that starts before k = 0: " + y);
        }
        if (y.numerator().isZero()) {
            return new Expansion<>(y.denominator().field(), List.of(), List.of());
        }
        return new PartialFractions<>(denominatorOverZ(y), factors).expand(numeratorOverZ(y));
    }

    /** N(λ)/D′(λ) with Y(z)/z = N/D: the coefficient of every simple pole λ but zero, as it comes, not reduced. */
    static <E> Expansion.Coefficient<E> unreduced(TransferFunction<E> y) {
        return new Expansion.Coefficient<>(numeratorOverZ(y), denominatorOverZ(y).derivative());
    }

    private static <E> Polynomial<E> numeratorOverZ(TransferFunction<E> y) {
        return startsWithZ(y) ? y.numerator().shiftedDown(1) : y.numerator();
    }

    private static <E> Polynomial<E> denominatorOverZ(TransferFunction<E> y) {
        return startsWithZ(y) ? y.denominator() : y.denominator().shiftedUp(1);
    }

    private static <E> boolean startsWithZ(TransferFunction<E> y) {
        return y.numerator().field().isZero(y.numerator().coefficient(0));
    }

    /**
     * The expansions of z · N/D for many N over one D, not necessarily in lowest terms: each has a part for every
     * factor of D but z, with coefficients that may be zero. Each N has a degree below that of D.
     */
    public static <E> List<Expansion<E>> ofEach(List<Polynomial<E>> numerators, Polynomial<E> denominator,
            Factorization<E> factors) {
        PartialFractions<E> fractions = new PartialFractions<>(denominator, factors);
        return numerators.stream().map(fractions::expand).toList();
    }

    private Expansion<E> expand(Polynomial<E> numerator) {
        List<Expansion.Part<E>> parts = new ArrayList<>();
        for (Factorization.Factor<E> factor : factors.factors()) {
            if (!isZ(factor.polynomial())) {
                parts.add(new Expansion.Part<>(factor, coefficients(numerator, factor)));
            }
        }
        return new Expansion<>(field, impulses(numerator), parts);
    }

    /** True for the factor z, whose terms are impulses. */
    private static <E> boolean isZ(Polynomial<E> factor) {
        return factor.degree() == 1 && factor.field().isZero(factor.coefficient(0));
    }

    /** The terms c/z^(i+1) of N/D, c the impulse at k = i: the power series at zero of N/(D/z^m), read backwards. */
    private List<E> impulses(Polynomial<E> numerator) {
        int order = denominator.lowestPower();
        List<E> impulses = new ArrayList<>(
                Series.quotient(field, numerator, denominator.shiftedDown(order), order));
        Collections.reverse(impulses);
        return impulses;
    }

    private List<Expansion.Coefficient<E>> coefficients(Polynomial<E> numerator, Factorization.Factor<E> factor) {
        boolean simple = factor.multiplicity() == 1;
        return simple && (factor.polynomial().degree() > Expansion.REDUCED_UP_TO || isLong(factor.polynomial()))
                ? List.of(new Expansion.Coefficient<>(numerator, denominator.derivative()))
                : taylor(numerator, factor);
    }

    /** Whether Euclid's algorithm, whose numbers grow with degree and length, would take long. */
    static <E> boolean isLong(Polynomial<E> factor) {
        int bits = factor.coefficients().stream().mapToInt(factor.field()::bits).max().orElse(0);
        return (long) bits * factor.degree() > Expansion.REDUCED_UP_TO_BITS;
    }

    /** R_p is the Taylor coefficient of order e−1−p: 1/(z − λ)^(p+1) goes with binomial(k, p) λ^(k−p). */
    private List<Expansion.Coefficient<E>> taylor(Polynomial<E> numerator, Factorization.Factor<E> factor) {
        int e = factor.multiplicity();
        Polynomial<Polynomial<E>> inverse =
                inverses.computeIfAbsent(factor.polynomial(), q -> inverseBeside(factor));
        Polynomial<Polynomial<E>> series = atRoot(new ResidueField<>(factor.polynomial()),
                numerator.remainder(factor.polynomial().pow(e)), 0, e).times(inverse);
        List<Expansion.Coefficient<E>> coefficients = new ArrayList<>();
        for (int p = 0; p < e; p++) {
            coefficients.add(new Expansion.Coefficient<>(series.coefficient(e - 1 - p), Polynomial.one(field)));
        }
        return coefficients;
    }

    /** The first e Taylor coefficients at λ of (z − λ)^e/D, D = q^e · cofactor and q = (z − λ) · overRoot. */
    private Polynomial<Polynomial<E>> inverseBeside(Factorization.Factor<E> factor) {
        int e = factor.multiplicity();
        Polynomial<E> power = factor.polynomial().pow(e);
        ResidueField<E> residues = new ResidueField<>(factor.polynomial());
        Polynomial<Polynomial<E>> beside =
                atRoot(residues, denominator.dividedExactlyBy(power).remainder(power), 0, e);
        Polynomial<Polynomial<E>> overRoot = atRoot(residues, factor.polynomial(), 1, e);
        for (int i = 0; i < e; i++) {
            beside = Series.truncated(beside.times(overRoot), e);
        }
        return new Polynomial<>(residues, Series.quotient(residues, Polynomial.one(residues), beside, e));
    }

    /** The Taylor coefficients of orders {@code from} … from+length−1 of f at λ, as a polynomial in t = z − λ. */
    private Polynomial<Polynomial<E>> atRoot(ResidueField<E> residues, Polynomial<E> f, int from, int length) {
        List<Polynomial<E>> taylor = new ArrayList<>();
        Polynomial<E> derivative = f;
        for (int order = 0; order < from + length; order++) {
            if (order >= from) {
                taylor.add(derivative.remainder(residues.modulus()));
            }
            derivative = derivative.derivative().times(field.inverse(field.of(order + 1L)));
        }
        return new Polynomial<>(residues, taylor);
    }
}
