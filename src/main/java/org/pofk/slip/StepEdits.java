package org.pofk.slip;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.claim.AuthorText;
import org.pofk.claim.AuthorText.Replacement;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;
import org.pofk.formula.ParsedFormula;
import org.pofk.slip.FormulaSurvey.Term;

/**
 * k shifted by a step: in the whole formula, or in one power; and what goes with repeated poles: k r^k where
 * k r^(k−1) is right, r^k where k r^(k−1) is.
 */
final class StepEdits {
    private final AuthorText text;
    private final AuthorNotation notation;

    StepEdits(AuthorText text) {
        this.text = text;
        this.notation = AuthorNotation.of(text.notation());
    }

    List<Edit> of(FormulaSurvey survey) {
        List<Edit> edits = new ArrayList<>();
        for (int by : new int[] {-1, 1}) {
            shiftedWhole(survey, by).ifPresent(edits::add);
        }
        for (ParsedFormula power : survey.powers()) {
            for (int by : new int[] {-1, 1, -2, -3}) {
                shifted(power.parts().get(1), by).ifPresent(shift -> edits.add(new Edit(kind(survey, power),
                        List.of(shift), text.place(power), text.text(power), text.edited(power, List.of(shift)))));
            }
        }
        text.tree().nodes().filter(StepEdits::isPowerOfK).forEach(power -> edits.add(asBinomial(power)));
        for (Term term : survey.summands()) {
            edits.addAll(asRepeated(survey, term));
        }
        return edits;
    }

    private static boolean isPowerOfK(ParsedFormula node) {
        return node.formula() instanceof Formula.Power power && power.base() instanceof Formula.Symbol symbol
                && symbol.name().equals("k") && power.exponent() instanceof Formula.Number number
                && (number.value().equals(Rational.TWO) || number.value().equals(Rational.of(3)));
    }

    /** k^2 as k (k − 1), k^3 as k (k − 1) (k − 2). */
    private Edit asBinomial(ParsedFormula power) {
        boolean isSquare = ((Formula.Power) power.formula()).exponent().equals(Formulas.number(2));
        String name = text.text(power.parts().get(0));
        String right = name + notation.times() + notation.enclosed(name + " - 1")
                + (isSquare ? "" : notation.times() + notation.enclosed(name + " - 2"));
        // what stands in braces of LaTeX alone stands there with them
        boolean isBraced = text.text(power).startsWith("{");
        return new Edit(SlipKind.POWER_FOR_BINOMIAL, List.of(new Replacement(AuthorText.start(power),
                AuthorText.end(power), isBraced ? notation.exponent(right) : notation.enclosed(right))),
                text.place(power), text.text(power).replaceAll("^\\{|\\}$", ""), right);
    }

    /** In a term with a factor k or binomial(k, p) outside its power, lowering is what was forgotten. */
    private SlipKind kind(FormulaSurvey survey, ParsedFormula power) {
        return survey.summands().stream().filter(term -> contains(term.node(), power))
                .anyMatch(term -> survey.steps().stream().anyMatch(step -> contains(term.node(), step)
                        && survey.powers().stream().noneMatch(each -> contains(each.parts().get(1), step))
                        && survey.waves().stream().noneMatch(wave -> contains(wave, step))))
                ? SlipKind.POWER_NOT_LOWERED : SlipKind.INDEX_SHIFTED;
    }

    private static boolean contains(ParsedFormula whole, ParsedFormula part) {
        return AuthorText.start(whole) <= AuthorText.start(part) && AuthorText.end(part) <= AuthorText.end(whole);
    }

    private Optional<Edit> shiftedWhole(FormulaSurvey survey, int by) {
        List<Replacement> shifts = new ArrayList<>();
        for (ParsedFormula node : text.tree().nodes().toList()) {
            boolean done = shifts.stream().anyMatch(shift -> shift.start() <= AuthorText.start(node)
                    && AuthorText.end(node) <= shift.end());
            if (!done) {
                shifted(node, by).ifPresent(shifts::add);
            }
        }
        return shifts.isEmpty() ? Optional.empty() : Optional.of(new Edit(SlipKind.INDEX_SHIFTED, shifts,
                text.place(), text.text(), text.edited(text.tree(), shifts)));
    }

    /** k or k + c with another c; nothing for any other part. */
    private Optional<Replacement> shifted(ParsedFormula node, int by) {
        Optional<Rational> shift = shiftOf(node);
        if (shift.isEmpty()) {
            return Optional.empty();
        }
        Rational next = shift.get().plus(Rational.of(by));
        ParsedFormula variable = node.formula() instanceof Formula.Sum ? node.parts().get(0) : node;
        String name = text.text(variable);
        String moved = next.isZero() ? name : name + (next.signum() < 0 ? "-" : "+") + next.abs();
        return Optional.of(placed(node, moved, next.isZero()));
    }

    private Replacement placed(ParsedFormula node, String moved, boolean bare) {
        int start = AuthorText.start(node);
        int end = AuthorText.end(node);
        int before = text.before(start);
        boolean braced = before >= 0 && text.text().charAt(before) == '{';
        boolean raised = before >= 0 && text.text().charAt(before) == '^';
        if (braced) {
            return new Replacement(start, end, moved);
        }
        if (raised) {
            return new Replacement(start, end, bare ? moved : notation.exponent(moved));
        }
        boolean multiplied = before >= 0 && (Character.isLetterOrDigit(text.text().charAt(before))
                || text.text().charAt(before) == ')');
        return new Replacement(start, end, bare ? moved
                : (multiplied ? notation.times() : "") + notation.enclosed(moved));
    }

    /** c for k + c. */
    private static Optional<Rational> shiftOf(ParsedFormula node) {
        if (node.formula() instanceof Formula.Symbol symbol && symbol.name().equals("k")) {
            return Optional.of(Rational.ZERO);
        }
        if (node.formula() instanceof Formula.Sum sum && sum.terms().size() == 2
                && sum.terms().get(0) instanceof Formula.Symbol symbol && symbol.name().equals("k")) {
            if (sum.terms().get(1) instanceof Formula.Number number) {
                return Optional.of(number.value());
            }
            if (sum.terms().get(1) instanceof Formula.Negation negation
                    && negation.operand() instanceof Formula.Number number) {
                return Optional.of(number.value().negate());
            }
        }
        return Optional.empty();
    }

    /** c r^k as c k r^(k−1), as c k r^k and as c k/r r^k. */
    private List<Edit> asRepeated(FormulaSurvey survey, Term term) {
        List<Edit> edits = new ArrayList<>();
        ParsedFormula inner = term.unsigned();
        Replacement times = new Replacement(AuthorText.start(inner), AuthorText.start(inner), "k" + notation.times());
        for (ParsedFormula power : survey.powers()) {
            if (contains(inner, power) && !(inner.formula() instanceof Formula.Sum)) {
                shifted(power.parts().get(1), -1).ifPresent(lower ->
                        edits.add(repeated(inner, List.of(times, lower))));
                edits.add(repeated(inner, List.of(times)));
            }
        }
        return edits;
    }

    private Edit repeated(ParsedFormula inner, List<Replacement> replacements) {
        return new Edit(SlipKind.REPEATED_POLE_AS_SIMPLE, replacements, text.place(inner), text.text(inner),
                text.edited(inner, replacements));
    }
}
