package org.pofk.report;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.FirstEntrance;
import org.pofk.answer.Passage;
import org.pofk.answer.PassageMoments;
import org.pofk.answer.Percentile;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.exact.Rational;
import org.pofk.schedule.ScheduledPassage;
import org.pofk.schedule.ScheduledPassage.At;
import org.pofk.schedule.ScheduledWait;
import org.pofk.steps.KnownValue;

/**
 * A first passage as rows that each say one number: law, distribution, survival and hazard by step, with an empty
 * {@code from}, which stands for the start asked about; the percentiles; probability and mean from every state.
 */
public final class PassageTable {
    private static final List<Prose> START = List.of(Prose.EMPTY);

    private final StepColumns steps;
    private final Rows rows;

    private PassageTable(StepColumns steps, Rows rows) {
        this.steps = steps;
        this.rows = rows;
    }

    /** @param chain with the start that was asked about; {@code digits} are the significant digits of decimals */
    public static Document.Table of(Model model, Chain chain, Passage passage, int digits) {
        StepColumns steps = StepColumns.of(model);
        Rows rows = new Rows(digits, Rows.words("quantity", "from"), steps.header(), Rows.words("exact", "decimal"));
        PassageTable table = new PassageTable(steps, rows);
        table.byStep("law", passage.law());
        table.byStep("distribution", passage.distribution());
        table.byStep("survival", passage.survival());
        passage.hazards().forEach(hazard ->
                rows.add(Rows.words("hazard"), START, steps.cells(hazard.k()), rows.value(hazard.value())));
        table.moments(passage.moments());
        table.percentiles(passage.percentiles());
        table.fromEach(chain, passage.fromEach());
        return rows.table();
    }

    /** The same under a schedule. */
    public static Document.Table of(Model model, ScheduledPassage passage, int digits) {
        StepColumns steps = StepColumns.of(model);
        Rows rows = new Rows(digits, Rows.words("quantity", "from"), steps.header(), Rows.words("exact", "decimal"));
        PassageTable table = new PassageTable(steps, rows);
        table.byStep("law", passage, At::law);
        table.byStep("distribution", passage, At::distribution);
        table.byStep("survival", passage, At::survival);
        passage.values().forEach(each -> each.hazard().ifPresent(hazard -> rows.add(Rows.words("hazard"), START,
                steps.cells(each.k()), rows.value(hazard))));
        passage.entrance().ifPresent(entrance -> {
            table.wait(START, entrance.first());
            entrance.first().variance().ifPresent(variance ->
                    table.number("variance given that it happens", START, variance));
        });
        table.percentiles(passage.percentiles());
        passage.entrance().ifPresent(entrance -> {
            for (int i = 0; i < entrance.fromEach().size(); i++) {
                table.wait(List.of(Prose.name(model.chain().states().get(i))), entrance.fromEach().get(i));
            }
        });
        return rows.table();
    }

    private void byStep(String quantity, ScheduledPassage passage, Function<At, KnownValue> value) {
        passage.values().forEach(each ->
                rows.add(Rows.words(quantity), START, steps.cells(each.k()), rows.value(value.apply(each))));
    }

    private void wait(List<Prose> from, ScheduledWait wait) {
        number("probability", from, wait.probability());
        wait.mean().ifPresent(mean -> number("mean given that it happens", from, mean));
    }

    private void number(String quantity, List<Prose> from, KnownValue value) {
        rows.add(Rows.words(quantity), from, steps.none(), rows.value(value));
    }

    private void percentiles(List<Percentile> percentiles) {
        percentiles.stream().filter(each -> each.k().isPresent()).forEach(each -> rows.add(
                Rows.words("percentile"), START, steps.cells(each.k().getAsInt()), rows.value(each.p())));
    }

    private void fromEach(Chain chain, FirstEntrance entrance) {
        for (int i = 0; i < chain.size(); i++) {
            number("probability", chain.states().get(i), Optional.of(entrance.probabilities().get(i)));
            number("mean given that it happens", chain.states().get(i), entrance.means().get(i));
        }
    }

    private void byStep(String quantity, DerivedOutput output) {
        output.values().forEach(value ->
                rows.add(Rows.words(quantity), START, steps.cells(value.k()), rows.value(value)));
    }

    private void moments(PassageMoments moments) {
        rows.add(Rows.words("probability"), START, steps.none(), rows.value(moments.probability()));
        rows.add(Rows.words("mean given that it happens"), START, steps.none(), rows.value(moments.mean()));
        rows.add(Rows.words("variance given that it happens"), START, steps.none(), rows.value(moments.variance()));
    }

    private void number(String quantity, String state, Optional<Rational> value) {
        rows.add(Rows.words(quantity), List.of(Prose.name(state)), steps.none(), rows.value(value));
    }
}
