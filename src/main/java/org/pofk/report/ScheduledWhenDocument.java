package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Table;
import org.pofk.schedule.ScheduledWhen;

/** When outputs meet a condition under a schedule, as a document. */
public final class ScheduledWhenDocument {
    static final String AT = ", at the end of step k, after what is done there";

    private final Style style;
    private final List<Block> blocks = new ArrayList<>();

    private ScheduledWhenDocument(Style style) {
        this.style = style;
    }

    public static Document of(ScheduledWhen found, Style style) {
        ScheduledWhenDocument document = new ScheduledWhenDocument(style);
        document.blocks.addAll(ModelHead.of(found.model()));
        found.answers().forEach(answer -> {
            document.blocks.add(new Heading(2, OutputProse.title(answer.output())));
            document.answer(answer);
        });
        document.blocks.add(Caution.ofInspections(found.model()));
        return new Document(document.blocks);
    }

    /** The same as a part of a report. */
    public static ReportSection section(ScheduledWhen found, Style style) {
        ScheduledWhenDocument document = new ScheduledWhenDocument(style);
        List<Labelled> key = new ArrayList<>();
        found.answers().forEach(answer -> {
            if (found.answers().size() > 1) {
                document.blocks.add(new Heading(3, OutputProse.title(answer.output())));
            }
            document.answer(answer);
            key.add(WhenDocument.keyFigure(answer.output(), answer.when(), style));
        });
        return new ReportSection(ReportSection.Place.RESULTS, Prose.of(WhenDocument.title(found.asked(), style)), key,
                document.blocks, found.isDecided() ? ReportSection.Standing.ANSWERED
                        : ReportSection.Standing.NOT_DECIDED);
    }

    private void answer(ScheduledWhen.Answer answer) {
        label("asked", WhenDocument.asked(answer.when().condition(), style) + AT);
        WhenDocument.partOfNothing(answer.when()).ifPresent(blocks::add);
        label("answer", WhenDocument.inWords(answer.when()));
        answer.when().first().ifPresent(first -> label("first", "k = " + first));
        answer.when().forEverFrom().ifPresent(from -> label("for ever", "from k = " + from + " on"));
        if (answer.when().classes().size() > 1) {
            blocks.add(ResidueTable.of(answer.when().classes()));
        }
        if (!answer.around().isEmpty()) {
            blocks.add(Table.ofText("Values there", List.of("k", answer.output().name() + "(k)"),
                    answer.around().stream().map(value -> List.of(String.valueOf(value.k()),
                            ValueText.of(value, style.digits()))).toList()));
        }
    }

    private void label(String label, String text) {
        blocks.add(new Labelled(label, text));
    }
}
