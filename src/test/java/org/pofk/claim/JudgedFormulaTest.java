package org.pofk.claim;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.PlainText;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.Fit;
import org.pofk.meaning.Precision;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

/** Formulas for p(k) held against what is true: exact, rounded, approximate and wrong ones told apart. */
class JudgedFormulaTest {
    private static final int MOST_STATES = 4;

    private static Claim claim(Output output, String text, Claim.Steps steps, Optional<Claim.Within> within,
            Optional<Claim.SafeSide> side) {
        return new Claim(1, "formula", output.name(), new Statement.PofK(List.of(
                new Statement.PofK.Part(output, WrittenFormulas.parsed(text)))), Optional.empty(), steps,
                Optional.empty(), within, side, Optional.empty(), new Position("claims.yaml", 1, 1));
    }

    static Judgement judged(Truth truth, Output output, String text) {
        return judged(truth, output, text, Claim.Steps.ALL);
    }

    private static Judgement judged(Truth truth, Output output, String text, Claim.Steps steps) {
        return Judging.of(claim(output, text, steps, Optional.empty(), Optional.empty()), truth);
    }

    static List<Output> outputs(Chain chain) {
        return chain.outputs().isEmpty() ? Outputs.states(chain) : chain.outputs();
    }

    /** A formula as written, about an output. */
    private record Case(Truth truth, Output output, String text) {
        Judgement judged() {
            return JudgedFormulaTest.judged(truth, output, text);
        }

        Case with(String other) {
            return new Case(truth, output, other);
        }

        ExponentialSum meaning() {
            try {
                return ExponentialSum.of(WrittenFormulas.parse(text), Precision.AS_WRITTEN);
            } catch (RefusedException e) {
                throw new AssertionError(text, e);
            }
        }
    }

    private static List<Case> cases(List<Integer> digits, List<WrittenFormulas.Notation> notations) {
        List<Case> cases = new ArrayList<>();
        for (Chain chain : Models.all().stream().filter(each -> each.size() <= MOST_STATES).toList()) {
            Truth truth = Truth.of(chain);
            for (Output output : outputs(chain)) {
                notations.stream().flatMap(notation -> digits.stream().map(each ->
                                WrittenFormulas.of(truth.about(output), notation, each))).distinct()
                        .forEach(text -> cases.add(new Case(truth, output, text)));
            }
        }
        return cases;
    }

    private static Case pumps(String text) {
        Truth truth = Truth.of(Models.pattern("pump-pair"));
        return new Case(truth, truth.chain().outputs().stream()
                .filter(output -> output.name().equals("lost")).findFirst().orElseThrow(), text);
    }

    @Test
    void everyNumberRoundedIsRounded() {
        int count = 0;
        for (Case each : cases(List.of(3, 6, 10), List.of(WrittenFormulas.Notation.values()))) {
            Judgement judgement = each.judged();
            assertTrue(judgement.isRight(), () -> each.text + ": " + judgement);
            assertTrue(Judging.isRight(claim(each.output, each.text, Claim.Steps.ALL, Optional.empty(),
                    Optional.empty()), each.truth), each.text);
            count++;
        }
        assertTrue(count > 400, "cases: " + count);
    }

    @Test
    void oneDigitAlteredIsWrong() {
        Random random = new Random(11);
        int count = 0;
        for (Case each : cases(List.of(3, 5, 8), List.of(WrittenFormulas.Notation.values()))) {
            Optional<String> altered = AlteredDigits.of(each.text, random);
            if (altered.isPresent()) {
                Judgement judgement = each.with(altered.get()).judged();
                assertEquals(Verdict.WRONG, judgement.verdict(), () -> each.text + " as " + altered.get());
                count++;
            }
        }
        assertTrue(count > 300, "cases: " + count);
    }

    @Test
    void theLargestErrorIsThatOfSomeStepAndOfNoneMore() {
        int reached = 0;
        for (Case each : cases(List.of(4), List.of(WrittenFormulas.Notation.POLAR))) {
            Judgement judgement = each.judged();
            if (judgement.verdict() == Verdict.ROUNDED && judgement.difference().isPresent()) {
                Rational size = judgement.difference().get().size().value();
                OptionalLong at = judgement.difference().get().at();
                ExponentialSum meaning = each.meaning();
                OutputTruth about = each.truth.about(each.output);
                for (long k = 0; k <= 500; k += k < 60 ? 1 : 20) {
                    assertTrue(error(meaning, about, k).upper().compareTo(size) <= 0, each.text + " at " + k);
                }
                if (at.isPresent()) {
                    Rational most = error(meaning, about, at.getAsLong()).upper();
                    // two digits, rounded up: at most a tenth more
                    assertTrue(size.times(Rational.of(10, 11)).compareTo(most) <= 0, each.text + judgement);
                    reached++;
                }
            }
        }
        assertTrue(reached > 30, "reached: " + reached);
    }

    private static Ball error(ExponentialSum meaning, OutputTruth about, long k) {
        return meaning.valueAt(k).enclose(200).real().minus(Ball.of(about.valueAt(k), 200)).abs();
    }

    @Test
    void theExactFormulaIsExact() {
        int count = 0;
        for (Chain chain : Models.all().stream().filter(each -> each.size() <= MOST_STATES).toList()) {
            Truth truth = Truth.of(chain);
            for (Output output : outputs(chain)) {
                Optional<Formula> exact = truth.about(output).closedForm().exactFormula();
                if (exact.isPresent()) {
                    for (PlainText plain : List.of(PlainText.ASCII, PlainText.UNICODE)) {
                        String text = plain.write(exact.get());
                        assertEquals(Verdict.EXACT, judged(truth, output, text).verdict(), text);
                        count++;
                    }
                }
            }
        }
        assertTrue(count > 80, "cases: " + count);
    }

    @Test
    void withoutItsImpulsesAFormulaHoldsFromWhereTheyEnd() {
        int count = 0;
        for (Case each : cases(List.of(5), List.of(WrittenFormulas.Notation.POLAR))) {
            OutputTruth about = each.truth.about(each.output);
            int from = about.impulses().size();
            if (from > 0 && !about.poles().isEmpty()) {
                String text = WrittenFormulas.withoutImpulses(about, WrittenFormulas.Notation.POLAR, 5);
                assertTrue(judged(each.truth, each.output, text, new Claim.Steps(from, OptionalLong.empty())).isRight(),
                        text);
                assertEquals(Verdict.WRONG, each.with(text).judged().verdict(), text);
                count++;
            }
        }
        assertTrue(count > 3, "cases: " + count);
    }

    @Test
    void aNumberCutOffIsRoundedAndSaid() {
        Judgement judgement = pumps("0.00817 - 0.01726*0.4508^k + 0.009084*0.2317^k").judged();
        assertEquals(Verdict.ROUNDED, judgement.verdict(), judgement::toString);
        assertEquals(1, judgement.numbers().stream().filter(number -> number.fit() == Fit.CUT_OFF).count());
        assertTrue(judgement.remarks().get(0).startsWith("0.00817 is cut off, not rounded"), judgement::toString);
    }

    @Test
    void anApproximationHoldsForEveryStepOrNot() {
        Case steady = pumps("0.008176");
        Claim.Steps later = new Claim.Steps(8, OptionalLong.empty());
        assertEquals(Verdict.APPROXIMATE, within(steady, later, "1/100", Optional.empty()).verdict());
        assertEquals(Verdict.APPROXIMATE,
                within(steady.with("0.0082"), later, "1/100", Optional.of(Claim.SafeSide.ABOVE)).verdict());
        Judgement below = within(steady.with("0.0082"), later, "1/100", Optional.of(Claim.SafeSide.BELOW));
        assertEquals(Verdict.WRONG, below.verdict());
        assertEquals(8, below.firstWrongStep().getAsLong());
        Judgement early = within(steady, Claim.Steps.ALL, "1/100", Optional.empty());
        assertEquals(Verdict.WRONG, early.verdict());
        assertEquals(0, early.firstWrongStep().getAsLong(), "p(0) is zero: no relative error is small enough");
    }

    private static Judgement within(Case formula, Claim.Steps steps, String amount, Optional<Claim.SafeSide> side) {
        return Judging.of(claim(formula.output, formula.text, steps,
                Optional.of(new Claim.Within(Rational.parse(amount), true)), side), formula.truth);
    }

    @Test
    void theWrongCoefficientIsNamedWithItsRightValue() {
        Judgement judgement = pumps("0.008176 - 0.01762*0.4508^k + 0.009084*0.2317^k").judged();
        assertEquals(Verdict.WRONG, judgement.verdict());
        assertEquals(0, judgement.firstWrongStep().getAsLong());
        assertEquals(List.of("0.01726"), judgement.numbers().stream().filter(number -> number.fit() == Fit.WRONG)
                .map(Judgement.JudgedNumber::right).toList());
        assertEquals("0.008176 - 0.01726*0.4508^k + 0.009084*0.2317^k", judgement.right());
    }

    @Test
    void formulasOfAllStatesSumToOneOrThatIsSaid() {
        Truth truth = Truth.of(Models.pattern("pump-pair"));
        Judgement right = all(truth, "");
        assertEquals(Verdict.ROUNDED, right.verdict(), right::toString);
        Judgement wrong = all(truth, " + 0.01");
        assertEquals(Verdict.WRONG, wrong.verdict());
        assertTrue(wrong.remarks().contains("the probabilities over all states don't sum to one at k = 0"),
                wrong::toString);
    }

    /** All states, the last with something added. */
    private static Judgement all(Truth truth, String added) {
        List<Output> states = Outputs.states(truth.chain());
        List<Statement.PofK.Part> parts = new ArrayList<>();
        for (Output state : states) {
            String text = WrittenFormulas.of(truth.about(state), WrittenFormulas.Notation.POLAR, 5);
            parts.add(new Statement.PofK.Part(state, WrittenFormulas.parsed(
                    parts.size() == states.size() - 1 ? text + added : text)));
        }
        return Judging.of(new Claim(1, "formula", "all", new Statement.PofK(parts), Optional.empty(), Claim.Steps.ALL,
                Optional.empty(), Optional.empty(), Optional.empty(), Optional.empty(),
                new Position("claims.yaml", 1, 1)), truth);
    }

    @Test
    void theModesThatDifferAreTold() throws RefusedException {
        Case wrong = pumps("0.008176 - 0.01726*0.4805^k + 0.009084*0.2317^k");
        Statement.PofK.Part part = new Statement.PofK.Part(wrong.output, WrittenFormulas.parsed(wrong.text));
        List<ModeDifferences.Entry> different = ModeDifferences.of(claim(wrong.output, wrong.text, Claim.Steps.ALL,
                Optional.empty(), Optional.empty()), part, wrong.truth).different();
        assertEquals(1, different.size(), different::toString);
        assertEquals(ModeDifferences.Difference.BASE, different.get(0).difference());
        assertEquals(1, different.get(0).terms().size());
    }
}
