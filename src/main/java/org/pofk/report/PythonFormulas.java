package org.pofk.report;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.DecimalForm;

/** The formulas of an output as they are printed, each as Python that holds it against y(k). */
record PythonFormulas(List<Printed> printed) {
    private static final long LAST = 60;
    private static final int BOUND_DIGITS = 3;

    /**
     * One formula.
     *
     * @param bound how far it may be off
     * @param last  the last step it is held against
     */
    record Printed(String called, PythonExpression expression, Rational bound, long last) {
        private String cell() {
            String bounded = bound.isZero() ? "0" : "Fraction(\"" + new BigDecimal(bound.numerator()).divide(
                    new BigDecimal(bound.denominator()), new MathContext(BOUND_DIGITS, RoundingMode.UP)) + "\")";
            return String.join("\n", "def " + called + "(k):",
                    "    return (" + expression.text().replaceAll("(?<=[^*(]) ([+-]) (?=[A-Za-z(])", "\n            $1 ")
                            + ")", "", "",
                    "require(f\"{name}: as printed in " + (called.equals("exact") ? "exact numbers it is y(k)"
                            : "decimals it is within its bound") + " at k = 0 ... " + last + "\",",
                    "        agrees(" + called + ", y, " + last + ", " + bounded + "))");
        }
    }

    static PythonFormulas of(ClosedForm form, int digits) {
        return of(form, digits, LAST);
    }

    /** @param until the last step for which there are terms */
    static PythonFormulas of(ClosedForm form, int digits, long until) {
        List<Printed> printed = new ArrayList<>();
        Optional<Formula> exact = form.exactFormula();
        exact.flatMap(PythonExpression::of).ifPresent(expression ->
                printed.add(new Printed("exact", expression, Rational.ZERO, until)));
        DecimalForm decimals = form.decimalForm(digits);
        decimals.formula().filter(formula -> !Optional.of(formula).equals(exact)).flatMap(PythonExpression::of)
                .ifPresent(expression -> printed.add(new Printed("decimals", expression, decimals.errorBound(),
                        decimals.upTo().map(last -> Math.min(last, until)).orElse(until))));
        return new PythonFormulas(printed);
    }

    PythonFormulas {
        printed = List.copyOf(printed);
    }

    boolean isEmpty() {
        return printed.isEmpty();
    }

    boolean needsDecimals() {
        return printed.stream().anyMatch(each -> each.expression().numbers() == PythonNumbers.DECIMALS);
    }

    List<String> cells() {
        return printed.stream().map(Printed::cell).toList();
    }
}
