package org.pofk.meaning;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.List;
import java.util.stream.Stream;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;

/** Written decimals as balls at one scale. Certified. */
sealed interface DecimalBalls {
    List<BigInteger> POWERS_OF_TEN = Stream.iterate(BigInteger.ONE, BigInteger.TEN::multiply).limit(64).toList();

    int scale();

    Ball of(String text);

    /** For decimals that are degrees. */
    DecimalBalls inDegrees();

    /** What the digits denote. */
    record FaceValue(int scale) implements DecimalBalls {
        @Override
        public Ball of(String text) {
            BigDecimal digits = new BigDecimal(text);
            return between(digits.unscaledValue(), digits.unscaledValue(), digits.scale(), scale);
        }

        @Override
        public DecimalBalls inDegrees() {
            return this;
        }
    }

    /** Everything within half a unit of the last place. */
    record Spread(Precision precision, int scale) implements DecimalBalls {
        @Override
        public Ball of(String text) {
            BigDecimal digits = new BigDecimal(text);
            if (precision.carried().isPresent()) {
                digits = digits.setScale(Math.max(digits.scale(), carriedScale(digits)));
            }
            BigInteger tenths = digits.unscaledValue().multiply(BigInteger.TEN);
            BigInteger half = BigInteger.valueOf(5);
            return between(tenths.subtract(half), tenths.add(half), digits.scale() + 1, scale);
        }

        @Override
        public DecimalBalls inDegrees() {
            return new Spread(precision.inDegrees(), scale);
        }

        private int carriedScale(BigDecimal digits) {
            Rational place = precision.carried().orElseThrow().lastPlace(Rational.of(digits));
            return place.denominator().bitLength() == 1 ? Integer.MIN_VALUE
                    : place.denominator().toString().length() - 1;
        }
    }

    /** The numbers from low · 10^−places to high · 10^−places. */
    private static Ball between(BigInteger low, BigInteger high, int places, int scale) {
        if (places < 0) {
            BigInteger up = powerOfTen(-places).shiftLeft(scale);
            return Ball.between(low.multiply(up), high.multiply(up), scale);
        }
        BigInteger line = powerOfTen(places);
        BigInteger[] bottom = low.shiftLeft(scale).divideAndRemainder(line);
        BigInteger[] top = high.shiftLeft(scale).divideAndRemainder(line);
        return Ball.between(bottom[1].signum() < 0 ? bottom[0].subtract(BigInteger.ONE) : bottom[0],
                top[1].signum() > 0 ? top[0].add(BigInteger.ONE) : top[0], scale);
    }

    private static BigInteger powerOfTen(int exponent) {
        return exponent < POWERS_OF_TEN.size() ? POWERS_OF_TEN.get(exponent) : BigInteger.TEN.pow(exponent);
    }
}
