package org.pofk.slip;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.pofk.Pofk;
import org.pofk.answer.Increment;
import org.pofk.answer.Total;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.claim.Answer;
import org.pofk.claim.AnswerOf;
import org.pofk.claim.Claim;
import org.pofk.claim.Claims;
import org.pofk.claim.FormulaText;
import org.pofk.claim.Truth;
import org.pofk.claim.Verdict;
import org.pofk.exact.Rational;
import org.pofk.steps.StepValue;

/** Claims that rest on answers: when it settles, how long until, how much by then, given what. */
class AnswerClaimsTest {
    private static final int STEPS = 160;

    private static Finding finding(String model, String claim) {
        return Reviewing.of(Slipped.claims(model, claim), Variants.NONE).findings().get(0);
    }

    private static List<SlipKind> kinds(Finding finding) {
        return finding.slips().stream().map(Slip::kind).toList();
    }

    /**
     * Feller, An Introduction to Probability Theory and Its Applications I (1968), XIV.3 and XVI.2(c): d (n − d);
     * Grinstead and Snell, Introduction to Probability (1997), example 11.13: 3, 4, 3; Billinton and Allan (1992):
     * (3λ + μ)/(2λ²); Shooman (2002): (5λ + μ)/(6λ²); Bertsekas and Gallager (1992): 1/(1 − p) for each of three
     * packets; Barlow and Proschan (1975): (1/λ) Σ 1/i.
     */
    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            cycle-5              | {mean passage: all, into: '1', from: '0', is: 4}
            cycle-5              | {mean passage: all, into: '2', from: '0', is: 6}
            walk-absorbing-5     | {mean passage: all, into: absorbed, from: '1', is: 3}
            walk-absorbing-5     | {mean passage: all, into: absorbed, is: 4}
            mttf-active-parallel | {mean passage: all, into: failed, is: (3*0.001 + 0.1)/(2*0.001^2)}
            mttf-2oo3-repair     | {mean passage: all, into: failed, is: (5*0.001 + 0.1)/(6*0.001^2)}
            stop-and-wait-arq    | {mean passage: all, into: '0', is: 3/(1 - 1/10)}
            k-out-of-n-no-repair | {mean passage: all, into: '0', is: 100*(1/3 + 1/2 + 1)}
            """)
    void publishedMeansAreExact(String model, String claim) {
        assertEquals(Verdict.EXACT, finding("../published/" + model, claim).verdict());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            {settling step: lost, within: 1%, is: 7}                                | EXACT       |
            {settling step: lost, within: 0.0001, is: 7}                            | EXACT       |
            {settling step: lost, within: 1%, is: 6}                                | WRONG       | INDEX_SHIFTED
            {settling step: lost, within: 2%, is: 4}                                | WRONG       | WRONG_COEFFICIENT
            {settling step: lost, within: 1%, is: 70}                               | WRONG       | DECIMAL_POINT_MOVED
            {mean passage: all, into: none, is: 14300/69}                           | EXACT       |
            {mean passage: all, into: none, is: 207.2}                              | ROUNDED     |
            {mean passage: all, into: none, is: 207, within: 1%}                    | APPROXIMATE |
            {mean passage: all, into: none, is: 208.2}                              | WRONG       | MEAN_OFF_BY_A_STEP
            {mean passage: all, into: none, is: 206.2}                              | WRONG       | MEAN_OFF_BY_A_STEP
            {mean passage: all, into: none, is: 14300/69 + 1}                       | WRONG       | MEAN_OFF_BY_A_STEP
            {mean passage: all, into: none, from: one, is: 207.2}                   | WRONG       | START_MISREAD
            {mean passage: all, into: none, is: 270.2}                              | WRONG       | DIGITS_TRANSPOSED
            {mean passage: all, into: one, is: 11.2821}                             | WRONG       | WRONG_COEFFICIENT
            {sum: lost, to: 5, is: 0.0297}                                          | ROUNDED     |
            {sum: lost, to: 5, is: 0.021854}                                        | WRONG       | TERM_MISSING
            {sum: lost, from: 1, to: 5, is: 0.0275}                                 | WRONG       | WRONG_COEFFICIENT
            {mean: lost, from: 1, to: 12, is: 0.00722}                              | ROUNDED     |
            {mean: lost, from: 1, to: 12, is: 0.00818}                              | WRONG       | END_VALUE_FOR_THE_MEAN
            {value: both, given: running, at: 3, is: 0.8663}                        | ROUNDED     |
            """)
    void pumpPair(String claim, Verdict verdict, SlipKind first) {
        Finding finding = finding("pump-pair", claim);
        assertEquals(verdict, finding.verdict(), finding::toString);
        assertEquals(Optional.ofNullable(first), kinds(finding).stream().findFirst(), finding::toString);
    }

    @Test
    void whereItMayNeverHappenThereIsNoMean() {
        String claim = "{mean passage: all, into: '0', is: …}";
        Finding infinite = finding("../published/walk-absorbing-5", claim.replace("…", "12.345"));
        assertEquals(Verdict.WRONG, infinite.verdict());
        assertEquals("infinite", infinite.judgement().right());
        assertEquals(List.of("there is no such number: 0 is never entered with probability 1/2, so that the mean is infinite; given that it is"
                + " entered, the mean is 4"), infinite.judgement().remarks());
        assertEquals(List.of(), kinds(infinite));
        for (String averaged : List.of("4", "2")) {
            assertEquals(SlipKind.NEVER_IS_AVERAGED,
                    kinds(finding("../published/walk-absorbing-5", claim.replace("…", averaged))).get(0));
        }
        Finding given = finding("../published/walk-absorbing-5", "{mean passage: all, into: '0', given: entered, is: 4}");
        assertEquals(Verdict.EXACT, given.verdict());
        assertEquals(SlipKind.NEVER_IS_AVERAGED, kinds(finding("../published/walk-absorbing-5",
                "{mean passage: all, into: '0', given: entered, is: 2}")).get(0));
        assertEquals(List.of("there is no such number: 1 is never entered"), finding("../published/walk-absorbing-5",
                "{mean passage: all, into: '1', from: '0', is: 3}").judgement().remarks());
    }

    /** Each word where the question has it for its answer, and nowhere else. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '`', textBlock = """
            {mean passage: all, into: relined tight, is: infinite}                                     | EXACT |
            {mean passage: all, into: relined tight, is: never}                                        | WRONG | infinite
            {mean passage: all, into: relined tight, given: entered, is: infinite}                     | WRONG |
            {mean passage: all, into: relined tight, from: out of use, is: never}                      | EXACT |
            {mean passage: all, into: relined tight, from: out of use, is: infinite}                   | EXACT |
            {mean passage: all, into: relined tight, from: out of use, given: entered, is: never}      | EXACT |
            {mean passage: all, into: relined tight, from: out of use, given: entered, is: infinite}   | WRONG | never
            {settling step: leaking, within: 1%, is: never}                                            | EXACT |
            {settling step: leaking, within: 0.01, is: never}                                          | WRONG |
            {settling step: leaking, within: 1%, is: 100}                                              | WRONG | never
            """)
    void aWordStandsWhereThereIsNoNumber(String claim, Verdict verdict, String right) {
        Finding finding = finding("relined-main", claim);
        assertEquals(verdict, finding.verdict(), finding::toString);
        assertEquals(Optional.ofNullable(right).orElse(""), finding.judgement().right(), finding::toString);
        assertEquals(List.of(), kinds(finding));
    }

    /** Another start, another step and the joint probability explain nothing where there is nothing right. */
    @ParameterizedTest
    @ValueSource(strings = {
        "{mean passage: all, into: relined tight, from: out of use, is: 0}",
        "{mean passage: all, into: relined tight, given: entered, from: out of use, is: 4}",
        "{value: leaks, given: out of use, at: 0, is: 0}",
        "{value: leaks, given: relined leaking, at: 0, is: 1}",
        "{settling step: leaking, within: 1%, is: 0}"})
    void noSlipIsNamedWhereThereIsNoNumber(String claim) {
        Finding finding = finding("relined-main", claim);
        assertEquals(Verdict.WRONG, finding.verdict());
        assertEquals(List.of(), kinds(finding), finding::toString);
        assertEquals(Optional.empty(), finding.rest());
        assertTrue(finding.judgement().remarks().get(0).startsWith("there is no such number: "), finding::toString);
    }

    /** A part of a cycle is one of its largest value, zeros in it or not: held against stepping. */
    @Test
    void onACycleAPartIsOneOfTheLargestValue() throws Exception {
        Chain chain = Pofk.read(Path.of("test-data/models/alternating-filters.yaml")).chain();
        Truth truth = Truth.of(chain);
        int compared = 0;
        for (Output output : Outputs.states(chain)) {
            List<Rational> p = values(truth, output);
            List<Rational> limits = limits(truth, output);
            Rational part = Rational.of(1, 1000);
            Rational near = part.times(limits.stream().reduce(Rational.ZERO, Rational::max));
            Answer answer = truth.answer(new AnswerOf.SettlingStep(output, new Claim.Within(part, true), text()));
            assertEquals(Rational.of(lastFarOff(p, limits, near) + 1), answer.low(), output.name());
            compared += limits.size() == 2 && limits.contains(Rational.ZERO) ? 1 : 0;
        }
        assertEquals(4, compared);
    }

    @Test
    void aJointProbabilityIsNoConditionalOne() {
        Claims claims = Slipped.claims("pump-pair", "{value: one, given: running, at: 2, is: 0.1}");
        AnswerOf.Conditional asked = (AnswerOf.Conditional) claims.claims().get(0).statement();
        Rational joint = Truth.of(claims.model().chain()).about(asked.joint()).valueAt(2);
        Finding finding = finding("pump-pair", "{value: one, given: running, at: 2, is: " + joint + "}");
        assertEquals(SlipKind.JOINT_FOR_CONDITIONAL, kinds(finding).get(0), finding::toString);
        Finding never = finding("pump-pair", "{value: both, given: none, at: 0, is: 0}");
        assertEquals(List.of("there is no such number: at k = 0 what is given has probability zero: nothing is given by it"),
                never.judgement().remarks());
    }

    /** What follows from a wrong formula follows in its sums, its means and the step it settles at. */
    @Test
    void answersAreCarriedFromAFormula() {
        List<Finding> findings = Reviewing.of(Slipped.claims("pump-pair",
                "{formula: lost, is: '0.01 - 0.01*0.5^k'}", "{sum: lost, to: 3, is: 0.02125}",
                "{mean: lost, from: 0, to: 3, is: 0.0053125}", "{settling step: lost, within: 1%, is: 7}"),
                Variants.NONE).findings();
        assertEquals(List.of(Verdict.WRONG, Verdict.CARRIED, Verdict.CARRIED, Verdict.EXACT),
                findings.stream().map(Finding::verdict).toList());
    }

    @Test
    void sumsFarOutAreEnclosed() {
        Finding finding = finding("pump-pair", "{sum: lost, to: 5000000, is: 40881.61}");
        assertEquals(Verdict.ROUNDED, finding.verdict(), finding::toString);
        assertEquals(Verdict.WRONG, finding("pump-pair", "{sum: lost, to: 5000000, is: 40881.63}").verdict());
    }

    /** Against plain stepping, for every output of every pattern of few states. */
    @Test
    void steppingSaysTheSame() throws Exception {
        int compared = 0;
        int settled = 0;
        for (String name : Files.readAllLines(Path.of("test-data/models/index.txt"))) {
            Chain chain = Pofk.read(Path.of("test-data/models", name.strip() + ".yaml")).chain();
            if (chain.size() > 12) {
                continue;
            }
            Truth truth = Truth.of(chain);
            Output given = Outputs.states(chain).get(0);
            for (Output output : Outputs.byDefault(chain).stream().limit(3).toList()) {
                List<Rational> p = values(truth, output);
                FormulaText is = text();
                assertEquals(sum(p, 2, 9), truth.answer(new AnswerOf.Sum(output, 2, 9, is)).low(), name);
                assertEquals(sum(p, 0, 20).dividedBy(Rational.of(21)),
                        truth.answer(new AnswerOf.IntervalMean(output, 0, 20, is)).low(), name);
                compared += 2 + conditional(truth, output, given, name);
                settled += settled(truth, output, p, name);
            }
        }
        assertTrue(compared > 80 && settled > 20, compared + " compared, " + settled + " settled");
    }

    /** What a claim's sum is held against is the total that the command for totals gives. */
    @Test
    void totalsSayTheSame() throws Exception {
        Chain chain = Pofk.read(Path.of("test-data/models/pump-pair.yaml")).chain();
        Truth truth = Truth.of(chain);
        int compared = 0;
        for (Output output : Outputs.states(chain)) {
            Total total = Total.of(chain, Increment.ofOutput(output), List.of(0, 7, 30));
            for (StepValue value : total.total().values()) {
                assertEquals(value.exact().orElseThrow(),
                        truth.answer(new AnswerOf.Sum(output, 0, value.k(), text())).low(), output.name());
                compared++;
            }
        }
        assertEquals(9, compared);
    }

    private static List<Rational> values(Truth truth, Output output) {
        return LongStream.range(0, STEPS).mapToObj(k -> truth.about(output).valueAt(k)).collect(Collectors.toList());
    }

    private static Rational sum(List<Rational> p, int first, int last) {
        return p.subList(first, last + 1).stream().reduce(Rational.ZERO, Rational::plus);
    }

    private static FormulaText text() {
        return ((AnswerOf) Slipped.claims("pump-pair", "{sum: lost, to: 5, is: 1}").claims().get(0).statement()).is();
    }

    private static int conditional(Truth truth, Output output, Output given, String name) {
        List<Rational> x = truth.stateAt(4);
        Answer answer = truth.answer(new AnswerOf.Conditional(output, given, 4, text()));
        if (x.get(0).isZero()) {
            assertEquals(Answer.Standing.NONE, answer.standing(), name);
        } else {
            // given one state the output is what it is in that state
            assertEquals(output.coefficients().get(0).plus(output.constant()), answer.low(), name);
        }
        return 1;
    }

    /** The last of the steps seen that isn't close, where all later ones seen are. */
    private static int settled(Truth truth, Output output, List<Rational> p, String name) {
        Rational near = Rational.of(1, 50);
        Answer answer = truth.answer(new AnswerOf.SettlingStep(output, new Claim.Within(near, false), text()));
        List<Rational> limits = limits(truth, output);
        if (limits.isEmpty() || answer.exact().filter(from -> from.compareTo(Rational.of(STEPS - 40)) < 0).isEmpty()) {
            return 0;
        }
        assertEquals(Rational.of(lastFarOff(p, limits, near) + 1), answer.low(), name + " " + output.name());
        return 1;
    }

    /** The last of the steps seen that is further off than that; -1 where none is. */
    private static int lastFarOff(List<Rational> p, List<Rational> limits, Rational near) {
        int last = -1;
        for (int k = 0; k < STEPS; k++) {
            if (p.get(k).minus(limits.get(k % limits.size())).abs().compareTo(near) > 0) {
                last = k;
            }
        }
        return last;
    }

    private static List<Rational> limits(Truth truth, Output output) {
        List<Rational> limits = new ArrayList<>();
        truth.about(output).longRun().accept(new org.pofk.longrun.LongRun.Visitor<Boolean>() {
            @Override
            public Boolean limit(org.pofk.longrun.LongRun.Limit limit) {
                return limits.add(limit.value());
            }

            @Override
            public Boolean cycle(org.pofk.longrun.LongRun.Cycle cycle) {
                return limits.addAll(cycle.values());
            }

            @Override
            public Boolean none(org.pofk.longrun.LongRun.None none) {
                return false;
            }
        });
        return limits;
    }
}
