package org.pofk.claim;

import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Equation;
import org.pofk.meaning.Equations;
import org.pofk.meaning.Fit;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.Solution;
import org.pofk.meaning.Written;
import org.pofk.meaning.WrittenNumber;

/**
 * The decimals of a statement beside the values they should have, by the equations that make it true. Exact.
 *
 * @param rounded whether every decimal is right to its last place, rounded or cut off, and all else exactly right. A
 *                decimal that serves in several equations has to be right in each, not with one value in all
 */
record RightNumbers(List<Equation> equations, Solution solution, Decision rounded) {
    static RightNumbers of(List<Equation> equations) {
        Solution solution = Equations.solve(equations);
        return new RightNumbers(List.copyOf(equations), solution, rounded(equations, solution));
    }

    private static Decision rounded(List<Equation> equations, Solution solution) {
        if (solution.numbers().values().stream().anyMatch(number -> number.fit() == Fit.WRONG)) {
            return Decision.NO;
        }
        Map<Written, Quantity> loosened = new HashMap<>();
        solution.numbers().forEach((written, number) -> {
            if (number.fit() == Fit.CUT_OFF) {
                loosened.put(written, Loosened.of(written));
            }
        });
        for (int failing : solution.failing()) {
            Equation equation = equations.get(failing);
            if (equation.written().decimals().isEmpty()
                    || !Spread.mayBe(equation.written().with(loosened), equation.right())) {
                return Decision.NO;
            }
        }
        return solution.failing().isEmpty() ? solution.holds() : Decision.YES;
    }

    /** Whether right decimals in place of the written ones make the statement true. */
    boolean isMended() {
        Map<Written, Quantity> right = right();
        return equations.stream().allMatch(equation -> {
            Quantity written = equation.written().with(right);
            return written.decimals().isEmpty()
                    ? written.minus(equation.right()).isZero() == Decision.YES
                    : Spread.mayBe(written, equation.right());
        });
    }

    private Map<Written, Quantity> right() {
        Map<Written, Quantity> right = new LinkedHashMap<>();
        solution.numbers().forEach((written, number) -> right.put(written, number.right()));
        return right;
    }

    List<Judgement.JudgedNumber> judged() {
        return solution.numbers().values().stream().map(RightNumbers::judged).toList();
    }

    private static Judgement.JudgedNumber judged(WrittenNumber number) {
        return new Judgement.JudgedNumber(number.written(), number.digits(), number.fit());
    }
}
