package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import org.pofk.exact.Rational;
import org.pofk.transform.TransferFunction;

/** Y(z) = Σ y(k) z^(−k), by long division. Exact; the degree of the denominator times the number of terms. */
public final class PowerSeries {
    private PowerSeries() {
    }

    /** y(0) … y(last). */
    public static List<Rational> of(TransferFunction<Rational> y, int last) {
        int degree = y.denominator().degree();
        List<Rational> values = new ArrayList<>();
        for (int k = 0; k <= last; k++) {
            Rational value = k <= degree ? y.numerator().coefficient(degree - k) : Rational.ZERO;
            for (int i = 1; i <= Math.min(k, degree); i++) {
                value = value.minus(y.denominator().coefficient(degree - i).times(values.get(k - i)));
            }
            values.add(value);
        }
        return values;
    }
}
