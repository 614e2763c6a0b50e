package org.pofk.slip;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;
import java.util.function.Consumer;
import org.pofk.claim.Claim;
import org.pofk.claim.Claims;
import org.pofk.claim.Judgement;
import org.pofk.claim.Judging;
import org.pofk.claim.Statement;
import org.pofk.claim.Truth;
import org.pofk.claim.Verdict;

/**
 * Judges a derivation step by step. A wrong step is carried when it is right for what an earlier wrong step implies;
 * otherwise the slips that explain it are named.
 */
public final class Reviewing {
    private final Truth truth;
    private final OtherTruths others;
    private final List<Implied> implied = new ArrayList<>();

    private Reviewing(Claims claims, ModelTruths known) {
        this.truth = known.truth();
        this.others = new OtherTruths(known, contradicted(claims));
    }

    /** Whose file states the start or the matrix rightly hasn't misread it. */
    private Set<SlipKind> contradicted(Claims claims) {
        Set<SlipKind> contradicted = EnumSet.noneOf(SlipKind.class);
        for (Claim claim : claims.claims()) {
            if (claim.statement() instanceof Statement.Start && Judging.isRight(claim, truth)) {
                contradicted.add(SlipKind.START_MISREAD);
            } else if (claim.statement() instanceof Statement.Matrix && Judging.isRight(claim, truth)) {
                // the right matrix may still be turned when it is used
                contradicted.addAll(List.of(SlipKind.RATE_AS_PROBABILITY, SlipKind.TWO_EVENT_MOVE_FORGOTTEN,
                        SlipKind.ABSORBING_STATE_LEFT));
            }
        }
        return contradicted;
    }

    public static ReviewedClaims of(Claims claims, Variants variants) {
        return of(claims, variants, ignored -> { });
    }

    /** The same; what is found so far is published after each step. */
    public static ReviewedClaims of(Claims claims, Variants variants, Consumer<ReviewedClaims> published) {
        return of(claims, ModelTruths.of(claims.model(), variants), published);
    }

    /** The same of one of several derivations about a model, for which what is true of it is found once. */
    public static ReviewedClaims of(Claims claims, ModelTruths known, Consumer<ReviewedClaims> published) {
        Reviewing reviewing = new Reviewing(claims, known);
        List<String> notStated = NotStated.in(claims.claims());
        List<Finding> findings = new ArrayList<>();
        for (Claim claim : claims.claims()) {
            findings.add(reviewing.finding(claim));
            published.accept(new ReviewedClaims(claims, findings, notStated));
        }
        return new ReviewedClaims(claims, findings, notStated);
    }

    private Finding finding(Claim claim) {
        Judgement judgement = Judging.of(claim, truth);
        if (judgement.verdict() != Verdict.WRONG) {
            return new Finding(claim, judgement, judgement.verdict(), OptionalInt.empty(), List.of(), false,
                    Optional.empty());
        }
        OptionalInt from = Carrying.from(claim, judgement, truth, implied);
        if (from.isPresent()) {
            // what it implies is what the earlier step implies, as far as its own digits go
            implied.addAll(Implied.of(claim, Explanation.NOTHING, truth)
                    .stream().map(own -> new Implied(from.getAsInt(), own.seen(), own.truth())).toList());
            return new Finding(claim, judgement, Verdict.CARRIED, from, List.of(), false, Optional.empty());
        }
        Explanation explanation = Explaining.of(claim, judgement, truth, others);
        implied.addAll(Implied.of(claim, explanation, truth));
        return new Finding(claim, judgement, Verdict.WRONG, OptionalInt.empty(), explanation.slips(),
                explanation.together(), explanation.rest());
    }
}
