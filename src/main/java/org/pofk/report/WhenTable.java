package org.pofk.report;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.pofk.answer.ConditionalWhen;
import org.pofk.answer.When;
import org.pofk.answer.WhenModel;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.schedule.ScheduledWhen;

/**
 * When outputs meet a condition: a row for each output, whose {@code residue} is empty, and where its steps end in
 * different ways one for each residue of k. An empty step is none, or one that isn't decided: {@code answer} says which.
 */
public final class WhenTable {
    private final StepColumns steps;
    private final List<Prose> side;
    private final Rows rows;

    private WhenTable(StepColumns steps, List<Prose> side, Rows rows) {
        this.steps = steps;
        this.side = side;
        this.rows = rows;
    }

    /** @param digits significant digits of decimals */
    public static Document.Table of(WhenModel found, int digits) {
        WhenTable table = of(found.model(), digits);
        found.answers().forEach(answer -> table.answer(answer.output(), answer.when()));
        return table.rows.table();
    }

    /** The same given what is known at k. */
    public static Document.Table of(ConditionalWhen found, int digits) {
        WhenTable table = of(found.model(), digits);
        found.answers().forEach(answer -> table.answer(answer.output(), answer.when()));
        return table.rows.table();
    }

    /** The same under a schedule, with the side of what is done at a step that is asked about. */
    public static Document.Table of(ScheduledWhen found, int digits) {
        WhenTable table = of(found.model(), Rows.words("side"), Rows.words(inWords(found.sides())), digits);
        found.answers().forEach(answer -> table.answer(answer.output(), answer.when()));
        return table.rows.table();
    }

    private static WhenTable of(Model model, int digits) {
        return of(model, List.of(), List.of(), digits);
    }

    private static WhenTable of(Model model, List<Prose> head, List<Prose> side, int digits) {
        StepColumns steps = StepColumns.of(model);
        return new WhenTable(steps, side, new Rows(digits, Rows.words("output"), head, Rows.words("condition", "exact",
                "decimal", "residue", "modulus", "answer"), first(steps.header(), "first"),
                first(steps.header(), "for ever from")));
    }

    /** {@code first k}, {@code first time (h)}. */
    private static List<Prose> first(List<Prose> header, String word) {
        return header.stream().map(each -> Prose.of(word + " ").and(each)).toList();
    }

    private void answer(Output output, When when) {
        add(output, when, Rows.words("", "", inWords(when.reason())), when.first(), when.forEverFrom());
        if (when.classes().size() > 1) {
            when.classes().forEach(each -> add(output, when, Rows.words(String.valueOf(each.residue()),
                    String.valueOf(each.modulus()), inWords(each.end())), each.first(), each.forEverFrom()));
        }
    }

    private void add(Output output, When when, List<Prose> middle, Optional<Long> first,
            Optional<Long> forEverFrom) {
        rows.add(List.of(Prose.name(output.name())), side, Rows.words(inWords(when.condition().kind())),
                rows.value(when.condition().bound()),
                middle, first.map(steps::cells).orElse(steps.none()), forEverFrom.map(steps::cells).orElse(steps.none()));
    }

    /** {@code NOT_DECIDED} is written {@code not decided}. */
    private static String inWords(Enum<?> constant) {
        return constant.name().toLowerCase(Locale.ROOT).replace('_', ' ');
    }
}
