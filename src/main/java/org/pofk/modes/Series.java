package org.pofk.modes;

import java.util.ArrayList;
import java.util.List;
import org.pofk.exact.Field;
import org.pofk.exact.Polynomial;

/** Power series cut off after finitely many terms. Exact; products and quotients cost length². */
final class Series {
    private Series() {
    }

    /** The first {@code length} coefficients of a/b, where b does not vanish at zero. */
    static <E> List<E> quotient(Field<E> field, Polynomial<E> a, Polynomial<E> b, int length) {
        List<E> quotient = new ArrayList<>(length);
        if (length == 0) {
            return quotient;
        }
        E inverse = field.inverse(b.coefficient(0));
        for (int i = 0; i < length; i++) {
            E rest = a.coefficient(i);
            for (int j = 1; j <= Math.min(i, b.degree()); j++) {
                rest = field.subtract(rest, field.multiply(b.coefficient(j), quotient.get(i - j)));
            }
            quotient.add(field.multiply(rest, inverse));
        }
        return quotient;
    }

    /** The terms below t^length. */
    static <E> Polynomial<E> truncated(Polynomial<E> series, int length) {
        return series.coefficients().size() <= length
                ? series
                : new Polynomial<>(series.field(), series.coefficients().subList(0, length));
    }
}
