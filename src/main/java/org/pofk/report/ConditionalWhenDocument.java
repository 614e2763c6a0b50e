package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.answer.ConditionalLongRun;
import org.pofk.answer.ConditionalWhen;
import org.pofk.answer.When;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Table;
import org.pofk.schedule.ScheduledWhen.Sides;

/** When outputs given what is known at the same step meet a condition, as a document. */
public final class ConditionalWhenDocument {
    private static final int VALUES_AT_MOST = 12;

    private final ConditionalWhen found;
    private final Style style;
    private final Prose given;
    private final List<Block> blocks = new ArrayList<>();

    private ConditionalWhenDocument(ConditionalWhen found, Style style) {
        this.found = found;
        this.style = style;
        this.given = GivenProse.of(found.given(), "k");
    }

    public static Document of(ConditionalWhen found, Style style) {
        ConditionalWhenDocument document = new ConditionalWhenDocument(found, style);
        document.blocks.addAll(ModelHead.of(found.model()));
        found.answers().forEach(document::answer);
        document.blocks.add(document.isScheduled() ? Caution.ofInspections(found.model())
                : new Paragraph(Caution.TEXT));
        return new Document(document.blocks);
    }

    private void answer(ConditionalWhen.Answer answer) {
        When when = answer.when();
        blocks.add(new Heading(2, OutputProse.title(answer.output()).and(", given ").and(given)));
        label("asked", Prose.of(WhenDocument.asked(when.condition(), style)
                + (isScheduled() ? ScheduledWhenDocument.at(Sides.AFTER) : "")));
        WhenDocument.partOfNothing(when).ifPresent(blocks::add);
        label("answer", Prose.of(WhenDocument.inWords(when)));
        when.first().ifPresent(first -> label("first", Prose.of("k = " + first)));
        when.forEverFrom().ifPresent(from -> label("for ever", Prose.of("from k = " + from + " on")));
        if (when.reason() == When.Reason.NOTHING_DEFINED) {
            return;
        }
        longRun(answer.longRun());
        found.possible().ifPresent(possible -> label("defined", Prose.of(GivenProse.impossible(possible))));
        if (when.classes().size() > 1) {
            blocks.add(ResidueTable.of(when.classes()));
        }
        if (!answer.around().isEmpty()) {
            blocks.add(new Table(Prose.of("Values there, given that"),
                    List.of(Prose.of("k"), Prose.name(answer.output().name())),
                    answer.around().stream().map(at -> List.of(Prose.of(String.valueOf(at.k())), Prose.of(at.value()
                            .map(value -> ValueText.of(value, style.digits())).orElse("–")))).toList()));
        }
    }

    private boolean isScheduled() {
        return found.model().schedule().isPresent();
    }

    /** Under a schedule a value for each step of the cycle, in decimals while they are few. */
    private void longRun(ConditionalLongRun longRun) {
        if (!isScheduled()) {
            label("long run", new ConditionalLongRunProse(style.digits()).of(longRun));
        } else if (longRun.values().size() <= VALUES_AT_MOST) {
            label("long run", new ConditionalLongRunProse(style.digits(), ConditionalLongRunProse.Numbers.DECIMALS)
                    .of(longRun));
        }
    }

    private void label(String label, Prose text) {
        blocks.add(new Labelled(label, text));
    }
}
