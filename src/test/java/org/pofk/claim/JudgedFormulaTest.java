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
        int rounded = 0;
        int exact = 0;
        for (Chain chain : Models.all()) {
            Truth truth = Truth.of(chain);
            for (Output output : outputs(chain)) {
                OutputTruth about = truth.about(output);
                for (WrittenFormulas.Notation notation : WrittenFormulas.Notation.values()) {
                    for (int digits : List.of(3, 4, 6, 10)) {
                        String text = WrittenFormulas.of(about, notation, digits);
                        long start = System.nanoTime();
                        Judgement judgement = judged(truth, output, text);
                        long ms = (System.nanoTime() - start) / 1_000_000;
                        if (!judgement.isRight() || ms > 50) {
                            System.out.println(ms + " ms " + judgement.verdict() + " " + output.name() + " of "
                                    + chain.size() + ": " + text + " | " + judgement.numbers().stream().filter(n -> n.fit() != org.pofk.meaning.Fit.RIGHT).toList() + judgement.remarks());
                        }
                        rounded += judgement.verdict() == Verdict.ROUNDED ? 1 : 0;
                        exact += judgement.verdict() == Verdict.EXACT ? 1 : 0;
                    }
                }
            }
        }
        System.out.println("rounded " + rounded + " exact " + exact);
    }
}
