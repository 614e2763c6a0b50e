package org.pofk.check;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.UnaryOperator;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.pofk.Pofk;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.exact.Rational;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.longrun.LongRun;
import org.pofk.modes.ClosedForm;
import org.pofk.slip.ModelTruths;
import org.pofk.text.RefusedException;
import org.pofk.transform.Transforms;

/** A model that claims are written about, with what is true of it. */
final class Subject {
    private static final int LARGEST = 12;
    private static final int OUTPUTS = 2;
    private static final int STATES = 2;

    private final Path file;
    private final Model model;
    private final Chain chain;
    private final Map<Output, Modes> modes = new HashMap<>();
    private final Map<Output, List<Near>> values = new HashMap<>();
    private final Map<Output, List<Near>> points = new HashMap<>();
    private final Map<Output, List<Near>> transforms = new HashMap<>();
    private final Map<Output, List<Rational>> longRuns = new HashMap<>();
    private Steps steps;
    private ModelTruths known;

    private Subject(Path file, Model model, Chain chain) {
        this.file = file;
        this.model = model;
        this.chain = chain;
    }

    /** Published cases, patterns and models of these tests, but those with more than {@value #LARGEST} states. */
    static List<Subject> all() {
        return Stream.of("test-data/published", "test-data/models", "src/test/resources/check")
                .flatMap(Subject::in).filter(subject -> subject.chain.size() <= LARGEST).toList();
    }

    private static Stream<Subject> in(String folder) {
        try (Stream<Path> files = Files.list(Path.of(folder))) {
            return files.filter(file -> file.toString().endsWith(".yaml")).sorted().map(Subject::read).toList().stream();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static Subject read(Path file) {
        try {
            Model model = Pofk.read(file);
            return new Subject(file, model, model.chain());
        } catch (RefusedException e) {
            throw new AssertionError(file.toString(), e);
        }
    }

    /** The same model as an author mistakes it for another chain. */
    Subject mistakenFor(Chain other) {
        return new Subject(file, model, other);
    }

    /** The model with another value of a parameter. */
    Subject withParameter(String name, BigDecimal value) {
        return mistakenFor(variant(name, Rational.of(value)).orElseThrow());
    }

    Path file() {
        return file.toAbsolutePath();
    }

    Model model() {
        return model;
    }

    Chain chain() {
        return chain;
    }

    /** What the tool finds to be true of the model, kept for all claims about it. */
    ModelTruths known() {
        if (known == null) {
            known = ModelTruths.of(model, this::variant);
        }
        return known;
    }

    private Optional<Chain> variant(String parameter, Rational value) {
        try {
            Overrides overrides = new Overrides(Map.of(parameter, value.toString()), Optional.empty());
            return Optional.of(ModelReader.read(file, overrides).chain());
        } catch (RefusedException e) {
            return Optional.empty();
        }
    }

    /** A few outputs, smallest transforms first, each with a name that stands for one thing. */
    List<Output> outputs() {
        List<Output> outputs = new ArrayList<>(chain.outputs().stream().limit(OUTPUTS).toList());
        Outputs.states(chain).stream()
                .filter(state -> chain.outputs().stream().noneMatch(output -> output.name().equals(state.name())))
                .filter(state -> !chain.sets().containsKey(state.name()))
                .limit(STATES).forEach(outputs::add);
        outputs.removeIf(output -> modes(output).poles().isEmpty());
        return outputs;
    }

    Modes modes(Output output) {
        return modes.computeIfAbsent(output,
                asked -> Modes.of(ClosedForm.of(Transforms.of(chain, List.of(asked)).get(0))));
    }

    Steps steps() {
        if (steps == null) {
            steps = Steps.of(chain);
        }
        return steps;
    }

    /** p(0) … p({@value Steps#LAST}). */
    List<Near> values(Output output) {
        return values.computeIfAbsent(output, asked -> steps().values(asked));
    }

    /** Points at which transforms of an output are compared. */
    List<Near> points(Output output) {
        return points.computeIfAbsent(output, asked -> Arbiter.points(modes(asked)));
    }

    /** Y(z) at these points, or Y(z)/z. */
    List<Near> transformValues(Output output, boolean isOverZ) {
        List<Near> values = transforms.computeIfAbsent(output, asked -> points(asked).stream()
                .map(point -> Arbiter.transformAt(chain, asked, point)).toList());
        return isOverZ ? IntStream.range(0, values.size())
                .mapToObj(i -> values.get(i).over(points(output).get(i))).toList() : values;
    }

    /** The poles of Y(z), each as often as it counts, pairs with both. */
    List<Near> poles(Output output) {
        List<Near> poles = new ArrayList<>();
        BigDecimal known = BigDecimal.ONE.movePointLeft(50);
        for (Modes.Pole pole : modes(output).poles()) {
            for (int i = 0; i < pole.multiplicity(); i++) {
                poles.add(pole.lambda().value().widened(known));
                if (!pole.isReal()) {
                    poles.add(pole.lambda().value().conjugate().widened(known));
                }
            }
        }
        int atZero = modes(output).form().transform().y().denominator().lowestPower();
        IntStream.range(0, atZero).forEach(i -> poles.add(Near.ZERO));
        return poles;
    }

    /** One value for a limit, several for a cycle, none where there is neither. */
    List<Rational> longRun(Output output) {
        return longRuns.computeIfAbsent(output, asked -> LongRun.of(chain, modes(asked).form().transform())
                .accept(new LongRun.Visitor<>() {
                    @Override
                    public List<Rational> limit(LongRun.Limit limit) {
                        return List.of(limit.value());
                    }

                    @Override
                    public List<Rational> cycle(LongRun.Cycle cycle) {
                        return cycle.values();
                    }

                    @Override
                    public List<Rational> none(LongRun.None none) {
                        return List.of();
                    }
                }));
    }

    /** det(zI − A) by ascending powers (Faddeev and LeVerrier). */
    List<Rational> characteristicPolynomial() {
        int n = chain.size();
        Rational[] c = new Rational[n + 1];
        c[n] = Rational.ONE;
        Rational[][] m = new Rational[n][n];
        for (Rational[] row : m) {
            Arrays.fill(row, Rational.ZERO);
        }
        for (int k = 1; k <= n; k++) {
            Rational[][] next = new Rational[n][n];
            for (int i = 0; i < n; i++) {
                for (int j = 0; j < n; j++) {
                    Rational sum = i == j ? c[n - k + 1] : Rational.ZERO;
                    for (int l = 0; l < n; l++) {
                        sum = sum.plus(chain.matrix().at(i, l).times(m[l][j]));
                    }
                    next[i][j] = sum;
                }
            }
            m = next;
            Rational trace = Rational.ZERO;
            for (int i = 0; i < n; i++) {
                for (int l = 0; l < n; l++) {
                    trace = trace.plus(chain.matrix().at(i, l).times(m[l][i]));
                }
            }
            c[n - k] = trace.negate().dividedBy(Rational.of(k));
        }
        return List.of(c);
    }

    /** Whether a polynomial can't be this one, at more points than its degree. */
    boolean differsFromPolynomial(UnaryOperator<Near> polynomial, List<Rational> truth) {
        for (int x = 2; x <= truth.size() + 3; x++) {
            Rational sum = Rational.ZERO;
            for (int n = truth.size() - 1; n >= 0; n--) {
                sum = sum.times(Rational.of(x)).plus(truth.get(n));
            }
            if (polynomial.apply(Near.exactly(x)).differsFrom(Near.of(sum))) {
                return true;
            }
        }
        return false;
    }

    @Override
    public String toString() {
        return file.getFileName().toString();
    }
}
