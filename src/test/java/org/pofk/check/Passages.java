package org.pofk.check;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.exact.Rational;

/**
 * The first steps into a set by elimination in fractions: with what probability it comes, and Σ k P(T = k). Written for
 * these tests alone.
 *
 * @param entered from each state
 * @param steps   from each state
 */
record Passages(List<Rational> entered, List<Rational> steps) {

    static Passages of(Chain chain, Set<Integer> into) {
        int n = chain.size();
        List<Integer> open = IntStream.range(0, n).filter(state -> !into.contains(state) && reaches(chain, into, state))
                .boxed().toList();
        int m = open.size();
        Rational[][] rows = new Rational[m][m + 2];
        for (int i = 0; i < m; i++) {
            Rational enters = Rational.ZERO;
            for (int target : into) {
                enters = enters.plus(chain.matrix().at(target, open.get(i)));
            }
            for (int j = 0; j < m; j++) {
                Rational moves = chain.matrix().at(open.get(j), open.get(i)).negate();
                rows[i][j] = i == j ? Rational.ONE.plus(moves) : moves;
            }
            rows[i][m] = enters;
            rows[i][m + 1] = Rational.ZERO;
        }
        List<Rational> entered = solved(rows, m);
        IntStream.range(0, m).forEach(i -> rows[i][m + 1] = entered.get(i));
        List<Rational> steps = solved(rows, m + 1);
        List<Rational> everywhere = new ArrayList<>();
        List<Rational> stepsEverywhere = new ArrayList<>();
        for (int state = 0; state < n; state++) {
            int place = open.indexOf(state);
            everywhere.add(into.contains(state) ? Rational.ONE : place < 0 ? Rational.ZERO : entered.get(place));
            stepsEverywhere.add(place < 0 ? Rational.ZERO : steps.get(place));
        }
        return new Passages(everywhere, stepsEverywhere);
    }

    private static boolean reaches(Chain chain, Set<Integer> into, int from) {
        List<Integer> seen = new ArrayList<>(List.of(from));
        for (int i = 0; i < seen.size(); i++) {
            for (int to = 0; to < chain.size(); to++) {
                if (!chain.matrix().at(to, seen.get(i)).isZero() && !seen.contains(to)) {
                    seen.add(to);
                }
            }
        }
        return seen.stream().anyMatch(into::contains);
    }

    /** With one of the columns behind the matrix on the right. */
    private static List<Rational> solved(Rational[][] system, int right) {
        int m = system.length;
        Rational[][] rows = new Rational[m][m + 1];
        for (int i = 0; i < m; i++) {
            System.arraycopy(system[i], 0, rows[i], 0, m);
            rows[i][m] = system[i][right];
        }
        for (int column = 0; column < m; column++) {
            int pivot = column;
            while (rows[pivot][column].isZero()) {
                pivot++;
            }
            Rational[] swapped = rows[pivot];
            rows[pivot] = rows[column];
            rows[column] = swapped;
            for (int i = 0; i < m; i++) {
                if (i != column && !rows[i][column].isZero()) {
                    Rational factor = rows[i][column].dividedBy(rows[column][column]);
                    for (int j = column; j <= m; j++) {
                        rows[i][j] = rows[i][j].minus(factor.times(rows[column][j]));
                    }
                }
            }
        }
        return IntStream.range(0, m).mapToObj(i -> rows[i][m].dividedBy(rows[i][i])).toList();
    }

    /** Σ over the start of what is true from each state. */
    static Rational from(List<Rational> start, List<Rational> each) {
        return IntStream.range(0, start.size()).mapToObj(i -> start.get(i).times(each.get(i)))
                .reduce(Rational.ZERO, Rational::plus);
    }
}
