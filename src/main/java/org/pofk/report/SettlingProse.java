package org.pofk.report;

import java.util.Optional;
import org.pofk.exact.Ball;
import org.pofk.exact.Decimal;
import org.pofk.exact.Decimals;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.longrun.Settling;

/** How an output approaches its long run, in words. */
final class SettlingProse {
    private static final int BITS = 64;

    private SettlingProse() {
    }

    static String of(Settling settling, LongRun longRun, int digits) {
        String within = "within 1e-" + settling.digits();
        String from = " from k = " + settling.from() + " on";
        return (longRun instanceof LongRun.Limit
                ? "stays " + within + " of it" + from
                : "the cycle is reached to " + within + from)
                + settling.slowest().map(modulus -> "; slowest part decays like "
                        + power(settling.power()) + base(settling, modulus, digits) + "^k"
                        + (settling.tied() > 1 ? ", shared by " + settling.tied() + " modes" : "")).orElse("");
    }

    /** How long its slowest mode lasts: its half-life, and in how many steps it turns round. */
    static Optional<String> slowest(Settling settling, int digits) {
        return settling.halfLife().map(half -> "is halved every " + Decimals.of(half, digits).text() + " steps"
                + (settling.power() > 0 ? ", powers of k left aside" : "")
                + settling.period().map(period -> "; it turns round in " + Decimals.of(period, digits).text()
                        + " steps").orElse(""));
    }

    private static String power(int power) {
        return power == 0 ? "" : power == 1 ? "k·" : "k^" + power + "·";
    }

    /** As it is where that is short. A base just below one is told apart from it by what it lacks. */
    private static String base(Settling settling, Enclosed modulus, int digits) {
        Optional<String> exact = settling.exactly().map(value -> Decimals.of(value, digits))
                .filter(Decimal::exact).map(Decimal::text);
        if (exact.isPresent()) {
            return exact.get();
        }
        Ball missing = Ball.of(1, BITS).minus(modulus.enclose(BITS));
        boolean nearlyOne = missing.isPositive() && missing.upper().compareTo(Rational.of(1, 1000)) <= 0;
        return nearlyOne
                ? "(1 − " + Decimals.of(Enclosed.of(Rational.ONE).plus(modulus.negate()), digits).text() + ")"
                : Decimals.of(modulus, digits).text();
    }
}
