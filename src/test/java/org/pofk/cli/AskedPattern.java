package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.IntStream;
import org.pofk.Pofk;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.exact.Rational;

/** A pattern that questions are asked of, with its plain stepping, and what comes back as JSON. */
record AskedPattern(String name, Path file, Chain chain, PlainChain plain, List<List<Rational>> states) {
    private static final ObjectMapper MAPPER = new ObjectMapper();
    private static final String LARGE = "cable-route";
    /** Steps that {@code --at} and {@code --to} ask for. */
    static final String AT = "0..12";

    /** Read and stepped once, by whoever asks first. */
    private static final class Every {
        static final List<AskedPattern> PATTERNS = Patterns.names().stream()
                .map(name -> of(name, Path.of("test-data", "models", name + ".yaml"))).toList();
    }

    /** Every pattern of the index, or those of one kind. */
    static List<AskedPattern> all() {
        return Every.PATTERNS;
    }

    static List<AskedPattern> all(Chain.Kind kind) {
        return all().stream().filter(pattern -> pattern.chain.kind() == kind).toList();
    }

    /** The chains of few states. */
    static List<AskedPattern> small() {
        return all(Chain.Kind.CHAIN).stream().filter(pattern -> !pattern.isLarge()).toList();
    }

    private static AskedPattern of(String name, Path file) {
        try {
            Chain chain = Pofk.read(file).chain();
            PlainChain plain = PlainChain.of(chain);
            return new AskedPattern(name, file, chain, plain, plain.states(name.equals(LARGE) ? 16 : 36));
        } catch (Exception broken) {
            throw new AssertionError(name, broken);
        }
    }

    /** A hundred states, too many for elimination on full matrices. */
    boolean isLarge() {
        return name.equals(LARGE);
    }

    int steps() {
        return states.size() - 1;
    }

    /** Its outputs by default; of a hundred states the last. */
    List<Output> outputs() {
        return isLarge() ? List.of(state(chain.size() - 1)) : Outputs.byDefault(chain);
    }

    Output state(int place) {
        return Outputs.states(chain).get(place);
    }

    String lastState() {
        return chain.states().get(chain.size() - 1);
    }

    List<Rational> values(Output output) {
        return states.stream().map(output::of).toList();
    }

    /** A set or an output of several states, not of all; the last state where there is none. */
    Output group() {
        List<Output> sets = new ArrayList<>();
        chain.sets().forEach((word, members) -> sets.add(new Output(word, plain.indicator(Set.copyOf(members)), Rational.ZERO,
                word)));
        sets.addAll(chain.outputs());
        return sets.stream().filter(each -> each.constant().isZero() && each.coefficients().stream()
                .allMatch(c -> c.isZero() || c.isOne()) && members(each).size() > 1
                && members(each).size() < chain.size()).findFirst().orElse(state(chain.size() - 1));
    }

    static Set<Integer> members(Output set) {
        Set<Integer> members = new TreeSet<>();
        IntStream.range(0, set.coefficients().size()).filter(i -> set.coefficients().get(i).isOne())
                .forEach(members::add);
        return members;
    }

    /** What a command answers as JSON. */
    JsonNode ask(String command, String... options) {
        return ask(file, command, options);
    }

    static JsonNode ask(Path file, String command, String... options) {
        Run run = run(file, command, options);
        assertTrue(run.exitCode() == 0 || run.exitCode() == 4, () -> file + Arrays.toString(options) + run.notes());
        try {
            return MAPPER.readTree(run.answer());
        } catch (java.io.IOException broken) {
            throw new AssertionError(file + Arrays.toString(options), broken);
        }
    }

    Run run(String command, String... options) {
        return run(file, command, options);
    }

    private static Run run(Path file, String command, String... options) {
        List<String> arguments = new ArrayList<>(List.of(command, file.toString(), "--as", "json"));
        arguments.addAll(List.of(options));
        return Run.of(arguments);
    }

    /** What a recursion is told that has no answer to a question about states. */
    static int assertNeedsAChain(String command, String... options) {
        int told = 0;
        for (AskedPattern pattern : all(Chain.Kind.RECURSION)) {
            Run run = pattern.run(command, options);
            assertEquals(2, run.exitCode(), pattern.name);
            assertTrue(run.notes().contains("chain of probabilities; this model is a recursion"), run.notes());
            assertEquals("", run.answer());
            told++;
        }
        return told;
    }

    static Rational number(JsonNode text) {
        return Rational.parse(text.asText());
    }

    /** That a sequence is the one expected: at the steps listed, and by its transform at all steps expected. */
    static void assertIs(List<Rational> expected, JsonNode sequence, String what) {
        assertListed(expected, sequence.get("values"), what);
        assertEquals(expected, series(sequence.get("transform"), expected.size() - 1), what);
    }

    static void assertListed(List<Rational> expected, JsonNode listed, String what) {
        assertTrue(listed.size() > 0, what);
        for (JsonNode each : listed) {
            assertEquals(expected.get(each.get("k").asInt()), number(each.get("exact")), what + " at " + each.get("k"));
        }
    }

    /** y(0) … y(last) of Y(z) = N/D by long division in 1/z. */
    static List<Rational> series(JsonNode transform, int last) {
        JsonNode numerator = transform.get("numerator");
        JsonNode denominator = transform.get("denominator");
        int degree = denominator.size() - 1;
        List<Rational> values = new ArrayList<>();
        for (int k = 0; k <= last; k++) {
            Rational value = degree - k >= 0 && degree - k < numerator.size() ? number(numerator.get(degree - k))
                    : Rational.ZERO;
            for (int i = 1; i <= Math.min(k, degree); i++) {
                value = value.minus(number(denominator.get(degree - i)).times(values.get(k - i)));
            }
            values.add(value);
        }
        return values;
    }

    static List<Rational> sums(List<Rational> values) {
        List<Rational> sums = new ArrayList<>();
        Rational sum = Rational.ZERO;
        for (Rational value : values) {
            sum = sum.plus(value);
            sums.add(sum);
        }
        return sums;
    }
}
