package org.pofk.slip;

import java.util.ArrayList;
import java.util.List;
import org.pofk.claim.AuthorText;
import org.pofk.claim.AuthorText.Replacement;
import org.pofk.formula.Formula;
import org.pofk.formula.ParsedFormula;
import org.pofk.slip.FormulaSurvey.Role;
import org.pofk.slip.FormulaSurvey.Term;
import org.pofk.text.Position;
import org.pofk.text.Span;

/** Every sign turned: of each term, of each phase, of a pole, in front of a factor. */
final class SignEdits {
    private final AuthorText text;

    SignEdits(AuthorText text) {
        this.text = text;
    }

    List<Edit> of(FormulaSurvey survey) {
        List<Edit> edits = new ArrayList<>();
        for (Term term : survey.terms()) {
            if (term.role() != Role.ANGLE) {
                edits.add(turned(term));
            }
        }
        for (ParsedFormula power : survey.powers()) {
            ParsedFormula base = power.parts().get(0);
            if (!AuthorText.varies(base)) {
                edits.add(turnedBase(base));
            }
        }
        for (ParsedFormula minus : survey.signs()) {
            if (edits.stream().noneMatch(edit -> edit.span().equals(text.place(minus)))) {
                edits.add(withoutMinus(minus));
            }
        }
        return edits;
    }

    private Edit turned(Term term) {
        SlipKind kind = term.role() == Role.PHASE ? SlipKind.SIGN_OF_THE_PHASE : SlipKind.SIGN_OF_A_TERM;
        ParsedFormula node = term.node();
        String without = text.text(term.unsigned());
        Replacement sign = sign(term);
        if (term.isNegative()) {
            return new Edit(kind, List.of(sign), text.place(node), "-" + without,
                    sign.text().contains("+") ? "+" + without : without);
        }
        boolean plus = sign.end() > sign.start();
        return new Edit(kind, List.of(sign), plus ? from(node, sign.start()) : text.place(node),
                plus ? "+" + without : without, "-" + without);
    }

    /** What turns the sign of a term where it stands. */
    Replacement sign(Term term) {
        int start = AuthorText.start(term.node());
        int before = text.before(start);
        boolean behindPlus = before >= 0 && text.text().charAt(before) == '+';
        if (term.isNegative()) {
            boolean needsPlus = term.sum().isPresent() && term.index() > 0 && !behindPlus;
            return new Replacement(start, start + 1, needsPlus ? "+" : "");
        }
        return behindPlus ? new Replacement(before, before + 1, "-") : new Replacement(start, start, "-");
    }

    private Edit turnedBase(ParsedFormula base) {
        AuthorNotation notation = AuthorNotation.of(text.notation());
        if (base.formula() instanceof Formula.Negation) {
            String without = text.text(base.parts().get(0));
            return new Edit(SlipKind.SIGN_OF_A_POLE, List.of(whole(base, without)), text.place(base), text.text(base),
                    without);
        }
        String turned = notation.enclosed("-" + text.text(base));
        return new Edit(SlipKind.SIGN_OF_A_POLE, List.of(whole(base, turned)), text.place(base), text.text(base), turned);
    }

    private Edit withoutMinus(ParsedFormula minus) {
        String without = text.text(minus.parts().get(0));
        return new Edit(SlipKind.SIGN_OF_A_TERM, List.of(whole(minus, without)), text.place(minus),
                text.text(minus), without);
    }

    private static Replacement whole(ParsedFormula node, String replacement) {
        return new Replacement(AuthorText.start(node), AuthorText.end(node), replacement);
    }

    /** From a sign that stands before a part to the part's end. */
    private Span from(ParsedFormula node, int offset) {
        Span span = text.place(node);
        int back = text.text().codePointCount(offset, AuthorText.start(node));
        Position start = span.start();
        return back < start.column() && !start.isWhole()
                ? new Span(new Position(start.source(), start.line(), start.column() - back), span.end())
                : span;
    }
}
