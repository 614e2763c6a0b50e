package org.pofk.report;

import java.util.List;
import java.util.Optional;
import org.pofk.answer.Simulation;
import org.pofk.answer.Simulation.Sample;
import org.pofk.chain.Model;
import org.pofk.exact.Rational;

/** What {@code simulate} found, a row for each output and step. */
public final class SimulationTable {
    private SimulationTable() {
    }

    /** @param digits significant digits of the true value's decimals */
    public static Document.Table of(Model model, Simulation simulation, int digits) {
        StepColumns steps = StepColumns.of(model);
        Rows rows = new Rows(digits, Rows.words("output"), steps.header(),
                Rows.words("sampled", "from", "to", "exact", "decimal", "inside"));
        simulation.series().forEach(series -> series.samples().forEach(sample -> rows.add(
                List.of(Prose.name(series.output().name())), steps.cells(sample.k()), sampled(sample),
                exact(sample, digits), Rows.words(inside(sample)))));
        return rows.table();
    }

    private static List<Prose> sampled(Sample sample) {
        return Rows.words(SampledNumber.number(sample.estimate()), SampledNumber.number(sample.interval().lower()),
                SampledNumber.number(sample.interval().upper()));
    }

    private static List<Prose> exact(Sample sample, int digits) {
        Optional<Rational> known = Optional.of(sample.exact()).filter(ball -> ball.isExact()).map(ball -> ball.middle());
        return Rows.words(known.map(Rational::toString).orElse(""), SampledNumber.valueNumber(sample, digits));
    }

    private static String inside(Sample sample) {
        return switch (sample.verdict()) {
            case INSIDE -> "yes";
            case OUTSIDE -> "no";
            case CANT_TELL -> "can't tell";
        };
    }
}
