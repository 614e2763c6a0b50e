package org.pofk.report;

import java.util.List;
import java.util.Optional;
import org.pofk.answer.Simulation;
import org.pofk.answer.Simulation.Sample;
import org.pofk.answer.Simulation.Series;
import org.pofk.chain.Model;

/** What {@code simulate} found, as JSON: format {@code pofk-simulation}. */
public final class SimulationJson {
    private SimulationJson() {
    }

    public static String write(Model model, Simulation simulation, int digits) {
        return Json.ofObject(json -> {
            JsonHead.write(json, "pofk-simulation", "simulate", model);
            json.count("runs", simulation.runs());
            json.text("seed", String.valueOf(simulation.seed()));
            json.text("confidence", SampledNumber.number(Simulation.CONFIDENCE));
            json.list("outputs", simulation.series(), series -> series(json, series, digits));
        });
    }

    private static void series(Json json, Series series, int digits) {
        json.object(() -> {
            json.text("name", series.output().name());
            json.text("word", "sampled");
            json.list("samples", series.samples(), sample -> sample(json, sample, digits));
        });
    }

    private static void sample(Json json, Sample sample, int digits) {
        json.object(() -> {
            json.count("k", sample.k());
            json.text("estimate", SampledNumber.number(sample.estimate()));
            json.texts("interval", List.of(SampledNumber.number(sample.interval().lower()),
                    SampledNumber.number(sample.interval().upper())));
            json.object("value", () -> {
                json.text("exact", sample.exact().isExact()
                        ? Optional.of(sample.exact().middle().toString()) : Optional.empty());
                json.text("decimal", SampledNumber.valueNumber(sample, digits));
            });
            json.text("inside", switch (sample.verdict()) {
                case INSIDE -> "yes";
                case OUTSIDE -> "no";
                case CANT_TELL -> "can't tell";
            });
        });
    }
}
