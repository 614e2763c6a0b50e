package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Table;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.schedule.ScheduledWhen;
import org.pofk.schedule.ScheduledWhen.Sides;

/** When outputs meet a condition under a schedule, as a document. */
public final class ScheduledWhenDocument {

    private final ScheduledWhen found;
    private final Style style;
    private final List<Block> blocks = new ArrayList<>();

    private ScheduledWhenDocument(ScheduledWhen found, Style style) {
        this.found = found;
        this.style = style;
    }

    public static Document of(ScheduledWhen found, Style style) {
        ScheduledWhenDocument document = new ScheduledWhenDocument(found, style);
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
        ScheduledWhenDocument document = new ScheduledWhenDocument(found, style);
        List<Labelled> key = new ArrayList<>();
        found.answers().forEach(answer -> {
            if (found.answers().size() > 1) {
                document.blocks.add(new Heading(3, OutputProse.title(answer.output())));
            }
            document.answer(answer);
            key.add(document.keyFigure(answer));
        });
        return new ReportSection(ReportSection.Place.RESULTS, Prose.of(WhenDocument.title(found.asked(), style)), key,
                document.blocks, found.isDecided() ? ReportSection.Standing.ANSWERED
                        : ReportSection.Standing.NOT_DECIDED);
    }

    private void answer(ScheduledWhen.Answer answer) {
        label("asked", WhenDocument.asked(answer.when().condition(), style) + at(found.sides()));
        WhenDocument.partOfNothing(answer.when()).ifPresent(blocks::add);
        label("answer", WhenDocument.inWords(answer.when()));
        answer.when().first().ifPresent(first -> label("first", "k = " + first));
        answer.when().forEverFrom().ifPresent(from -> label("for ever", "from k = " + from + " on"));
        answer.otherwiseBefore().ifPresent(before -> label("beware", "just before what is done there: "
                + WhenDocument.inBrief(before) + " (--side before)"));
        if (answer.when().classes().size() > 1) {
            blocks.add(ResidueTable.of(answer.when().classes()));
        }
        if (!answer.around().isEmpty()) {
            blocks.add(values(answer));
        }
    }

    /** With the answer just before what is done, where that is another. */
    private Labelled keyFigure(ScheduledWhen.Answer answer) {
        Labelled figure = WhenDocument.keyFigure(answer.output(), answer.when(), style);
        String sides = switch (found.sides()) {
            case BEFORE -> "just before what is done: ";
            case AFTER -> answer.otherwiseBefore().isPresent() ? "after what is done: " : "";
            case BOTH -> "before and after what is done: ";
        };
        return new Labelled(figure.label(), Prose.of(sides).and(figure.text()).and(answer.otherwiseBefore()
                .map(before -> "; just before it: " + WhenDocument.inBrief(before)).orElse("")));
    }

    /** Which values of a step are meant. */
    static String at(Sides sides) {
        return ", at the end of step k, " + switch (sides) {
            case BEFORE -> "before what is done there";
            case AFTER -> "after what is done there";
            case BOTH -> "both before and after what is done there";
        };
    }

    private Table values(ScheduledWhen.Answer answer) {
        String name = answer.output().name() + "(k)";
        return Table.ofText("Values there", found.sides() == Sides.AFTER ? List.of("k", name)
                : Stream.concat(Stream.of("k"), found.sides().all().stream().map(side -> name + ", " + word(side))).toList(),
                answer.around().stream().map(reading -> Stream.concat(Stream.of(String.valueOf(reading.j())),
                        found.sides().all().stream().map(side -> KnownText.of(reading.at(side), style.digits())))
                        .toList()).toList());
    }

    private static String word(Side side) {
        return side == Side.BEFORE ? "before" : "after";
    }

    private void label(String label, String text) {
        blocks.add(new Labelled(label, text));
    }
}
