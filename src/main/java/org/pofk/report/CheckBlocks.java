package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.answer.Comparison;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.Deriving;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;

/** How the formulas were checked besides their proof: powers, stepping in doubles, random runs, a second opinion. */
final class CheckBlocks {
    private final DerivedModel derived;
    private final Style style;
    private final List<Block> blocks = new ArrayList<>();

    private CheckBlocks(DerivedModel derived, Style style) {
        this.derived = derived;
        this.style = style;
    }

    static List<Block> of(DerivedModel derived, Style style) {
        CheckBlocks checks = new CheckBlocks(derived, style);
        checks.write();
        return checks.blocks;
    }

    private void write() {
        if (derived.wanted().extras().isEmpty()) {
            return;
        }
        blocks.add(new Heading(2, "How it was checked"));
        if (derived.outputs().stream().noneMatch(CheckBlocks::isChecked)) {
            blocks.add(new Paragraph("Not reached within the budget."));
            return;
        }
        if (derived.outputs().stream().anyMatch(output -> output.comparison().isPresent())) {
            blocks.add(new Paragraph("Beside the proof, which needs none of this: the formula was compared with what"
                    + " comes out when the model is stepped."));
        }
        if (derived.outputs().stream().flatMap(output -> output.comparison().stream())
                .anyMatch(comparison -> comparison.random().isPresent())) {
            blocks.add(SimulationDocument.sampled(Deriving.RUNS, Deriving.SEED));
        }
        derived.outputs().forEach(this::output);
    }

    private static boolean isChecked(DerivedOutput output) {
        return output.comparison().isPresent() || output.poleCheck().isPresent() || output.secondOpinion().isPresent();
    }

    private void output(DerivedOutput output) {
        blocks.add(new Heading(3, OutputProse.atStep(output.output())));
        if (!isChecked(output)) {
            label("checked", MissingBlocks.NOT_DECIDED);
            return;
        }
        output.comparison().ifPresent(this::compared);
        output.poleCheck().ifPresent(check -> label("poles", PoleProse.of(check)));
        output.secondOpinion().ifPresent(opinion -> label("second opinion", CheckProse.of(opinion)));
        blocks.addAll(MissingBlocks.checks(output, derived.wanted()));
        output.comparison().flatMap(Comparison::random)
                .ifPresent(series -> blocks.addAll(SimulationDocument.series(series, style)));
    }

    private void compared(Comparison comparison) {
        Comparison.ExactPowers powers = comparison.exactPowers();
        label("exact powers", CheckProse.powers(powers));
        label("decimals", "the terms worked out to many digits add up to these powers within "
                + CheckProse.small(powers.modesWithin()));
        label("doubles", CheckProse.doubles(comparison.doubleStepping()));
    }

    private void label(String label, String text) {
        blocks.add(new Labelled(label, text));
    }
}
