package org.pofk.slip;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.pofk.chain.Model;
import org.pofk.exact.Rational;

/** The rate that a probability 1 − exp(−rate) was made from, where a parameter says so or its value tells. */
final class Rates {
    private static final Pattern FROM_RATE =
            Pattern.compile("1\\s*[-−]\\s*exp\\(\\s*[-−]\\s*([0-9.]+(?:[eE]-?[0-9]+)?)\\s*(?:[*·]\\s*([0-9.]+))?\\s*\\)");
    /** A rate of so few digits is no accident. */
    private static final int SHORT = 4;
    private static final double NEAR = 1e-9;

    private Rates() {
    }

    /** Guesses, each to be tried. */
    static List<Rational> behind(Model.Parameter parameter) {
        Set<Rational> rates = new LinkedHashSet<>();
        Stream.of(parameter.definition(), parameter.meaning(), parameter.source())
                .flatMap(text -> text.stream()).forEach(text -> stated(text, rates));
        OtherChain.number(parameter.value()).ifPresent(value -> told(value, rates));
        return rates.stream().filter(rate -> rate.signum() > 0 && rate.compareTo(Rational.ONE) <= 0).toList();
    }

    private static void stated(String text, Set<Rational> rates) {
        Matcher matcher = FROM_RATE.matcher(text);
        while (matcher.find()) {
            try {
                Rational rate = Rational.parse(matcher.group(1));
                rates.add(matcher.group(2) == null ? rate : rate.times(Rational.parse(matcher.group(2))));
            } catch (NumberFormatException notANumber) {
                // dots that are no decimal: nothing is stated
                continue;
            }
        }
    }

    private static void told(Rational value, Set<Rational> rates) {
        double probability = value.approximate();
        if (probability > 0 && probability < 1) {
            double rate = -Math.log1p(-probability);
            BigDecimal rounded = new BigDecimal(rate, new MathContext(SHORT));
            if (Math.abs(rounded.doubleValue() - rate) < NEAR * rate) {
                rates.add(Rational.of(rounded));
            }
        }
    }
}
