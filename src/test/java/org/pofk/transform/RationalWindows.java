package org.pofk.transform;

import java.util.ArrayList;
import java.util.List;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;

/**
 * What {@link ExactWindows} proves, in fractions: the terms y(0) … y(n+d−1) satisfy D at all n windows, so by
 * Cayley–Hamilton at every k.
 */
final class RationalWindows {
    private RationalWindows() {
    }

    /** x(0) … x(count−1). */
    static List<List<Rational>> states(LinearSystem system, int count) {
        List<List<Rational>> states = new ArrayList<>(count);
        List<Rational> state = system.start();
        for (int k = 0; k < count; k++) {
            states.add(state);
            state = k + 1 < count ? system.matrix().times(state) : state;
        }
        return states;
    }

    /** c x for each of the states. */
    static List<Rational> terms(List<List<Rational>> states, List<Rational> reading) {
        List<Rational> terms = new ArrayList<>(states.size());
        for (List<Rational> state : states) {
            Rational sum = Rational.ZERO;
            for (int i = 0; i < reading.size(); i++) {
                if (!reading.get(i).isZero() && !state.get(i).isZero()) {
                    sum = sum.plus(reading.get(i).times(state.get(i)));
                }
            }
            terms.add(sum);
        }
        return terms;
    }

    /** Σ_i D_i y(k+i) = 0 for k = 0 … windows − 1, the terms at least windows + d. */
    static boolean hold(Polynomial<Rational> recurrence, List<Rational> terms, int windows) {
        for (int k = 0; k < windows; k++) {
            Rational window = Rational.ZERO;
            for (int i = 0; i <= recurrence.degree(); i++) {
                window = window.plus(recurrence.coefficient(i).times(terms.get(k + i)));
            }
            if (!window.isZero()) {
                return false;
            }
        }
        return true;
    }

    /** P with Σ y(k) z^(−k−1) = P/D, from D and the first d terms: P_m = Σ_j D_(m+1+j) y(j). */
    static Polynomial<Rational> numerator(Polynomial<Rational> recurrence, List<Rational> terms) {
        List<Rational> numerator = new ArrayList<>();
        for (int m = 0; m < recurrence.degree(); m++) {
            Rational sum = Rational.ZERO;
            for (int j = 0; m + 1 + j <= recurrence.degree(); j++) {
                sum = sum.plus(recurrence.coefficient(m + 1 + j).times(terms.get(j)));
            }
            numerator.add(sum);
        }
        return Polynomial.ofRationals(numerator);
    }
}
