package org.pofk.answer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.pofk.Pofk;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Outputs;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRunValues;
import org.pofk.steps.ExactSteps;
import org.pofk.text.RefusedException;

class KeyFiguresTest {
    private static final int STEPS = 80;

    @Test
    void noStepIsHigherThanTheHighestAndTheOneNamedIsTheFirstToReachIt() throws IOException, RefusedException {
        int named = 0;
        int approached = 0;
        List<String> undecided = new ArrayList<>();
        for (String pattern : Files.readAllLines(Path.of("test-data/models/index.txt"))) {
            Model model = Pofk.read(Path.of("test-data/models", pattern.strip() + ".yaml"));
            if (model.chain().size() <= 20) {
                DerivedModel derived = Deriving.of(model, Outputs.byDefault(model.chain()), List.of(), Set.of(),
                        partly -> { });
                for (DerivedOutput output : derived.outputs()) {
                    Optional<Peak> peak = KeyFigures.of(model.chain(), output).highest();
                    if (peak.isEmpty() && !LongRunValues.of(output.longRun().orElseThrow().byPoles()).isEmpty()) {
                        undecided.add(pattern + ": " + output.output().name());
                    }
                    peak.ifPresent(found -> holds(model.chain(), output, found));
                    named += peak.flatMap(Peak::at).isPresent() ? 1 : 0;
                    approached += peak.isPresent() && peak.get().at().isEmpty() ? 1 : 0;
                }
            }
        }
        assertTrue(named >= 15 && approached >= 8, named + " " + approached);
        assertEquals(List.of(), undecided);
    }

    private static void holds(Chain chain, DerivedOutput output, Peak peak) {
        List<Rational> values = ExactSteps.of(chain, List.of(output.output()), STEPS).values().get(0);
        Rational highest = values.stream().reduce(Rational::max).orElseThrow();
        Rational above = peak.value().enclosure().enclose(200).upper();
        assertTrue(highest.compareTo(above) <= 0, output.output().name() + " reaches " + highest);
        if (peak.at().filter(at -> at <= STEPS).isPresent()) {
            int at = Math.toIntExact(peak.at().get());
            assertEquals(highest, values.get(at), output.output().name());
            assertEquals(values.indexOf(highest), at, output.output().name());
        } else if (peak.at().isEmpty()) {
            assertTrue(peak.value().exact().filter(highest::equals).isEmpty(), output.output().name() + " is reached");
        }
    }
}
