package org.pofk.transform;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Rational;

/** What the engine is compared with: elimination over the rationals at one z, and the recursion step by step. */
final class DirectSolution {
    private DirectSolution() {
    }

    /** x with (zI − A) x = z·x0, by Gauss's elimination; z must be no eigenvalue. */
    static List<Rational> stateTransformAt(Chain chain, Rational z) {
        int n = chain.size();
        Rational[][] rows = new Rational[n][n + 1];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                rows[i][j] = (i == j ? z : Rational.ZERO).minus(chain.matrix().at(i, j));
            }
            rows[i][n] = z.times(chain.start().get(i));
        }
        for (int pivot = 0; pivot < n; pivot++) {
            int from = pivot;
            while (rows[from][pivot].isZero()) {
                from++;
            }
            Rational[] row = rows[from];
            rows[from] = rows[pivot];
            rows[pivot] = row;
            Rational scale = row[pivot].inverse();
            for (int j = pivot; j <= n; j++) {
                row[j] = row[j].times(scale);
            }
            for (int i = 0; i < n; i++) {
                Rational factor = rows[i][pivot];
                if (i != pivot && !factor.isZero()) {
                    for (int j = pivot; j <= n; j++) {
                        rows[i][j] = rows[i][j].minus(factor.times(row[j]));
                    }
                }
            }
        }
        List<Rational> solution = new ArrayList<>();
        for (Rational[] row : rows) {
            solution.add(row[n]);
        }
        return solution;
    }

    /** Y(z) of an output: c x plus what its constant gives. */
    static Rational transformAt(Chain chain, Output output, Rational z) {
        return output.of(stateTransformAt(chain, z)).minus(output.constant())
                .plus(output.constant().times(z).dividedBy(z.minus(Rational.ONE)));
    }

    /** y(0) … y(count−1) by exact steps. */
    static List<Rational> terms(Chain chain, Output output, int count) {
        List<Rational> terms = new ArrayList<>();
        List<Rational> state = chain.start();
        for (int k = 0; k < count; k++) {
            terms.add(output.of(state));
            state = chain.matrix().times(state);
        }
        return terms;
    }
}
