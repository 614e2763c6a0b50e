package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.TreeSet;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.pofk.chain.Timetable;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Table;
import org.pofk.schedule.CycleCourse;
import org.pofk.schedule.CycleCourse.Reading;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.schedule.CycleFormula;
import org.pofk.schedule.JointFormula;
import org.pofk.schedule.PeriodicRegime;
import org.pofk.schedule.ScheduledModel;
import org.pofk.schedule.ScheduledOutput;
import org.pofk.schedule.StretchFormula;
import org.pofk.steps.KnownValue;

/** What was found about a model with a schedule, as a document. */
public final class ScheduledDocument {
    /** Longer cycles are shown at some of their steps. */
    private static final int STEPS_LISTED = 24;
    private static final int STEPS_CHOSEN = 12;

    private final ScheduledModel found;
    private final Timetable timetable;
    private final Style style;
    private final List<Block> blocks = new ArrayList<>();

    private ScheduledDocument(ScheduledModel found, Style style) {
        this.found = found;
        this.timetable = found.timetable();
        this.style = style;
    }

    public static Document of(ScheduledModel found, Style style) {
        ScheduledDocument document = new ScheduledDocument(found, style);
        document.write();
        return new Document(document.blocks);
    }

    private void write() {
        blocks.addAll(ModelHead.of(found.model()));
        found.outputs().forEach(this::output);
        values();
        blocks.add(Caution.ofInspections(found.model()));
    }

    /** The cycles of an output in a few lines: what the first is like, and what they tend to. */
    static List<Block> results(ScheduledModel found, ScheduledOutput output, Style style) {
        ScheduledDocument document = new ScheduledDocument(found, style);
        document.results(output);
        return document.blocks;
    }

    /** The long run by step of the cycle, and the formulas, whose proof is told apart. */
    static List<Block> formulas(ScheduledModel found, ScheduledOutput output, Style style) {
        ScheduledDocument document = new ScheduledDocument(found, style);
        document.tabled(output);
        document.formulas(output);
        return document.blocks;
    }

    /** The values at the steps asked for. */
    static List<Block> values(ScheduledModel found, Style style) {
        ScheduledDocument document = new ScheduledDocument(found, style);
        document.values();
        return document.blocks;
    }

    private void output(ScheduledOutput output) {
        blocks.add(new Heading(2, OutputProse.title(output.output())));
        results(output);
        tabled(output);
        within(output);
        over(output);
        proof(output);
        joint(output);
    }

    private void formulas(ScheduledOutput output) {
        within(output);
        over(output);
        joint(output);
    }

    private void results(ScheduledOutput output) {
        output.preamble().ifPresent(course -> summary("before the cycles", course));
        output.first().filter(course -> timetable.period() > 1).ifPresent(course -> summary("first cycle", course));
        output.regime().ifPresentOrElse(this::regime, () -> blocks.add(new Labelled("in the long run",
                "not decided: even very many cycles leave it unsettled, or the budget ran out")));
    }

    private void tabled(ScheduledOutput output) {
        output.regime().flatMap(RecurringCourse::of).ifPresent(course -> table(output, course));
    }

    private void joint(ScheduledOutput output) {
        output.joint().ifPresent(formula -> joint(output, formula));
        if (found.formulasLeftOut()) {
            blocks.add(new Labelled("formulas", "left out, their numbers are too long to be found at once; --show all"
                    + " derives them however long it takes"));
        }
    }

    /** The course of a regime that recurs. */
    private static final class RecurringCourse implements PeriodicRegime.Visitor<Optional<CycleCourse>> {
        static Optional<CycleCourse> of(PeriodicRegime regime) {
            return regime.accept(new RecurringCourse());
        }

        @Override
        public Optional<CycleCourse> recurring(PeriodicRegime.Recurring recurring) {
            return Optional.of(recurring.course());
        }

        @Override
        public Optional<CycleCourse> none(PeriodicRegime.None none) {
            return Optional.empty();
        }
    }

    private void regime(PeriodicRegime regime) {
        regime.accept(new PeriodicRegime.Visitor<Void>() {
            @Override
            public Void recurring(PeriodicRegime.Recurring recurring) {
                if (recurring.course().steps() == 1 && !isActed(1)) {
                    blocks.add(new Labelled("in the long run", "tends to "
                            + KnownText.withFraction(recurring.course().average(), style.digits())
                            + word(recurring.course())));
                } else {
                    summary(recurring.cycles() == 1 ? "in the long run"
                            : "in the long run, over " + recurring.cycles() + " cycles", recurring.course());
                }
                return null;
            }

            @Override
            public Void none(PeriodicRegime.None none) {
                blocks.add(new Labelled("in the long run", "nothing that recurs: " + none.explanation()));
                return null;
            }
        });
    }

    private void summary(String label, CycleCourse course) {
        blocks.add(new Labelled(label, Prose.of("average "
                + KnownText.withFraction(course.average(), style.digits()) + "; highest ")
                .and(extreme(course.highest())).and("; lowest ").and(extreme(course.lowest())).and(word(course))));
    }

    private Prose extreme(CycleCourse.Extreme extreme) {
        String value = KnownText.of(extreme.value(), style.digits()) + " at j = " + extreme.j();
        return extreme.side() == Side.BEFORE && isActed(extreme.j())
                ? Prose.of(value + ", just before ").and(done(extreme.j())) : Prose.of(value);
    }

    private static String word(CycleCourse course) {
        return course.average().word() == KnownValue.Word.EXACT ? "; exact"
                : "; certified, every digit shown is right";
    }

    private void table(ScheduledOutput output, CycleCourse course) {
        if (course.steps() == 1) {
            return;
        }
        boolean isActed = timetable.cycle().stream().anyMatch(moment -> !moment.actions().isEmpty());
        List<Integer> steps = listed(course);
        List<Prose> header = new ArrayList<>(List.of(Prose.of("j")));
        if (isActed) {
            header.addAll(List.of(Prose.of("just before"), Prose.of("just after")));
        } else {
            header.add(Prose.name(output.output().name()));
        }
        blocks.add(new Table(Prose.of("In the long run, by step of the cycle"), header,
                steps.stream().map(j -> row(course.readings().get(j), j, isActed)).toList()));
    }

    private List<Prose> row(Reading reading, int j, boolean isActed) {
        List<Prose> cells = new ArrayList<>(List.of(Prose.of(String.valueOf(j))));
        if (isActed) {
            // what is before the actions of step 0 stands at the end of the cycle
            cells.add(Prose.of(j == 0 ? "" : text(reading.before())));
        }
        cells.add(Prose.of(text(reading.after())));
        return cells;
    }

    private String text(KnownValue value) {
        return KnownText.of(value, style.digits());
    }

    private static List<Integer> listed(CycleCourse course) {
        if (course.steps() <= STEPS_LISTED) {
            return IntStream.rangeClosed(0, course.steps()).boxed().toList();
        }
        TreeSet<Integer> chosen = new TreeSet<>(List.of(0, course.highest().j(), course.lowest().j(), course.steps()));
        for (int i = 1; i < STEPS_CHOSEN; i++) {
            chosen.add((int) ((long) course.steps() * i / STEPS_CHOSEN));
        }
        return List.copyOf(chosen);
    }

    private void within(ScheduledOutput output) {
        if (output.within().isEmpty()) {
            return;
        }
        blocks.add(new Heading(3, "Within a cycle"));
        FormulaInSteps formulas = new FormulaInSteps("j", style);
        for (StretchFormula formula : output.within()) {
            int steps = formula.to() - formula.from();
            Prose left = Prose.name(output.output().name())
                    .and("(" + (formula.from() == 0 ? "j)" : formula.from() + " + j)"));
            String cycle = formula.cycle() == StretchFormula.Cycle.FIRST ? "in the first cycle" : "in the long run";
            formulas.add(formula.closedForm(), left, Prose.of(cycle + ", 0 ≤ j ≤ " + steps)
                    .and(isActed(formula.to()) ? Prose.of("; j = " + steps + " is just before ")
                            .and(done(formula.to())) : Prose.EMPTY));
        }
        blocks.addAll(formulas.blocks());
    }

    private boolean isActed(int j) {
        return j > 0 && !timetable.cycle().get((j - 1) % timetable.period()).actions().isEmpty();
    }

    /** The names of what is done at the end of step j of a cycle. */
    private Prose done(int j) {
        return Prose.names(timetable.cycle().get((j - 1) % timetable.period()).actions().stream()
                .map(action -> timetable.actions().get(action).name()).toList());
    }

    private void over(ScheduledOutput output) {
        if (output.over().isEmpty()) {
            return;
        }
        blocks.add(new Heading(3, "Over the cycles"));
        FormulaInSteps formulas = new FormulaInSteps("m", style);
        output.over().forEach(formula -> formulas.add(formula.closedForm(), left(output, formula),
                Prose.of("m ≥ 0").and(formula.place().map(this::side).orElse(Prose.EMPTY))));
        blocks.addAll(formulas.blocks());
    }

    private Prose left(ScheduledOutput output, CycleFormula formula) {
        Prose name = Prose.name(output.output().name());
        return formula.place().map(place -> name.and("(" + ScheduleProse.stepOf(timetable, place.j()) + ")"))
                .orElse(Prose.of("mean of ").and(name).and(" over cycle m"));
    }

    /** Of the formulas over the cycles. */
    static Stream<Proved> proofs(ScheduledModel found, ScheduledOutput output, Style style) {
        ScheduledDocument document = new ScheduledDocument(found, style);
        return output.over().stream().map(formula -> Proved.overCycles(document.left(output, formula)
                .and(formula.place().map(document::side).orElse(Prose.EMPTY)), "schedule", formula));
    }

    private Prose side(CycleFormula.Place place) {
        int step = place.j() == 0 ? timetable.period() : place.j();
        return !isActed(step) ? Prose.EMPTY
                : Prose.of(place.side() == Side.BEFORE ? ", before " : ", after ").and(done(step));
    }

    private void joint(ScheduledOutput output, JointFormula formula) {
        blocks.add(new Heading(3, "Both at once"));
        blocks.add(FormulaInSteps.joint(formula, Prose.name(output.output().name())
                .and("(" + ScheduleProse.step(timetable, "m", "j") + ")")));
    }

    private void proof(ScheduledOutput output) {
        if (output.over().isEmpty()) {
            return;
        }
        blocks.add(CycleProof.holds(timetable, output.over().get(0)));
    }

    private void values() {
        int rows = found.outputs().stream().mapToInt(output -> output.values().size()).max().orElse(0);
        if (rows == 0) {
            return;
        }
        boolean isActed = found.model().schedule().filter(each -> !each.recurring().isEmpty()).isPresent();
        List<Prose> header = new ArrayList<>(List.of(Prose.of("k"), Prose.of("cycle m"), Prose.of("step j")));
        for (ScheduledOutput output : found.outputs()) {
            Prose name = Prose.name(output.output().name());
            header.addAll(isActed ? List.of(name.and(", before"), name.and(", after")) : List.of(name));
        }
        blocks.add(new Table(Prose.of(isActed ? "Values at step k, just before and just after what is done there"
                : "Values at the end of step k"), header,
                IntStream.range(0, rows).mapToObj(row -> valuesAt(row, isActed)).toList()));
    }

    private List<Prose> valuesAt(int row, boolean isActed) {
        int k = found.outputs().get(0).values().get(row).j();
        Timetable.Place place = timetable.place(k);
        OptionalInt cycle = place.cycle();
        List<Prose> cells = new ArrayList<>(List.of(Prose.of(String.valueOf(k)),
                Prose.of(cycle.isPresent() ? String.valueOf(cycle.getAsInt()) : "–"),
                Prose.of(cycle.isPresent() ? String.valueOf(place.within()) : "–")));
        for (ScheduledOutput output : found.outputs()) {
            Reading reading = output.values().get(row);
            if (isActed) {
                cells.add(Prose.of(text(reading.before())));
            }
            cells.add(Prose.of(text(reading.after())));
        }
        return cells;
    }
}
