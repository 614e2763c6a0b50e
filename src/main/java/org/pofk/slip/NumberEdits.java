package org.pofk.slip;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.pofk.claim.AuthorText;
import org.pofk.claim.AuthorText.Replacement;
import org.pofk.formula.Formula;
import org.pofk.formula.ParsedFormula;
import org.pofk.slip.FormulaSurvey.Constant;
import org.pofk.slip.FormulaSurvey.Role;

/** One number replaced by another: by one with digits transposed or the point moved, or by a right one. */
final class NumberEdits {
    private final AuthorText text;
    private final AuthorNotation notation;

    NumberEdits(AuthorText text) {
        this.text = text;
        this.notation = AuthorNotation.of(text.notation());
    }

    /** The right numbers that may stand in the place of one. */
    @FunctionalInterface
    interface Right {
        List<String> inPlaceOf(Constant constant);
    }

    List<Edit> of(FormulaSurvey survey, Right right) {
        List<Edit> edits = new ArrayList<>();
        for (Constant constant : survey.literals()) {
            if (constant.role() == Role.SHIFT) {
                continue;
            }
            String found = text.text(constant.node());
            if (Digits.isNumber(found)) {
                Digits.transposed(found).stream()
                        .filter(other -> !Digits.isPointMoved(found, other) || hasOtherPrecision(survey, constant))
                        .forEach(other -> edits.add(edit(SlipKind.DIGITS_TRANSPOSED, constant.node(), other)));
                if (new BigDecimal(found).signum() != 0) {
                    Digits.pointMoved(found).forEach(other ->
                            edits.add(edit(SlipKind.DECIMAL_POINT_MOVED, constant.node(), other)));
                }
            }
            edits.addAll(replaced(survey, constant, right));
        }
        for (Constant constant : survey.fractions()) {
            if (constant.role() != Role.SHIFT) {
                edits.addAll(replaced(survey, constant, right));
            }
        }
        return edits;
    }

    /**
     * Whether 0.050 beside 0.333 is rather 0.500 with its digits transposed than 0.50 with the point moved: when the
     * author writes all other numbers to as many places, or else to another number of digits.
     */
    private boolean hasOtherPrecision(FormulaSurvey survey, Constant constant) {
        List<BigDecimal> others = survey.literals().stream().filter(each -> each != constant)
                .map(each -> text.text(each.node())).filter(each -> Digits.isNumber(each) && each.contains("."))
                .map(BigDecimal::new).toList();
        BigDecimal own = new BigDecimal(text.text(constant.node()));
        boolean samePlaces = others.stream().map(BigDecimal::scale).distinct().count() == 1;
        return !others.isEmpty() && (samePlaces ? others.get(0).scale() == own.scale()
                : others.stream().noneMatch(other -> other.precision() == own.precision()));
    }

    private List<Edit> replaced(FormulaSurvey survey, Constant constant, Right right) {
        String found = text.text(constant.node());
        Set<String> others = new LinkedHashSet<>(right.inPlaceOf(constant));
        others.remove(found);
        return others.stream().map(other -> {
            SlipKind kind = Digits.compared(found, other.startsWith("-") ? other.substring(1) : other)
                    .orElse(generic(constant));
            return signed(survey, constant, kind, other).orElseGet(() -> edit(kind, constant.node(), other));
        }).toList();
    }

    /** Another number with the other sign, where its sign stands before it: − 0.1331 made + 0.2906. */
    private Optional<Edit> signed(FormulaSurvey survey, Constant constant, SlipKind kind, String right) {
        ParsedFormula node = constant.node();
        if (node == text.tree() || !right.startsWith("-") || right.indexOf('+') >= 0 || right.lastIndexOf('-') > 0) {
            return Optional.empty();
        }
        String size = right.substring(1);
        return survey.terms().stream().filter(term -> leading(term.unsigned(), node)).findFirst().map(term ->
                new Edit(kind, List.of(new SignEdits(text).sign(term), new Replacement(AuthorText.start(node),
                        AuthorText.end(node), size)), text.place(node),
                        (term.isNegative() ? "-" : "") + text.text(node), (term.isNegative() ? "" : "-") + size));
    }

    private static boolean leading(ParsedFormula whole, ParsedFormula node) {
        return whole == node || (whole.formula() instanceof Formula.Product
                || whole.formula() instanceof Formula.Quotient) && leading(whole.parts().get(0), node);
    }

    static SlipKind generic(Constant constant) {
        return constant.role() == Role.POLE || constant.role() == Role.ANGLE
                ? SlipKind.WRONG_POLE : SlipKind.WRONG_COEFFICIENT;
    }

    private Edit edit(SlipKind kind, ParsedFormula node, String right) {
        boolean simple = right.chars().allMatch(c -> Character.isLetterOrDigit(c) || c == '.');
        boolean alone = node == text.tree();
        boolean keeps = !simple && !alone && (right.startsWith("-") || !text.text(node).startsWith("("));
        return new Edit(kind, List.of(new Replacement(AuthorText.start(node), AuthorText.end(node),
                keeps && needsParentheses(right) ? notation.enclosed(right) : right)), text.place(node),
                text.text(node), right);
    }

    /** A sign, a sum or a quotient in place of a number. */
    private static boolean needsParentheses(String right) {
        return right.chars().anyMatch(c -> "+-/* ".indexOf(c) >= 0) && !right.matches("[0-9.]+[eE][-+]?[0-9]+");
    }
}
