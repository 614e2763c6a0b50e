package org.pofk.longrun;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.pofk.exact.Ball;
import org.pofk.exact.Decimals;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.exact.Roots;

/**
 * How a sequence with poles outside the unit circle, or repeated on it, grows: like k^p · r^k, r the largest modulus
 * of a pole. Moduli that agree to {@link #TIED_BITS} bits count as tied, since equal ones can't be told apart by
 * looking closer; then p is the largest power among them, and only an upper bound where they differ. Certified.
 *
 * @param ratio          r; empty when it is one
 * @param power          p
 * @param isPowerDecided whether every pole that may have the largest modulus has this power
 */
record GrowthRate(Optional<Enclosed> ratio, int power, boolean isPowerDecided) {
    private static final int TIED_BITS = 256;
    private static final int SHOWN_DIGITS = 6;

    private record Modulus(Enclosed value, int power, Ball ball) {
        static Modulus of(Enclosed value, int power) {
            return new Modulus(value, power, value.enclose(TIED_BITS));
        }
    }

    /** For factors of which at least one grows. */
    static GrowthRate of(List<PlacedFactor> factors) {
        List<Modulus> moduli = factors.stream().filter(each -> each.counts().outside() > 0)
                .flatMap(GrowthRate::moduli).toList();
        if (moduli.isEmpty()) {
            int power = factors.stream().filter(PlacedFactor::growsLikeAPower).mapToInt(PlacedFactor::power).max()
                    .orElseThrow();
            return new GrowthRate(Optional.empty(), power, true);
        }
        Modulus largest = moduli.stream().max((a, b) -> a.ball.middle().compareTo(b.ball.middle())).orElseThrow();
        List<Modulus> tied = moduli.stream().filter(each -> each.ball.overlaps(largest.ball)).toList();
        int power = tied.stream().mapToInt(Modulus::power).max().orElseThrow();
        return new GrowthRate(Optional.of(largest.value), power, tied.stream().allMatch(each -> each.power == power));
    }

    private static Stream<Modulus> moduli(PlacedFactor placed) {
        int power = placed.power();
        if (placed.factor().polynomial().degree() == 1) {
            Rational root = placed.factor().polynomial().coefficient(0).abs();
            return Stream.of(Modulus.of(bits -> Ball.of(root, bits), power));
        }
        return Roots.of(placed.factor().polynomial()).all().stream()
                .map(root -> Modulus.of(bits -> root.enclose(bits + 2).modulus(), power));
    }

    /** {@code grows like k * 1.2^k}. */
    String inWords() {
        String polynomial = power == 0 ? "" : power == 1 ? "k" : "k^" + power;
        String exponential = ratio.map(each -> Decimals.of(each, SHOWN_DIGITS).text() + "^k").orElse("");
        String both = polynomial.isEmpty() || exponential.isEmpty()
                ? polynomial + exponential
                : polynomial + " * " + exponential;
        return (isPowerDecided ? "grows like " : "grows, at most like ") + both;
    }
}
