package org.pofk.claim;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.claim.Judgement.JudgedNumber;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Equation;
import org.pofk.meaning.Equations;
import org.pofk.meaning.Fit;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.Solution;
import org.pofk.meaning.Written;
import org.pofk.meaning.WrittenNumber;

/**
 * The decimals of a claim with the values they should have, given what the claim should say. Exact: each is solved
 * for, and where that isn't possible, all values that the decimals allow are held against what should come out.
 */
record RightDecimals(List<Equation> equations, Solution solution) {
    private static final int BITS = 96;

    static RightDecimals of(List<Equation> equations) {
        return new RightDecimals(List.copyOf(equations), Equations.solve(equations));
    }

    /** The value a decimal should have; empty where that isn't determined. */
    Optional<Quantity> right(Written written) {
        return solution.right(written);
    }

    /** Whether the right value of a decimal is known and goes with it in this way. */
    boolean fits(Written written, Fit fit) {
        return solution.numbers().containsKey(written) && solution.numbers().get(written).fit() == fit;
    }

    /** Whether every number is right to its digits, cut off or rounded. */
    Decision areRight() {
        if (solution.holds() != Decision.NO) {
            return solution.holds();
        }
        Decision all = Decision.YES;
        for (int place : solution.failing()) {
            Decision one = isCutOff(equations.get(place));
            if (one == Decision.NO) {
                return Decision.NO;
            }
            all = one == Decision.UNDECIDED ? one : all;
        }
        return all;
    }

    /** Whether an equation holds with the right values of its decimals, each of which was cut off or rounded. */
    private Decision isCutOff(Equation equation) {
        Map<Written, Quantity> right = new LinkedHashMap<>();
        for (Written written : equation.written().decimals()) {
            WrittenNumber number = solution.numbers().get(written);
            if (number == null || number.fit() == Fit.WRONG) {
                return Decision.NO;
            }
            right.put(written, number.right());
        }
        return equation.written().with(right).minus(equation.right()).isZero();
    }

    /** Whether the right values in the decimals' places make all equations hold. */
    boolean mend() {
        Map<Written, Quantity> right = new LinkedHashMap<>();
        solution.numbers().forEach((written, number) -> right.put(written, number.right()));
        return equations.stream().allMatch(equation -> {
            Quantity mended = equation.written().with(right);
            return mended.decimals().isEmpty() ? mended.minus(equation.right()).isZero() == Decision.YES
                    : mended.spread(BITS).overlaps(equation.right().enclose(BITS));
        });
    }

    /** Those whose right value is known, in order of reading. */
    List<JudgedNumber> judged() {
        return solution.numbers().values().stream()
                .map(number -> new JudgedNumber(number.written(), number.digits(), number.fit()))
                .sorted((a, b) -> a.written().span().start().compareTo(b.written().span().start())).toList();
    }
}
