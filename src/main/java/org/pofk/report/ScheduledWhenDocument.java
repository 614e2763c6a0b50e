package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.answer.When.End;
import org.pofk.answer.When.ResidueClass;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Table;
import org.pofk.schedule.ScheduledWhen;

/** When outputs meet a condition under a schedule, as a document. */
public final class ScheduledWhenDocument {
    private static final int ROWS_AT_MOST = 60;

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
        label("asked", WhenDocument.asked(answer.when().condition(), style) + ", at the end of step k, after what is"
                + " done there");
        label("answer", WhenDocument.inWords(answer.when()));
        answer.when().first().ifPresent(first -> label("first", "k = " + first));
        answer.when().forEverFrom().ifPresent(from -> label("for ever", "from k = " + from + " on"));
        List<Stretch> stretches = stretches(answer.when().classes());
        if (stretches.size() > 1 && stretches.size() <= ROWS_AT_MOST) {
            blocks.add(Table.ofText("By step", List.of("k", "in the end", "first", "for ever from"),
                    stretches.stream().map(Stretch::row).toList()));
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

    private static List<Stretch> stretches(List<ResidueClass> classes) {
        List<Stretch> stretches = new ArrayList<>();
        for (ResidueClass each : classes) {
            int last = stretches.size() - 1;
            if (last >= 0 && stretches.get(last).classes.get(0).end() == each.end()) {
                stretches.get(last).classes.add(each);
            } else {
                stretches.add(new Stretch(new ArrayList<>(List.of(each))));
            }
        }
        return stretches;
    }

    /** Residues one after the other whose steps end alike. */
    private record Stretch(List<ResidueClass> classes) {
        List<String> row() {
            ResidueClass begin = classes.get(0);
            long last = classes.get(classes.size() - 1).residue();
            return List.of("≡ " + begin.residue() + (classes.size() == 1 ? "" : " … " + last) + " mod "
                    + begin.modulus(), WhenDocument.end(begin.end()),
                    shown(classes.stream().flatMap(each -> each.first().stream()).min(Long::compare)),
                    shown(begin.end() == End.MET ? forEverFrom(begin) : Optional.empty()));
        }

        /** The least step of these residues from which all of them are met. */
        private Optional<Long> forEverFrom(ResidueClass begin) {
            long lastFailed = classes.stream().mapToLong(each -> each.forEverFrom().orElseThrow() - each.modulus()).max()
                    .orElseThrow();
            return classes.stream().map(each -> Math.max(each.residue(), lastFailed + 1
                    + Math.floorMod(each.residue() - lastFailed - 1, begin.modulus()))).min(Long::compare);
        }

        private static String shown(Optional<Long> step) {
            return step.map(String::valueOf).orElse("–");
        }
    }
}
