package org.pofk.claim;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.claim.Statement.TransformOf.Form;
import org.pofk.text.Position;

/** Transforms held against what is true, in every shape they are written in. */
class JudgedTransformTest {
    private static final int MOST_STATES = 5;

    private static Claim claim(Output output, Form form, String text) {
        return new Claim(1, "transform", output.name(), new Statement.TransformOf(output, form,
                WrittenFormulas.parsed(text)), Optional.empty(), Claim.Steps.ALL, Optional.empty(), Optional.empty(),
                Optional.empty(), Optional.empty(), new Position("claims.yaml", 1, 1));
    }

    /** A transform as written, about an output. */
    private record Case(Truth truth, Output output, Form form, String text) {
        Judgement judged() {
            return Judging.of(claim(output, form, text), truth);
        }

        Case with(String other) {
            return new Case(truth, output, form, other);
        }
    }

    private static List<Case> cases(List<Integer> digits) {
        List<Case> cases = new ArrayList<>();
        for (Chain chain : Models.all().stream().filter(each -> each.size() <= MOST_STATES).toList()) {
            Truth truth = Truth.of(chain);
            for (Output output : JudgedFormulaTest.outputs(chain)) {
                for (Form form : Form.values()) {
                    for (WrittenTransforms.Shape shape : WrittenTransforms.Shape.values()) {
                        digits.forEach(each -> cases.add(new Case(truth, output, form,
                                WrittenTransforms.of(truth.about(output), form, shape, each))));
                    }
                }
            }
        }
        return cases;
    }

    @Test
    void everyNumberRoundedIsRounded() {
        int count = 0;
        for (Case each : cases(List.of(3, 6))) {
            Judgement judgement = each.judged();
            assertTrue(judgement.isRight(), () -> each.text + ": " + judgement);
            count++;
        }
        assertTrue(count > 1_500, "cases: " + count);
    }

    @Test
    void oneDigitAlteredIsWrong() {
        Random random = new Random(7);
        int count = 0;
        for (Case each : cases(List.of(4))) {
            Optional<String> altered = AlteredDigits.of(each.text, random);
            if (altered.isPresent()) {
                Judgement judgement = each.with(altered.get()).judged();
                assertEquals(Verdict.WRONG, judgement.verdict(), () -> each.text + " as " + altered.get());
                count++;
            }
        }
        assertTrue(count > 700, "cases: " + count);
    }

    @Test
    void theTrueFractionIsExactInEveryForm() {
        int count = 0;
        for (Case each : cases(List.of(40))) {
            if (!AlteredDigits.hasLongDecimal(each.text)) {
                assertEquals(Verdict.EXACT, each.judged().verdict(), each.text);
                count++;
            }
        }
        assertTrue(count > 100, "cases: " + count);
    }
}
