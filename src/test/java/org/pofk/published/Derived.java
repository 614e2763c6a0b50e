package org.pofk.published;

import static org.junit.jupiter.api.Assertions.fail;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.FormulaParser;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.longrun.LongRun;
import org.pofk.modes.ClosedForm;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;
import org.pofk.transform.Transforms;

/** A published case as the tool derives it, for one choice of its parameters. */
final class Derived {
    private final PublishedCase published;
    private final Map<String, Rational> sample;
    private final Chain chain;
    private final Map<String, ClosedForm> forms = new LinkedHashMap<>();

    Derived(PublishedCase published, Map<String, Rational> sample) {
        this(published, sample, read(published, sample));
    }

    private Derived(PublishedCase published, Map<String, Rational> sample, Chain chain) {
        this.published = published;
        this.sample = sample;
        this.chain = chain;
        Transforms.of(chain, chain.outputs()).forEach(transform ->
                forms.put(transform.output().name(), ClosedForm.of(transform)));
    }

    private static Chain read(PublishedCase published, Map<String, Rational> sample) {
        Map<String, String> values = new TreeMap<>();
        sample.forEach((name, value) -> values.put(name, value.toString()));
        try {
            return ModelReader.read(published.model(), new Overrides(values, Optional.empty())).chain();
        } catch (RefusedException e) {
            throw new AssertionError(published.source(), e);
        }
    }

    /** The same chain started in one state for certain. */
    Derived startedIn(int state) {
        List<Rational> start = IntStream.range(0, chain.size())
                .mapToObj(i -> i == state ? Rational.ONE : Rational.ZERO).toList();
        return new Derived(published, sample, new Chain(chain.kind(), chain.states(), chain.matrix(), start,
                chain.sets(), chain.outputs()));
    }

    /** The same case with another value for a parameter. */
    Derived with(String parameter, Rational value) {
        Map<String, Rational> other = new TreeMap<>(sample);
        other.put(parameter, value);
        return new Derived(published, other);
    }

    Chain chain() {
        return chain;
    }

    /** The closed form of an output, or of a state that is no output. */
    ClosedForm form(String name) {
        return forms.computeIfAbsent(name, missing -> ClosedForm.of(
                Transforms.of(chain, List.of(Outputs.states(chain).get(chain.states().indexOf(missing)))).get(0)));
    }

    /** What the states do in the long run, in their order. */
    List<LongRun> longRuns() {
        List<Output> states = Outputs.states(chain);
        return Transforms.of(chain, states).stream().map(each -> LongRun.of(chain, each)).toList();
    }

    LongRun longRun(String name) {
        return LongRun.of(chain, form(name).transform());
    }

    FractionInZ fraction(String expression) {
        return FractionInZ.of(parse(expression), sample);
    }

    Rational value(String expression) {
        return fraction(expression).value();
    }

    /** What the names of an expression stand for at step k. */
    Map<String, Rational> valuesAt(int k) {
        Map<String, Rational> values = new LinkedHashMap<>(sample);
        values.put("k", Rational.of(k));
        return values;
    }

    Formula parse(String expression) {
        try {
            return FormulaParser.parse(expression, new Position(published.id(), 1, 1)).formula();
        } catch (RefusedException e) {
            return fail(published.source() + ": " + e.getMessage());
        }
    }

    @Override
    public String toString() {
        return published.source() + " at " + sample;
    }
}
