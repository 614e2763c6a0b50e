package org.pofk.report;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.pofk.exact.CommonDenominator;
import org.pofk.exact.LeastCommonMultiple;
import org.pofk.exact.Rational;
import org.pofk.report.Document.Sequence;

/**
 * A sequence in integers: y(k) = u(k) / (divisor · scale^k) with u(k + d) = Σ recurrence_i · u(k + i), so that a script
 * gets at any y(k) exactly without a fraction on the way. Exact.
 *
 * @param recurrence d integers
 * @param first      u(0) … u(d − 1)
 */
record StepData(BigInteger scale, BigInteger divisor, List<BigInteger> recurrence, List<BigInteger> first) {
    /** What is longer makes the page large for few. */
    private static final int MOST_CHARACTERS = 200_000;

    private static final int PRIMES_BELOW = 1000;

    /** Nothing where its numbers are too long for a page. */
    static Optional<StepData> of(Sequence sequence) {
        int order = sequence.first().size();
        BigInteger scale = scale(sequence.recurrence());
        BigInteger divisor = CommonDenominator.of(IntStream.range(0, order)
                .mapToObj(i -> sequence.first().get(i).times(Rational.of(scale.pow(i)))).toList());
        List<BigInteger> recurrence = new ArrayList<>();
        List<BigInteger> first = new ArrayList<>();
        for (int i = 0; i < order; i++) {
            recurrence.add(whole(sequence.recurrence().get(i).negate().times(Rational.of(scale.pow(order - i)))));
            first.add(whole(sequence.first().get(i).times(Rational.of(divisor.multiply(scale.pow(i))))));
        }
        StepData data = new StepData(scale, divisor, recurrence, first);
        return data.attributes().length() <= MOST_CHARACTERS ? Optional.of(data) : Optional.empty();
    }

    /**
     * An integer whose power d − i every coefficient i is to be multiplied by to be one: of small primes as few as that
     * takes, of what else is in the denominators all.
     */
    private static BigInteger scale(List<Rational> recurrence) {
        BigInteger scale = BigInteger.ONE;
        List<BigInteger> rest = new ArrayList<>(recurrence.stream().map(Rational::denominator).toList());
        for (int prime = 2; prime < PRIMES_BELOW; prime++) {
            int needed = 0;
            for (int i = 0; i < rest.size(); i++) {
                int times = 0;
                BigInteger[] divided = rest.get(i).divideAndRemainder(BigInteger.valueOf(prime));
                while (divided[1].signum() == 0) {
                    times++;
                    rest.set(i, divided[0]);
                    divided = divided[0].divideAndRemainder(BigInteger.valueOf(prime));
                }
                needed = Math.max(needed, -Math.floorDiv(-times, rest.size() - i));
            }
            scale = scale.multiply(BigInteger.valueOf(prime).pow(needed));
        }
        return scale.multiply(rest.stream().reduce(BigInteger.ONE, LeastCommonMultiple::of));
    }

    private static BigInteger whole(Rational number) {
        if (!number.isInteger()) {
            throw new AssertionError("not an integer: " + number);
        }
        return number.numerator();
    }

    String attributes() {
        return " data-scale=\"" + scale + "\" data-divisor=\"" + divisor + "\" data-recurrence=\"" + list(recurrence)
                + "\" data-first=\"" + list(first) + "\"";
    }

    private static String list(List<BigInteger> numbers) {
        return numbers.stream().map(BigInteger::toString).collect(Collectors.joining(" "));
    }
}
