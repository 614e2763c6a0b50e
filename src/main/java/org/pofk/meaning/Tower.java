package org.pofk.meaning;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.pofk.exact.BinaryPowering;
import org.pofk.exact.Rational;

/**
 * Q[x₁, …, xₘ] modulo x_j^(d_j) = a polynomial in x₁ … x_j of lower degree in x_j, one rule a generator; each generator
 * stands for an algebraic integer. Not always a field: what is zero here is zero as a number, and not the other way
 * round. Exact; a product of two elements with n terms takes n² products and as many for the rules.
 */
final class Tower {
    /** Products of more terms than that take longer than high precision does. */
    private static final int MOST_PRODUCTS = 1 << 16;
    private static final int MOST_COEFFICIENT_BITS = 100_000;

    /**
     * One generator.
     *
     * @param degree d
     * @param rule   what its d-th power is; no denominator
     * @param value  the number it stands for
     * @param height a bound on its absolute logarithmic height, in units of {@link Logarithm}
     */
    record Generator(int degree, Element rule, Quantity value, long height) {
    }

    private final List<Generator> generators = new ArrayList<>();

    Generator generator(int index) {
        return generators.get(index);
    }

    int size() {
        return generators.size();
    }

    /** The place of the new generator. */
    int add(Generator generator) {
        if (generator.degree() > Monomial.MOST_DEGREE || generators.size() == Monomial.MOST_GENERATORS) {
            throw new BeyondTowerException();
        }
        generators.add(generator);
        return generators.size() - 1;
    }

    Element times(Element a, Element b) {
        if (a.isRational() || b.isRational()) {
            return a.isRational() ? b.times(a.constant()) : a.times(b.constant());
        }
        if ((long) a.coefficients().size() * b.coefficients().size() > MOST_PRODUCTS) {
            throw new BeyondTowerException();
        }
        Map<Long, BigInteger> product = new HashMap<>();
        a.coefficients().forEach((first, c) -> b.coefficients().forEach((second, d) ->
                product.merge(first + second, c.multiply(d), BigInteger::add)));
        reduce(product);
        return Element.over(product, a.denominator().multiply(b.denominator()));
    }

    /** Applies the rules, of the last generator first, for its rule may bring in the earlier ones. */
    private void reduce(Map<Long, BigInteger> terms) {
        for (int index = generators.size() - 1; index >= 0; index--) {
            int degree = generators.get(index).degree();
            for (int exponent = highest(terms, index); exponent >= degree; exponent = highest(terms, index)) {
                lower(terms, index, exponent);
            }
        }
    }

    private static int highest(Map<Long, BigInteger> terms, int index) {
        int highest = 0;
        for (long monomial : terms.keySet()) {
            highest = Math.max(highest, Monomial.exponent(monomial, index));
        }
        return highest;
    }

    private void lower(Map<Long, BigInteger> terms, int index, int exponent) {
        Generator generator = generators.get(index);
        List<Long> high = terms.keySet().stream()
                .filter(monomial -> Monomial.exponent(monomial, index) == exponent).toList();
        for (long monomial : high) {
            BigInteger coefficient = terms.remove(monomial);
            long rest = monomial - Monomial.power(index, generator.degree());
            if (coefficient.signum() != 0) {
                generator.rule().coefficients().forEach((lower, c) ->
                        mergeReduced(terms, rest, lower, coefficient.multiply(c), index));
            }
        }
    }

    /** rest · lower may have earlier generators beyond what a monomial holds only if both are beyond their rules. */
    private void mergeReduced(Map<Long, BigInteger> terms, long rest, long lower, BigInteger coefficient, int below) {
        for (int i = 0; i < below; i++) {
            if (Monomial.exponent(rest, i) + Monomial.exponent(lower, i) > 2 * Monomial.MOST_DEGREE) {
                throw new BeyondTowerException();
            }
        }
        terms.merge(rest + lower, coefficient, BigInteger::add);
    }

    /** a^exponent, exponent ≥ 0. */
    Element pow(Element a, int exponent) {
        if ((long) exponent * a.bitLength() > MOST_COEFFICIENT_BITS) {
            throw new BeyondTowerException();
        }
        return BinaryPowering.of(Element.ONE, a, exponent, this::times);
    }

    /** The number an element stands for. */
    Quantity value(Element element) {
        List<Quantity> terms = new ArrayList<>();
        element.coefficients().entrySet().stream().sorted(Map.Entry.comparingByKey()).forEach(entry ->
                terms.add(Quantity.of(new Rational(entry.getValue(), element.denominator()))
                        .times(value(entry.getKey()))));
        return Quantity.sum(terms);
    }

    private Quantity value(long monomial) {
        Quantity product = Quantity.ONE;
        for (int i = 0; i < generators.size(); i++) {
            product = product.times(generators.get(i).value().pow(Monomial.exponent(monomial, i)));
        }
        return product;
    }

    /** A bound on the height of an element without denominator: log Σ|c| + Σ degree · height, as {@link Heights} says. */
    long height(Element integral) {
        long height = Logarithm.ofMagnitude(integral.length());
        for (int i = 0; i < generators.size(); i++) {
            height += integral.degreeIn(i) * generators.get(i).height();
        }
        return height;
    }

    /**
     * b such that the numerator of an element has modulus ≥ 2^−b as a number, unless that is zero: Liouville's
     * inequality for the polynomial, |f(γ)| ≥ (Σ|c|)^(1−D) · 2^(−D Σ degree · height), from the product formula and
     * |f| ≤ Σ|c| Π max(1, |γᵢ|)^degree at each of the other places (Waldschmidt 2000, section 3.5). D is the product of
     * the degrees of the generators it needs.
     */
    long separation(Element element) {
        long length = Logarithm.ofMagnitude(element.length());
        long polynomial = height(element) - length;
        long degree = degreeOfField(element);
        BigInteger bits = BigInteger.valueOf(degree - 1).multiply(BigInteger.valueOf(length))
                .add(BigInteger.valueOf(degree).multiply(BigInteger.valueOf(polynomial)))
                .divide(BigInteger.valueOf(Logarithm.PER_BIT)).add(BigInteger.ONE);
        return bits.min(BigInteger.valueOf(Long.MAX_VALUE)).longValueExact();
    }

    private long degreeOfField(Element element) {
        boolean[] needed = new boolean[generators.size()];
        long degree = 1;
        for (int i = generators.size() - 1; i >= 0; i--) {
            needed[i] |= element.degreeIn(i) > 0;
            if (needed[i]) {
                degree *= generators.get(i).degree();
                for (int j = 0; j < i; j++) {
                    needed[j] |= generators.get(i).rule().degreeIn(j) > 0;
                }
            }
        }
        return degree;
    }
}
