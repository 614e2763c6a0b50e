package org.pofk.report;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.pofk.chain.Timetable;
import org.pofk.modes.ClosedForm;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.schedule.CycleFormula;
import org.pofk.schedule.JointFormula;
import org.pofk.schedule.StretchFormula;
import org.pofk.steps.KnownValue;
import org.pofk.text.Alphabet;
import org.pofk.transform.Transform;

/**
 * Proofs of formulas under a schedule as Python: over the cycles by recurrence and windows of terms that are stepped
 * through the timetable, within a cycle at every step there is.
 */
final class PythonCycles {
    /** More steps in fractions that grow with each would keep a reader waiting. */
    private static final int STEPS_AT_MOST = 1200;
    private static final int STATES_AT_MOST = 40;

    private final Timetable timetable;

    PythonCycles(Timetable timetable) {
        this.timetable = timetable;
    }

    /** Whether the terms that prove a formula are stepped again. */
    boolean isProved(CycleFormula formula) {
        int cycles = formula.chain().size() + 1 + formula.closedForm().transform().recurrence().degree();
        return formula.chain().size() <= STATES_AT_MOST && (long) cycles * timetable.period() <= STEPS_AT_MOST
                && PythonOutput.isEvaluated(formula.closedForm());
    }

    /** A formula over the cycles of the output that {@code c} and {@code constant} read, at its place or its mean. */
    List<String> formula(Prose name, CycleFormula formula, int digits) {
        return formula(name, formula, formula.place().map(place -> "lambda before, after: "
                + (place.side() == Side.BEFORE ? "before[" : "after[") + place.j() + "]").orElse("mean"), digits);
    }

    /** What cycles add to an output. */
    List<String> added(Prose name, CycleFormula formula, int digits) {
        return formula(name, formula, "lambda before, after: after[-1] - after[0]", digits);
    }

    private static List<String> formula(Prose name, CycleFormula formula, String reading, int digits) {
        Transform transform = formula.closedForm().transform();
        int order = transform.recurrence().degree();
        List<String> lines = new ArrayList<>(List.of(named(name)));
        lines.addAll(PythonOutput.claimed(transform));
        lines.addAll(List.of("", "n, d = taking_part(constant), " + order,
                "y = over_cycles(c, constant, n + d, " + reading + ")"));
        lines.addAll(PythonOutput.proof("m"));
        lines.addAll(PythonOutput.parts(formula.closedForm(), "m"));
        return Stream.concat(Stream.of(String.join("\n", lines)), PythonFormulas.of(formula.closedForm(), digits,
                transform.proof().order() + order - 1).cells().stream()).toList();
    }

    private static String named(Prose name) {
        return "name = " + Python.text(new Spelling(Alphabet.UNICODE, StandardCharsets.UTF_8).of(name)
                .replace(Spelling.NO_BREAK, ' '));
    }

    /** @param pairs the states of a cycle that begins where the formula's does, in Python */
    static String within(Prose name, StretchFormula formula, String pairs) {
        List<String> lines = new ArrayList<>(List.of(named(name)));
        lines.addAll(PythonOutput.alone(formula.closedForm()));
        lines.addAll(List.of("", "y = stretch(c, constant, " + pairs + ", " + formula.from() + ", " + formula.to()
                + ")",
                "require(f\"{name}: the formula is what is stepped, at every one of its steps\",",
                "        closed_form(impulses, parts, len(y)) == y)"));
        return String.join("\n", lines);
    }

    /** In m and j: r powers, so that n + r cycles decide every m, at each j. */
    static String joint(Prose name, JointFormula formula) {
        List<String> lines = new ArrayList<>(List.of(named(name), "joint = []"));
        formula.terms().forEach(term -> {
            lines.addAll(PythonOutput.alone(term.within()));
            lines.add("joint.append((Fraction(\"" + term.base() + "\"), closed_form(impulses, parts, "
                    + (formula.to() + 1) + ")))");
        });
        lines.addAll(List.of("", "cycles = taking_part(constant) + len(joint)",
                "require(f\"{name}: the formula is what is stepped at every j in the first {cycles} cycles, and so in"
                        + " all\", all(",
                "    stretch(c, constant, cycle_of(m), 0, " + formula.to() + ") == [sum(base ** m * at[j] for base, at"
                        + " in joint)",
                "                                                  for j in range(" + (formula.to() + 1) + ")]",
                "    for m in range(cycles)))"));
        return String.join("\n", lines);
    }

    /** Whether a formula is evaluated at each of its steps. */
    boolean isProved(ClosedForm form, int steps) {
        return steps <= STEPS_AT_MOST && PythonOutput.isEvaluated(form);
    }

    /** That values at some steps, ascending, are those stepped. */
    static String values(String what, List<Integer> steps, List<KnownValue> values) {
        return String.join("\n", "require(" + Python.text(what) + ", holds(\"\"\"",
                PythonSchedule.values(values.stream()), "\"\"\", at_steps(c, constant, " + steps + ")))");
    }

    /** Whether a step is near enough to be reached. */
    static boolean isStepped(int k) {
        return k <= STEPS_AT_MOST;
    }
}
