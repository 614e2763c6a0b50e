package org.pofk.exact;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class DecimalsTest {
    private static final long SEED = 20261201;

    @ParameterizedTest
    @CsvSource({"1/2,6,0.5", "1/3,6,0.333333", "2/3,6,0.666667", "-2/3,3,-0.667", "0,6,0", "7281/10000000,4,7.281e-4",
        "1/1000,6,0.001", "1/10000,6,1e-4", "123456789,6,1.23457e8", "123456789,9,123456789", "1000000,6,1000000",
        "100000000000000000000,6,1e20", "299999999/1000000000,6,0.300000", "1/8,2,0.12", "3/8,2,0.38",
        "9999999/10000000,6,1.00000", "2469135/10,6,246914", "12345/1000,4,12.34", "1/7,1,0.1"})
    void significantDigitsStayAndExactValuesAreShort(String value, int digits, String text) {
        assertEquals(text, Decimals.of(Rational.parse(value), digits).text());
    }

    @ParameterizedTest
    @CsvSource({"1/3,4,0.3333", "1/2,4,0.5", "0,4,0", "1/100000,4,0.0000", "-1/3,2,-0.33", "250,1,250",
        "19999999/10000000,3,2.000"})
    void placesAreAbsolute(String value, int places, String text) {
        assertEquals(text, Decimals.fixed(Rational.parse(value), places).text());
    }

    @Test
    void thousandsOfRationalsAgreeWithTheDecimalLibrary() {
        Random random = new Random(SEED);
        int compared = 0;
        for (int i = 0; i < 5000; i++) {
            Rational value = new Rational(new BigInteger(1 + random.nextInt(80), random).add(BigInteger.ONE),
                    new BigInteger(1 + random.nextInt(80), random).add(BigInteger.ONE));
            int digits = 1 + random.nextInt(50);
            Decimal decimal = Decimals.of(value, digits);
            BigDecimal expected = new BigDecimal(value.numerator()).divide(new BigDecimal(value.denominator()),
                    new MathContext(digits, RoundingMode.HALF_EVEN));
            assertEquals(0, expected.compareTo(new BigDecimal(decimal.text())), decimal.text());
            assertEquals(Rational.of(expected), decimal.value());
            assertEquals(decimal.exact(), decimal.value().equals(value));
            if (!decimal.exact()) {
                assertEquals(digits, significantDigits(decimal.text()), decimal.text());
            }
            compared++;
        }
        assertEquals(5000, compared);
    }

    @Test
    void enclosedNumbersGetTheDigitsOfTheRationalTheyEnclose() {
        Random random = new Random(SEED);
        for (int i = 0; i < 2000; i++) {
            Rational value = Rational.of(random.nextInt(2_000_000) - 1_000_000L, 3L + 7L * random.nextInt(1_000_000));
            int digits = 1 + random.nextInt(20);
            int places = random.nextInt(20);
            if (!value.isZero()) {
                Enclosed coarse = bits -> Ball.of(value, bits).widened(BigInteger.ONE);
                assertEquals(Decimals.of(value, digits).value(), Decimals.of(coarse, digits).value());
                assertEquals(Decimals.fixed(value, places).value(), Decimals.fixed(coarse, places).value());
            }
        }
    }

    @Test
    void aTieKnownOnlyByEnclosuresEndsAndGoesToEven() {
        Enclosed eighth = bits -> Ball.of(Rational.of(1, 8), bits).widened(BigInteger.ONE);
        assertEquals("0.12", Decimals.of(eighth, 2).text());
        assertEquals("0.12", Decimals.fixed(eighth, 2).text());
        assertFalse(Decimals.of(eighth, 3).exact());
        assertEquals("0.125000", Decimals.of(eighth, 6).text());
    }

    @Test
    void exactZeroIsZeroAndAnUnknownZeroIsRefused() {
        assertEquals("0", Decimals.of(Enclosed.of(Rational.ZERO), 6).text());
        Enclosed hidden = bits -> Ball.of(0, bits).widened(BigInteger.ONE);
        assertThrows(AssertionError.class, () -> Decimals.of(hidden, 6));
        assertEquals("0.0000", Decimals.fixed(hidden, 4).text());
    }

    @Test
    void verySmallNumbersKeepTheirDigits() {
        Rational tiny = Rational.of(2, 3).times(Rational.of(10).pow(-400));
        assertEquals("6.66667e-401", Decimals.of(Enclosed.of(tiny), 6).text());
        assertTrue(Decimals.of(Enclosed.of(tiny), 6).value().signum() > 0);
    }

    private static int significantDigits(String text) {
        String mantissa = text.replace("-", "").replaceFirst("e.*", "").replace(".", "");
        return mantissa.replaceFirst("^0+", "").length();
    }
}
