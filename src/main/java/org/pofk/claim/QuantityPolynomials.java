package org.pofk.claim;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.meaning.Quantity;

/** Polynomials whose coefficients are numbers as expressions, by ascending power; which of them are zero isn't asked. */
final class QuantityPolynomials {
    static final List<Quantity> ONE = List.of(Quantity.ONE);

    private QuantityPolynomials() {
    }

    static List<Quantity> of(Polynomial<Rational> polynomial) {
        return polynomial.coefficients().stream().map(Quantity::of).toList();
    }

    static List<Quantity> plus(List<Quantity> a, List<Quantity> b) {
        List<Quantity> sum = new ArrayList<>();
        for (int i = 0; i < Math.max(a.size(), b.size()); i++) {
            sum.add(coefficient(a, i).plus(coefficient(b, i)));
        }
        return sum;
    }

    static Quantity coefficient(List<Quantity> polynomial, int power) {
        return power < polynomial.size() ? polynomial.get(power) : Quantity.ZERO;
    }

    static List<Quantity> times(List<Quantity> a, List<Quantity> b) {
        if (a.isEmpty() || b.isEmpty()) {
            return List.of();
        }
        List<List<Quantity>> terms = new ArrayList<>();
        for (int i = 0; i < a.size() + b.size() - 1; i++) {
            terms.add(new ArrayList<>());
        }
        for (int i = 0; i < a.size(); i++) {
            for (int j = 0; j < b.size(); j++) {
                terms.get(i + j).add(a.get(i).times(b.get(j)));
            }
        }
        return terms.stream().map(Quantity::sum).toList();
    }

    static List<Quantity> times(List<Quantity> a, Quantity factor) {
        return a.stream().map(each -> factor.times(each)).toList();
    }

    static List<Quantity> power(List<Quantity> a, int exponent) {
        List<Quantity> power = ONE;
        for (int i = 0; i < exponent; i++) {
            power = times(power, a);
        }
        return power;
    }

    static List<Quantity> withRoot(Quantity root) {
        return List.of(root.negate(), Quantity.ONE);
    }

    /** What a division by a polynomial with leading coefficient one gives. */
    record Division(List<Quantity> quotient, List<Quantity> remainder) {
    }

    static Division divide(List<Quantity> dividend, List<Quantity> monic) {
        int degree = monic.size() - 1;
        List<Quantity> rest = new ArrayList<>(dividend);
        int steps = dividend.size() - degree;
        List<Quantity> quotient = new ArrayList<>(Collections.nCopies(Math.max(0, steps), Quantity.ZERO));
        for (int shift = steps - 1; shift >= 0; shift--) {
            Quantity factor = rest.get(shift + degree);
            quotient.set(shift, factor);
            for (int i = 0; i < degree; i++) {
                rest.set(shift + i, rest.get(shift + i).minus(monic.get(i).times(factor)));
            }
        }
        return new Division(quotient, rest.subList(0, Math.min(degree, rest.size())));
    }
}
