package org.pofk.slip;

import java.util.ArrayList;
import java.util.List;
import org.pofk.claim.Claim;
import org.pofk.claim.FormulaText;
import org.pofk.claim.Statement;
import org.pofk.claim.TruePole;
import org.pofk.claim.Truth;
import org.pofk.exact.ComplexBall;
import org.pofk.meaning.Precision;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.StepEvaluation;

/**
 * Whether a residue is the right one times the distance of its pole from another one: what comes of leaving that factor
 * out where the pole is put in. By enclosures; which pole a residue is stated for is guessed, and only names a slip.
 */
final class ResidueFactors {
    private static final int BITS = 96;

    private ResidueFactors() {
    }

    /** For the residue that stands in one part of the statement; simple poles only. */
    static boolean isOneLeftOut(Claim claim, Statement.Residues residues, int part, Truth truth) {
        FormulaText stated = StatementPart.of(residues).get(part).text();
        List<TruePole> simple = truth.about(residues.output()).poles().stream()
                .filter(pole -> pole.multiplicity() == 1).toList();
        return residues.coefficients().stream()
                .filter(at -> at.coefficients().size() == 1 && at.coefficients().get(0) == stated)
                .flatMap(at -> StepEvaluation.atFaceValue(at.pole().parsed(), 0, BITS).stream())
                .flatMap(place -> simple.stream().min((a, b) -> Double.compare(distance(a, place), distance(b, place)))
                        .stream())
                .anyMatch(own -> isOneLeftOut(claim, stated, own, truth.about(residues.output()).poles()));
    }

    private static boolean isOneLeftOut(Claim claim, FormulaText stated, TruePole own, List<TruePole> poles) {
        ComplexBall spread = StepEvaluation.spread(stated.parsed(), new Precision(claim.carried()), 0, BITS)
                .orElseThrow();
        List<Quantity> others = new ArrayList<>();
        for (TruePole pole : poles) {
            if (pole != own) {
                others.add(pole.value());
            }
            if (!pole.isReal()) {
                others.add(pole.value().conjugate());
            }
        }
        return others.stream().map(other -> own.coefficients().get(0).times(own.value().minus(other)))
                .anyMatch(value -> value.enclose(BITS).overlaps(spread));
    }

    private static double distance(TruePole pole, ComplexBall place) {
        return pole.value().enclose(BITS).minus(place).modulus().middle().approximate();
    }
}
