package org.pofk;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.pofk.answer.DerivedModel;
import org.pofk.chain.Model;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.text.RefusedException;

class PofkTest {
    private static final Path PUMPS = Path.of("test-data/models/pump-pair.yaml");

    @Test
    void aModelIsReadDerivedAndAsked() throws RefusedException {
        Model model = Pofk.read(PUMPS);
        DerivedModel derived = Pofk.derive(model, Pofk.outputs(model, "lost"));
        assertTrue(derived.isDecided());
        // 23/2813 solves 0 = (A − I) x, sum 1, by hand from the three balance equations
        assertEquals(new LongRun.Limit(Rational.of(23, 2813)), derived.outputs().get(0).longRun().orElseThrow().byPoles());
        assertEquals(List.of("lost", "spare", "load"),
                Pofk.inspect(model).outputs().stream().map(each -> each.output().name()).toList());
    }

    @Test
    void totalsCostsAndPowersAreAsked() throws RefusedException {
        Model link = Pofk.read(Path.of("test-data/costs/burst-error-link.yaml"));
        // a burst begins in 1/50 of the clear hours and lasts 4 hours: 2/27 of the time
        assertEquals(Rational.of(2, 27),
                Pofk.totals(link, Pofk.outputs(link, "fading"), List.of()).totals().get(0).growth().perStep());
        // 2/27 of 120 and 25/27 · 1/50 of 300
        assertEquals(Rational.of(130, 9), Pofk.costs(link, List.of()).totals().get(0).growth().perStep());
        assertEquals(2, Pofk.powers(link, Pofk.outputs(link, "fading")).found().get(0).byStart().size());
    }

    @Test
    void aNameThatStandsForNothingIsRefused() throws RefusedException {
        Model model = Pofk.read(PUMPS);
        assertThrows(RefusedException.class, () -> Pofk.outputs(model, "lots"));
    }
}
