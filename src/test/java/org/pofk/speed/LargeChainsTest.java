package org.pofk.speed;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.pofk.answer.Passage;
import org.pofk.answer.PowerModel;
import org.pofk.answer.When;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.exact.Factoring;
import org.pofk.exact.Rational;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.longrun.LongRun;
import org.pofk.modes.ClosedForm;
import org.pofk.steps.ExactSteps;
import org.pofk.steps.PowerSeries;
import org.pofk.text.RefusedException;
import org.pofk.transform.Transform;
import org.pofk.transform.Transforms;

/** What is made quick for large chains, on smaller ones of the same kinds and the plain way. */
class LargeChainsTest {
    private static final int STEPS = 40;

    private static Model model(LargeChains kind, int size) throws RefusedException {
        return ModelReader.read(Source.ofText(kind.name(), kind.yaml(size)), Optional.empty(), Overrides.NONE);
    }

    @ParameterizedTest
    @EnumSource(LargeChains.class)
    void factorsAndValuesAreThoseOfThePlainWay(LargeChains kind) throws RefusedException {
        Chain chain = model(kind, 36).chain();
        Transform transform = Transforms.of(chain, List.of(chain.outputs().get(0))).get(0);
        assertEquals(Factoring.of(transform.y().denominator()), transform.factors());
        assertEquals(0, transform.y().numerator().greatestCommonDivisor(transform.y().denominator()).degree());
        assertEquals(ExactSteps.of(chain, List.of(transform.output()), STEPS).values().get(0),
                PowerSeries.of(transform.y(), STEPS));
    }

    @ParameterizedTest
    @EnumSource(LargeChains.class)
    void lawOfTheFirstPassageIsThatOfStoppedSteps(LargeChains kind) throws RefusedException {
        Chain chain = model(kind, 16).chain();
        Set<Integer> into = Set.of(13, 14, 15);
        Passage passage = Passage.of(chain, into, Set.of(), List.of(Rational.HALF), List.of(STEPS));
        Output law = passage.law().output();
        List<Rational> stepped = ExactSteps.of(passage.stopped(), List.of(law), STEPS).values().get(0);
        assertEquals(stepped, PowerSeries.of(passage.law().transform().orElseThrow().y(), STEPS));
        assertEquals(stepped.stream().reduce(Rational.ZERO, Rational::plus), ExactSteps.of(passage.stopped(),
                List.of(passage.distribution().output()), STEPS).values().get(0).get(STEPS));
    }

    /** Early steps touch the bound exactly: no enclosure tells that, exact values do. */
    @ParameterizedTest
    @EnumSource(LargeChains.class)
    void whenTouchingItsBoundIsWhatStepsSay(LargeChains kind) throws RefusedException {
        Chain chain = model(kind, 16).chain();
        Output output = chain.outputs().get(0);
        Transform transform = Transforms.of(chain, List.of(output)).get(0);
        List<Rational> stepped = ExactSteps.of(chain, List.of(output), STEPS).values().get(0);
        When notAbove = When.of(chain, ClosedForm.of(transform), LongRun.of(chain, transform),
                new When.Condition(When.Condition.Kind.AT_MOST, Rational.ZERO));
        long first = stepped.stream().takeWhile(value -> value.signum() > 0).count();
        assertTrue(notAbove.decided());
        assertEquals(first < stepped.size() ? Optional.of(first) : Optional.empty(), notAbove.first());
        When above = When.of(chain, ClosedForm.of(transform), LongRun.of(chain, transform),
                new When.Condition(When.Condition.Kind.AT_LEAST, stepped.get(STEPS)));
        assertTrue(above.first().orElseThrow() <= STEPS);
        assertEquals(stepped.indexOf(stepped.stream().filter(value -> value.compareTo(stepped.get(STEPS)) >= 0)
                .findFirst().orElseThrow()), above.first().orElseThrow());
    }

    @ParameterizedTest
    @EnumSource(LargeChains.class)
    void eachStartGivesWhatThatStartAloneGives(LargeChains kind) throws RefusedException {
        Model model = model(kind, 12 + (kind == LargeChains.PRODUCT ? 4 : 0));
        Chain chain = model.chain();
        PowerModel.FromEach all = PowerModel.of(model, chain.outputs(), List.of(), published -> { }).found().get(0);
        int compared = 0;
        for (int from = 0; from < chain.size(); from += 3) {
            int start = from;
            Chain alone = new Chain(chain.kind(), chain.states(), chain.matrix(), IntStream.range(0, chain.size())
                    .mapToObj(i -> i == start ? Rational.ONE : Rational.ZERO).toList(), Map.of(), chain.outputs());
            Transform own = Transforms.of(alone, chain.outputs()).get(0);
            assertEquals(own.y(), all.byStart().get(from).transform().orElseThrow().y());
            assertEquals(own.factors(), all.byStart().get(from).transform().orElseThrow().factors());
            compared++;
        }
        assertTrue(compared >= 4);
    }
}
