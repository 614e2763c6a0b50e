package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.pofk.chain.Chain;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Timetable;
import org.pofk.chain.Timetable.Moment;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.schedule.CycleCourse;
import org.pofk.schedule.CycleCourse.Reading;
import org.pofk.steps.KnownValue;

/** A chain with its timetable, and courses of outputs, as Python. */
final class PythonSchedule {
    /** Behind a chain and the tools. */
    static final String BEGIN = "begin = stepped(start, preamble)[-1][1]  # where the first cycle begins\n"
            + "cycle_path = []";

    private static final int BITS = 128;

    private PythonSchedule() {
    }

    static String of(Chain chain, Timetable timetable) {
        List<String> lines = new ArrayList<>(List.of(
                "states = [" + chain.states().stream().map(Python::text).collect(Collectors.joining(", ")) + "]",
                "start = " + Python.numbers(chain.start()),
                "moves = " + matrices(timetable.moves()),
                "actions = " + matrices(timetable.actions().stream().map(action -> action.matrix()).toList()),
                "# steps: the place of the move, None where there is none, and those of the actions done behind it",
                "preamble = " + moments(timetable.preamble()),
                "cycle = " + moments(timetable.cycle())));
        if (chain.kind() == Chain.Kind.CHAIN) {
            lines.addAll(List.of("require(\"what leaves every state adds up to one, nothing is negative\",",
                    "        all(weight > 0 for matrix in moves + actions for _, _, weight in matrix) and",
                    "        all(sum(weight for source, _, weight in matrix if source == state) == 1",
                    "            for matrix in moves + actions for state in range(len(states))))",
                    "require(\"the start adds up to one\", sum(start) == 1 and min(start) >= 0)"));
        }
        return String.join("\n", lines);
    }

    /** What steps such a chain, behind it: cells. */
    static List<String> tools() {
        return List.of(Python.tools("polynomials"), Python.tools("proof"), Python.tools("long_run"),
                Python.tools("decimals"), Python.tools("printed"), Python.tools("schedule"), Python.tools("cycles"),
                BEGIN);
    }

    private static String matrices(List<SparseMatrix> matrices) {
        return matrices.stream().map(PythonSchedule::matrix).collect(Collectors.joining(",\n    ", "[", "]"));
    }

    private static String matrix(SparseMatrix matrix) {
        List<String> entries = new ArrayList<>();
        for (int from = 0; from < matrix.size(); from++) {
            for (SparseMatrix.Entry entry : matrix.columns().get(from)) {
                entries.add("(" + from + ", " + entry.row() + ", Fraction(\"" + entry.value() + "\"))");
            }
        }
        return entries.stream().collect(Collectors.joining(",\n     ", "[", "]"));
    }

    /** Equal steps in a row are written once. */
    private static String moments(List<Moment> moments) {
        List<String> parts = new ArrayList<>();
        int from = 0;
        for (int i = 1; i <= moments.size(); i++) {
            if (i == moments.size() || !moments.get(i).equals(moments.get(from))) {
                Moment moment = moments.get(from);
                parts.add((i - from) + " * [(" + (moment.move().isPresent() ? moment.move().getAsInt() : "None") + ", "
                        + moment.actions() + ")]");
                from = i;
            }
        }
        return parts.isEmpty() ? "[]" : String.join(" + ", parts);
    }

    /** Requires that a course is what was stepped: {@code pairs} holds the states of its steps. */
    static String course(String what, CycleCourse course, String pairs) {
        return String.join("\n", "pairs = " + pairs,
                "before = [read(c, constant, x) for x, _ in pairs]",
                "after = [read(c, constant, x) for _, x in pairs]",
                "require(" + Python.text(what + ": just before what is done, at every step") + ", holds(\"\"\"",
                values(course.readings().stream().map(Reading::before)), "\"\"\", before))",
                "require(" + Python.text(what + ": just after it, at every step") + ", holds(\"\"\"",
                values(course.readings().stream().map(Reading::after)), "\"\"\", after))",
                "require(" + Python.text(what + ": average, highest and lowest value") + ", holds(\"\"\"",
                values(Stream.of(course.average(), course.highest().value(), course.lowest().value())),
                "\"\"\", summary(before, after)))");
    }

    static String values(Stream<KnownValue> values) {
        return values.map(PythonSchedule::value).collect(Collectors.joining("\n"));
    }

    /** The number, or where it is long or not known exactly the interval that holds it. */
    static String value(KnownValue value) {
        return value.exact().map(Rational::toString).orElseGet(() -> {
            Ball ball = value.enclosure().enclose(BITS);
            return ball.lower() + ".." + ball.upper();
        });
    }
}
