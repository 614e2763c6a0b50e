package org.pofk.answer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.answer.AbsentEigenvalues.Absent;
import org.pofk.answer.AbsentEigenvalues.Reason;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Structure;
import org.pofk.exact.Factoring;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.RationalField;
import org.pofk.transform.Transform;

class AbsentEigenvaluesTest {

    @Test
    void eachReasonIsToldFromTheOthers() {
        // s0 is never reached, s3 is entered from s1 and read by nobody; the halves s1, s2 look alike to the output
        Chain chain = Chains.chain("0 1/2 1/2 0",
                "1/3 0 0 0", "1/3 1/2 1/4 0", "1/3 1/4 1/2 0", "0 1/4 1/4 1");
        assertEquals(Map.of("1/3", Reason.NOT_REACHED, "1", Reason.NOT_SEEN, "1/4", Reason.CANCELLED),
                reasons(chain, Chains.reading("0 1 1 0")));
    }

    @Test
    void nothingIsAbsentWhereTheOutputShowsEveryMode() {
        assertEquals(Map.of(), reasons(Chains.pumps(), Chains.state(Chains.pumps(), 2)));
    }

    @Test
    void anEigenvalueOfTwoClassesIsAbsentOnlyWhenBothAreSilent() {
        Chain apart = Chains.chain("1 0", "1 0", "0 1");
        assertEquals(Map.of(), reasons(apart, Chains.reading("1 0")));
        assertEquals(Map.of("1", Reason.NOT_SEEN), reasons(apart, Chains.reading("0 1")));
    }

    @Test
    void thePoleOfAnOutputsConstantStandsForNoEigenvalue() {
        Chain recursion = Chains.recursion("1 1", "1/2 1/4", "1/4 1/2");
        Output shifted = new Output("shifted", Chains.numbers("1 1"), Rational.of(3), "s0 + s1 + 3");
        assertEquals(Map.of("1/4", Reason.CANCELLED), reasons(recursion, shifted));
    }

    @Test
    void presentAndAbsentFactorsTogetherMakeUpTheCharacteristicPolynomialsOfRandomChains() {
        RandomChains chains = new RandomChains(3);
        int absent = 0;
        for (int round = 0; round < 150; round++) {
            Chain chain = chains.next();
            Output output = chains.output(chain);
            Transform transform = Chains.transform(chain, output);
            Structure structure = Structure.of(chain);
            List<Absent> found = AbsentEigenvalues.of(chain, structure, transform).orElseThrow().factors();
            Polynomial<Rational> whole = ClassPolynomial.of(chain.matrix(),
                    IntStream.range(0, chain.size()).boxed().toList());
            Polynomial<Rational> byClasses = structure.classes().stream()
                    .map(each -> ClassPolynomial.of(chain.matrix(), each.states()))
                    .reduce(Polynomial.one(RationalField.Q), Polynomial::times);
            assertEquals(whole, byClasses);
            for (var factor : Factoring.of(whole).factors()) {
                boolean isPresent = transform.recurrence().remainder(factor.polynomial()).isZero();
                boolean isAbsent = found.stream().anyMatch(each -> each.factor().equals(factor.polynomial()));
                assertTrue(isPresent != isAbsent, "seed 3, round " + round + ", " + factor.polynomial());
            }
            absent += found.size();
        }
        assertTrue(absent > 100, "absent " + absent);
    }

    @Test
    void theCharacteristicPolynomialAnnihilatesItsMatrix() {
        // Cayley and Hamilton, on three vectors that span the space
        Chain pumps = Chains.pumps();
        Polynomial<Rational> polynomial = ClassPolynomial.of(pumps.matrix(), List.of(0, 1, 2));
        for (String start : List.of("1 0 0", "0 1 0", "0 0 1")) {
            List<Rational> vector = Chains.numbers(start);
            List<Rational> sum = Chains.numbers("0 0 0");
            for (int power = 0; power <= 3; power++) {
                for (int i = 0; i < 3; i++) {
                    List<Rational> terms = vector;
                    Rational more = polynomial.coefficient(power).times(terms.get(i));
                    sum = replaced(sum, i, sum.get(i).plus(more));
                }
                vector = pumps.matrix().times(vector);
            }
            assertEquals(Chains.numbers("0 0 0"), sum);
        }
    }

    private static List<Rational> replaced(List<Rational> list, int place, Rational value) {
        List<Rational> copy = new ArrayList<>(list);
        copy.set(place, value);
        return copy;
    }

    private static Map<String, Reason> reasons(Chain chain, Output output) {
        return AbsentEigenvalues.of(chain, Structure.of(chain), Chains.transform(chain, output)).orElseThrow()
                .factors().stream().collect(Collectors.toMap(
                        each -> each.factor().coefficient(0).negate().toString(), Absent::reason));
    }
}
