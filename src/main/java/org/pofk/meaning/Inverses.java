package org.pofk.meaning;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.ResidueField;

/** 1/x in a {@link Tower} for an x that isn't zero as a number, where that is easy. Exact. */
final class Inverses {
    /** Euclid's algorithm makes numbers d times as long. */
    private static final int MOST_EUCLID_DEGREE = 12;

    private final Tower tower;

    Inverses(Tower tower) {
        this.tower = tower;
    }

    Optional<Element> of(Element element) {
        if (element.isRational()) {
            return Optional.of(Element.of(element.constant().inverse()));
        }
        if (element.coefficients().size() == 1) {
            return ofMonomial(element);
        }
        List<Integer> within = IntStream.range(0, tower.size()).filter(i -> element.degreeIn(i) > 0).boxed().toList();
        if (within.size() == 1) {
            return ofPolynomial(element, within.get(0));
        }
        return Optional.empty();
    }

    /** From x^d = Σ rᵢ xⁱ with a rational r₀: 1/x = (x^(d−1) − Σ_{i≥1} rᵢ x^(i−1))/r₀. */
    private Optional<Element> ofMonomial(Element element) {
        Map.Entry<Long, BigInteger> term = element.coefficients().entrySet().iterator().next();
        Element product = Element.of(new Rational(element.denominator(), term.getValue()));
        for (int i = 0; i < tower.size(); i++) {
            int exponent = Monomial.exponent(term.getKey(), i);
            if (exponent > 0) {
                Optional<Element> inverse = ofGenerator(i);
                if (inverse.isEmpty()) {
                    return inverse;
                }
                product = tower.times(product, tower.pow(inverse.get(), exponent));
            }
        }
        return Optional.of(product);
    }

    private Optional<Element> ofGenerator(int index) {
        Element rule = tower.generator(index).rule();
        Element sum = Element.power(index, tower.generator(index).degree() - 1);
        Element constant = Element.ZERO;
        for (Map.Entry<Long, BigInteger> term : rule.coefficients().entrySet()) {
            Element coefficient = Element.over(Map.of(term.getKey(), term.getValue()), BigInteger.ONE);
            if (Monomial.exponent(term.getKey(), index) == 0) {
                constant = constant.plus(coefficient);
            } else {
                long lower = term.getKey() - Monomial.power(index, 1);
                sum = sum.plus(Element.over(Map.of(lower, term.getValue().negate()), BigInteger.ONE));
            }
        }
        return constant.isRational() && !constant.isZero()
                ? Optional.of(sum.times(constant.constant().inverse()))
                : Optional.empty();
    }

    /** An element with one generator whose rule holds no other. */
    private Optional<Element> ofPolynomial(Element element, int index) {
        Tower.Generator generator = tower.generator(index);
        boolean alone = IntStream.range(0, index).allMatch(i -> generator.rule().degreeIn(i) == 0);
        if (!alone || generator.degree() > MOST_EUCLID_DEGREE) {
            return Optional.empty();
        }
        Polynomial<Rational> modulus = polynomial(Element.power(index, generator.degree())
                .plus(generator.rule().negate()), index);
        try {
            return Optional.of(element(new ResidueField<>(modulus).inverse(polynomial(element, index)), index));
        } catch (ArithmeticException commonRoot) {
            return Optional.empty();
        }
    }

    private static Polynomial<Rational> polynomial(Element element, int index) {
        List<Rational> ascending = new ArrayList<>();
        for (int power = 0; power <= element.degreeIn(index); power++) {
            ascending.add(new Rational(element.coefficients().getOrDefault(Monomial.power(index, power),
                    BigInteger.ZERO), element.denominator()));
        }
        return Polynomial.ofRationals(ascending);
    }

    private static Element element(Polynomial<Rational> polynomial, int index) {
        Element sum = Element.ZERO;
        for (int power = 0; power <= polynomial.degree(); power++) {
            sum = sum.plus(Element.power(index, power).times(polynomial.coefficient(power)));
        }
        return sum;
    }
}
