package org.pofk.slip;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.claim.AuthorText;
import org.pofk.claim.Claim;
import org.pofk.claim.FormulaText;
import org.pofk.claim.OutputTruth;
import org.pofk.claim.Statement;
import org.pofk.claim.TruePole;
import org.pofk.claim.Truth;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.formula.Formulas;

/** Lists with an item more or less: poles with other multiplicities, a pole missing or too many; long runs scaled. */
final class StructuralChanges {
    private static final int DIGITS = 6;

    private final Claim claim;
    private final Truth truth;
    private final List<Candidate> candidates = new ArrayList<>();

    private StructuralChanges(Claim claim, Truth truth) {
        this.claim = claim;
        this.truth = truth;
    }

    static List<Candidate> of(Claim claim, Truth truth) {
        StructuralChanges changes = new StructuralChanges(claim, truth);
        if (claim.statement() instanceof Statement.Poles poles) {
            changes.poles(poles);
        } else if (claim.statement() instanceof Statement.LongRunOf longRun) {
            changes.scaled(longRun);
        }
        return changes.candidates;
    }

    private void poles(Statement.Poles stated) {
        List<Statement.Poles.Pole> poles = stated.poles();
        for (int i = 0; i < poles.size(); i++) {
            Statement.Poles.Pole own = poles.get(i);
            OutputTruth about = truth.about(stated.output());
            int most = about.poles().stream().mapToInt(TruePole::multiplicity).max().orElse(1);
            for (int times = 1; times <= Math.max(most, about.poleAtZero()); times++) {
                if (times != own.multiplicity()) {
                    List<Statement.Poles.Pole> changed = new ArrayList<>(poles);
                    changed.set(i, new Statement.Poles.Pole(own.value(), times));
                    add(SlipKind.REPEATED_POLE_AS_SIMPLE, own.value(), StatementText.pole(own), StatementText.pole(changed.get(i)),
                            stated, changed);
                }
            }
            List<Statement.Poles.Pole> without = new ArrayList<>(poles);
            without.remove(i);
            if (!without.isEmpty()) {
                add(SlipKind.WRONG_POLE, own.value(), own.value().text(), "no such pole", stated, without);
            }
        }
        missing(stated);
    }

    private void missing(Statement.Poles stated) {
        OutputTruth about = truth.about(stated.output());
        List<Missing> added = new ArrayList<>();
        if (about.poleAtZero() > 0) {
            added.add(new Missing("0", about.poleAtZero()));
        }
        for (TruePole pole : about.poles()) {
            for (String text : texts(pole)) {
                added.add(new Missing(text, pole.multiplicity()));
            }
        }
        for (int i = 0; i < added.size(); i++) {
            plus(stated, List.of(added.get(i)));
            if (i + 1 < added.size()) {
                plus(stated, List.of(added.get(i), added.get(i + 1)));
            }
        }
    }

    private record Missing(String text, int multiplicity) {
    }

    private void plus(Statement.Poles stated, List<Missing> missing) {
        FormulaText last = stated.poles().get(stated.poles().size() - 1).value();
        List<Statement.Poles.Pole> changed = new ArrayList<>(stated.poles());
        for (Missing each : missing) {
            Optional<FormulaText> read = AuthorText.of(last).flatMap(text -> text.read(each.text()));
            if (read.isEmpty()) {
                return;
            }
            changed.add(new Statement.Poles.Pole(read.get(), each.multiplicity()));
        }
        add(SlipKind.TERM_MISSING, last, "", String.join(", ", missing.stream().map(Missing::text).toList()),
                stated, changed);
    }

    private List<String> texts(TruePole pole) {
        AuthorNotation notation = AuthorNotation.of(StatementPart.of(claim.statement()).get(0).text().notation());
        if (pole.root().polynomial().degree() == 1) {
            return List.of(notation.write(Formulas.number(
                    pole.root().polynomial().coefficient(0).negate())));
        }
        String real = decimal(TrueNumber.realPart(pole.value()));
        if (pole.isReal()) {
            return List.of(real);
        }
        String imaginary = decimal(TrueNumber.imaginaryPart(pole.value()));
        return List.of(real + " + " + imaginary + "*i", real + " - " + imaginary + "*i");
    }

    private static String decimal(TrueNumber number) {
        return number.inPlaceOf("0.0", new TrueNumber.Precisions(DIGITS, DIGITS), AuthorNotation.PLAIN).stream()
                .reduce((first, last) -> last).orElse("0");
    }

    private void add(SlipKind kind, FormulaText at, String found, String right, Statement.Poles stated,
            List<Statement.Poles.Pole> changed) {
        Statement statement = new Statement.Poles(stated.output(), changed);
        candidates.add(new Candidate(kind, at.parsed().span(), found, right,
                () -> StatementText.of(statement),
                Candidate.with(claim, statement), () -> truth));
    }

    /** All values over their sum: as quotients where they are exact, else in decimals, which rounding may shorten by one. */
    private void scaled(Statement.LongRunOf stated) {
        if (stated.parts().size() < 2 || stated.parts().stream().anyMatch(part -> part.values().size() != 1)) {
            return;
        }
        List<FormulaText> texts = stated.parts().stream().map(part -> part.values().get(0)).toList();
        List<Rational> values = texts.stream().map(FaceValue::number).flatMap(Optional::stream).toList();
        Rational sum = values.stream().reduce(Rational.ZERO, Rational::plus);
        if (values.size() < texts.size() || sum.signum() <= 0 || sum.isOne()) {
            return;
        }
        List<Rational> shares = values.stream().map(value -> value.dividedBy(sum)).toList();
        AuthorNotation notation = AuthorNotation.of(texts.get(0).notation());
        int digits = texts.stream().map(FormulaText::text).filter(text -> Digits.isNumber(text) && text.contains("."))
                .mapToInt(text -> new BigDecimal(text).precision()).max().orElse(0);
        if (digits == 0) {
            scaled(stated, shares.stream().map(share -> notation.write(Formulas.number(share))).toList());
        } else {
            for (int shown = digits; shown >= Math.max(1, digits - 1); shown--) {
                int significant = shown;
                scaled(stated, shares.stream().map(share -> share.isZero() ? "0"
                        : TrueNumber.padded(Decimals.of(share, significant).text(), significant)).toList());
            }
        }
    }

    private void scaled(Statement.LongRunOf stated, List<String> shares) {
        List<Statement.LongRunOf.Part> parts = new ArrayList<>();
        for (int i = 0; i < shares.size(); i++) {
            Statement.LongRunOf.Part own = stated.parts().get(i);
            String share = shares.get(i);
            AuthorText.of(own.values().get(0)).flatMap(text -> text.read(share)).ifPresent(text ->
                    parts.add(new Statement.LongRunOf.Part(own.output(), List.of(text))));
        }
        String right = String.join(", ", shares);
        if (parts.size() == shares.size()) {
            candidates.add(new Candidate(SlipKind.EIGENVECTOR_NOT_SCALED, OtherTruths.place(stated),
                    String.join(", ", stated.parts().stream().map(part -> part.values().get(0).text()).toList()),
                    right, () -> right, Candidate.with(claim, new Statement.LongRunOf(parts)), () -> truth));
        }
    }
}
