package org.pofk.report;

import java.math.BigDecimal;
import java.util.Locale;
import java.util.Optional;
import org.pofk.claim.AnswerOf;
import org.pofk.claim.Claim;
import org.pofk.claim.Claim.SafeSide;
import org.pofk.claim.Claim.Within;
import org.pofk.claim.Judgement;
import org.pofk.claim.Statement;
import org.pofk.claim.Verdict;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.slip.Finding;

/** Verdicts in words. */
final class VerdictProse {
    private static final Rational HUNDRED = Rational.of(100);
    private static final int PLACES = 12;

    private VerdictProse() {
    }

    /** {@code wrong}. */
    static String word(Verdict verdict) {
        return verdict.name().toLowerCase(Locale.ROOT);
    }

    /** {@code wrong}, {@code carried from 3}. */
    static String of(Finding finding) {
        return word(finding.verdict()) + (finding.carriedFrom().isPresent()
                ? " from " + finding.carriedFrom().getAsInt() : "");
    }

    /** What a verdict means. */
    static String meaning(Verdict verdict) {
        return switch (verdict) {
            case EXACT -> "identical for every k it is claimed for, proved";
            case ROUNDED -> "every number in it is right to the digits written, or cut off where that is said";
            case APPROXIMATE -> "no further off than it is claimed to be, and on the side claimed to be safe";
            case CARRIED -> "wrong, but what follows from an earlier wrong step";
            case WRONG -> "not what it claims to be";
            case UNDECIDED -> "neither proved nor refuted within the bounds on the work";
        };
    }

    /** The verdict with what is known about it, {@code wrong, first at k = 1; off by up to 2.3e-4, at k = 2}. */
    static Prose explained(Finding finding) {
        Judgement judgement = finding.judgement();
        String verdict = finding.carriedFrom().isPresent() ? "wrong" : word(finding.verdict());
        boolean isOfOneStep = finding.claim().statement() instanceof Statement.Value;
        return Prose.of(verdict + (judgement.firstWrongStep().isPresent() && !isOfOneStep
                ? ", first at " + step(judgement.firstWrongStep().getAsLong()) : "")
                + (finding.carriedFrom().isPresent()
                ? ", but what follows from claim " + finding.carriedFrom().getAsInt() : "")
                + largestError(finding).map(error -> "; " + off(finding.verdict()) + error).orElse(""));
    }

    private static String step(long k) {
        return "k = ".replace(' ', Spelling.NO_BREAK) + k;
    }

    private static String off(Verdict verdict) {
        return verdict == Verdict.WRONG || verdict == Verdict.CARRIED ? "off by up to "
                : "as printed it is off by at most ";
    }

    /** {@code within 2 %, above the true value}. */
    static String claimed(Within within, Claim claim) {
        return amount(within) + claim.safeSide().map(side -> side == SafeSide.ABOVE
                ? ", not below the true value" : ", not above the true value").orElse("");
    }

    /** {@code within 2 %}. */
    static String amount(Within within) {
        return "within " + (within.relative() ? Decimals.of(within.amount().times(HUNDRED), PLACES).text() + " %"
                : Decimals.of(within.amount(), PLACES).text());
    }

    /** {@code 2.1e-4, at k = 2}; a relative error in per cent; nothing for what is exact. */
    static Optional<String> largestError(Finding finding) {
        boolean isOverSteps = finding.claim().statement() instanceof Statement.PofK;
        return finding.judgement().difference().filter(difference -> finding.verdict() != Verdict.EXACT)
                .filter(difference -> new BigDecimal(difference.size().text()).signum() != 0)
                .map(difference -> size(difference, unit(finding.claim().statement(), difference)) + (!isOverSteps ? ""
                        : difference.at().isPresent() ? ", at " + step(difference.at().getAsLong())
                        : ", approached as k grows"));
    }

    /** Steps, where it is steps that were counted. */
    private static String unit(Statement statement, Judgement.Difference difference) {
        boolean isInSteps = statement instanceof AnswerOf.SettlingStep || statement instanceof AnswerOf.MeanPassage;
        return !isInSteps ? "" : Spelling.NO_BREAK + (difference.size().text().equals("1") ? "step" : "steps");
    }

    /** {@code 2.1e-4}, or {@code 1.3 %} of the true value. */
    private static String size(Judgement.Difference difference, String unit) {
        String size = difference.size().text();
        return difference.relative() ? new BigDecimal(size).movePointRight(2).toPlainString() + " %" : size + unit;
    }
}
