package org.pofk.slip;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.stream.IntStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.pofk.claim.AuthorText;
import org.pofk.claim.Claim;
import org.pofk.claim.Judgement;
import org.pofk.claim.Truth;
import org.pofk.claim.Verdict;

/** What undoes a slip is among the candidates, and few others are left once they are held against a few points. */
class CandidatesTest {
    private static final Judgement UNTOLD = new Judgement(Verdict.WRONG, Optional.empty(), OptionalLong.empty(),
            List.of(), List.of(), "");

    private static List<String> kept(Claim claim, Truth truth) {
        List<StatementPart> parts = StatementPart.of(claim.statement());
        List<Optional<AuthorText>> texts = parts.stream().map(part -> AuthorText.of(part.text())).toList();
        List<Optional<Screen>> screens = IntStream.range(0, parts.size())
                .mapToObj(part -> Screen.of(claim, part, truth)).toList();
        List<String> kept = new ArrayList<>();
        for (Change change : new Changes(claim, UNTOLD, truth, texts, screens).all()) {
            if (change.edits().keySet().stream().allMatch(part -> change.textOf(texts.get(part).get(), part)
                    .filter(text -> screens.get(part).map(screen -> screen.mayBeRight(text)).orElse(true))
                    .isPresent())) {
                kept.add(change.kind() + ": " + change.found() + " -> " + change.right());
            }
        }
        return kept;
    }

    @ParameterizedTest
    @MethodSource("org.pofk.slip.Slipped#formulas")
    void whatUndoesASlipIsKeptAndMostElseIsRefuted(Slipped slipped) {
        Claim claim = slipped.claims().claims().get(0);
        List<String> kept = kept(claim, Truth.of(slipped.claims().model().chain()));
        assertTrue(kept.contains(slipped.kind() + ": " + slipped.found() + " -> " + slipped.instead()),
                kept::toString);
        assertTrue(kept.size() <= 80, kept::toString);
    }

    @ParameterizedTest
    @MethodSource({"org.pofk.slip.Slipped#transforms", "org.pofk.slip.Slipped#lists"})
    void whatUndoesASlipInAListOrATransformIsKept(Slipped slipped) {
        Claim claim = slipped.claims().claims().get(0);
        List<String> kept = kept(claim, Truth.of(slipped.claims().model().chain()));
        assertTrue(kept.contains(slipped.kind() + ": " + slipped.found() + " -> " + slipped.instead()),
                kept::toString);
    }

    @ParameterizedTest
    @MethodSource("org.pofk.slip.Slipped#formulas")
    void aRightFormulaIsNotRefuted(Slipped slipped) {
        Claim claim = slipped.rightClaims().claims().get(0);
        Screen screen = Screen.of(claim, 0, Truth.of(slipped.claims().model().chain())).orElseThrow();
        assertTrue(screen.mayBeRight(StatementPart.of(claim.statement()).get(0).text()));
    }

    @org.junit.jupiter.api.Test
    void theSimplestRationalBetweenTwoIsFound() {
        assertEquals(org.pofk.exact.Rational.of(133, 4500), SimplestFraction.between(
                org.pofk.exact.Rational.parse("0.0295555555"), org.pofk.exact.Rational.parse("0.0295555556")));
        assertEquals(org.pofk.exact.Rational.of(-1, 3), SimplestFraction.between(
                org.pofk.exact.Rational.parse("-0.334"), org.pofk.exact.Rational.parse("-0.332")));
    }
}
