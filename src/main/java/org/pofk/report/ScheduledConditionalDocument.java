package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import java.util.stream.IntStream;
import org.pofk.chain.Output;
import org.pofk.chain.Timetable;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Table;
import org.pofk.schedule.ConditionalCourse;
import org.pofk.schedule.ConditionalCourse.Reading;
import org.pofk.schedule.ConditionalCourse.Value;
import org.pofk.schedule.ConditionalSchedule;
import org.pofk.schedule.ConditionalSchedule.Conditional;
import org.pofk.schedule.CycleCourse.Extreme;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.schedule.ScheduledOutput;
import org.pofk.steps.KnownValue;

/** Outputs of a model with a schedule given what is known at the same moment, as a document. */
public final class ScheduledConditionalDocument {
    /** Longer cycles are shown at some of their steps. */
    private static final int STEPS_LISTED = 24;
    private static final int STEPS_CHOSEN = 12;

    private final ConditionalSchedule found;
    private final Timetable timetable;
    private final Style style;
    private final Prose given;
    private final List<Block> blocks = new ArrayList<>();

    private ScheduledConditionalDocument(ConditionalSchedule found, Style style) {
        this.found = found;
        this.timetable = found.stopped().timetable();
        this.style = style;
        this.given = GivenProse.of(found.given(), "k");
    }

    public static Document of(ConditionalSchedule found, Style style) {
        ScheduledConditionalDocument document = new ScheduledConditionalDocument(found, style);
        document.blocks.addAll(ModelHead.of(found.model()));
        document.write();
        document.blocks.add(Caution.ofInspections(found.model()));
        return new Document(document.blocks);
    }

    /** The same as a part of a report. */
    public static ReportSection section(ConditionalSchedule found, Style style) {
        ScheduledConditionalDocument document = new ScheduledConditionalDocument(found, style);
        document.write();
        List<Conditional> told = document.isNever() ? List.of() : found.outputs().stream()
                .filter(each -> !ConditionalDocument.isExcluded(each.joint().output())).toList();
        List<Proved> proofs = new ArrayList<>();
        told.forEach(each -> proofs.addAll(document.proofs("N for " + each.output().name(), each.joint())));
        proofs.addAll(told.isEmpty() ? List.of() : document.proofs("D", found.event()));
        return new ReportSection(ReportSection.Place.RESULTS, ConditionalDocument.title(found.given()),
                document.isNever() ? List.of(new Labelled(ConditionalDocument.title(found.given()),
                        Prose.of(GivenProse.NEVER))) : told.stream().map(document::keyFigure).toList(),
                document.blocks.stream().map(Document::lowered).toList(), proofs,
                found.isDecided() ? ReportSection.Standing.ANSWERED : ReportSection.Standing.NOT_DECIDED);
    }

    private List<Proved> proofs(String name, ScheduledOutput output) {
        CycleFormulas formulas = CycleFormulas.of(timetable, output.named(name));
        return output.over().stream().filter(each -> each.place().isPresent()).map(each -> Proved.overCycles(
                formulas.left(each).and(formulas.side(each)),
                found.given().never().isEmpty() ? "schedule" : "stopped chain", each)).toList();
    }

    private Labelled keyFigure(Conditional output) {
        return new Labelled(Prose.name(output.output().name()).and(", given ").and(given),
                output.longRun().map(course -> longRun(course).text()).map(text -> Prose.of("long run: ").and(text))
                        .orElse(Prose.of("long run: not decided")));
    }

    private void write() {
        if (isNever()) {
            found.outputs().forEach(output -> {
                blocks.add(new Heading(2, OutputProse.title(output.output()).and(", given ").and(given)));
                label("defined", GivenProse.NEVER);
            });
            return;
        }
        found.outputs().forEach(this::output);
        if (found.outputs().stream().allMatch(each -> ConditionalDocument.isExcluded(each.joint().output()))) {
            return;
        }
        blocks.add(new Heading(2, Prose.of("D(k) = P(").and(given).and(")")));
        if (!found.given().never().isEmpty()) {
            blocks.add(new Labelled("of", Prose.of("D and N are those of the chain in which what enters ")
                    .and(Prose.names(found.given().neverNames())).and(" stays there, whatever is done")));
        }
        formulas(found.event(), "D");
        values();
    }

    /** Whether what is given has probability zero at every moment. */
    private boolean isNever() {
        return found.possible().filter(each -> each.after().isNever() && each.before().isNever()).isPresent();
    }

    private void output(Conditional output) {
        Output asked = output.output();
        blocks.add(new Heading(2, OutputProse.title(asked).and(", given ").and(given)));
        if (ConditionalDocument.isExcluded(output.joint().output())) {
            label("is", ConditionalDocument.EXCLUDED);
            defined();
            return;
        }
        blocks.add(new Labelled("is", ConditionalDocument.quotient(asked, given)));
        label("read", "at the end of step k, after what is done there; just before it, where that is said, what is"
                + " given is known just before it too");
        defined();
        output.preamble().ifPresent(course -> blocks.add(summary("before the cycles", course, 0)));
        output.first().filter(course -> timetable.period() > 1)
                .ifPresent(course -> blocks.add(summary("first cycle", course, timetable.before())));
        output.longRun().map(this::longRun).ifPresentOrElse(blocks::add, () -> label("in the long run",
                "not decided: the numbers of a whole cycle are too long for formulas"));
        output.longRun().ifPresent(course -> table(asked, course));
        blocks.add(new Heading(2, Prose.of("N(k) for ").andName(asked.name())));
        formulas(output.joint(), "N");
    }

    private void defined() {
        String after = found.possible().map(each -> GivenProse.impossible(each.after()))
                .orElse("wherever D(k) isn't zero; which steps these are repeats too late to be listed");
        label("defined", after);
        found.possible().map(each -> isAnyActed() ? GivenProse.impossible(each.before()) : after)
                .filter(before -> !before.equals(after)).ifPresent(before ->
                label("", "just before what is done there, " + before));
    }

    private Labelled longRun(ConditionalCourse course) {
        int cycles = course.steps() / timetable.period();
        String label = cycles == 1 ? "in the long run" : "in the long run, over " + cycles + " cycles";
        if (course.highest().isEmpty()) {
            return new Labelled(label, Prose.of("none: from some step on what is given has probability zero"));
        }
        return course.steps() == 1 && !ScheduleProse.isActed(timetable, 1)
                ? new Labelled(label, Prose.of("tends to " + number(course.highest().get().value())))
                : summary(label, course, timetable.before());
    }

    private Labelled summary(String label, ConditionalCourse course, int first) {
        if (course.highest().isEmpty()) {
            return new Labelled(label, Prose.of(course.isDecided() ? "what is given has probability zero throughout"
                    : "not decided"));
        }
        boolean isEverywhere = course.readings().stream().allMatch(each -> each.after().kind() == Value.Kind.VALUE);
        return new Labelled(label, Prose.of(course.average().map(average -> "average " + number(average)
                + " over the steps" + (isEverywhere ? "" : " where it is defined") + ", each given what is known then; highest ")
                .orElse("highest ")).and(extreme(course.highest().get(), first)).and("; lowest ")
                .and(extreme(course.lowest().orElseThrow(), first)));
    }

    private String number(KnownValue value) {
        return KnownText.withFraction(value, style.digits());
    }

    /** @param first the step at j = 0 */
    private Prose extreme(Extreme extreme, int first) {
        return Prose.of(KnownText.of(extreme.value(), style.digits()) + " at j = " + extreme.j())
                .and(extreme.side() == Side.BEFORE ? ScheduleProse.justBefore(timetable, first + extreme.j())
                        : Prose.EMPTY);
    }

    private boolean isAnyActed() {
        return found.model().schedule().filter(each -> !each.recurring().isEmpty()).isPresent();
    }

    private void table(Output output, ConditionalCourse course) {
        if (course.steps() == 1 || course.highest().isEmpty()) {
            return;
        }
        List<Prose> header = new ArrayList<>(List.of(Prose.of("j")));
        header.addAll(isAnyActed() ? List.of(Prose.of("just before"), Prose.of("just after"))
                : List.of(Prose.name(output.name())));
        blocks.add(new Table(Prose.of("In the long run, by step of the cycle"), header,
                listed(course).stream().map(j -> row(course.readings().get(j), j)).toList()));
    }

    private List<Prose> row(Reading reading, int j) {
        List<Prose> cells = new ArrayList<>(List.of(Prose.of(String.valueOf(j))));
        if (isAnyActed()) {
            // what is before the actions of step 0 stands at the end of the cycle
            cells.add(Prose.of(j == 0 ? "" : text(reading.before())));
        }
        cells.add(Prose.of(text(reading.after())));
        return cells;
    }

    private String text(Value value) {
        return value.value().map(known -> KnownText.of(known, style.digits()))
                .orElse(value.kind() == Value.Kind.IMPOSSIBLE ? "–" : "not decided");
    }

    private static List<Integer> listed(ConditionalCourse course) {
        if (course.steps() <= STEPS_LISTED) {
            return IntStream.rangeClosed(0, course.steps()).boxed().toList();
        }
        TreeSet<Integer> chosen = new TreeSet<>(List.of(0, course.highest().orElseThrow().j(),
                course.lowest().orElseThrow().j(), course.steps()));
        IntStream.range(1, STEPS_CHOSEN).forEach(i -> chosen.add((int) ((long) course.steps() * i / STEPS_CHOSEN)));
        return List.copyOf(chosen);
    }

    private void formulas(ScheduledOutput output, String name) {
        blocks.addAll(ScheduledDocument.quotientPart(found.stopped(), output.named(name), style));
    }

    private void label(String label, String text) {
        blocks.add(new Labelled(label, text));
    }

    private void values() {
        if (found.event().values().isEmpty()) {
            return;
        }
        List<Prose> header = new ArrayList<>(List.of(Prose.of("k"), Prose.of("cycle m"), Prose.of("step j")));
        for (Conditional output : found.outputs()) {
            Prose name = Prose.name(output.output().name());
            header.addAll(isAnyActed() ? List.of(name.and(", before"), name.and(", after")) : List.of(name));
        }
        blocks.add(new Table(Prose.of("Values at step k, given that"), header,
                IntStream.range(0, found.event().values().size()).mapToObj(this::valuesAt).toList()));
    }

    private List<Prose> valuesAt(int row) {
        int k = found.event().values().get(row).j();
        Timetable.Place place = timetable.place(k);
        boolean isInCycle = place.cycle().isPresent();
        List<Prose> cells = new ArrayList<>(List.of(Prose.of(String.valueOf(k)),
                Prose.of(isInCycle ? String.valueOf(place.cycle().getAsInt()) : "–"),
                Prose.of(isInCycle ? String.valueOf(place.within()) : "–")));
        for (Conditional output : found.outputs()) {
            Reading reading = output.values().get(row);
            if (isAnyActed()) {
                cells.add(Prose.of(text(reading.before())));
            }
            cells.add(Prose.of(text(reading.after())));
        }
        return cells;
    }
}
