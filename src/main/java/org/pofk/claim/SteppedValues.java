package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import org.pofk.exact.Rational;
import org.pofk.transform.TransferFunction;

/**
 * y(0), y(1), … of a transform N/D by its recurrence Σ D_(d−j) y(k−j) = N_(d−k), kept as far as asked for. Exact; d
 * products a step.
 */
final class SteppedValues {
    private final TransferFunction<Rational> y;
    private final List<Rational> values = new ArrayList<>();

    SteppedValues(TransferFunction<Rational> y) {
        this.y = y;
    }

    synchronized Rational at(int k) {
        while (values.size() <= k) {
            values.add(next());
        }
        return values.get(k);
    }

    private Rational next() {
        int k = values.size();
        int degree = y.denominator().degree();
        Rational value = k <= degree ? y.numerator().coefficient(degree - k) : Rational.ZERO;
        for (int j = 1; j <= Math.min(k, degree); j++) {
            value = value.minus(y.denominator().coefficient(degree - j).times(values.get(k - j)));
        }
        return value;
    }
}
