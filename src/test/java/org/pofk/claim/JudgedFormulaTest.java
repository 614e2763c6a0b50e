package org.pofk.claim;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.text.Position;

/** Formulas for p(k) held against what is true: exact, rounded and wrong ones told apart. */
class JudgedFormulaTest {

    static Claim claim(Output output, String text, Claim.Steps steps) {
        return claim(output, text, steps, Optional.empty(), Optional.empty());
    }

    static Claim claim(Output output, String text, Claim.Steps steps, Optional<Claim.Within> within,
            Optional<Claim.SafeSide> side) {
        return new Claim(1, "formula", output.name(), new Statement.PofK(List.of(
                new Statement.PofK.Part(output, WrittenFormulas.parsed(text)))), Optional.empty(), steps,
                Optional.empty(), within, side, Optional.empty(), new Position("claims.yaml", 1, 1));
    }

    static Judgement judged(Truth truth, Output output, String text) {
        return Judging.of(claim(output, text, Claim.Steps.ALL), truth);
    }

    static List<Output> outputs(Chain chain) {
        return chain.outputs().isEmpty() ? Outputs.states(chain) : chain.outputs();
    }

    @Test
    void everyNumberRoundedIsRounded() {
        int count = 0;
        for (String name : List.of("pump-pair", "standby-trio", "level-controller", "tandem-presses")) {
            Chain chain = Models.pattern(name);
            Truth truth = Truth.of(chain);
            for (Output output : outputs(chain)) {
                for (WrittenFormulas.Notation notation : WrittenFormulas.Notation.values()) {
                    for (int digits : List.of(3, 4, 6, 10)) {
                        String text = WrittenFormulas.of(truth.about(output), notation, digits);
                        Judgement judgement = judged(truth, output, text);
                        assertTrue(judgement.isRight(), () -> name + ", " + output.name() + ": " + text + judgement);
                        count++;
                    }
                }
            }
        }
        assertEquals(0, count % 20);
        assertTrue(count >= 100, "cases: " + count);
    }
}
