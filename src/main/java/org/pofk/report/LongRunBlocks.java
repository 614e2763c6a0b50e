package org.pofk.report;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import org.pofk.answer.DerivedOutput;
import org.pofk.longrun.HighPowers;
import org.pofk.longrun.LongRun;
import org.pofk.longrun.LongRunChecks;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;

/** What outputs do as k grows, how that was found, and where a habit would have found something else. */
final class LongRunBlocks {
    private final Style style;
    private final List<Block> blocks = new ArrayList<>();

    private LongRunBlocks(Style style) {
        this.style = style;
    }

    static List<Block> of(Report report, Style style) {
        LongRunBlocks all = new LongRunBlocks(style);
        all.blocks.add(new Heading(2, "Long run"));
        for (int i = 0; i < report.derived().outputs().size(); i++) {
            DerivedOutput output = report.derived().outputs().get(i);
            int place = i;
            output.longRun().ifPresent(checks -> {
                all.blocks.add(new Heading(3, OutputProse.atStep(output.output())));
                all.output(output, checks, report);
                report.figures().get(place).settling().ifPresent(settling -> all.label("settles",
                        SettlingProse.of(settling, checks.byPoles(), style.digits())));
                all.beware(checks);
            });
        }
        return all.blocks.size() > 1 ? all.blocks : List.of();
    }

    private void output(DerivedOutput output, LongRunChecks checks, Report report) {
        label("long run", new LongRunProse(style.digits()).of(checks.byPoles()));
        label("found by", LongRunProse.ways(checks));
        if (checks.byPoles() instanceof LongRun.Cycle cycle
                && !checks.chainPeriod().equals(BigInteger.valueOf(cycle.period()))) {
            label("period", "of this output " + cycle.period() + ", of the chain itself " + checks.chainPeriod());
        }
        output.absent().ifPresent(found -> blocks.add(new Labelled("eigenvalues", AbsentProse.of(found))));
    }

    private void beware(LongRunChecks checks) {
        checks.highPowers().stream().flatMap(verdict -> verdict.habits().stream())
                .filter(stop -> stop.outcome() != HighPowers.Outcome.RIGHT)
                .forEach(stop -> label("beware", LongRunWarning.of(stop, style.digits())));
    }

    private void label(String label, String text) {
        blocks.add(new Labelled(label, text));
    }
}
