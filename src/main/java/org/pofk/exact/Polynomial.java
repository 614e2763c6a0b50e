package org.pofk.exact;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.function.Function;

/**
 * A polynomial in one variable with exact coefficients. Canonical form: coefficients by ascending power, the last
 * one not zero; the zero polynomial has none and degree −1.
 *
 * @param <E> coefficient
 */
public record Polynomial<E>(Field<E> field, List<E> coefficients) {

    /** A quotient and the remainder it leaves. */
    public record Division<E>(Polynomial<E> quotient, Polynomial<E> remainder) {
    }

    public Polynomial {
        int length = coefficients.size();
        while (length > 0 && field.isZero(coefficients.get(length - 1))) {
            length--;
        }
        coefficients = List.copyOf(coefficients.subList(0, length));
    }

    public static <E> Polynomial<E> zero(Field<E> field) {
        return new Polynomial<>(field, List.of());
    }

    public static <E> Polynomial<E> one(Field<E> field) {
        return new Polynomial<>(field, List.of(field.one()));
    }

    public static <E> Polynomial<E> constant(Field<E> field, E value) {
        return new Polynomial<>(field, List.of(value));
    }

    /** coefficient · z^power. */
    public static <E> Polynomial<E> monomial(Field<E> field, E coefficient, int power) {
        List<E> all = new ArrayList<>(Collections.nCopies(power, field.zero()));
        all.add(coefficient);
        return new Polynomial<>(field, all);
    }

    /** z − root. */
    public static <E> Polynomial<E> linear(Field<E> field, E root) {
        return new Polynomial<>(field, List.of(field.negate(root), field.one()));
    }

    /** A rational polynomial from integer coefficients by ascending power. */
    public static Polynomial<Rational> ofIntegers(long... ascending) {
        List<Rational> all = new ArrayList<>();
        for (long coefficient : ascending) {
            all.add(Rational.of(coefficient));
        }
        return new Polynomial<>(RationalField.Q, all);
    }

    /** A rational polynomial from coefficients by ascending power. */
    public static Polynomial<Rational> ofRationals(List<Rational> ascending) {
        return new Polynomial<>(RationalField.Q, ascending);
    }

    /** Degree; −1 for zero. */
    public int degree() {
        return coefficients.size() - 1;
    }

    public boolean isZero() {
        return coefficients.isEmpty();
    }

    public boolean isConstant() {
        return coefficients.size() <= 1;
    }

    /** The coefficient of z^power, zero above the degree. */
    public E coefficient(int power) {
        return power < coefficients.size() ? coefficients.get(power) : field.zero();
    }

    /** The coefficient of the highest power; an {@link ArithmeticException} for zero. */
    public E leading() {
        if (isZero()) {
            throw new ArithmeticException("the zero polynomial has no leading coefficient");
        }
        return coefficients.get(degree());
    }

    public Polynomial<E> plus(Polynomial<E> other) {
        int length = Math.max(coefficients.size(), other.coefficients.size());
        List<E> sum = new ArrayList<>(length);
        for (int i = 0; i < length; i++) {
            sum.add(field.add(coefficient(i), other.coefficient(i)));
        }
        return new Polynomial<>(field, sum);
    }

    public Polynomial<E> negate() {
        return map(field, field::negate);
    }

    public Polynomial<E> minus(Polynomial<E> other) {
        return plus(other.negate());
    }

    public Polynomial<E> times(Polynomial<E> other) {
        return field.product(this, other);
    }

    public Polynomial<E> times(E scalar) {
        return map(field, coefficient -> field.multiply(coefficient, scalar));
    }

    /** This times z^power, power ≥ 0. */
    public Polynomial<E> shiftedUp(int power) {
        List<E> all = new ArrayList<>(Collections.nCopies(power, field.zero()));
        all.addAll(coefficients);
        return new Polynomial<>(field, all);
    }

    /** This divided by z^power; the lowest {@code power} coefficients must be zero. */
    public Polynomial<E> shiftedDown(int power) {
        if (power > lowestPower() && !isZero()) {
            throw new ArithmeticException("not divisible by z^" + power);
        }
        return isZero() ? this : new Polynomial<>(field, coefficients.subList(power, coefficients.size()));
    }

    /** The multiplicity of the root zero; 0 for the zero polynomial. */
    public int lowestPower() {
        int power = 0;
        while (power < coefficients.size() && field.isZero(coefficients.get(power))) {
            power++;
        }
        return power == coefficients.size() ? 0 : power;
    }

    public Polynomial<E> pow(int exponent) {
        return BinaryPowering.of(one(field), this, exponent, Polynomial::times);
    }

    /** Quotient and remainder, the remainder's degree below the divisor's; fails on a zero divisor. */
    public Division<E> dividedBy(Polynomial<E> divisor) {
        if (divisor.isZero()) {
            throw new ArithmeticException("division by the zero polynomial");
        }
        return field.division(this, divisor);
    }

    /** The quotient of a division that leaves nothing; an {@link ArithmeticException} when it leaves something. */
    public Polynomial<E> dividedExactlyBy(Polynomial<E> divisor) {
        Division<E> division = dividedBy(divisor);
        if (!division.remainder.isZero()) {
            throw new ArithmeticException("the division leaves a remainder");
        }
        return division.quotient;
    }

    public Polynomial<E> remainder(Polynomial<E> divisor) {
        return dividedBy(divisor).remainder;
    }

    /** This over its leading coefficient; zero stays zero. */
    public Polynomial<E> monic() {
        return isZero() ? this : times(field.inverse(leading()));
    }

    public Polynomial<E> derivative() {
        List<E> result = new ArrayList<>();
        for (int i = 1; i < coefficients.size(); i++) {
            result.add(field.multiply(coefficients.get(i), field.of(i)));
        }
        return new Polynomial<>(field, result);
    }

    /** The value at a point, by Horner's rule. */
    public E valueAt(E point) {
        E value = field.zero();
        for (int i = degree(); i >= 0; i--) {
            value = field.add(field.multiply(value, point), coefficients.get(i));
        }
        return value;
    }

    public Polynomial<E> greatestCommonDivisor(Polynomial<E> other) {
        return field.greatestCommonDivisor(this, other);
    }

    /** The polynomial whose coefficients are the images of this one's. */
    public <F> Polynomial<F> map(Field<F> target, Function<E, F> image) {
        List<F> images = new ArrayList<>(coefficients.size());
        for (E coefficient : coefficients) {
            images.add(image.apply(coefficient));
        }
        return new Polynomial<>(target, images);
    }

    static <E> Polynomial<E> schoolbookProduct(Field<E> field, Polynomial<E> a, Polynomial<E> b) {
        if (a.isZero() || b.isZero()) {
            return zero(field);
        }
        List<E> product = new ArrayList<>(Collections.nCopies(a.degree() + b.degree() + 1, field.zero()));
        for (int i = 0; i <= a.degree(); i++) {
            for (int j = 0; j <= b.degree(); j++) {
                product.set(i + j, field.add(product.get(i + j),
                        field.multiply(a.coefficients.get(i), b.coefficients.get(j))));
            }
        }
        return new Polynomial<>(field, product);
    }

    static <E> Division<E> longDivision(Field<E> field, Polynomial<E> dividend, Polynomial<E> divisor) {
        E inverseLeading = field.inverse(divisor.leading());
        int steps = dividend.degree() - divisor.degree();
        if (steps < 0) {
            return new Division<>(zero(field), dividend);
        }
        List<E> rest = new ArrayList<>(dividend.coefficients);
        List<E> quotient = new ArrayList<>(Collections.nCopies(steps + 1, field.zero()));
        for (int shift = steps; shift >= 0; shift--) {
            E factor = field.multiply(rest.get(shift + divisor.degree()), inverseLeading);
            quotient.set(shift, factor);
            if (!field.isZero(factor)) {
                for (int i = 0; i <= divisor.degree(); i++) {
                    rest.set(shift + i, field.subtract(rest.get(shift + i),
                            field.multiply(factor, divisor.coefficients.get(i))));
                }
            }
        }
        return new Division<>(new Polynomial<>(field, quotient),
                new Polynomial<>(field, rest.subList(0, Math.max(0, divisor.degree()))));
    }

    static <E> Polynomial<E> euclid(Field<E> field, Polynomial<E> a, Polynomial<E> b) {
        Polynomial<E> larger = a;
        Polynomial<E> smaller = b;
        while (!smaller.isZero()) {
            Polynomial<E> rest = larger.remainder(smaller);
            larger = smaller;
            smaller = rest.monic();
        }
        return larger.monic();
    }

    /** Euclid's algorithm with monic remainders, which keeps them as short as they can be. */
    static <E> Polynomial<E> inverseByEuclid(Field<E> field, Polynomial<E> a, Polynomial<E> modulus) {
        Polynomial<E> larger = modulus;
        Polynomial<E> largerCofactor = zero(field);
        Polynomial<E> smaller = a;
        Polynomial<E> smallerCofactor = one(field);
        while (!smaller.isZero()) {
            E scale = field.inverse(smaller.leading());
            smaller = smaller.times(scale);
            smallerCofactor = smallerCofactor.times(scale);
            if (smaller.isConstant()) {
                return smallerCofactor;
            }
            Polynomial.Division<E> division = larger.dividedBy(smaller);
            Polynomial<E> nextCofactor = largerCofactor.minus(division.quotient().times(smallerCofactor));
            larger = smaller;
            largerCofactor = smallerCofactor;
            smaller = division.remainder();
            smallerCofactor = nextCofactor;
        }
        throw new ArithmeticException("no inverse: a common root with the modulus");
    }

    /** Written out for the same reason as in {@link Rational}. */
    @Override
    public boolean equals(Object other) {
        return other instanceof Polynomial<?> polynomial && field.equals(polynomial.field)
                && coefficients.equals(polynomial.coefficients);
    }

    @Override
    public int hashCode() {
        return 31 * field.hashCode() + coefficients.hashCode();
    }

    /** Coefficients by descending power with the variable {@code z}, for messages and assertions. */
    @Override
    public String toString() {
        if (isZero()) {
            return "0";
        }
        StringBuilder text = new StringBuilder();
        for (int i = degree(); i >= 0; i--) {
            if (!field.isZero(coefficients.get(i))) {
                text.append(text.isEmpty() ? "" : " + ").append('(').append(coefficients.get(i)).append(')')
                        .append(i == 0 ? "" : i == 1 ? "*z" : "*z^" + i);
            }
        }
        return text.toString();
    }
}
