package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import org.pofk.exact.Rational;

/** Exact elimination on full matrices, for tests alone: shares nothing with what it is held against. */
public final class Gauss {
    private Gauss() {
    }

    /** M⁻¹, row by row. */
    public static List<List<Rational>> inverse(List<List<Rational>> rows) {
        int n = rows.size();
        Rational[][] work = new Rational[n][2 * n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                work[i][j] = rows.get(i).get(j);
                work[i][n + j] = i == j ? Rational.ONE : Rational.ZERO;
            }
        }
        for (int column = 0; column < n; column++) {
            int pivot = column;
            while (work[pivot][column].isZero()) {
                pivot++;
            }
            Rational[] swapped = work[pivot];
            work[pivot] = work[column];
            work[column] = swapped;
            Rational scale = swapped[column].inverse();
            for (int j = 0; j < 2 * n; j++) {
                swapped[j] = swapped[j].times(scale);
            }
            for (int i = 0; i < n; i++) {
                Rational factor = work[i][column];
                for (int j = 0; i != column && !factor.isZero() && j < 2 * n; j++) {
                    work[i][j] = work[i][j].minus(factor.times(swapped[j]));
                }
            }
        }
        List<List<Rational>> inverse = new ArrayList<>();
        for (Rational[] row : work) {
            inverse.add(List.of(row).subList(n, 2 * n));
        }
        return inverse;
    }

    /** M x. */
    public static List<Rational> times(List<List<Rational>> rows, List<Rational> vector) {
        return rows.stream().map(row -> dot(row, vector)).toList();
    }

    public static Rational dot(List<Rational> a, List<Rational> b) {
        Rational sum = Rational.ZERO;
        for (int i = 0; i < a.size(); i++) {
            sum = sum.plus(a.get(i).times(b.get(i)));
        }
        return sum;
    }
}
