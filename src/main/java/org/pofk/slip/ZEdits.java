package org.pofk.slip;

import java.util.ArrayList;
import java.util.List;
import org.pofk.claim.AuthorText;
import org.pofk.claim.AuthorText.Replacement;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.ParsedFormula;
import org.pofk.slip.FormulaSurvey.Term;

/** A transform times z, or over z: as a whole, or one of its terms. */
final class ZEdits {
    private final AuthorText text;
    private final AuthorNotation notation;

    ZEdits(AuthorText text) {
        this.text = text;
        this.notation = AuthorNotation.of(text.notation());
    }

    List<Edit> of(FormulaSurvey survey) {
        List<Edit> edits = new ArrayList<>();
        edits.add(lost(text.tree()));
        edits.addAll(doubled(text.tree()));
        edits.addAll(multiplicities());
        List<Term> varying = survey.summands().stream().filter(term -> AuthorText.varies(term.node())).toList();
        if (varying.size() > 1 && varying.size() < survey.summands().size()) {
            List<Replacement> all = varying.stream().map(term -> AuthorText.start(term.unsigned()))
                    .map(start -> new Replacement(start, start, "z" + notation.times())).toList();
            edits.add(new Edit(SlipKind.Z_LOST, all, text.place(), text.text(), text.edited(text.tree(), all)));
        }
        for (Term term : survey.summands()) {
            if (term.node() != text.tree() && AuthorText.varies(term.node())) {
                edits.add(lost(term.unsigned()));
                edits.addAll(doubled(term.unsigned()));
            }
        }
        return edits;
    }

    /** Each factor below the line once more. */
    private List<Edit> multiplicities() {
        List<Edit> edits = new ArrayList<>();
        text.tree().nodes().filter(node -> node.formula() instanceof Formula.Quotient)
                .flatMap(node -> node.parts().get(1).nodes())
                .filter(node -> node.formula() instanceof Formula.Sum && AuthorText.varies(node)).forEach(node -> {
                    String own = text.text(node);
                    boolean enclosed = own.startsWith("(") || own.startsWith("\\left(");
                    edits.add(edit(SlipKind.REPEATED_POLE_AS_SIMPLE, node,
                            whole(node, (enclosed ? own : notation.enclosed(own)) + "^2")));
                });
        text.tree().nodes().filter(node -> node.formula() instanceof Formula.Power power
                && power.exponent() instanceof Formula.Number && AuthorText.varies(node)).forEach(node -> {
                    ParsedFormula exponent = node.parts().get(1);
                    Formula.Number number = (Formula.Number) exponent.formula();
                    edits.add(edit(SlipKind.REPEATED_POLE_AS_SIMPLE, node,
                            whole(exponent, number.value().plus(Rational.ONE).toString())));
                });
        return edits;
    }

    private Edit lost(ParsedFormula node) {
        boolean simple = !(node.formula() instanceof Formula.Sum || node.formula() instanceof Formula.Negation)
                || text.text(node).startsWith("(");
        if (simple) {
            int start = AuthorText.start(node);
            return edit(SlipKind.Z_LOST, node, new Replacement(start, start, "z" + notation.times()));
        }
        return edit(SlipKind.Z_LOST, node, whole(node, "z" + notation.times() + notation.enclosed(text.text(node))));
    }

    /** A factor z above the line less, where one is seen; all of it over z in any case. */
    private List<Edit> doubled(ParsedFormula node) {
        List<Edit> edits = new ArrayList<>();
        node.nodes().forEach(part -> {
            if (part.formula() instanceof Formula.Power power && power.base() instanceof Formula.Symbol
                    && power.exponent() instanceof Formula.Number) {
                int exponent = ((Formula.Number) power.exponent()).value().numerator().intValue();
                String z = text.text(part.parts().get(0));
                if (exponent > 1 && exponent < 100) {
                    edits.add(new Edit(SlipKind.Z_DOUBLED, List.of(whole(part, exponent == 2 ? z
                            : z + "^" + (exponent > 10 ? notation.exponent("" + (exponent - 1)) : exponent - 1))),
                            text.place(part), text.text(part), exponent == 2 ? z : z + "^" + (exponent - 1)));
                }
            }
            if (part.formula() instanceof Formula.Product) {
                factorGone(part, edits);
            }
        });
        edits.add(edit(SlipKind.Z_DOUBLED, node,
                whole(node, notation == AuthorNotation.LATEX ? "\\frac{" + text.text(node) + "}{z}"
                        : notation.enclosed(text.text(node)) + "/z")));
        return edits;
    }

    private void factorGone(ParsedFormula product, List<Edit> edits) {
        for (int i = 0; i < product.parts().size(); i++) {
            if (product.parts().get(i).formula() instanceof Formula.Symbol) {
                int from = i == 0 ? AuthorText.start(product.parts().get(0))
                        : AuthorText.end(product.parts().get(i - 1));
                int to = i == 0 ? AuthorText.start(product.parts().get(1)) : AuthorText.end(product.parts().get(i));
                edits.add(edit(SlipKind.Z_DOUBLED, product, new Replacement(from, to, "")));
            }
        }
    }

    private Edit edit(SlipKind kind, ParsedFormula node, Replacement replacement) {
        return new Edit(kind, List.of(replacement), text.place(node), text.text(node),
                text.edited(node, List.of(replacement)));
    }

    private static Replacement whole(ParsedFormula node, String other) {
        return new Replacement(AuthorText.start(node), AuthorText.end(node), other);
    }
}
