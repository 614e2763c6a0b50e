package org.pofk.claim;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.Model.Convention;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;

/** Right numbers of every kind are right to any digits, and wrong with one digit changed. */
class JudgedNumbersTest {
    private static final List<Integer> DIGITS = List.of(4, 6);
    private int right;
    private int wrong;

    /** Judged as it stands, and with a digit changed in one number after the other. */
    private void check(Truth truth, List<String> numbers, Function<List<String>, Statement> statement) {
        Judgement judgement = Judging.of(Stating.claim(statement.apply(numbers)), truth);
        assertTrue(judgement.verdict() == Verdict.EXACT || judgement.verdict() == Verdict.ROUNDED,
                numbers + ": " + judgement);
        right++;
        for (int i = 0; i < numbers.size(); i++) {
            List<String> changed = new ArrayList<>(numbers);
            changed.set(i, Stating.changed(numbers.get(i)));
            if (!changed.equals(numbers)) {
                Judgement other = Judging.of(Stating.claim(statement.apply(changed)), truth);
                assertEquals(Verdict.WRONG, other.verdict(), changed + ": " + other);
                wrong++;
            }
        }
    }

    private void assertCounts(int leastRight, int leastWrong) {
        assertTrue(right >= leastRight && wrong >= leastWrong, right + " right, " + wrong + " wrong");
    }

    private interface ForOutput {
        void check(Truth truth, OutputTruth output);
    }

    private static void forEveryOutput(ForOutput work) {
        for (Chain chain : Models.all()) {
            Truth truth = Truth.of(chain);
            Outputs.byDefault(chain).stream().limit(1).forEach(output -> work.check(truth, truth.about(output)));
        }
    }

    @Test
    void valuesAtAStep() {
        Stating stating = new Stating();
        forEveryOutput((truth, output) -> {
            for (int k : List.of(1, 4, 9)) {
                Function<List<String>, Statement> statement =
                        texts -> new Statement.Value(output.output(), k, stating.text(texts.get(0)));
                Quantity value = Quantity.of(output.valueAt(k));
                DIGITS.forEach(digits -> check(truth, List.of(Stating.decimal(value, digits)), statement));
                Statement fraction = statement.apply(List.of(Stating.fraction(output.valueAt(k))));
                assertEquals(Verdict.EXACT, Judging.of(Stating.claim(fraction), truth).verdict());
            }
        });
        assertCounts(150, 50);
    }

    @Test
    void longRuns() {
        Stating stating = new Stating();
        forEveryOutput((truth, output) -> {
            if (output.longRun() instanceof LongRun.Limit limit) {
                DIGITS.forEach(digits -> check(truth, List.of(Stating.decimal(Quantity.of(limit.value()), digits)),
                        texts -> new Statement.LongRunOf(List.of(new Statement.LongRunOf.Part(output.output(),
                                stating.texts(texts))))));
            }
        });
        assertCounts(40, 10);
    }

    @Test
    void poles() {
        Stating stating = new Stating();
        forEveryOutput((truth, output) -> DIGITS.forEach(digits -> check(truth,
                AllPoles.repeated(output).stream().map(pole -> Stating.decimal(pole, digits)).toList(),
                texts -> new Statement.Poles(output.output(), stating.texts(texts).stream()
                        .map(text -> new Statement.Poles.Pole(text, 1)).toList()))));
        assertCounts(50, 40);
    }

    @Test
    void coefficientsAtThePoles() {
        Stating stating = new Stating();
        forEveryOutput((truth, output) -> {
            List<AllPoles.Place> places = AllPoles.withImpulses(output);
            List<String> numbers = places.stream().flatMap(place -> place.coefficients().stream())
                    .map(coefficient -> Stating.decimal(coefficient, 5)).toList();
            check(truth, numbers, texts -> {
                List<Statement.Residues.AtPole> entries = new ArrayList<>();
                int next = 0;
                for (AllPoles.Place place : places) {
                    entries.add(new Statement.Residues.AtPole(stating.text(Stating.decimal(place.value(), 9)),
                            stating.texts(texts.subList(next, next + place.multiplicity()))));
                    next += place.multiplicity();
                }
                return new Statement.Residues(output.output(), entries);
            });
        });
        assertCounts(25, 40);
    }

    @Test
    void pairsByRadiusAngleAmplitudeAndPhaseInEverySignThatMeansTheSame() {
        Stating stating = new Stating();
        Quantity turn = Quantity.pi().times(Rational.TWO);
        forEveryOutput((truth, output) -> output.poles().stream().filter(pole -> !pole.isReal()
                && pole.coefficients().get(0).isZero() == Decision.NO).limit(1).forEach(pole -> {
            Quantity phase = pole.phase(0);
            List<List<Quantity>> ways = List.of(List.of(pole.angle(), pole.amplitude(0), phase),
                    List.of(pole.angle().negate(), pole.amplitude(0), phase.negate()),
                    List.of(pole.angle().plus(turn), pole.amplitude(0).negate(), phase.minus(Quantity.pi())),
                    List.of(pole.angle().negate().minus(turn), pole.amplitude(0).negate(),
                            phase.negate().plus(Quantity.pi())));
            for (List<Quantity> way : ways) {
                List<String> numbers = new ArrayList<>(List.of(Stating.decimal(pole.modulus(), 7)));
                way.forEach(number -> numbers.add(Stating.decimal(number, 7)));
                check(truth, numbers, texts -> new Statement.Pair(output.output(),
                        Optional.of(stating.text(texts.get(0))), Optional.of(stating.text(texts.get(1))),
                        Optional.of(stating.text(texts.get(2))), Optional.of(stating.text(texts.get(3)))));
            }
        }));
        assertCounts(16, 30);
    }

    @Test
    void matricesInBothConventionsAndNotTurned() {
        Stating stating = new Stating();
        int turned = 0;
        for (Chain chain : Models.all()) {
            Truth truth = Truth.of(chain);
            List<List<FormulaText>> rows = IntStream.range(0, chain.size()).mapToObj(i -> IntStream.range(0, chain.size())
                    .mapToObj(j -> stating.text(Stating.fraction(chain.matrix().at(i, j)))).toList()).toList();
            assertEquals(Verdict.EXACT,
                    Judging.of(Stating.claim(new Statement.Matrix(Convention.COLUMNS, rows)), truth).verdict());
            boolean isSymmetric = IntStream.range(0, chain.size()).allMatch(i -> IntStream.range(0, chain.size())
                    .allMatch(j -> chain.matrix().at(i, j).equals(chain.matrix().at(j, i))));
            Judgement other = Judging.of(Stating.claim(new Statement.Matrix(Convention.ROWS, rows)), truth);
            assertEquals(isSymmetric ? Verdict.EXACT : Verdict.WRONG, other.verdict());
            turned += isSymmetric ? 0 : 1;
        }
        assertTrue(turned >= 20, turned + " matrices");
    }

    @Test
    void theLongRunOfAllStatesIsAnEigenvectorUpToScale() {
        Stating stating = new Stating();
        for (Chain chain : Models.all()) {
            Truth truth = Truth.of(chain);
            List<Rational> limits = new ArrayList<>();
            for (Output state : Outputs.states(chain)) {
                if (truth.about(state).longRun() instanceof LongRun.Limit limit) {
                    limits.add(limit.value());
                }
            }
            if (limits.size() == chain.size() && limits.stream().anyMatch(value -> !value.isZero())) {
                List<String> scaled = limits.stream().map(value -> Stating.fraction(value.times(Rational.of(-7)))).toList();
                assertEquals(Verdict.EXACT, Judging.of(Stating.claim(eigenvector(scaled, stating)), truth).verdict());
                right++;
                List<String> rounded =
                        limits.stream().map(value -> Stating.decimal(Quantity.of(value), 6)).toList();
                Verdict verdict = Judging.of(Stating.claim(eigenvector(rounded, stating)), truth).verdict();
                assertTrue(verdict == Verdict.EXACT || verdict == Verdict.ROUNDED, rounded + ": " + verdict);
            }
        }
        assertTrue(right >= 10, right + " vectors");
    }

    private static Statement eigenvector(List<String> components, Stating stating) {
        return new Statement.Eigenvector(stating.text("1"), IntStream.range(0, components.size())
                .mapToObj(state -> new Statement.Component(state, stating.text(components.get(state)))).toList());
    }

    @Test
    void boundsAgreeWithTheValuesOfThreeHundredSteps() {
        Stating stating = new Stating();
        int[] counts = new int[2];
        forEveryOutput((truth, output) -> {
            List<Rational> values = IntStream.rangeClosed(0, 300).mapToObj(output::valueAt).toList();
            Rational largest = values.stream().reduce(Rational::max).orElseThrow();
            Rational below = largest.minus(Rational.of(1, 1_000));
            Judgement fails = Judging.of(Stating.claim(bound(output, below, stating)), truth);
            assertEquals(Verdict.WRONG, fails.verdict(), output.output() + " at most " + below);
            assertEquals(IntStream.range(0, 301).filter(k -> values.get(k).compareTo(below) > 0).findFirst().getAsInt(),
                    fails.firstWrongStep().getAsLong());
            counts[0]++;
            Verdict touched = Judging.of(Stating.claim(bound(output, largest, stating)), truth).verdict();
            if (output.longRun() instanceof LongRun.Limit limit && limit.value().compareTo(largest) < 0) {
                assertEquals(Verdict.EXACT, touched, output.output() + " touches " + largest);
                counts[1]++;
            }
        });
        assertTrue(counts[0] >= 25 && counts[1] >= 8, counts[0] + " bounds, " + counts[1] + " touched");
    }

    private static Statement bound(OutputTruth output, Rational bound, Stating stating) {
        return new Statement.Bound(output.output(), Statement.Bound.Direction.AT_MOST,
                stating.text(Stating.fraction(bound)));
    }
}
