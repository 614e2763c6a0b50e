package org.pofk.meaning;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
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
}
