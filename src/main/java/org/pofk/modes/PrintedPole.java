package org.pofk.modes;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.PlainText;

/**
 * The modes of one pole (a real one, or a conjugate pair), to be written in decimals, each number with as many digits
 * as its share of the error allowed needs. Certified: Σ error of a number · its weight bounds what the terms are off
 * at every step. For C λ^n − C̃ λ̃^n = C (λ^n − λ̃^n) + (C − C̃) λ̃^n, and the same with cos(θn + φ), whose own error is
 * at most n |θ − θ̃| + |φ − φ̃|.
 */
final class PrintedPole {
    private static final int EXACT_SHOWN_UP_TO = 60;

    private static final int SIZE_BITS = 48;
    /** A pole that isn't proved to lie inside the unit circle with this many bits counts as not inside. */
    private static final int MOST_BITS = 4_096;

    private final List<PrintedTerm> terms;
    private final RealValue base;
    private final Optional<RealValue> angle;
    private final PrintingRule rule;
    private final Optional<Rational> gap;

    private PrintedPole(List<PrintedTerm> terms, PrintingRule rule) {
        this.terms = terms;
        this.base = terms.get(0).base();
        this.angle = terms.get(0).angle();
        this.rule = rule;
        this.gap = gapToCircle(base);
    }

    /** The modes have their pole in common. */
    static PrintedPole of(List<Mode> modes, PrintingRule rule) {
        return new PrintedPole(modes.stream().flatMap(mode -> PrintedTerm.of(mode).stream()).toList(), rule);
    }

    /** A positive number below 1 − |λ|; empty where |λ| isn't proved below one. */
    private static Optional<Rational> gapToCircle(RealValue base) {
        if (base.rational().isPresent()) {
            return base.rational().map(value -> Rational.ONE.minus(value.abs())).filter(gap -> gap.signum() > 0);
        }
        for (int bits = SIZE_BITS; bits <= MOST_BITS; bits *= 2) {
            Ball size = base.enclosure().enclose(bits).abs();
            Rational gap = Rational.ONE.minus(size.upper());
            if (gap.compareTo(size.upper().minus(size.lower())) > 0) {
                return Optional.of(gap);
            }
            if (size.lower().compareTo(Rational.ONE) >= 0) {
                return Optional.empty();
            }
        }
        return Optional.empty();
    }

    /** The bound on |λ| as printed: a sixteenth of the gap is left to the rounding. */
    private Amplification amplification(int power) {
        if (gap.isPresent()) {
            return Amplification.decaying(Rational.ONE.minus(gap.get().times(Rational.of(15, 16))), power);
        }
        if (rule.lastStep().isPresent()) {
            Rational beyond = size(base).plus(Rational.of(1, 1 << 20));
            return Amplification.upTo(rule.lastStep().getAsInt(), beyond, power);
        }
        boolean onCircle = base.rational().filter(value -> value.abs().isOne()).isPresent();
        return onCircle && power == 0 ? Amplification.steady() : Amplification.growing();
    }

    /** True when no number of digits is enough for every k: some number that must be exact has no short exact form. */
    boolean needsLastStep() {
        return gap.isEmpty() && rule.lastStep().isEmpty()
                && (isMissing(base, weight(Amplification::ofBase))
                || angle.filter(value -> isMissing(value, weight(Amplification::ofAngle))).isPresent()
                || terms.stream().anyMatch(term -> term.constants().stream()
                        .anyMatch(value -> isMissing(value, amplification(term.power()).ofCoefficient()))));
    }

    /** An exact form longer than most of a line is none that is read. */
    private static boolean isMissing(RealValue value, Optional<Rational> weight) {
        return weight.isEmpty() && value.exact()
                .filter(exact -> PlainText.UNICODE.write(exact).length() <= EXACT_SHOWN_UP_TO).isEmpty();
    }

    /** Σ over the powers of |C_p| · what one unit of error in the pole does; empty where that has no bound. */
    private Optional<Rational> weight(Function<Amplification, Optional<Rational>> of) {
        Rational sum = Rational.ZERO;
        for (PrintedTerm term : terms) {
            Optional<Rational> bound = of.apply(amplification(term.power()));
            if (bound.isEmpty()) {
                return bound;
            }
            sum = sum.plus(bound.get().times(size(term.coefficient())));
        }
        return Optional.of(Amplification.roundedUp(sum));
    }

    private static Rational size(RealValue value) {
        return value.enclosure().enclose(SIZE_BITS).abs().upper();
    }

    /** All terms written into the formula; false where a number would need more digits than the rule allows. */
    boolean writeInto(PrintedSum sum) {
        Optional<Formula> writtenBase = sum.add(printedBase(), weight(Amplification::ofBase));
        Optional<Formula> writtenAngle = angle.flatMap(value ->
                sum.add(printed(value, weight(Amplification::ofAngle)), weight(Amplification::ofAngle)));
        if (writtenBase.isEmpty() || writtenAngle.isPresent() != angle.isPresent()) {
            return false;
        }
        for (PrintedTerm term : terms) {
            Optional<Rational> weight = amplification(term.power()).ofCoefficient();
            Optional<Rational> turn = weight.map(bound -> bound.times(size(term.coefficient())));
            Optional<Formula> coefficient = sum.add(rule.weighted(term.coefficient(), weight), weight);
            Optional<Formula> phase = term.phase().flatMap(value -> sum.add(printed(value, turn), turn));
            if (coefficient.isEmpty() || phase.isPresent() != term.phase().isPresent()) {
                return false;
            }
            sum.term(term.written(coefficient.get(), writtenBase.get(), writtenAngle, phase));
        }
        return true;
    }

    /** Besides its share of the error, the printed |λ| has to stay where the weights hold. */
    private Optional<PrintedNumber> printedBase() {
        Optional<PrintedNumber> printed = printed(base, weight(Amplification::ofBase));
        Rational slack = gap.map(g -> g.times(Rational.of(1, 16))).orElse(Rational.of(1, 1 << 20));
        return printed.filter(number -> number.error().compareTo(slack) <= 0).or(() -> printed.isPresent()
                ? rule.within(base, Rational.min(slack, printed.get().error()))
                : printed);
    }

    /** What stands under a power or a cosine is better a short fraction or a multiple of π than a decimal. */
    private Optional<PrintedNumber> printed(RealValue value, Optional<Rational> weight) {
        return PrintedNumber.shortExactly(value).or(() -> rule.weighted(value, weight));
    }
}
