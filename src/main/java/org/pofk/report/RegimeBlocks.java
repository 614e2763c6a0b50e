package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Timetable;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Labelled;
import org.pofk.schedule.CycleCourse;
import org.pofk.schedule.CycleCourse.Side;
import org.pofk.schedule.PeriodicRegime;
import org.pofk.schedule.ScheduledOutput;
import org.pofk.steps.KnownValue;

/** The cycles of an output in a few lines: what comes before them, what the first is like, and what they tend to. */
final class RegimeBlocks implements PeriodicRegime.Visitor<Labelled> {
    private static final String LONG_RUN = "in the long run";

    private final Timetable timetable;
    private final Style style;

    private RegimeBlocks(Timetable timetable, Style style) {
        this.timetable = timetable;
        this.style = style;
    }

    static List<Block> of(Timetable timetable, ScheduledOutput output, Style style) {
        RegimeBlocks all = new RegimeBlocks(timetable, style);
        List<Block> blocks = new ArrayList<>();
        output.preamble().ifPresent(course -> blocks.add(all.summary("before the cycles", course, 0)));
        output.first().filter(course -> timetable.period() > 1).ifPresent(course ->
                blocks.add(all.summary("first cycle", course, timetable.before())));
        blocks.add(longRun(timetable, output, style));
        return blocks;
    }

    /** What the cycles tend to. */
    static Labelled longRun(Timetable timetable, ScheduledOutput output, Style style) {
        return output.regime().map(regime -> regime.accept(new RegimeBlocks(timetable, style))).orElse(
                new Labelled(LONG_RUN, "not decided: even very many cycles leave it unsettled, or the budget ran out"));
    }

    /** Its average and its highest value in a line. */
    static String inBrief(ScheduledOutput output, Style style) {
        return CycleTables.recurring(output).map(course -> inBrief(course, style))
                .orElse(output.regime().isPresent() ? "nothing that recurs" : "not decided");
    }

    private static String inBrief(CycleCourse course, Style style) {
        String highest = KnownText.of(course.highest().value(), style.digits());
        return highest.equals(KnownText.of(course.lowest().value(), style.digits())) ? "tends to " + highest
                : "average " + KnownText.of(course.average(), style.digits()) + "; highest " + highest;
    }

    @Override
    public Labelled recurring(PeriodicRegime.Recurring recurring) {
        if (recurring.course().steps() == 1 && !ScheduleProse.isActed(timetable, 1)) {
            return new Labelled(LONG_RUN, "tends to "
                    + KnownText.withFraction(recurring.course().average(), style.digits()) + word(recurring.course()));
        }
        return summary(recurring.cycles() == 1 ? LONG_RUN : LONG_RUN + ", over " + recurring.cycles() + " cycles",
                recurring.course(), timetable.before());
    }

    @Override
    public Labelled none(PeriodicRegime.None none) {
        return new Labelled(LONG_RUN, "nothing that recurs: " + none.explanation());
    }

    private Labelled summary(String label, CycleCourse course, int first) {
        return new Labelled(label, Prose.of("average " + KnownText.withFraction(course.average(), style.digits())
                + "; highest ").and(extreme(course.highest(), first)).and("; lowest ")
                .and(extreme(course.lowest(), first))
                .and(word(course)));
    }

    /** @param first the step at j = 0 */
    private Prose extreme(CycleCourse.Extreme extreme, int first) {
        return Prose.of(KnownText.of(extreme.value(), style.digits()) + " at j = " + extreme.j())
                .and(extreme.side() == Side.BEFORE ? ScheduleProse.justBefore(timetable, first + extreme.j())
                        : Prose.EMPTY);
    }

    private static String word(CycleCourse course) {
        return course.average().word() == KnownValue.Word.EXACT ? "; exact" : "; certified, every digit shown is right";
    }
}
