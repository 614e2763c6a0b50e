package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.answer.Simulation;
import org.pofk.answer.Simulation.Sample;
import org.pofk.answer.Simulation.Series;
import org.pofk.chain.Model;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Table;

/** Random runs of a chain beside its exact values, as a document. */
public final class SimulationDocument {
    private SimulationDocument() {
    }

    public static Document of(Model model, Simulation simulation, Style style) {
        List<Block> blocks = new ArrayList<>(ModelHead.of(model));
        blocks.add(sampled(simulation.runs(), simulation.seed()));
        if (model.schedule().filter(each -> !each.recurring().isEmpty()).isPresent()) {
            blocks.add(new Paragraph("At each step k what is read is read after the actions done there."));
        }
        for (Series series : simulation.series()) {
            blocks.add(new Heading(2, OutputProse.title(series.output())));
            blocks.addAll(series(series, style));
        }
        blocks.add(Caution.of(model));
        return new Document(blocks);
    }

    /** How the runs were made. */
    static Block sampled(int runs, long seed) {
        return new Paragraph("Sampled: " + runs + " runs, seed " + seed
                + ". Each interval holds the true value with 99.9 % confidence, per step, not jointly.");
    }

    /** One output's samples beside its exact values. */
    static List<Block> series(Series series, Style style) {
        return List.of(table(series, style.digits()), new Paragraph(summary(series)));
    }

    private static Table table(Series series, int digits) {
        return Table.ofText("", List.of("k", "sampled", "from", "to", "p(k)", "inside"),
                series.samples().stream().map(sample -> row(sample, series.method(), digits)).toList());
    }

    private static List<String> row(Sample sample, Simulation.Method method, int digits) {
        return List.of(String.valueOf(sample.k()), SampledNumber.text(sample.estimate(), method),
                SampledNumber.text(sample.interval().lower(), method),
                SampledNumber.text(sample.interval().upper(), method), SampledNumber.value(sample, method, digits), switch (sample.verdict()) {
                    case INSIDE -> "yes";
                    case OUTSIDE -> "NO";
                    case CANT_TELL -> "can't tell here";
                });
    }

    private static String summary(Series series) {
        String method = switch (series.method()) {
            case CLOPPER_PEARSON -> "Intervals by Clopper and Pearson. ";
            case HOEFFDING -> "Intervals by Hoeffding. ";
        };
        long unclear = series.samples().size() - series.checked();
        String few = "fewer than " + Simulation.HITS_NEEDED + " hits are expected, which is no check.";
        if (series.checked() == 0) {
            return method + "At no step is the exact value checked: " + few;
        }
        String held = series.checked() == 1
                ? (series.inside() == 1 ? "The one step checked holds" : "The one step checked does NOT hold")
                : series.inside() + " of " + series.checked() + " steps hold";
        return method + held + " the exact value" + (unclear == 0 ? "." : "; at " + unclear + " " + few);
    }
}
