package org.pofk.meaning;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.OptionalLong;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.LongFunction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.pofk.exact.Rational;
import org.pofk.formula.FormulaParser;
import org.pofk.meaning.SameSequence.Answer;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

class SameSequenceTest {
    private static final Answer SAME = new Answer(Decision.YES, OptionalLong.empty());

    private static ExponentialSum sum(String text) throws RefusedException {
        return ExponentialSum.of(FormulaParser.parse(text, new Position("claims.yaml", 1, 1)), Precision.AS_WRITTEN);
    }

    private static Answer differsAt(long k) {
        return new Answer(Decision.NO, OptionalLong.of(k));
    }

    /** The values of y(k+2) = y(k+1) + y(k) from 0, 1: order two, irrational roots. */
    private static Rational additive(long k) {
        Rational before = Rational.ZERO;
        Rational now = Rational.ONE;
        for (long i = 0; i < k; i++) {
            Rational next = before.plus(now);
            before = now;
            now = next;
        }
        return before;
    }

    /** The real part of ((1 + 2i)/4)^k. */
    private static Rational turning(long k) {
        Rational re = Rational.ONE;
        Rational im = Rational.ZERO;
        for (long i = 0; i < k; i++) {
            Rational next = re.minus(im.times(Rational.TWO)).times(Rational.of(1, 4));
            im = re.times(Rational.TWO).plus(im).times(Rational.of(1, 4));
            re = next;
        }
        return re;
    }

    private static Rational halves(long k) {
        return Rational.HALF.pow((int) k);
    }

    private static Answer decide(String text, LongFunction<Rational> values, int order) throws RefusedException {
        return SameSequence.decide(sum(text), values, order, 0, OptionalLong.empty());
    }

    @Test
    void irrationalBasesThatMakeARationalSequenceAreProved() throws RefusedException {
        assertEquals(SAME, decide("((1+sqrt(5))^k - (1-sqrt(5))^k)/(2^k sqrt(5))", SameSequenceTest::additive, 2));
        assertEquals(differsAt(0), decide("((1+sqrt(5))/2)^k/sqrt(5)", SameSequenceTest::additive, 2));
    }

    @Test
    void aPairInItsPolarFormIsTheSequenceOfItsRealParts() throws RefusedException {
        assertEquals(SAME, decide("(sqrt(5)/4)^k cos(k arctan(2))", SameSequenceTest::turning, 2));
        assertEquals(SAME, decide("((1+2i)^k + (1-2i)^k)/(2*4^k)", SameSequenceTest::turning, 2));
        assertEquals(differsAt(1), decide("(sqrt(5)/4)^k cos(k arctan(-1/2))", SameSequenceTest::turning, 2));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "0.5^k | -1", "(1/2)^k | -1", "0.25^(k/2) | -1", "2*0.5^(k+1) | -1", "0.5^k + 0.3^k - 0.30^k | -1",
        "0.5^k + 1e-60 | 0",
        "0.5^k + 1e-60*k | 1", "0.5^k + delta(k-2) | 2", "0.5^k + delta(k-4)*1e-80 | 4", "0.5^k + delta(k-5000) | 5000",
        "0.5^k + delta(k-50) - delta(k-50) | -1", "{1 for k = 0; 0.5^k for k >= 1} | -1",
        "{1 for k = 0; 1/2 for k = 1} | 2",
        "{0.5^k for k >= 1} | 0", "{0.5^k for k <= 900} | 901", "0.5^k*(1 + sqrt(2) - sqrt(3 + 2 sqrt(2)))+0.5^k | -1",
        "k(k-1)(k-2)(k-3)(k-4)*1e-30 + 0.5^k | 5"
    })
    void theFirstStepThatDiffersIsFound(String text, long first) throws RefusedException {
        assertEquals(first < 0 ? SAME : differsAt(first), decide(text, SameSequenceTest::halves, 1));
    }

    @Test
    void aLastStepEndsTheComparison() throws RefusedException {
        ExponentialSum late = sum("0.5^k + binomial(k, 4)");
        assertEquals(SAME, SameSequence.decide(late, SameSequenceTest::halves, 1, 0, OptionalLong.of(3)));
        assertEquals(differsAt(4), SameSequence.decide(late, SameSequenceTest::halves, 1, 0, OptionalLong.of(4)));
        assertEquals(differsAt(7), SameSequence.decide(late, SameSequenceTest::halves, 1, 7, OptionalLong.empty()));
        ExponentialSum beforeFrom = sum("0.5^k + delta(k)");
        assertEquals(SAME, SameSequence.decide(beforeFrom, SameSequenceTest::halves, 1, 1, OptionalLong.empty()));
    }

    @Test
    void noMoreStepsAreComparedThanTheOrdersSay() throws RefusedException {
        AtomicLong asked = new AtomicLong();
        LongFunction<Rational> counting = k -> {
            asked.incrementAndGet();
            return halves(k);
        };
        ExponentialSum sum = sum("0.5^k + 0.3^k*(1 - 1) + 0*k + 0.2^k - (1/5)^k + delta(k-100000) - delta(k-100000)");
        assertEquals(SAME, SameSequence.decide(sum, counting, 1, 0, OptionalLong.empty()));
        int window = sum.order() + 1;
        assertEquals(4, window);
        assertTrue(asked.get() <= 2L * window, asked + " values asked for");
    }
}
