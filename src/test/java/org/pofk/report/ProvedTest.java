package org.pofk.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.pofk.Pofk;
import org.pofk.answer.Increment;
import org.pofk.answer.Passage;
import org.pofk.answer.ProofWindow;
import org.pofk.answer.Total;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Outputs;
import org.pofk.exact.Rational;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Display;
import org.pofk.report.Document.Labelled;
import org.pofk.text.RefusedException;

/** Formulas in sections of a report, and what proves them. */
class ProvedTest {
    private static final Style STYLE = new Style(6, Style.Angles.RADIANS);

    private static Model model(String pattern) throws RefusedException {
        return Pofk.read(Path.of("test-data/models", pattern + ".yaml"));
    }

    private static long formulas(List<Block> blocks) {
        return blocks.stream().filter(Display.class::isInstance).map(block -> ((Display) block).left()).distinct()
                .count();
    }

    private static long saidToHold(List<Block> blocks) {
        return blocks.stream().filter(Labelled.class::isInstance)
                .filter(block -> ((Labelled) block).label().equals(Prose.of("holds"))).count();
    }

    @Test
    void everyFormulaOfAPassageSaysWhyItHolds() throws RefusedException {
        int formulas = 0;
        for (String pattern : List.of("pump-pair", "relined-main", "valve-rotation")) {
            Chain chain = model(pattern).chain();
            for (int state = 0; state < chain.size(); state++) {
                ReportSection section = PassageDocument.section(chain,
                        Passage.of(chain, Set.of(state), Set.of(), List.of(), List.of()), STYLE);
                assertEquals(formulas(section.blocks()), saidToHold(section.blocks()));
                assertEquals(formulas(section.blocks()), section.proofs().size());
                formulas += section.proofs().size();
            }
        }
        assertTrue(formulas > 30, "formulas: " + formulas);
    }

    @Test
    void theWindowOfAPassageIsSteppedByTheStoppedChain() throws RefusedException {
        Chain chain = model("pump-pair").chain();
        Passage passage = Passage.of(chain, Set.of(chain.states().indexOf("none")), Set.of(), List.of(), List.of());
        List<Proved> proofs = PassageDocument.section(chain, passage, STYLE).proofs();
        assertEquals(3, proofs.size());
        for (Proved each : proofs) {
            Optional<ProofWindow> window = ProofWindow.of(each.chain(), each.transform());
            assertEquals(Optional.of(Rational.ZERO), window.map(ProofWindow::sum));
        }
    }

    @Test
    void everyFormulaOfATotalSaysWhyItHolds() throws RefusedException {
        Model model = model("pump-pair");
        Total total = Total.of(model.chain(), Increment.of(model.chain(), Outputs.byDefault(model.chain()).get(0)),
                List.of());
        List<Block> blocks = TotalBlocks.of(model, total, STYLE);
        assertEquals(formulas(blocks), saidToHold(blocks));
        assertEquals(formulas(blocks), TotalBlocks.proofs(total).size());
    }
}
