package org.pofk.report;

import java.util.List;
import java.util.stream.IntStream;
import org.pofk.exact.Ball;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Decimal;
import org.pofk.exact.Decimals;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;
import org.pofk.formula.PlainText;
import org.pofk.modes.RealValue;

/**
 * How numbers are written as JSON: counts and steps as integers, all others as strings, exact ones as fractions,
 * polynomials as lists of coefficients by ascending power.
 *
 * @param digits significant digits of decimals
 */
record JsonNumbers(Json json, int digits) {
    private static final int GUARD_DIGITS = 2;

    /** {@code {"exact": "13/40", "decimal": "0.325"}}. */
    void number(RealValue value) {
        json.object(() -> {
            json.text("exact", value.exact().map(PlainText.ASCII::write));
            json.text("decimal", decimal(value));
        });
    }

    void number(String field, RealValue value) {
        json.name(field);
        number(value);
    }

    String decimal(RealValue value) {
        return value.decimal(digits).text();
    }

    String decimal(Rational value) {
        return ValueText.number(value, digits);
    }

    /** {@code ["-1/2", "0", "1"]}; zero is {@code ["0"]}. */
    void polynomial(Polynomial<Rational> polynomial) {
        List<Rational> coefficients = IntStream.rangeClosed(0, Math.max(0, polynomial.degree()))
                .mapToObj(polynomial::coefficient).toList();
        json.list(coefficients, coefficient -> json.text(coefficient.toString()));
    }

    void polynomial(String field, Polynomial<Rational> polynomial) {
        json.name(field);
        polynomial(polynomial);
    }

    void fractions(String field, List<Rational> values) {
        json.texts(field, values.stream().map(Rational::toString).toList());
    }

    /** Decimals of the middle of an enclosure, with a radius that covers it and the rounding. */
    void root(Root root) {
        ComplexBall enclosure = root.enclose((digits + GUARD_DIGITS) * 10 / 3 + 1);
        Decimal real = Decimals.of(enclosure.real().middle(), digits + GUARD_DIGITS);
        Decimal imaginary = Decimals.of(enclosure.imaginary().middle(), digits + GUARD_DIGITS);
        json.object(() -> {
            json.text("re", real.text());
            json.text("im", imaginary.text());
            json.text("radius", powerOfTenFrom(
                    farthest(enclosure.real(), real).plus(farthest(enclosure.imaginary(), imaginary))));
        });
    }

    private static Rational farthest(Ball ball, Decimal written) {
        return Rational.max(ball.upper().minus(written.value()), written.value().minus(ball.lower()));
    }

    /** A power of ten that is not below a small number; 0 for zero. */
    private static String powerOfTenFrom(Rational small) {
        if (small.isZero()) {
            return "0";
        }
        int exponent = small.denominator().toString().length() - small.numerator().toString().length() - 1;
        return exponent > 0 ? "1e-" + exponent : Rational.of(10).pow(-exponent).toString();
    }
}
