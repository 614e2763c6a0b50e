package org.pofk.claim;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.exact.Ball;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;

/** What is true of a chain, each part against another way to it. */
class TruthTest {

    @Test
    void valuesByStepsBySequenceByTransformAndByPartialFractionsAreTheSame() {
        int compared = 0;
        for (Chain chain : Models.all()) {
            Truth truth = Truth.of(chain);
            for (Output output : Outputs.byDefault(chain)) {
                OutputTruth one = truth.about(output);
                OutputTruth other = OutputTruth.of(output, one.y());
                for (int k = 0; k <= 12; k++) {
                    assertEquals(one.valueAt(k), other.valueAt(k));
                    assertEquals(one.valueAt(k), one.sequence().at(k));
                    assertEquals(one.valueAt(k), other.sequence().at(k));
                    assertEquals(one.valueAt(k), one.closedForm().expansion().valueAt(k));
                    compared++;
                }
                assertEquals(one.transform().recurrence().degree(), one.order());
                assertEquals(one.order(), other.order());
                assertEquals(one.valueAt(1_000), other.valueAt(1_000));
            }
        }
        assertTrue(compared >= 1_000, compared + " values");
    }

    @Test
    void everyPoleComesWithItsMultiplicity() {
        int compared = 0;
        for (Chain chain : Models.all()) {
            for (Output output : Outputs.byDefault(chain)) {
                OutputTruth truth = Truth.of(chain).about(output);
                int poles = truth.poles().stream().mapToInt(pole -> pole.multiplicity() * (pole.isReal() ? 1 : 2)).sum();
                assertEquals(truth.y().denominator().degree(), poles + truth.poleAtZero());
                compared++;
            }
        }
        assertTrue(compared >= 80, compared + " outputs");
    }

    @Test
    void polesAndCoefficientsAddUpToTheValues() {
        int compared = 0;
        for (Chain chain : Models.all()) {
            for (Output output : Outputs.byDefault(chain)) {
                OutputTruth truth = Truth.of(chain).about(output);
                for (int k = 0; k <= 7; k++) {
                    Ball sum = sum(truth, k).enclose(96).real();
                    assertTrue(sum.contains(truth.valueAt(k)), output.name() + " at " + k);
                    assertTrue(sum.radius().bitLength() < sum.scale() - 60, "tight");
                    assertTrue(byAmplitudes(truth, k).enclose(96).real().overlaps(sum), output.name() + " at " + k);
                    compared++;
                }
            }
        }
        assertTrue(compared >= 600, compared + " values");
    }

    private static Quantity sum(OutputTruth truth, int k) {
        List<Quantity> terms = new ArrayList<>(List.of(impulse(truth, k)));
        for (TruePole pole : truth.poles()) {
            for (int p = 0; p < pole.multiplicity() && p <= k; p++) {
                Quantity term = pole.coefficients().get(p).times(binomial(k, p)).times(pole.value().pow(k - p));
                terms.add(pole.isReal() ? term : term.realPart().times(Rational.TWO));
            }
        }
        return Quantity.sum(terms);
    }

    private static Quantity byAmplitudes(OutputTruth truth, int k) {
        List<Quantity> terms = new ArrayList<>(List.of(impulse(truth, k)));
        for (TruePole pole : truth.poles()) {
            for (int p = 0; p < pole.multiplicity() && p <= k; p++) {
                if (pole.coefficients().get(p).isZero() != Decision.YES) {
                    Quantity turn = pole.angle().times(Quantity.of(k - p)).plus(pole.phase(p)).cosine();
                    Quantity size = pole.amplitude(p).times(pole.isReal() ? Rational.HALF : Rational.ONE);
                    terms.add(size.times(binomial(k, p)).times(pole.modulus().pow(k - p)).times(turn));
                }
            }
        }
        return Quantity.sum(terms);
    }

    private static Quantity impulse(OutputTruth truth, int k) {
        return k < truth.impulses().size() ? Quantity.of(truth.impulses().get(k)) : Quantity.ZERO;
    }

    private static Rational binomial(int k, int p) {
        Rational result = Rational.ONE;
        for (int i = 0; i < p; i++) {
            result = result.times(Rational.of(k - i, i + 1));
        }
        return result;
    }

    @Test
    void theMinimalPolynomialVanishesAtTheMatrixAndNoneOfLowerDegreeDoes() {
        int repeated = 0;
        int compared = 0;
        for (Chain chain : Models.all()) {
            Truth truth = Truth.of(chain);
            Polynomial<Rational> minimal = truth.minimalPolynomial();
            assertEquals(minimal, firstDependentPower(chain), chain.states().toString());
            Polynomial<Rational> characteristic = truth.characteristicPolynomial().orElseThrow();
            assertTrue(characteristic.remainder(minimal).isZero());
            repeated += minimal.degree() < characteristic.degree() ? 1 : 0;
            compared++;
        }
        assertTrue(compared >= 20, compared + " chains");
        assertTrue(repeated >= 2, repeated + " chains with an eigenvalue of several eigenvectors");
    }

    /** The first power of A that the lower ones add up to, by elimination in the n² entries. */
    private static Polynomial<Rational> firstDependentPower(Chain chain) {
        int n = chain.size();
        List<List<Rational>> reduced = new ArrayList<>();
        List<List<Rational>> combinations = new ArrayList<>();
        List<List<Rational>> power = IntStream.range(0, n).mapToObj(j -> IntStream.range(0, n)
                .mapToObj(i -> i == j ? Rational.ONE : Rational.ZERO).toList()).toList();
        for (int degree = 0; true; degree++) {
            List<Rational> row = new ArrayList<>(power.stream().flatMap(List::stream).toList());
            List<Rational> combination = new ArrayList<>(Collections.nCopies(n + 1, Rational.ZERO));
            combination.set(degree, Rational.ONE);
            for (int r = 0; r < reduced.size(); r++) {
                int pivot = pivot(reduced.get(r));
                Rational factor = row.get(pivot).dividedBy(reduced.get(r).get(pivot)).negate();
                add(row, reduced.get(r), factor);
                add(combination, combinations.get(r), factor);
            }
            if (row.stream().allMatch(Rational::isZero)) {
                return Polynomial.ofRationals(combination).monic();
            }
            reduced.add(row);
            combinations.add(combination);
            power = power.stream().map(chain.matrix()::times).toList();
        }
    }

    private static int pivot(List<Rational> row) {
        return IntStream.range(0, row.size()).filter(i -> !row.get(i).isZero()).findFirst().orElseThrow();
    }

    private static void add(List<Rational> target, List<Rational> row, Rational factor) {
        for (int i = 0; i < target.size(); i++) {
            target.set(i, target.get(i).plus(row.get(i).times(factor)));
        }
    }
}
