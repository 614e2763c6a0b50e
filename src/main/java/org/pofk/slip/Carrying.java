package org.pofk.slip;

import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;
import java.util.stream.Collectors;
import org.pofk.claim.Claim;
import org.pofk.claim.Judgement;
import org.pofk.claim.Judging;
import org.pofk.claim.Truth;
import org.pofk.claim.Verdict;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.ParsedFormula;
import org.pofk.text.Span;

/**
 * Whether a wrong claim is right for what an earlier wrong one implies. An earlier claim is rounded itself, so that what
 * was worked out from it with more digits than it shows may differ in the last places: where every decimal of the later
 * claim is within a few units of what the earlier one implies, it follows from it.
 */
final class Carrying {
    private static final Rational UNITS = Rational.of(4);

    private Carrying() {
    }

    /** The first earlier step that a claim follows from. */
    static OptionalInt from(Claim claim, Judgement judgement, Truth truth, List<Implied> implied) {
        if (isOnTheWrongSideOnly(claim, truth)) {
            return OptionalInt.empty();
        }
        // what is nearly right doesn't follow from an earlier step just because that is nearly right too
        boolean nearlyRight = isNear(claim, judgement);
        for (Implied each : implied) {
            Optional<Claim> seen = each.seen().apply(claim);
            if (seen.isPresent()) {
                Truth other = each.truth().apply(claim);
                if (Judging.isRight(seen.get(), other) || !nearlyRight
                        && isNear(seen.get(), Judging.of(seen.get(), other))) {
                    return OptionalInt.of(each.from());
                }
            }
        }
        return OptionalInt.empty();
    }

    /** An approximation near enough to the truth itself, that only lies on its unsafe side. */
    private static boolean isOnTheWrongSideOnly(Claim claim, Truth truth) {
        return claim.safeSide().isPresent() && Judging.isRight(new Claim(claim.number(), claim.kind(), claim.of(),
                claim.statement(), claim.where(), claim.steps(), claim.carried(), claim.within(), Optional.empty(),
                claim.note(), claim.position()), truth);
    }

    /** Wrong, but every decimal there is has a right value, and each is within a few units of its last place. */
    private static boolean isNear(Claim claim, Judgement judgement) {
        if (judgement.verdict() != Verdict.WRONG) {
            return false;
        }
        Set<Span> near = judgement.numbers().stream().filter(Carrying::isNear).map(each -> each.written().span())
                .collect(Collectors.toSet());
        List<Span> decimals = StatementPart.of(claim.statement()).stream()
                .flatMap(part -> part.text().parsed().nodes())
                .filter(node -> node.formula() instanceof Formula.WrittenDecimal).map(ParsedFormula::span).toList();
        return !decimals.isEmpty() && near.containsAll(decimals);
    }

    private static boolean isNear(Judgement.JudgedNumber number) {
        try {
            return Rational.parse(number.right()).minus(number.written().value()).abs()
                    .compareTo(UNITS.times(number.written().lastPlace())) <= 0;
        } catch (NumberFormatException noDecimal) {
            return false;
        }
    }
}
