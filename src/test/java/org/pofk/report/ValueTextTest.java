package org.pofk.report;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.steps.StepValue;

class ValueTextTest {

    @Test
    void whatLacksLittleToOneIsWrittenByWhatItLacks() {
        Rational available = Rational.of(9_999_997, 10_000_000);
        assertEquals("1 − 3e-7", ValueText.of(available, 6));
        assertEquals("0.9999997", ValueText.number(available, 6));
        Rational nearly = Rational.ONE.minus(Rational.of(1, 3_000_000));
        assertEquals("1 − 3.33333e-7", ValueText.of(nearly, 6));
        assertEquals("0.999999666667", ValueText.number(nearly, 6));
    }

    @Test
    void anEnclosedValueIsWrittenLikeTheExactOne() {
        Rational nearly = Rational.ONE.minus(Rational.of(1, 3_000_000));
        StepValue enclosed = new StepValue(5, Optional.empty(), Enclosed.of(nearly));
        assertEquals("1 − 3.33333e-7", ValueText.of(enclosed, 6));
        assertEquals("0.999999666667", ValueText.number(enclosed, 6));
    }

    @Test
    void onlyBetweenNearlyOneAndOneIsAnythingLacking() {
        assertEquals("1", ValueText.of(Rational.ONE, 6));
        assertEquals("1", ValueText.number(Rational.ONE, 6));
        assertEquals("0.9995", ValueText.of(Rational.of(9995, 10_000), 6));
        assertEquals("0.998999", ValueText.of(Rational.of(2_996_998, 3_000_000), 6));
        assertEquals("1.00000", ValueText.of(Rational.ONE.plus(Rational.of(1, 3_000_000)), 6));
    }
}
