package org.pofk.meaning;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.exact.CommonDenominator;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;

/** What is irrational in a number, each put into a {@link Tower} once, and how conjugation acts on it. Exact. */
final class Generators {
    private static final int MOST_COMPARED_BITS = 2048;

    private final Tower tower;
    private final SquareRoots squareRoots;
    private final Optional<RootOfUnity> unity;
    private final Map<Polynomial<Rational>, Roots> roots = new HashMap<>();
    private final List<Integer> radicals = new ArrayList<>();
    /** The conjugate of a generator; that of one that isn't here is itself. */
    private final Map<Integer, Element> conjugates = new HashMap<>();
    private final Map<Integer, Place> places = new HashMap<>();

    /** Which root of a polynomial a generator stands for, up to its scale. */
    private record Place(Polynomial<Rational> polynomial, int index, int conjugateIndex, Quantity value) {
        Place conjugate() {
            return new Place(polynomial, conjugateIndex, index, value.conjugate());
        }
    }

    /** The roots of one polynomial by index; of c times the root the minimal polynomial has no denominators. */
    private record Roots(BigInteger scale, List<Element> left, Map<Integer, Element> scaled) {
    }

    /** @param order of the roots of unity that are needed */
    Generators(Tower tower, BigInteger order) {
        this.tower = tower;
        this.squareRoots = new SquareRoots(tower);
        this.unity = RootOfUnity.of(order, tower, squareRoots);
        unity.ifPresent(zeta -> conjugates.put(zeta.index(), zeta.power(-1)));
    }

    /** e^(2πi · turns); its order divides the one announced. */
    Element turn(Rational turns) {
        if (unity.isEmpty()) {
            return turns.isInteger() ? Element.ONE : Element.ONE.negate();
        }
        Rational exponent = turns.times(Rational.of(unity.get().order()));
        return unity.get().power(exponent.numerator().mod(BigInteger.valueOf(unity.get().order())).longValueExact());
    }

    Element imaginaryUnit() {
        Optional<RootOfUnity> quarter = unity.filter(zeta -> zeta.order() % 4 == 0);
        if (quarter.isPresent()) {
            return quarter.get().power(quarter.get().order() / 4);
        }
        Element minusOne = Element.ONE.negate();
        return radical(minusOne, 2, Quantity.i());
    }

    /** The main square root of a rational number. */
    Element squareRoot(Rational radicand) {
        if (radicand.isZero()) {
            return Element.ZERO;
        }
        if (radicand.signum() < 0) {
            return tower.times(imaginaryUnit(), squareRoot(radicand.negate()));
        }
        return squareRoots.of(radicand.numerator().multiply(radicand.denominator()))
                .times(new Rational(BigInteger.ONE, radicand.denominator()));
    }

    /** An n-th root, its value given, of an element without denominator. */
    Element radical(Element power, int n, Quantity value) {
        if (power.isZero()) {
            return Element.ZERO;
        }
        for (int index : radicals) {
            Tower.Generator known = tower.generator(index);
            if (known.degree() == n && known.rule().equals(power)) {
                return n == 2 ? sameOrOpposite(index, value) : newRadical(power, n, value);
            }
        }
        return newRadical(power, n, value);
    }

    private Element newRadical(Element power, int n, Quantity value) {
        int index = tower.add(new Tower.Generator(n, power, value, Logarithm.divideUp(tower.height(power), n)));
        radicals.add(index);
        return Element.power(index, 1);
    }

    /** Two numbers with the same square, told apart by the one of sum and difference that isn't zero. */
    private Element sameOrOpposite(int index, Quantity value) {
        Quantity known = tower.generator(index).value();
        for (int bits = 64; bits <= MOST_COMPARED_BITS; bits *= 2) {
            if (!known.plus(value).enclose(bits).containsZero()) {
                return Element.power(index, 1);
            }
            if (!known.minus(value).enclose(bits).containsZero()) {
                return Element.power(index, 1).negate();
            }
        }
        throw new BeyondTowerException();
    }

    Element root(Root root) {
        Polynomial<Rational> polynomial = root.polynomial();
        if (polynomial.degree() == 2) {
            return quadratic(polynomial, root.index());
        }
        return root(new Place(polynomial, root.index(), root.conjugateIndex(), Quantity.of(root)));
    }

    /** (−b ± √(b² − 4c))/2: the larger of two real roots is the first, or the upper one. */
    private Element quadratic(Polynomial<Rational> monic, int index) {
        Rational b = monic.coefficient(1);
        Element distance = squareRoot(b.times(b).minus(monic.coefficient(0).times(Rational.of(4))));
        return Element.of(b.negate()).plus(index == 0 ? distance : distance.negate()).times(Rational.HALF);
    }

    private Element root(Place place) {
        return scaledRoot(place).times(new Rational(BigInteger.ONE, roots.get(place.polynomial()).scale()));
    }

    private Element scaledRoot(Place place) {
        Roots known = roots.computeIfAbsent(place.polynomial(), Generators::withoutDenominators);
        Element scaled = known.scaled().get(place.index());
        if (scaled == null) {
            scaled = newRoot(known, place);
            known.scaled().put(place.index(), scaled);
            roots.put(place.polynomial(), new Roots(known.scale(), quotient(known.left(), scaled), known.scaled()));
        }
        return scaled;
    }

    /** c^d q(x/c), whose roots are c times those of q. */
    private static Roots withoutDenominators(Polynomial<Rational> monic) {
        BigInteger scale = CommonDenominator.of(monic.coefficients());
        List<Element> coefficients = new ArrayList<>();
        for (int power = 0; power <= monic.degree(); power++) {
            coefficients.add(Element.of(monic.coefficient(power)
                    .times(Rational.of(scale.pow(monic.degree() - power)))));
        }
        return new Roots(scale, coefficients, new HashMap<>());
    }

    /** A root of what is left of the polynomial once the roots known are divided out. */
    private Element newRoot(Roots known, Place place) {
        int degree = known.left().size() - 1;
        if (degree == 1) {
            return known.left().get(0).negate();
        }
        Element rule = Element.ZERO;
        int index = tower.size();
        for (int power = 0; power < degree; power++) {
            rule = rule.plus(shifted(known.left().get(power).negate(), Monomial.power(index, power)));
        }
        Polynomial<Rational> polynomial = place.polynomial();
        long height = Logarithm.divideUp(Heights.measure(scaled(polynomial, known.scale())), polynomial.degree());
        tower.add(new Tower.Generator(degree, rule, place.value().times(Rational.of(known.scale())), height));
        places.put(index, place);
        return Element.power(index, 1);
    }

    private static Polynomial<Rational> scaled(Polynomial<Rational> monic, BigInteger scale) {
        List<Rational> coefficients = new ArrayList<>();
        for (int power = 0; power <= monic.degree(); power++) {
            coefficients.add(monic.coefficient(power).times(Rational.of(scale.pow(monic.degree() - power))));
        }
        return Polynomial.ofRationals(coefficients);
    }

    private static Element shifted(Element element, long monomial) {
        Map<Long, BigInteger> terms = new HashMap<>();
        element.coefficients().forEach((each, c) -> terms.put(each + monomial, c));
        return Element.over(terms, element.denominator());
    }

    /** The quotient by x − root, by Horner's scheme. */
    private List<Element> quotient(List<Element> polynomial, Element root) {
        List<Element> descending = new ArrayList<>();
        Element carried = Element.ZERO;
        for (int power = polynomial.size() - 1; power > 0; power--) {
            carried = tower.times(carried, root).plus(polynomial.get(power));
            descending.add(carried);
        }
        Collections.reverse(descending);
        return descending;
    }

    Element conjugate(Element element) {
        Element sum = Element.ZERO;
        for (Map.Entry<Long, BigInteger> term : element.coefficients().entrySet()) {
            Element product = Element.of(new Rational(term.getValue(), element.denominator()));
            for (int i = 0; i < tower.size(); i++) {
                int exponent = Monomial.exponent(term.getKey(), i);
                if (exponent > 0) {
                    product = tower.times(product, tower.pow(conjugateOf(i), exponent));
                }
            }
            sum = sum.plus(product);
        }
        return sum;
    }

    private Element conjugateOf(int index) {
        Element known = conjugates.get(index);
        if (known == null) {
            known = newConjugate(index);
            conjugates.put(index, known);
        }
        return known;
    }

    private Element newConjugate(int index) {
        Tower.Generator generator = tower.generator(index);
        if (places.containsKey(index)) {
            return scaledRoot(places.get(index).conjugate());
        }
        if (!radicals.contains(index)) {
            return Element.power(index, 1);
        }
        return generator.degree() == 2
                ? radical(conjugate(generator.rule()), 2, generator.value().conjugate())
                : Element.power(index, 1);
    }

    /** 1/element where it is found without more work than it saves. */
    Optional<Element> inverse(Element element) {
        return new Inverses(tower).of(element);
    }
}
