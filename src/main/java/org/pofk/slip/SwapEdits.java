package org.pofk.slip;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.claim.AuthorText;
import org.pofk.claim.AuthorText.Replacement;
import org.pofk.formula.ParsedFormula;
import org.pofk.slip.FormulaSurvey.Constant;
import org.pofk.slip.FormulaSurvey.Role;
import org.pofk.slip.FormulaSurvey.Term;

/** Two numbers of one kind exchanged, without their signs and with them. */
final class SwapEdits {
    private static final int MOST = 400;

    private final AuthorText text;

    SwapEdits(AuthorText text) {
        this.text = text;
    }

    List<Edit> of(FormulaSurvey survey) {
        List<Constant> units = new ArrayList<>(survey.fractions());
        survey.literals().stream().filter(literal -> units.stream().noneMatch(unit ->
                AuthorText.start(unit.node()) <= AuthorText.start(literal.node())
                        && AuthorText.end(literal.node()) <= AuthorText.end(unit.node()))).forEach(units::add);
        List<Edit> edits = new ArrayList<>();
        for (int i = 0; i < units.size(); i++) {
            for (int j = i + 1; j < units.size() && edits.size() < MOST; j++) {
                Constant a = units.get(i);
                Constant b = units.get(j);
                if (a.role() == b.role() && (a.role() == Role.COEFFICIENT || a.role() == Role.POLE)
                        && !text.text(a.node()).equals(text.text(b.node()))) {
                    edits.add(edit(a, b, List.of()));
                    if (a.role() == Role.COEFFICIENT) {
                        signed(survey, a, b).ifPresent(signs -> edits.add(edit(a, b, signs)));
                    }
                }
            }
        }
        return edits;
    }

    /** The signs of both terms turned, where one is negative and the other isn't. */
    private Optional<List<Replacement>> signed(FormulaSurvey survey, Constant a, Constant b) {
        List<Term> own = survey.summands().stream()
                .filter(term -> term.node() == a.term() || term.node() == b.term()).toList();
        if (own.size() != 2 || own.get(0).isNegative() == own.get(1).isNegative()) {
            return Optional.empty();
        }
        SignEdits signs = new SignEdits(text);
        return Optional.of(own.stream().map(signs::sign).toList());
    }

    private Edit edit(Constant a, Constant b, List<Replacement> signs) {
        List<Replacement> replacements = new ArrayList<>(signs);
        replacements.add(in(a.node(), text.text(b.node())));
        replacements.add(in(b.node(), text.text(a.node())));
        return new Edit(SlipKind.COEFFICIENTS_SWAPPED, replacements, text.place(a.node()),
                text.text(a.node()) + " and " + text.text(b.node()),
                text.text(b.node()) + " and " + text.text(a.node()));
    }

    private static Replacement in(ParsedFormula node, String other) {
        return new Replacement(AuthorText.start(node), AuthorText.end(node), other);
    }
}
