package org.pofk.report;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.answer.ConditionalLongRun;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.modes.RealValue;

/** The long run of a conditional value in words, with short exact forms or in decimals alone. */
record ConditionalLongRunProse(int digits, Numbers numbers) {
    /** What is shown of a number. */
    enum Numbers { WITH_EXACT_FORMS, DECIMALS }

    ConditionalLongRunProse(int digits) {
        this(digits, Numbers.WITH_EXACT_FORMS);
    }

    Prose of(ConditionalLongRun longRun) {
        return switch (longRun.kind()) {
            case LIMIT -> Prose.of("tends to ").and(number(longRun.values().get(0).orElseThrow()));
            case CYCLE -> Prose.of("no limit; a cycle of " + longRun.values().size() + ": ").and(cycle(longRun));
            case CYCLE_OR_LIMIT -> Prose.of("tends to values by residue of k, of which it isn't decided whether they"
                    + " are equal: ").and(cycle(longRun));
            case IMPOSSIBLE_IN_THE_END -> Prose.of("none: from some step on what is given has probability zero");
            case PERIOD_TOO_LONG -> Prose.of("not decided: the moves go through cycles whose common period is too"
                    + " long");
            case FORMULAS_TOO_LONG -> Prose.of("not decided: formulas over the cycles would need numbers too long to"
                    + " be found at once");
        };
    }

    private Prose cycle(ConditionalLongRun longRun) {
        List<Prose> values = longRun.values().stream().map(value ->
                value.map(this::number).orElse(Prose.of("undefined"))).toList();
        return Prose.joined(values, ", ").and(" for k ≡ " + (values.size() <= 3
                ? String.join(", ", IntStream.range(0, values.size()).mapToObj(String::valueOf).toList())
                : "0, 1, …, " + (values.size() - 1)) + " (mod " + values.size() + ")");
    }

    private Prose number(RealValue value) {
        Optional<Rational> rational = value.rational();
        if (numbers == Numbers.DECIMALS) {
            return Prose.of(value.decimal(digits).text());
        }
        if (rational.isPresent()) {
            return Prose.of(new LongRunProse(digits).number(rational.get()));
        }
        String decimal = value.decimal(digits).text();
        Optional<Formula> exact = value.exact();
        return exact.map(formula -> Prose.formula(formula).and(" ≈ " + decimal)).orElse(Prose.of(decimal));
    }
}
