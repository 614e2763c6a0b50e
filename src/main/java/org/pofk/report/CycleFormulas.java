package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.pofk.chain.Timetable;
import org.pofk.modes.ClosedForm;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.schedule.CycleFormula;
import org.pofk.schedule.ScheduledOutput;
import org.pofk.schedule.StretchFormula;
import org.pofk.schedule.StretchFormula.Cycle;

/** The formulas of an output under a schedule: within a cycle, over the cycles, and both at once. */
final class CycleFormulas {
    private final Timetable timetable;
    private final ScheduledOutput output;
    private final Prose name;

    private CycleFormulas(Timetable timetable, ScheduledOutput output) {
        this.timetable = timetable;
        this.output = output;
        this.name = Prose.name(output.output().name());
    }

    static CycleFormulas of(Timetable timetable, ScheduledOutput output) {
        return new CycleFormulas(timetable, output);
    }

    /** In steps j of a cycle. */
    static List<Block> within(Timetable timetable, ScheduledOutput output, Style style) {
        return output.within().isEmpty() ? List.of() : new CycleFormulas(timetable, output).within(style);
    }

    private List<Block> within(Style style) {
        FormulaInSteps formulas = new FormulaInSteps("j", style);
        List<StretchFormula> left = new ArrayList<>(output.within());
        while (!left.isEmpty()) {
            StretchFormula formula = left.get(0);
            List<StretchFormula> same = left.stream().filter(other -> isSame(formula, other)).toList();
            formulas.add(formula.closedForm(), left(formula),
                    range(formula, same.stream().map(StretchFormula::cycle).toList()));
            left.removeAll(same);
        }
        return headed("Within a cycle", formulas);
    }

    Prose left(StretchFormula formula) {
        return name.and("(" + (formula.from() == 0 ? "j)" : formula.from() + " + j)"));
    }

    /** In the same steps of a cycle the same sequence. */
    private static boolean isSame(StretchFormula formula, StretchFormula other) {
        return formula.from() == other.from() && formula.to() == other.to()
                && y(formula.closedForm()).equals(y(other.closedForm()));
    }

    private static Object y(ClosedForm form) {
        return form.transform().y();
    }

    private Prose range(StretchFormula formula, List<Cycle> cycles) {
        int steps = formula.to() - formula.from();
        String cycle = cycles.containsAll(List.of(Cycle.FIRST, Cycle.LONG_RUN))
                ? "in the first cycle and in the long run"
                : cycles.contains(Cycle.FIRST) ? "in the first cycle" : "in the long run";
        return Prose.of(cycle + ", 0 ≤ j ≤ " + steps).and(ScheduleProse.isActed(timetable, formula.to())
                ? Prose.of("; j = " + steps + " is just before ").and(ScheduleProse.done(timetable, formula.to()))
                : Prose.EMPTY);
    }

    /** In cycles m. */
    static List<Block> over(Timetable timetable, ScheduledOutput output, Style style) {
        CycleFormulas all = new CycleFormulas(timetable, output);
        FormulaInSteps formulas = new FormulaInSteps("m", style);
        output.over().forEach(formula -> formulas.add(formula.closedForm(), all.left(formula),
                Prose.of("m ≥ 0").and(all.side(formula))));
        return output.over().isEmpty() ? List.of() : headed("Over the cycles", formulas);
    }

    /** Of the formulas over the cycles. */
    static Stream<Proved> proofs(Timetable timetable, ScheduledOutput output) {
        CycleFormulas all = new CycleFormulas(timetable, output);
        return output.over().stream().map(formula ->
                Proved.overCycles(all.left(formula).and(all.side(formula)), "schedule", formula));
    }

    /** In both. */
    static List<Block> joint(Timetable timetable, ScheduledOutput output) {
        CycleFormulas all = new CycleFormulas(timetable, output);
        return output.joint().map(formula -> List.<Block>of(new Heading(3, "Both at once"),
                FormulaInSteps.joint(formula, all.leftOfBoth()))).orElse(List.of());
    }

    Prose leftOfBoth() {
        return name.and("(" + ScheduleProse.step(timetable, "m", "j") + ")");
    }

    private static List<Block> headed(String heading, FormulaInSteps formulas) {
        List<Block> blocks = new ArrayList<>(List.of(new Heading(3, heading)));
        blocks.addAll(formulas.blocks());
        return blocks;
    }

    Prose left(CycleFormula formula) {
        return formula.place().map(place -> name.and("(" + ScheduleProse.stepOf(timetable, place.j()) + ")"))
                .orElse(Prose.of("mean of ").and(name).and(" over cycle m"));
    }

    /** Before or after what is done there. */
    Prose side(CycleFormula formula) {
        return formula.place().filter(place -> ScheduleProse.isActed(timetable, endOf(place)))
                .map(place -> Prose.of(place.side() == Side.BEFORE ? ", before " : ", after ")
                        .and(ScheduleProse.done(timetable, endOf(place)))).orElse(Prose.EMPTY);
    }

    /** What is done at the beginning of a cycle is done at the end of the one before. */
    private int endOf(CycleFormula.Place place) {
        return place.j() == 0 ? timetable.period() : place.j();
    }
}
