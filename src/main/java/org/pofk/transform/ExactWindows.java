package org.pofk.transform;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.CommonDenominator;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;

/**
 * The proof that a reader can repeat: the terms y(0) … y(n+d−1) as rational numbers satisfy D at all n windows, so by
 * Cayley–Hamilton at every k. Exact; in whole numbers Y(k) = w Lᵏ y(k), with L the common denominator of A, so that
 * nothing is reduced on the way. Cost: (n + d) steps of the system, once for all readings, with numbers that grow by the
 * step.
 */
final class ExactWindows {
    private final LinearSystem system;
    private final BigInteger unit;
    private final BigInteger starts;
    /** Each column's entries times L, in its order. */
    private final List<BigInteger[]> columns;
    private final List<BigInteger[]> states = new ArrayList<>();

    private ExactWindows(LinearSystem system) {
        this.system = system;
        this.unit = system.matrix().commonDenominator();
        this.starts = CommonDenominator.of(system.start());
        this.columns = system.matrix().columns().stream().map(column -> column.stream()
                .map(entry -> times(entry.value(), unit)).toArray(BigInteger[]::new)).toList();
        states.add(system.start().stream().map(share -> times(share, starts)).toArray(BigInteger[]::new));
    }

    static ExactWindows of(LinearSystem system) {
        return new ExactWindows(system);
    }

    private static BigInteger times(Rational value, BigInteger multiple) {
        return value.numerator().multiply(multiple.divide(value.denominator()));
    }

    private BigInteger[] state(int k) {
        while (states.size() <= k) {
            BigInteger[] before = states.get(states.size() - 1);
            BigInteger[] next = new BigInteger[before.length];
            Arrays.fill(next, BigInteger.ZERO);
            for (int j = 0; j < before.length; j++) {
                if (before[j].signum() != 0) {
                    List<Entry> column = system.matrix().columns().get(j);
                    for (int i = 0; i < column.size(); i++) {
                        int row = column.get(i).row();
                        next[row] = next[row].add(columns.get(j)[i].multiply(before[j]));
                    }
                }
            }
            states.add(next);
        }
        return states.get(k);
    }

    /** Whether D and P are those of this reading: D at so many windows, P from the first d terms. */
    boolean hold(Polynomial<Rational> recurrence, Polynomial<Rational> numerator, List<Rational> reading, int windows) {
        BigInteger readings = CommonDenominator.of(reading);
        List<BigInteger> terms = new ArrayList<>();
        for (int k = 0; k < windows + recurrence.degree(); k++) {
            BigInteger sum = BigInteger.ZERO;
            BigInteger[] state = state(k);
            for (int i = 0; i < state.length; i++) {
                if (!reading.get(i).isZero() && state[i].signum() != 0) {
                    sum = sum.add(times(reading.get(i), readings).multiply(state[i]));
                }
            }
            terms.add(sum);
        }
        BigInteger common = CommonDenominator.of(recurrence.coefficients());
        List<BigInteger> whole = inUnits(recurrence, common);
        return hold(whole, terms, windows)
                && numerator(whole, terms, common.multiply(starts).multiply(readings)).equals(numerator);
    }

    /** D_i L^(d−i), times the common denominator of all. */
    private List<BigInteger> inUnits(Polynomial<Rational> recurrence, BigInteger common) {
        List<BigInteger> whole = new ArrayList<>();
        for (int i = 0; i <= recurrence.degree(); i++) {
            whole.add(times(recurrence.coefficient(i), common).multiply(unit.pow(recurrence.degree() - i)));
        }
        return whole;
    }

    /** Σ_i D_i L^(d−i) Y(k+i) = 0. */
    private static boolean hold(List<BigInteger> recurrence, List<BigInteger> terms, int windows) {
        for (int k = 0; k < windows; k++) {
            BigInteger window = BigInteger.ZERO;
            for (int i = 0; i < recurrence.size(); i++) {
                window = window.add(recurrence.get(i).multiply(terms.get(k + i)));
            }
            if (window.signum() != 0) {
                return false;
            }
        }
        return true;
    }

    /** P with Σ y(k) z^(−k−1) = P/D: P_m = Σ_j D_(m+1+j) y(j), here over L^(d−1−m) times the weight of the terms. */
    private Polynomial<Rational> numerator(List<BigInteger> recurrence, List<BigInteger> terms, BigInteger weight) {
        int degree = recurrence.size() - 1;
        List<Rational> numerator = new ArrayList<>();
        for (int m = 0; m < degree; m++) {
            BigInteger sum = BigInteger.ZERO;
            for (int j = 0; m + 1 + j <= degree; j++) {
                sum = sum.add(recurrence.get(m + 1 + j).multiply(terms.get(j)));
            }
            numerator.add(new Rational(sum, weight.multiply(unit.pow(degree - 1 - m))));
        }
        return Polynomial.ofRationals(numerator);
    }
}
