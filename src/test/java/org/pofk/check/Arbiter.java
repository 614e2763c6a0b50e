package org.pofk.check;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.function.Function;
import java.util.function.UnaryOperator;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;

/**
 * Whether a claim's text can't be right: it is worked out with every decimal standing for all numbers within so many
 * units of its last place, and told wrong only where none of them gives the truth. What can't be told wrong isn't
 * thereby right: an edit that isn't told wrong with one unit (a last digit cut off is still right) isn't counted.
 */
final class Arbiter {
    private static final int EVERY_STEP_TO = 24;
    private static final int THEN_EVERY = 11;

    private Arbiter() {
    }

    /** A formula in k, against what multiplying out gives at steps from {@code first} to {@value Steps#LAST}. */
    static Function<String, Boolean> formula(String text, List<Near> values, int first) {
        return units -> {
            UnaryOperator<Near> formula = Evaluator.of(text, units);
            for (int k = first; k <= Steps.LAST; k += k < EVERY_STEP_TO ? 1 : THEN_EVERY) {
                if (differs(formula, k, values)) {
                    return true;
                }
            }
            return false;
        };
    }

    /** The same at every step. */
    static boolean differsSomewhere(String text, List<Near> values, int first, String units) {
        UnaryOperator<Near> formula = Evaluator.of(text, units);
        for (int k = first; k <= Steps.LAST; k++) {
            if (differs(formula, k, values)) {
                return true;
            }
        }
        return false;
    }

    private static boolean differs(UnaryOperator<Near> formula, int k, List<Near> values) {
        return formula.apply(Near.exactly(k)).differsFrom(values.get(k));
    }

    /** A formula in z, against Y(z) (over z) by elimination at several points, some of them near the poles. */
    static Function<String, Boolean> transform(String text, List<Near> points, List<Near> values) {
        return units -> {
            UnaryOperator<Near> formula = Evaluator.of(text, units);
            for (int i = 0; i < points.size(); i++) {
                if (formula.apply(points.get(i)).differsFrom(values.get(i))) {
                    return true;
                }
            }
            return false;
        };
    }

    static Function<String, Boolean> number(String text, Near value) {
        return units -> Evaluator.constant(text, units).differsFrom(value);
    }

    /** Some of several is wrong. */
    static Function<String, Boolean> some(List<Function<String, Boolean>> parts) {
        return units -> parts.stream().anyMatch(part -> part.apply(units));
    }

    /** Points off the poles: a few of any size, and one near each pole. */
    static List<Near> points(Modes modes) {
        List<Near> points = new ArrayList<>();
        for (String place : List.of("2", "3", "1.7", "-2.3", "0.37", "5", "1.01", "-0.61")) {
            points.add(Near.exactly(new BigDecimal(place)));
        }
        Near beside = Near.exactly(new BigDecimal("1.03"));
        modes.poles().forEach(pole -> points.add(pole.lambda().value().times(beside)));
        return points;
    }

    /** Y(z) = z c (zI − A)⁻¹ x0 plus what a constant adds, by elimination in numbers with a radius. */
    static Near transformAt(Chain chain, Output output, Near z) {
        int n = chain.size();
        Near[][] rows = new Near[n][n + 1];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                Near entry = Near.of(chain.matrix().at(i, j)).negate();
                rows[i][j] = i == j ? entry.plus(z) : entry;
            }
            rows[i][n] = Near.of(chain.start().get(i));
        }
        Near sum = Near.of(output.constant()).over(z.minus(Near.ONE));
        Near[] solution = solution(rows);
        for (int i = 0; i < n; i++) {
            sum = sum.plus(Near.of(output.coefficients().get(i)).times(solution[i]));
        }
        return sum.times(z);
    }

    private static Near[] solution(Near[][] rows) {
        int n = rows.length;
        for (int column = 0; column < n; column++) {
            int pivot = column;
            for (int i = column + 1; i < n; i++) {
                if (rows[i][column].upperModulus().compareTo(rows[pivot][column].upperModulus()) > 0) {
                    pivot = i;
                }
            }
            Near[] swapped = rows[pivot];
            rows[pivot] = rows[column];
            rows[column] = swapped;
            Near inverse = rows[column][column].inverse();
            for (int i = 0; i < n; i++) {
                if (i != column) {
                    Near factor = rows[i][column].times(inverse);
                    for (int j = column; j <= n; j++) {
                        rows[i][j] = rows[i][j].minus(factor.times(rows[column][j]));
                    }
                }
            }
        }
        Near[] solution = new Near[n];
        for (int i = 0; i < n; i++) {
            solution[i] = rows[i][n].times(rows[i][i].inverse());
        }
        return solution;
    }

    /** Whether no pairing of claimed numbers with true ones, as many of each, goes within what the decimals allow. */
    static boolean cannotBePaired(List<Near> claimed, List<Near> truth) {
        return claimed.size() != truth.size() || !paired(claimed, new ArrayList<>(truth), 0);
    }

    private static boolean paired(List<Near> claimed, List<Near> left, int from) {
        if (from == claimed.size()) {
            return true;
        }
        for (int i = 0; i < left.size(); i++) {
            if (!claimed.get(from).differsFrom(left.get(i))) {
                Near taken = left.remove(i);
                boolean isPaired = paired(claimed, left, from + 1);
                left.add(i, taken);
                if (isPaired) {
                    return true;
                }
            }
        }
        return false;
    }
}
