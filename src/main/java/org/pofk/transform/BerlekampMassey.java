package org.pofk.transform;

import java.util.Arrays;

/**
 * The shortest linear recurrence of a sequence modulo a prime, kept up to date term by term (Massey 1969,
 * shift-register synthesis). Its order is the length of the shift register, not the degree of the connection
 * polynomial: they differ exactly when z divides the recurrence. Exact; cost O(order) a term. Mutable; one sequence.
 */
final class BerlekampMassey {
    private final PrimeField field;
    private long[] terms = new long[64];
    private int count;
    private long[] connection = {1};
    private long[] previous = {1};
    private long previousDiscrepancy = 1;
    private int shift = 1;
    private int order;

    BerlekampMassey(PrimeField field) {
        this.field = field;
    }

    /** Takes the next term into account. */
    void accept(long term) {
        if (count == terms.length) {
            terms = Arrays.copyOf(terms, 2 * count);
        }
        terms[count++] = term;
        long discrepancy = field.convolution(connection, 0, terms, count - 1, Math.min(connection.length, order + 1));
        if (discrepancy == 0) {
            shift++;
            return;
        }
        long factor = field.multiply(discrepancy, field.inverse(previousDiscrepancy));
        long[] corrected = corrected(factor);
        if (2 * order <= count - 1) {
            order = count - order;
            previous = connection;
            previousDiscrepancy = discrepancy;
            shift = 1;
        } else {
            shift++;
        }
        connection = corrected;
    }

    /** connection − factor · z^shift · previous. */
    private long[] corrected(long factor) {
        long[] result = Arrays.copyOf(connection, Math.max(connection.length, previous.length + shift));
        for (int i = 0; i < previous.length; i++) {
            result[i + shift] = field.subtract(result[i + shift], field.multiply(factor, previous[i]));
        }
        return result;
    }

    /** Terms accepted so far. */
    int count() {
        return count;
    }

    /** L, the order of the recurrence that the terms so far satisfy. */
    int order() {
        return order;
    }

    /** D by ascending power, monic of degree {@link #order()}: the connection polynomial turned round. */
    long[] recurrence() {
        long[] ascending = new long[order + 1];
        for (int i = 0; i <= order && i < connection.length; i++) {
            ascending[order - i] = connection[i];
        }
        return ascending;
    }

    /** P with Σ y(k) z^(−k−1) = P/D, by ascending power: P_m = Σ_j D_(m+1+j) y(j), {@code order} coefficients. */
    long[] numerator() {
        long[] recurrence = recurrence();
        long[] reversed = new long[order];
        for (int j = 0; j < order; j++) {
            reversed[order - 1 - j] = terms[j];
        }
        long[] numerator = new long[order];
        for (int m = 0; m < order; m++) {
            numerator[m] = field.convolution(recurrence, m + 1, reversed, order - 1, order - m);
        }
        return numerator;
    }
}
