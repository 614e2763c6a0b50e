package org.pofk.modes;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.stream.Collectors;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;

/**
 * Writes a closed form in decimals so that the formula as printed is within 10^−digits of p(k) at every k ≥ 0, proved.
 * Where a pole on or outside the unit circle has no short exact form no rounding of it will do for every k, and the
 * formula is for k up to a last step that is said.
 */
final class DecimalForms {
    private static final int MOST_DIGITS = 30;
    /** For those who ask for more digits themselves. */
    private static final int MORE_DIGITS = 10;
    private static final int[] LAST_STEPS = {1_000, 500, 200, 100, 50, 20};
    private static final MathContext TWO_DIGITS_UP = new MathContext(2, RoundingMode.CEILING);

    private final List<Mode> modes;
    private final int digits;
    private final int mostDigits;

    private DecimalForms(List<Mode> modes, int digits) {
        this.modes = modes;
        this.digits = digits;
        this.mostDigits = Math.max(MOST_DIGITS, digits + MORE_DIGITS);
    }

    static DecimalForm of(List<Mode> modes, int digits) {
        return new DecimalForms(modes, digits).written();
    }

    private DecimalForm written() {
        if (poles(rule(OptionalInt.empty())).stream().noneMatch(PrintedPole::needsLastStep)) {
            return print(OptionalInt.empty(), Optional.empty()).orElseGet(() ->
                    none("to be that close, some number would need more than " + mostDigits + " digits"));
        }
        String reason = "a number at a pole on or outside the unit circle has no short exact form, and the error of its"
                + " decimals"
                + " grows with k";
        for (int lastStep : LAST_STEPS) {
            Optional<DecimalForm> form = print(OptionalInt.of(lastStep), Optional.of(reason));
            if (form.isPresent()) {
                return form.get();
            }
        }
        return none(reason + ": more than " + mostDigits + " digits would be needed even up to k = "
                + LAST_STEPS[LAST_STEPS.length - 1]);
    }

    private static DecimalForm none(String reason) {
        return new DecimalForm(Optional.empty(), Rational.ZERO, Optional.empty(), Optional.of(reason));
    }

    private Optional<DecimalForm> print(OptionalInt lastStep, Optional<String> reason) {
        PrintingRule rule = rule(lastStep);
        PrintedSum sum = new PrintedSum();
        for (Mode mode : modes) {
            if (!mode.accept(new Impulses(rule, sum))) {
                return Optional.empty();
            }
        }
        for (PrintedPole pole : poles(rule)) {
            if (!pole.writeInto(sum)) {
                return Optional.empty();
            }
        }
        Optional<Long> upTo = lastStep.isPresent() ? Optional.of((long) lastStep.getAsInt()) : Optional.empty();
        return Optional.of(new DecimalForm(Optional.of(sum.formula()), roundedUp(sum.error()), upTo, reason));
    }

    /** Every number may take an equal share of 10^−digits. */
    private PrintingRule rule(OptionalInt lastStep) {
        long numbers = 4L * Math.max(1, modes.size());
        Rational share = Rational.of(10).pow(-digits).dividedBy(Rational.of(numbers));
        return new PrintingRule(digits, mostDigits, share, lastStep);
    }

    private List<PrintedPole> poles(PrintingRule rule) {
        Map<List<Integer>, List<Mode>> byPole = modes.stream().filter(mode -> !mode.pole().isEmpty())
                .collect(Collectors.groupingBy(Mode::pole, LinkedHashMap::new, Collectors.toList()));
        return byPole.values().stream().map(own -> PrintedPole.of(own, rule)).toList();
    }

    private static Rational roundedUp(Rational error) {
        return error.isZero() ? error : Rational.of(new BigDecimal(error.numerator())
                .divide(new BigDecimal(error.denominator()), TWO_DIGITS_UP));
    }

    /** Writes impulses, whose numbers have weight one; leaves the others to their poles. */
    private record Impulses(PrintingRule rule, PrintedSum sum) implements Mode.Visitor<Boolean> {
        @Override
        public Boolean impulse(Mode.Impulse impulse) {
            Optional<Rational> weight = Optional.of(Rational.ONE);
            Optional<Formula> written = sum.add(rule.weighted(impulse.value(), weight), weight);
            written.ifPresent(value -> sum.term(ModeFormula.impulse(value, impulse.at())));
            return written.isPresent();
        }

        @Override
        public Boolean geometric(Mode.Geometric mode) {
            return true;
        }

        @Override
        public Boolean oscillating(Mode.Oscillating mode) {
            return true;
        }
    }
}
