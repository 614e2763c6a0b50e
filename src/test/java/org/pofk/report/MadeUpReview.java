package org.pofk.report;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.OptionalLong;
import org.pofk.claim.Claim;
import org.pofk.claim.Claims;
import org.pofk.claim.Judgement;
import org.pofk.claim.Judgement.Difference;
import org.pofk.claim.Judgement.JudgedNumber;
import org.pofk.claim.Verdict;
import org.pofk.exact.Decimal;
import org.pofk.exact.Rational;
import org.pofk.input.ClaimsReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.meaning.Fit;
import org.pofk.meaning.Written;
import org.pofk.slip.Finding;
import org.pofk.slip.ReviewedClaims;
import org.pofk.slip.Slip;
import org.pofk.slip.SlipKind;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;
import org.pofk.text.Span;

/** A review whose findings are made up, one of every sort, so that how it is shown can be told from how it is found. */
final class MadeUpReview {
    static final String TEXT = """
            pofk-claims: 1
            model: pump-pair.yaml
            review: {document: PN-12 Brine pumps, revision: B, author: R. Vale, reviewer: T. Okafor, date: 2026-11-30, carried: 4 significant}
            claims:
              - {transform: lost, is: 'z*(0.0025 z + 0.00095)/((z-1)*(z-0.2317)*(z-0.4508))', where: "eq. (3)"}
              - {poles: lost, are: [1, 0.2317, 0.4508], where: "eq. (4)"}
              - {formula: lost, is: '0.008176 - 0.01726*0.4580^k + 0.009084*0.2317^k', where: "eq. (5)", note: checked against the table of the annex}
              - {value: lost, at: 5, is: 0.0082, where: "table 2"}
              - {long run: lost, is: 0.008176}
              - {value: lost, at: 9, is: 0.0083, within: 2%, safe side: above}
              - {bound: lost, at most: 0.01}
              - {pair: lost, radius: 0.52, angle: 39.7 deg, amplitude: 0.66, phase: -119 deg}
            """;

    private MadeUpReview() {
    }

    static ReviewedClaims review() throws RefusedException {
        Claims claims = ClaimsReader.read(Source.ofText("claims.yaml", TEXT),
                Optional.of(Path.of("test-data/models")), Overrides.NONE);
        List<Claim> all = claims.claims();
        List<Finding> findings = new ArrayList<>();
        findings.add(plain(all.get(0), Verdict.ROUNDED, List.of("the number 0.00095 is exact")));
        findings.add(plain(all.get(1), Verdict.EXACT, List.of()));
        findings.add(wrong(all.get(2)));
        findings.add(new Finding(all.get(3), new Judgement(Verdict.WRONG,
                difference("2.4e-4", false, OptionalLong.of(5)), OptionalLong.of(5), List.of(), List.of(), "0.007962"),
                Verdict.CARRIED, OptionalInt.of(3), List.of(), false, Optional.empty()));
        findings.add(plain(all.get(4), Verdict.EXACT, List.of()));
        findings.add(new Finding(all.get(5), new Judgement(Verdict.APPROXIMATE,
                difference("0.0156", true, OptionalLong.of(9)), OptionalLong.empty(), List.of(),
                List.of("it is above the true value, on the safe side"), "0.008172"),
                Verdict.APPROXIMATE, OptionalInt.empty(), List.of(), false, Optional.empty()));
        findings.add(plain(all.get(6), Verdict.UNDECIDED, List.of("the bound is met at every step up to 1000000")));
        findings.add(unexplained(all.get(7)));
        return new ReviewedClaims(claims, findings, List.of("the start", "the transition matrix",
                "the probabilities of the states 'both' and 'one'"));
    }

    private static Optional<Difference> difference(String text, boolean relative, OptionalLong at) {
        return Optional.of(new Difference(new Decimal(text, Rational.of(new java.math.BigDecimal(text)), false), relative,
                at));
    }

    private static Finding plain(Claim claim, Verdict verdict, List<String> remarks) {
        return new Finding(claim, new Judgement(verdict, Optional.empty(), OptionalLong.empty(), List.of(), remarks, ""),
                verdict, OptionalInt.empty(), List.of(), false, Optional.empty());
    }

    private static Finding wrong(Claim claim) {
        String right = "0.008176 - 0.01726*0.4508^k + 0.009084*0.2317^k";
        Slip digits = new Slip(SlipKind.DIGITS_TRANSPOSED, span(7, "0.4580"), "0.4580", "0.4508", right);
        Slip sign = new Slip(SlipKind.SIGN_OF_A_TERM, span(7, "+ 0.009084*0.2317^k"), "+", "-",
                "0.008176 - 0.01726*0.4580^k - 0.009084*0.2317^k");
        return new Finding(claim, new Judgement(Verdict.WRONG, difference("2.31e-4", false, OptionalLong.of(2)),
                OptionalLong.of(1), List.of(), List.of(), right), Verdict.WRONG, OptionalInt.empty(),
                List.of(sign, digits), false, Optional.empty());
    }

    private static Finding unexplained(Claim claim) {
        Written angle = new Written("39.7", Rational.of(397, 10), Rational.of(1, 10), span(12, "39.7"));
        Written amplitude = new Written("0.66", Rational.of(33, 50), Rational.of(1, 100), span(12, "0.66"));
        return new Finding(claim, new Judgement(Verdict.WRONG, Optional.empty(), OptionalLong.empty(),
                List.of(new JudgedNumber(angle, "39.7", Fit.RIGHT), new JudgedNumber(amplitude, "0.33", Fit.WRONG)),
                List.of(), "radius: 0.52, angle: 39.7 deg, amplitude: 0.33, phase: -119 deg"), Verdict.WRONG,
                OptionalInt.empty(), List.of(), false, Optional.of("the amplitude is half again as large as it should be"));
    }

    /** Where a text stands first in a line. */
    private static Span span(int line, String text) {
        int column = TEXT.lines().toList().get(line - 1).indexOf(text) + 1;
        return new Span(new Position("claims.yaml", line, column),
                new Position("claims.yaml", line, column + text.length()));
    }
}
