package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.pofk.chain.Output;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.Expansion.Coefficient;
import org.pofk.modes.Expansion.Part;
import org.pofk.transform.Transform;

/** One output's transform and closed form as Python that proves them. */
final class PythonOutput {
    /** Degree up to which a coefficient that is a quotient is reduced in the notebook. */
    private static final int REDUCED_UP_TO = 40;
    private static final int SHOWN_UP_TO = 60;

    private PythonOutput() {
    }

    /** Terms, recurrence, Y(z). */
    static String transform(Transform transform) {
        Output output = transform.output();
        int order = transform.recurrence().degree();
        List<String> lines = new ArrayList<>(List.of(
                "name = " + Python.text(output.name()),
                "c, constant = " + Python.numbers(output.coefficients()) + ", Fraction(\"" + output.constant()
                        + "\")"));
        lines.addAll(claimed(transform));
        lines.addAll(List.of("",
                "n, d = annihilated_by_degree(c, constant), " + order,
                "y = terms(c, constant, max(n + d, " + (SHOWN_UP_TO + 1) + "))"));
        lines.addAll(proof("k"));
        return String.join("\n", lines);
    }

    /** The recurrence and Y(z) as they are claimed. */
    static List<String> claimed(Transform transform) {
        List<String> lines = new ArrayList<>(List.of(
                "recurrence = " + Python.numbers(transform.recurrence()),
                "numerator = " + Python.numbers(transform.y().numerator()),
                "denominator = " + Python.numbers(transform.y().denominator())));
        lines.addAll(factors(transform));
        return lines;
    }

    private static List<String> factors(Transform transform) {
        List<String> lines = new ArrayList<>(List.of("factors = [  # of the denominator, each with its multiplicity"));
        for (Factor<Rational> factor : transform.factors().factors()) {
            lines.add("    (" + Python.numbers(factor.polynomial()) + ", " + factor.multiplicity() + "),");
        }
        lines.add("]");
        return lines;
    }

    /** That they are those of the terms in y, in steps called k or m. */
    static List<String> proof(String k) {
        return List.of(
                "require(f\"{name}: the recurrence of order {d} holds at " + k + " = 0 ... {n - 1}, and so for every "
                        + k + "\",",
                "        len(recurrence) == d + 1 and recurrence[-1] == 1 and satisfies(recurrence, y, n))",
                "require(f\"{name}: the denominator of Y(z) is the recurrence, up to a z that cancels\",",
                "        recurrence in (denominator, [Fraction(0)] + denominator))",
                "require(f\"{name}: the denominator is the product of the factors\","
                        + " denominator == multiplied_out(factors))",
                "require(f\"{name}: Y(z) has y(" + k + ") as its coefficients at " + k
                        + " = 0 ... {n + d - 1}, and so for every " + k + "\",",
                "        expanded(numerator, denominator, n + d) == y[:n + d])");
    }

    /** Whether the closed form is evaluated in the notebook: no large quotient has to be reduced for it. */
    static boolean isEvaluated(ClosedForm form) {
        return form.expansion().parts().stream().allMatch(PythonOutput::isEvaluated);
    }

    /** The closed form, one that {@link #isEvaluated}. */
    static String parts(ClosedForm form) {
        return String.join("\n", parts(form, "k"));
    }

    /** The same in steps called k or m. */
    static List<String> parts(ClosedForm form, String k) {
        List<String> lines = new ArrayList<>(expansion(form));
        lines.addAll(List.of("",
                "require(f\"{name}: its closed form satisfies a recurrence of order d\",",
                "        len(impulses) + sum(len(coefficients) * (len(q) - 1) for q, coefficients in parts) <= d)",
                "require(f\"{name}: the closed form equals y(" + k + ") at " + k
                        + " = 0 ... {n + d - 1}, and so for every " + k + "\",",
                "        closed_form(impulses, parts, n + d) == y[:n + d])"));
        return lines;
    }

    /** The factors and what each adds, of a closed form whose transform isn't proved. */
    static List<String> alone(ClosedForm form) {
        List<String> lines = new ArrayList<>(factors(form.transform()));
        lines.addAll(expansion(form));
        return lines;
    }

    private static List<String> expansion(ClosedForm form) {
        List<Factor<Rational>> factors = form.transform().factors().factors();
        List<String> lines = new ArrayList<>(List.of(
                "impulses = " + Python.numbers(form.expansion().impulses()) + "  # at k = 0, 1, ...",
                "parts = [  # a factor, and R_0, R_1, ... at its roots"));
        for (Part<Rational> part : form.expansion().parts()) {
            lines.add("    (factors[" + factors.indexOf(part.factor()) + "][0], " + coefficients(part) + "),");
        }
        lines.add("]");
        return lines;
    }

    private static boolean isEvaluated(Part<Rational> part) {
        return part.factor().polynomial().degree() <= REDUCED_UP_TO
                || part.coefficients().stream().allMatch(Coefficient::isReduced);
    }

    private static String coefficients(Part<Rational> part) {
        return part.coefficients().stream().map(coefficient -> coefficient.isReduced()
                ? Python.numbers(coefficient.numerator().times(coefficient.denominator().coefficient(0).inverse()))
                : "(" + Python.numbers(coefficient.numerator()) + ", " + Python.numbers(coefficient.denominator())
                        + ")")
                .collect(Collectors.joining(", ", "[", "]"));
    }
}
