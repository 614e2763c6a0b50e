package org.pofk;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.LongRun;
import org.pofk.chain.Model;
import org.pofk.exact.Rational;
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
    void aNameThatStandsForNothingIsRefused() throws RefusedException {
        Model model = Pofk.read(PUMPS);
        assertThrows(RefusedException.class, () -> Pofk.outputs(model, "lots"));
    }
}
