package org.pofk.answer;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.pofk.answer.SecondOpinion.Verdict;
import org.pofk.chain.Chain;
import org.pofk.exact.Factorization;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.RationalField;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.Expansion;
import org.pofk.transform.Transform;

class SecondOpinionTest {
    private static final Duration LONG_ENOUGH = Duration.ofMinutes(2);
    private static final SecondOpinion CONFIRMED = new SecondOpinion(Verdict.CONFIRMED, Verdict.CONFIRMED);

    /** A double pair, a double real pole, a pole at zero and an irreducible quadratic with real roots. */
    private static final Chain EVERYTHING = Chains.recursion("1 0 0 0 0 0 0 0 0 1",
            "0 -1/4 0 0 0 0 0 0 0 0",
            "1 0 0 0 0 0 0 0 0 0",
            "1 0 0 -1/4 0 0 0 0 0 0",
            "0 0 1 0 0 0 0 0 0 0",
            "0 0 1 0 1/3 0 0 0 0 0",
            "0 0 0 0 1 1/3 0 0 0 0",
            "0 0 0 0 0 1 0 1/8 0 0",
            "0 0 0 0 0 0 1 1/8 0 0",
            "0 0 0 0 0 0 0 1 0 0",
            "0 0 0 0 0 0 0 0 1 0");

    @Test
    void rightDerivationsAreConfirmed() {
        assertEquals(CONFIRMED, opinion(Chains.closedForm(Chains.pumps(), Chains.state(Chains.pumps(), 2))));
        assertEquals(CONFIRMED, opinion(Chains.closedForm(Chains.rotation(), Chains.state(Chains.rotation(), 1))));
        ClosedForm everything = Chains.closedForm(EVERYTHING, Chains.state(EVERYTHING, 9));
        assertTrue(everything.transform().factors().factors().stream().anyMatch(
                each -> each.multiplicity() == 2 && each.polynomial().degree() == 2));
        assertEquals(CONFIRMED, opinion(everything));
    }

    @Test
    void anyCoefficientChangedIsRefused() {
        ClosedForm right = Chains.closedForm(EVERYTHING, Chains.state(EVERYTHING, 9));
        int refused = 0;
        for (int i = 0; i < right.expansion().parts().size(); i++) {
            for (int power = 0; power < right.expansion().parts().get(i).coefficients().size(); power++) {
                Expansion<Rational> wrong = changed(right.expansion(), i, power, Change.ADD_ONE);
                assertEquals(new SecondOpinion(Verdict.CONFIRMED, Verdict.REFUSED),
                        SecondOpinion.of(right.transform(), wrong, LONG_ENOUGH));
                refused++;
            }
        }
        assertEquals(5, refused);
    }

    @Test
    void aSignChangedIsRefused() {
        ClosedForm right = Chains.closedForm(Chains.pumps(), Chains.state(Chains.pumps(), 2));
        assertEquals(new SecondOpinion(Verdict.CONFIRMED, Verdict.REFUSED), SecondOpinion.of(right.transform(),
                changed(right.expansion(), 0, 0, Change.TURN_SIGN), LONG_ENOUGH));
    }

    @Test
    void aFactorChangedIsRefused() {
        ClosedForm right = Chains.closedForm(Chains.pumps(), Chains.state(Chains.pumps(), 2));
        Transform transform = right.transform();
        List<Factorization.Factor<Rational>> factors = new ArrayList<>(transform.factors().factors());
        Factorization.Factor<Rational> first = factors.get(0);
        factors.set(0, new Factorization.Factor<>(first.polynomial().plus(Polynomial.ofRationals(
                List.of(Rational.of(1, 1_000_000_000)))), first.multiplicity(), first.irreducible()));
        Transform wrong = new Transform(transform.output(), transform.recurrence(), transform.y(),
                new Factorization<>(Rational.ONE, factors), transform.proof());
        assertEquals(Verdict.REFUSED, SecondOpinion.of(wrong, right.expansion(), LONG_ENOUGH).factors());
    }

    @Test
    void anImpulseLeftOutIsRefused() {
        ClosedForm right = Chains.closedForm(EVERYTHING, Chains.state(EVERYTHING, 9));
        assertTrue(!right.expansion().impulses().isEmpty());
        Expansion<Rational> wrong = new Expansion<>(RationalField.Q, List.of(), right.expansion().parts());
        assertEquals(Verdict.REFUSED, SecondOpinion.of(right.transform(), wrong, LONG_ENOUGH).expansion());
    }

    @Test
    void noTimeMeansNoSecondOpinion() {
        ClosedForm right = Chains.closedForm(EVERYTHING, Chains.state(EVERYTHING, 9));
        assertEquals(new SecondOpinion(Verdict.NOT_WITHIN_LIMIT, Verdict.NOT_WITHIN_LIMIT),
                SecondOpinion.of(right.transform(), right.expansion(), Duration.ZERO));
    }

    @Test
    void nothingIsWrittenAndNoThreadKeepsTheProgramAlive() {
        ByteArrayOutputStream written = new ByteArrayOutputStream();
        PrintStream out = System.out;
        PrintStream error = System.err;
        PrintStream kept = new PrintStream(written, true);
        System.setOut(kept);
        System.setErr(kept);
        try {
            opinion(Chains.closedForm(Chains.pumps(), Chains.state(Chains.pumps(), 1)));
        } finally {
            System.setOut(out);
            System.setErr(error);
        }
        assertEquals("", written.toString());
        assertTrue(Thread.getAllStackTraces().keySet().stream()
                .filter(thread -> thread.getName().contains("second opinion")).allMatch(Thread::isDaemon));
    }

    private enum Change { ADD_ONE, TURN_SIGN }

    private static Expansion<Rational> changed(Expansion<Rational> right, int place, int power, Change change) {
        Expansion.Part<Rational> part = right.parts().get(place);
        List<Expansion.Coefficient<Rational>> coefficients = new ArrayList<>(part.coefficients());
        Polynomial<Rational> numerator = coefficients.get(power).numerator();
        coefficients.set(power, new Expansion.Coefficient<>(change == Change.ADD_ONE
                ? numerator.plus(Polynomial.one(RationalField.Q))
                : numerator.negate(), coefficients.get(power).denominator()));
        List<Expansion.Part<Rational>> parts = new ArrayList<>(right.parts());
        parts.set(place, new Expansion.Part<>(part.factor(), coefficients));
        return new Expansion<>(right.field(), right.impulses(), parts);
    }

    private static SecondOpinion opinion(ClosedForm closedForm) {
        return SecondOpinion.of(closedForm.transform(), closedForm.expansion(), LONG_ENOUGH);
    }
}
