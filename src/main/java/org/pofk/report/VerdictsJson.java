package org.pofk.report;

import java.util.Locale;
import java.util.Optional;
import java.util.OptionalLong;
import org.pofk.claim.Claim;
import org.pofk.claim.Claims;
import org.pofk.claim.Judgement;
import org.pofk.claim.Judgement.Difference;
import org.pofk.meaning.Carried;
import org.pofk.slip.Finding;
import org.pofk.slip.ReviewedClaims;
import org.pofk.slip.Slip;

/** A derivation with its verdicts as data: {@code pofk-verdicts}. */
public final class VerdictsJson {
    private final Json json;
    private final ReviewedClaims reviewed;

    private VerdictsJson(Json json, ReviewedClaims reviewed) {
        this.json = json;
        this.reviewed = reviewed;
    }

    public static String write(ReviewedClaims reviewed) {
        return Json.ofObject(json -> new VerdictsJson(json, reviewed).fields());
    }

    private void fields() {
        Claims claims = reviewed.claims();
        JsonHead.write(json, "pofk-verdicts", "check", claims.model());
        json.object("file", () -> {
            json.text("file", claims.origin().file());
            json.text("sha256", claims.origin().sha256());
        });
        json.object("review", () -> review(claims.review()));
        json.list("claims", reviewed.findings(), this::finding);
        count("firstWrong", reviewed.firstWrong()
                .map(first -> OptionalLong.of(first.claim().number())).orElse(OptionalLong.empty()));
        json.list("notReached", reviewed.notReached(), claim -> json.count(claim.number()));
        json.texts("notStated", reviewed.notStated());
    }

    private void review(Claims.Review review) {
        json.text("document", review.document());
        json.text("revision", review.revision());
        json.text("author", review.author());
        json.text("reviewer", review.reviewer());
        json.text("date", review.date());
        json.text("convention", review.convention().map(VerdictsJson::word));
        json.text("carried", review.carried().map(VerdictsJson::carried));
    }

    private static String carried(Carried carried) {
        return carried.count() + " " + word(carried.unit());
    }

    private void finding(Finding finding) {
        Claim claim = finding.claim();
        Judgement judgement = finding.judgement();
        Optional<Difference> difference = judgement.difference();
        json.object(() -> {
            json.count("number", claim.number());
            json.text("where", claim.where());
            json.text("kind", claim.kind());
            json.text("of", claim.of());
            json.count("line", claim.position().line());
            json.text("verdict", word(finding.verdict()));
            count("carriedFrom", finding.carriedFrom().isPresent()
                    ? OptionalLong.of(finding.carriedFrom().getAsInt()) : OptionalLong.empty());
            json.text("largestDifference", difference.map(found -> found.size().text()));
            json.text("differenceIs", difference.map(found -> found.relative() ? "relative" : "absolute"));
            count("differenceAt", difference.map(Difference::at).orElse(OptionalLong.empty()));
            count("firstWrongStep", judgement.firstWrongStep());
            json.list("numbers", judgement.numbers(), this::number);
            json.list("slips", finding.slips(), this::slip);
            json.text("slipsExplain", finding.slips().isEmpty() ? Optional.empty()
                    : Optional.of(finding.together() ? "together" : "each alone"));
            json.text("unexplained", finding.rest());
            json.texts("remarks", judgement.remarks());
            json.text("right", Optional.of(judgement.right()).filter(right -> !right.isBlank()));
        });
    }

    private void number(Judgement.JudgedNumber number) {
        json.object(() -> {
            json.text("written", number.written().text());
            json.count("line", number.written().span().start().line());
            json.count("column", number.written().span().start().column());
            json.text("right", number.right());
            json.text("fit", word(number.fit()));
        });
    }

    private void slip(Slip slip) {
        json.object(() -> {
            json.text("name", word(slip.kind()));
            json.text("inWords", slip.kind().inWords());
            json.count("line", slip.span().start().line());
            json.count("column", slip.span().start().column());
            json.text("found", slip.found());
            json.text("right", slip.right());
            json.text("corrected", slip.corrected());
        });
    }

    /** {@code CUT_OFF} is written {@code cut off}. */
    private static String word(Enum<?> constant) {
        return constant.name().toLowerCase(Locale.ROOT).replace('_', ' ');
    }

    private void count(String field, OptionalLong count) {
        if (count.isPresent()) {
            json.count(field, count.getAsLong());
        } else {
            json.text(field, Optional.empty());
        }
    }
}
