package org.pofk.exact;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;

/**
 * E[λ]/(q): what can be said at once of all roots λ of a square-free q. An element is a polynomial in λ, canonical
 * when its degree is below that of q; arguments that aren't are reduced. A field when q is irreducible; otherwise a
 * product of fields, in which a divisor of zero has no inverse. Exact.
 *
 * @param modulus q, monic, square-free, degree d ≥ 1
 * @param <E> coefficient
 */
public record ResidueField<E>(Polynomial<E> modulus) implements Field<Polynomial<E>> {

    public ResidueField {
        if (modulus.isConstant()) {
            throw new ArithmeticException("residues modulo a constant are no field");
        }
        modulus = modulus.monic();
    }

    /** The field of the coefficients. */
    public Field<E> base() {
        return modulus.field();
    }

    /** d, the degree over E. */
    public int degree() {
        return modulus.degree();
    }

    /** The element λ. */
    public Polynomial<E> generator() {
        return residue(Polynomial.monomial(base(), base().one(), 1));
    }

    /** The value of a polynomial at λ. */
    public Polynomial<E> residue(Polynomial<E> polynomial) {
        return polynomial.degree() < degree() ? polynomial : polynomial.remainder(modulus);
    }

    @Override
    public Polynomial<E> zero() {
        return Polynomial.zero(base());
    }

    @Override
    public Polynomial<E> one() {
        return Polynomial.one(base());
    }

    @Override
    public Polynomial<E> of(Rational value) {
        return Polynomial.constant(base(), base().of(value));
    }

    @Override
    public Polynomial<E> add(Polynomial<E> a, Polynomial<E> b) {
        return residue(a.plus(b));
    }

    @Override
    public Polynomial<E> negate(Polynomial<E> a) {
        return residue(a.negate());
    }

    @Override
    public Polynomial<E> multiply(Polynomial<E> a, Polynomial<E> b) {
        return residue(a.times(b));
    }

    @Override
    public boolean isZero(Polynomial<E> a) {
        return residue(a).isZero();
    }

    /**
     * 1/a by the extended Euclidean algorithm; an {@link ArithmeticException} when a vanishes at some root of q. About
     * d² operations on numbers whose length grows d-fold: meant for small d.
     */
    @Override
    public Polynomial<E> inverse(Polynomial<E> a) {
        return base().inverseModulo(residue(a), modulus);
    }

    /**
     * The sum of the element's values at all roots of q: Σ g(λ)/q′(λ) is the coefficient of λ^(d−1) of g (Euler; Serre,
     * Local Fields, III §6, from memory), here with g = element · q′.
     */
    public E trace(Polynomial<E> element) {
        return multiply(element, modulus.derivative()).coefficient(degree() - 1);
    }

    /** The product of the element's values at all roots of q. */
    public E norm(Polynomial<E> element) {
        E last = characteristicPolynomial(element).coefficient(0);
        return degree() % 2 == 0 ? last : base().negate(last);
    }

    /**
     * The monic polynomial over E whose roots are the element's values at the d roots of q, from the traces of the
     * element's powers by Newton's identities. 2d products of residues.
     */
    public Polynomial<E> characteristicPolynomial(Polynomial<E> element) {
        List<E> traces = new ArrayList<>(List.of(base().of(degree())));
        Polynomial<E> power = one();
        for (int k = 1; k <= degree(); k++) {
            power = multiply(power, element);
            traces.add(trace(power));
        }
        List<E> descending = new ArrayList<>(List.of(base().one()));
        for (int k = 1; k <= degree(); k++) {
            E sum = convolution(descending, traces, k);
            descending.add(base().divide(base().negate(sum), base().of(k)));
        }
        Collections.reverse(descending);
        return new Polynomial<>(base(), descending);
    }

    /**
     * The monic polynomial of least degree over E that vanishes at the element. The values at the roots are those of
     * the characteristic polynomial, and in a product of fields each is needed once.
     */
    public Polynomial<E> minimalPolynomial(Polynomial<E> element) {
        return SquareFree.part(characteristicPolynomial(element));
    }

    /** Σ e_i s_(k−i) for i = 0 … k − 1, e by descending power. */
    private E convolution(List<E> descending, List<E> sums, int k) {
        E sum = base().zero();
        for (int i = 0; i < k; i++) {
            sum = base().add(sum, base().multiply(descending.get(i), sums.get(k - i)));
        }
        return sum;
    }
}
