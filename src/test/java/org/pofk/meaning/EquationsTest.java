package org.pofk.meaning;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.pofk.exact.Rational;
import org.pofk.text.Position;
import org.pofk.text.Span;

class EquationsTest {
    private int column;

    private Written written(String text) {
        Position place = new Position("claims", 1, ++column);
        return Written.of(text, new Span(place, place), Precision.AS_WRITTEN);
    }

    @Test
    void factorTakenOutIsSolvedBeforeWhatItMultiplies() {
        Written outer = written("0.50");
        Written inner = written("0.667");
        Quantity third = Quantity.of(Rational.of(1, 3));
        Solution solution = Equations.solve(List.of(
                new Equation(Quantity.of(outer).times(Quantity.of(inner)), third),
                new Equation(Quantity.of(outer).pow(-1), Quantity.of(2))));
        assertEquals(Decision.YES, solution.holds());
        assertEquals("0.667", solution.numbers().get(inner).digits());
        assertEquals(Decision.YES, solution.right(inner).orElseThrow().minus(Quantity.of(Rational.of(2, 3))).isZero());
    }

    @Test
    void wrongAndCutOffDigitsAreToldApart() {
        Written wrong = written("0.1414");
        Written cut = written("1.4142");
        Quantity root = Quantity.of(2).squareRoot();
        Solution solution = Equations.solve(List.of(
                new Equation(Quantity.of(wrong), root), new Equation(Quantity.of(cut).negate(), root.negate())));
        assertEquals(Decision.NO, solution.holds());
        assertEquals(List.of(0), solution.failing());
        assertEquals(Fit.WRONG, solution.numbers().get(wrong).fit());
        assertEquals("1.4142", solution.numbers().get(wrong).digits());
        assertEquals(Fit.RIGHT, solution.numbers().get(cut).fit());
        assertEquals(Fit.CUT_OFF, WrittenNumber.of(written("0.66"), Quantity.of(Rational.of(2, 3))).fit());
    }

    private static Quantity fraction(long p, long q) {
        return Quantity.of(Rational.of(p, q));
    }

    /** 0.5 (0.667 + 0.111 a + 0.050 b) for 1/3 + 1/18 a + 1/40 b: any factor would do, and one is taken as it is. */
    @Test
    void factorTakenOutOfSeveralIsTakenAsItIs() {
        Written factor = written("0.5");
        List<Written> parts = List.of(written("0.667"), written("0.111"), written("0.050"));
        List<Quantity> right = List.of(fraction(1, 3), fraction(1, 18), fraction(1, 40));
        Solution solution = Equations.solve(equations(factor, parts, right));
        assertEquals(Decision.YES, solution.holds());
        assertEquals(List.of("0.667", "0.111", "0.050"), parts.stream()
                .map(part -> solution.numbers().get(part).digits()).toList());
    }

    @Test
    void oneWrongNumberBesideAFactorIsTheOnlyOneFound() {
        Written factor = written("0.5");
        List<Written> parts = List.of(written("0.667"), written("0.119"), written("0.050"));
        List<Quantity> right = List.of(fraction(1, 3), fraction(1, 18), fraction(1, 40));
        Solution solution = Equations.solve(equations(factor, parts, right));
        assertEquals(Decision.NO, solution.holds());
        assertEquals(List.of(1), solution.failing());
        assertEquals(Fit.WRONG, solution.numbers().get(parts.get(1)).fit());
        assertEquals("0.111", solution.numbers().get(parts.get(1)).digits());
    }

    @Test
    void wrongFactorIsFoundWhereTheRestAgrees() {
        Written factor = written("0.3");
        List<Written> parts = List.of(written("0.667"), written("0.111"), written("0.050"));
        List<Quantity> right = List.of(fraction(1, 3), fraction(1, 18), fraction(1, 40));
        Solution solution = Equations.solve(equations(factor, parts, right));
        assertEquals(Decision.NO, solution.holds());
        assertEquals(List.of(Fit.WRONG), solution.numbers().values().stream().map(WrittenNumber::fit)
                .filter(fit -> fit != Fit.RIGHT).toList());
        assertEquals(Fit.WRONG, solution.numbers().get(factor).fit());
        assertEquals("0.5", solution.numbers().get(factor).digits());
    }

    /** 1/3 is 0.546 · 0.61 and 0.450 · 0.74: no value of the factor suits both at once, though each alone. */
    @Test
    void factorThatSuitsEachPartAndNotBothIsNoWayOut() {
        Written factor = written("0.5");
        List<Written> parts = List.of(written("0.61"), written("0.74"));
        List<Quantity> right = List.of(fraction(1, 3), fraction(1, 3));
        Solution solution = Equations.solve(equations(factor, parts, right));
        assertEquals(Decision.NO, solution.holds());
    }

    /** At 0.5 the parts would be 0.6667 and 0.3333; at 0.5128 they are 0.65 and 0.325. */
    @Test
    void factorOffItsFaceValueIsFound() {
        Written factor = written("0.5");
        List<Written> parts = List.of(written("0.65"), written("0.325"));
        List<Quantity> right = List.of(fraction(1, 3), fraction(1, 6));
        Solution solution = Equations.solve(equations(factor, parts, right));
        assertEquals(Decision.YES, solution.holds());
    }

    /** c·λ^(k−3) for a coefficient of 2/7 at λ = 3/10: c is judged by the λ that is right, not by the one written. */
    @Test
    void shiftedPowerIsJudgedByTheRightPole() {
        Written pole = written("0.3001");
        Written coefficient = written("0.00771");
        Quantity front = Quantity.of(coefficient).times(Quantity.of(pole).pow(-3));
        Solution solution = Equations.solve(List.of(new Equation(front, fraction(2, 7)),
                new Equation(Quantity.of(pole), fraction(3, 10))));
        assertEquals(Fit.WRONG, solution.numbers().get(pole).fit());
        assertEquals(Fit.RIGHT, solution.numbers().get(coefficient).fit());
        assertEquals(Decision.YES, solution.right(coefficient).orElseThrow().minus(fraction(27, 3500)).isZero());
        assertEquals(List.of(1), solution.failing());
    }

    @Test
    void everyInvertibleOperationIsUndone() {
        Quantity half = fraction(1, 2);
        List<UnaryOperator<Quantity>> operations = List.of(
                x -> x.plus(Quantity.of(3).squareRoot()),
                x -> x.times(Quantity.pi()).times(Rational.of(1, 180)),
                Quantity::negate,
                Quantity::inverse,
                x -> x.pow(3),
                x -> x.negate().pow(4).inverse(),
                Quantity::squareRoot,
                x -> x.negate().exponential(),
                x -> x.times(Quantity.of(5)).plus(half).cosine(),
                x -> x.plus(Quantity.of(2)).sine(),
                Quantity::arctangent,
                Quantity::arccosine,
                x -> half.dividedBy(x.plus(half)).squareRoot().plus(x.minus(x)));
        int solved = 0;
        for (UnaryOperator<Quantity> operation : operations) {
            Written decimal = written("0.6667");
            Quantity right = operation.apply(fraction(2, 3));
            Solution solution = Equations.solve(List.of(new Equation(operation.apply(Quantity.of(decimal)), right)));
            if (solution.right(decimal).isPresent()) {
                solved++;
                assertTrue(solution.right(decimal).get().minus(fraction(2, 3)).enclose(200).containsZero());
                assertEquals("0.6667", solution.numbers().get(decimal).digits());
                assertEquals(Decision.YES, solution.holds());
            }
        }
        assertEquals(operations.size() - 1, solved);
    }

    /** x + x² can't be isolated: that a right value exists is seen from the signs at both ends. */
    @Test
    void decimalThatOccursTwiceIsHeldToItsInterval() {
        Written decimal = written("0.62");
        Quantity x = Quantity.of(decimal);
        assertEquals(Decision.YES,
                Equations.solve(List.of(new Equation(x.plus(x.pow(2)), Quantity.ONE))).holds());
        assertEquals(Decision.NO,
                Equations.solve(List.of(new Equation(x.plus(x.pow(2)), fraction(102, 100)))).holds());
    }

    @Test
    void noSolutionIsWrong() {
        Written decimal = written("0.5");
        Quantity x = Quantity.of(decimal);
        assertEquals(Decision.NO, Equations.solve(List.of(new Equation(x.squareRoot(), fraction(-7, 10)))).holds());
        assertEquals(Decision.NO, Equations.solve(List.of(new Equation(x.pow(2), fraction(-1, 4)))).holds());
        assertEquals(Decision.NO, Equations.solve(List.of(new Equation(Quantity.of(2), Quantity.of(3)))).holds());
        assertEquals(Decision.YES, Equations.solve(List.of()).holds());
    }

    @Test
    void halfAUnitIsInclusive() {
        assertEquals(Fit.RIGHT, WrittenNumber.of(written("0.4508"), Quantity.of(Rational.parse("0.45085"))).fit());
        assertEquals(Fit.RIGHT, WrittenNumber.of(written("0.4508"), Quantity.of(Rational.parse("0.45075"))).fit());
        Quantity above = Quantity.of(Rational.parse("0.45085").plus(Rational.of(10).pow(-60)));
        assertEquals(Fit.CUT_OFF, WrittenNumber.of(written("0.4508"), above).fit());
        Quantity root = Quantity.of(2).squareRoot();
        Quantity tie = root.times(root.plus(Quantity.ONE)).minus(root).times(Rational.parse("0.225425"));
        assertEquals(Fit.RIGHT, WrittenNumber.of(written("0.4508"), tie).fit());
        assertEquals("0.45085", WrittenNumber.of(written("0.4509"), tie).digits());
    }

    @Test
    void rightDigitsAreInTheAuthorsWay() {
        Quantity third = fraction(1, 3);
        assertEquals("0.333", WrittenNumber.of(written("0.334"), third).digits());
        assertEquals("33.3%", WrittenNumber.of(written("33.4%"), third).digits());
        assertEquals("3.333e-4", WrittenNumber.of(written("3.334e-4"), third.times(Rational.of(1, 1000))).digits());
        assertEquals("0", WrittenNumber.of(written("0.1"), Quantity.ZERO).digits());
        assertEquals("-0.33", WrittenNumber.of(written("0.33"), third.negate()).digits());
        assertEquals(Rational.of(1, 1000), written("33.4%").lastPlace());
        assertEquals(Rational.of(1, 10_000), written("1.2e-3").lastPlace());
        assertEquals(Rational.of(1, 10_000), Written.of("0.43", written("0.43").span(),
                new Precision(Optional.of(new Carried(4, Carried.Unit.SIGNIFICANT)))).lastPlace());
    }

    private static List<Equation> equations(Written factor, List<Written> parts, List<Quantity> right) {
        return IntStream.range(0, parts.size()).mapToObj(i ->
                new Equation(Quantity.of(factor).times(Quantity.of(parts.get(i))), right.get(i))).toList();
    }
}
