package org.pofk.claim;

import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.meaning.Quantity;
import org.pofk.text.RefusedException;

/**
 * A number that is to be another one. Where that is known between two fractions only, what is said is what holds for
 * both.
 */
final class JudgedAnswer {
    private static final int DIGITS = 6;
    private static final int LONGEST_FRACTION = 24;

    private JudgedAnswer() {
    }

    static Judgement of(AnswerOf stated, Claim claim, Truth truth) throws RefusedException {
        Answer answer = Answers.of(stated, truth);
        return switch (answer.standing()) {
            case KNOWN -> told(between(answer.low(), answer.high(), stated.is(), claim, OptionalLong.empty(),
                    answer.remarks()), answer);
            case NONE -> without(Verdict.WRONG, answer.remarking("there is no such number: "
                    + String.join("; ", answer.remarks())));
            case NOT_DECIDED -> without(Verdict.UNDECIDED, answer);
        };
    }

    private static Judgement without(Verdict verdict, Answer answer) {
        return new Judgement(verdict, Optional.empty(), OptionalLong.empty(), List.of(), answer.remarks(),
                answer.word());
    }

    /** Against a number between two fractions, the same one twice where it is known exactly. */
    static Judgement between(Rational low, Rational high, FormulaText is, Claim claim, OptionalLong step,
            List<String> remarks) throws RefusedException {
        Judgement judgement = against(low, is, claim, step, remarks);
        return low.equals(high) ? judgement : alike(judgement, against(high, is, claim, step, remarks));
    }

    private static Judgement against(Rational value, FormulaText is, Claim claim, OptionalLong step,
            List<String> remarks) throws RefusedException {
        Holding holding = new Holding(claim);
        remarks.forEach(holding::remark);
        holding.hold(is, Quantity.of(value));
        return holding.judgement(texts -> texts.all().get(0), step);
    }

    /** With more of the true value than the digits of the author show, where it is known exactly. */
    private static Judgement told(Judgement judgement, Answer answer) {
        boolean isKnown = answer.low().equals(answer.high()) && !answer.low().isInteger();
        return judgement.verdict() == Verdict.WRONG && isKnown ? judgement.remarking("the true value is "
                + inFull(answer)) : judgement;
    }

    /** A number: as it is where that is short, and what that comes to. */
    static String inFull(Answer answer) {
        String fraction = answer.low().toString();
        String decimals = "about " + Decimals.of(answer.low(), DIGITS).text();
        boolean isShort = answer.low().equals(answer.high()) && fraction.length() <= LONGEST_FRACTION;
        return !isShort ? decimals : answer.low().isInteger() ? fraction : fraction + ", " + decimals;
    }

    /** That nothing between the two is what is stated isn't known of a number that is both. */
    private static Judgement alike(Judgement low, Judgement high) {
        return low.verdict() == high.verdict() && low.verdict() != Verdict.EXACT ? low : undecided(low);
    }

    static Judgement undecided(Judgement judgement) {
        return new Judgement(Verdict.UNDECIDED, judgement.difference(), OptionalLong.empty(), List.of(),
                List.of("the value is too near to what is stated for enclosures to tell"), judgement.right());
    }
}
