package org.pofk.transform;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.exact.CommonDenominator;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.transform.RandomSystems.Shape;
import org.pofk.transform.RecurrenceProof.Method;

class RecurrenceProofTest {

    @Test
    void oneTamperedTermBreaksTheWindows() {
        RandomSystems systems = new RandomSystems(101);
        int broken = 0;
        for (int i = 0; i < 500; i++) {
            Chain chain = systems.next(Shape.values()[i % (Shape.values().length - 1)]);
            LinearSystem system = Reduction.of(chain, chain.outputs()).reduced();
            for (int reading = 0; reading < system.readings().size(); reading++) {
                Polynomial<Rational> recurrence = Transforms.of(chain, chain.outputs()).get(reading).recurrence();
                int count = system.size() + recurrence.degree();
                List<Rational> terms = RationalWindows.terms(RationalWindows.states(system, count),
                        system.readings().get(reading));
                assertTrue(RationalWindows.hold(recurrence, terms, system.size()));
                // Below z's multiplicity a term is free: it is an impulse, and only the numerator knows it.
                for (int at = recurrence.lowestPower(); at < count; at++) {
                    List<Rational> tampered = new ArrayList<>(terms);
                    tampered.set(at, terms.get(at).plus(Rational.of(1, 1_000_000_007)));
                    assertFalse(RationalWindows.hold(recurrence, tampered, system.size()));
                    broken++;
                }
            }
        }
        assertTrue(broken > 3000, "broken: " + broken);
    }

    @Test
    void oneTamperedCoefficientBreaksTheWindows() {
        RandomSystems systems = new RandomSystems(102);
        Random random = new Random(102);
        int broken = 0;
        for (int i = 0; i < 500; i++) {
            Chain chain = systems.next(Shape.values()[i % (Shape.values().length - 1)]);
            LinearSystem system = Reduction.of(chain, chain.outputs()).reduced();
            Transform transform = Transforms.of(chain, chain.outputs()).get(0);
            int degree = transform.recurrence().degree();
            List<Rational> terms = RationalWindows.terms(RationalWindows.states(system, system.size() + degree),
                    system.readings().get(0));
            if (degree > 0) {
                List<Rational> coefficients = new ArrayList<>(transform.recurrence().coefficients());
                int at = random.nextInt(degree);
                coefficients.set(at, coefficients.get(at).plus(Rational.of(1, 97)));
                assertFalse(RationalWindows.hold(Polynomial.ofRationals(coefficients), terms, system.size()));
                broken++;
                Polynomial<Rational> numerator = RationalWindows.numerator(transform.recurrence(), terms);
                List<Rational> reading = system.readings().get(0);
                ExactWindows windows = ExactWindows.of(system);
                assertTrue(windows.hold(transform.recurrence(), numerator, reading, system.size()));
                assertFalse(windows.hold(Polynomial.ofRationals(coefficients), numerator, reading, system.size()));
                assertFalse(windows.hold(transform.recurrence(), numerator.plus(Polynomial.ofRationals(
                        List.of(Rational.of(1, 97)))), reading, system.size()));
            }
        }
        assertTrue(broken > 300, "broken: " + broken);
    }

    @Test
    void everyMethodOccursAndSaysHowMuchItCompared() {
        Map<Method, Integer> seen = new EnumMap<>(Method.class);
        // all 60 orders at once; a few states in rational numbers; two modes in 60 states that no symmetry takes together
        record Case(Chain chain, Method method) {
        }
        List<Case> cases = List.of(
                new Case(RandomSystems.sparseChain(1, 60, 5), Method.CHARACTERISTIC),
                new Case(new RandomSystems(5).next(Shape.REPEATED), Method.WINDOWS),
                new Case(twoModes(60), Method.VECTOR));
        for (Case each : cases) {
            for (Transform transform : Transforms.of(each.chain, each.chain.outputs())) {
                assertEquals(each.method, transform.proof().method());
                assertEquals(transform.proof().order() + transform.recurrence().degree(),
                        transform.proof().comparedSteps());
                seen.merge(transform.proof().method(), 1, Integer::sum);
            }
        }
        assertEquals(Method.values().length, seen.size());
    }

    /** A = (1/2) I + rank one with every weight different: z − 1/2 and z − 1 are all it has. */
    private static Chain twoModes(int size) {
        List<List<Rational>> rows = new ArrayList<>();
        long total = size * (size + 1L) / 2;
        for (int i = 0; i < size; i++) {
            List<Rational> row = new ArrayList<>();
            for (int j = 0; j < size; j++) {
                row.add(Rational.of(i + 1L, 2 * total).plus(i == j ? Rational.HALF : Rational.ZERO));
            }
            rows.add(row);
        }
        List<Rational> start = new ArrayList<>();
        List<Rational> reading = new ArrayList<>();
        List<String> names = new ArrayList<>();
        for (int i = 0; i < size; i++) {
            start.add(Rational.of(i * (i + 1L), size * (size + 1L) * (size - 1L) / 3));
            reading.add(Rational.of(1, i + 2L));
            names.add("s" + i);
        }
        return new Chain(Chain.Kind.CHAIN, names, org.pofk.chain.SparseMatrix.ofRows(rows), start, Map.of(),
                List.of(new org.pofk.chain.Output("y", reading, Rational.ZERO, "y")));
    }

    @Test
    void boundsHoldForEveryCoefficientOfSmallSystems() {
        RandomSystems systems = new RandomSystems(103);
        int compared = 0;
        for (int i = 0; i < 500; i++) {
            Chain chain = systems.next(Shape.values()[i % (Shape.values().length - 1)]);
            ScaledSystem scaled = ScaledSystem.of(LinearSystem.of(chain, chain.outputs()));
            CoefficientBounds bounds = scaled.bounds();
            Chain same = new Chain(Chain.Kind.RECURSION, chain.states(), scaled.system().matrix(),
                    scaled.system().start(), Map.of(), List.of());
            Polynomial<Rational> characteristic = CharacteristicPolynomial.of(same).orElseThrow().polynomial();
            Rational sum = characteristic.coefficients().stream().map(Rational::abs)
                    .reduce(Rational.ZERO, Rational::plus);
            assertTrue(sum.compareTo(Rational.of(bounds.denominator())) <= 0);
            assertEquals(BigInteger.ONE, CommonDenominator.of(characteristic.coefficients().stream()
                    .map(value -> value.times(Rational.of(bounds.scale()))).toList()));
            for (List<Rational> reading : scaled.system().readings()) {
                List<Rational> terms = RationalWindows.terms(
                        RationalWindows.states(scaled.system(), chain.size()), reading);
                for (Rational coefficient : RationalWindows.numerator(characteristic, terms).coefficients()) {
                    assertTrue(coefficient.abs().compareTo(Rational.of(bounds.numerator())) <= 0);
                    compared++;
                }
            }
        }
        assertTrue(compared > 2000, "compared: " + compared);
    }
}
