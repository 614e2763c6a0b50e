package org.pofk.meaning;

import java.util.List;
import java.util.stream.IntStream;
import org.pofk.text.Span;

/**
 * A polynomial to a whole power that isn't zero, while it is read; coefficients by ascending power, at least two, the
 * last one not zero.
 */
record FormFactor(List<Scalar> coefficients, int exponent, Span span) {

    FormFactor {
        coefficients = List.copyOf(coefficients);
    }

    static FormFactor variable(Span span) {
        return new FormFactor(List.of(Scalars.of(0), Scalars.of(1)), 1, span);
    }

    int degree() {
        return coefficients.size() - 1;
    }

    FormFactor to(int newExponent) {
        return new FormFactor(coefficients, newExponent, span);
    }

    boolean isVariable() {
        return degree() == 1 && coefficients.get(0).isPlainZero() && coefficients.get(1).isPlainOne();
    }

    boolean isBelow() {
        return exponent < 0;
    }

    /** Whether the polynomials are written alike, whatever their exponents. */
    boolean isAlike(FormFactor other) {
        return degree() == other.degree() && IntStream.rangeClosed(0, degree())
                .allMatch(power -> coefficients.get(power).isAlike(other.coefficients.get(power)));
    }
}
