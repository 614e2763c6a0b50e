package org.pofk.answer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.Pofk;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Outputs;
import org.pofk.exact.Rational;
import org.pofk.steps.StepValue;

/** Formulas from each state are the entries of A^k. */
class PowerModelTest {
    private static final int STEPS = 20;

    @Test
    void theFormulasAreTheEntriesOfThePowersAndAddUpToOne() throws Exception {
        int entries = 0;
        for (Path file : PatternFiles.all()) {
            Model model = Pofk.read(file);
            Chain chain = model.chain();
            if (chain.kind() == Chain.Kind.CHAIN && chain.size() <= 6) {
                PowerModel found = PowerModel.of(model, Outputs.states(chain), List.of(3), partly -> { });
                for (int from = 0; from < chain.size(); from++) {
                    entries += equalToPowers(chain, found, from, file);
                }
            }
        }
        assertTrue(entries > 3_000, entries + " entries");
    }

    private static int equalToPowers(Chain chain, PowerModel found, int from, Path file) {
        List<Rational> state = IntStream.range(0, chain.size()).mapToObj(i -> i == from ? Rational.ONE : Rational.ZERO)
                .toList();
        int compared = 0;
        for (int k = 0; k <= STEPS; k++) {
            Rational sum = Rational.ZERO;
            for (int to = 0; to < chain.size(); to++) {
                DerivedOutput output = found.found().get(to).byStart().get(from);
                Rational value = output.closedForm().orElseThrow().expansion().valueAt(k);
                assertEquals(state.get(to), value, file + ": " + from + " to " + to + " in " + k);
                if (k == 3) {
                    assertEquals(List.of(new StepValue(3, Optional.of(value),
                            output.values().get(0).enclosure())), output.values());
                }
                sum = sum.plus(value);
                compared++;
            }
            assertEquals(Rational.ONE, sum);
            state = chain.matrix().times(state);
        }
        return compared;
    }

    /** From each state as from a start there. */
    @Test
    void theLongRunsAreThoseOfAStartInThatState() throws Exception {
        Model model = Pofk.read(Path.of("test-data/models/relined-main.yaml"));
        Chain chain = model.chain();
        PowerModel found = PowerModel.of(model, Outputs.states(chain), List.of(), partly -> { });
        for (int from = 0; from < chain.size(); from++) {
            int start = from;
            Chain started = new Chain(chain.kind(), chain.states(), chain.matrix(), IntStream.range(0, chain.size())
                    .mapToObj(i -> i == start ? Rational.ONE : Rational.ZERO).toList(), chain.sets(), List.of());
            for (int to = 0; to < chain.size(); to++) {
                assertEquals(Chains.longRun(started, Chains.state(started, to)),
                        found.found().get(to).byStart().get(from).longRun().orElseThrow().byPoles());
            }
        }
    }
}
