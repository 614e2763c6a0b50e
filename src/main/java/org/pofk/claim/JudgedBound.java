package org.pofk.claim;

import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import org.pofk.answer.Peak;
import org.pofk.answer.When;
import org.pofk.answer.When.Condition.Kind;
import org.pofk.claim.Statement.Bound.Direction;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.Written;
import org.pofk.text.RefusedException;

/**
 * That p(k) is never above, or never below, a number at the steps claimed. At face value: a bound that only holds when
 * it is rounded the other way isn't one. Proved for all steps at once from how the sequence ends; no step is passed over.
 */
final class JudgedBound {
    private static final int BITS = 128;
    /** Steps gone through one by one for the first at which a bound fails. */
    private static final long SEARCHED = 20_000;
    /** Steps up to which a value that enclosures can't tell from the bound is worked out. */
    private static final long EXACT = 1_000;
    /** So many steps that nothing tells, and later ones are nearer still. */
    private static final int MOST_UNTOLD = 100;

    private final Statement.Bound stated;
    private final Claim claim;
    private final OutputTruth truth;
    private final StatedNumber number;

    private JudgedBound(Statement.Bound stated, Claim claim, OutputTruth truth, StatedNumber number) {
        this.stated = stated;
        this.claim = claim;
        this.truth = truth;
        this.number = number;
    }

    static Judgement of(Statement.Bound stated, Claim claim, Truth truth) throws RefusedException {
        return new JudgedBound(stated, claim, truth.about(stated.output()), StatedNumber.of(stated.is(), claim))
                .judgement();
    }

    /** Whether the bound holds at all steps claimed; where it fails first, if that was found. */
    private record Answer(Verdict verdict, OptionalLong first) {
    }

    private Judgement judgement() {
        Quantity face = AtFaceValue.of(number.value());
        Answer answer = face.rational().isPresent() ? against(face.rational().get()) : between(face);
        if (answer.verdict == Verdict.WRONG) {
            Optional<Peak> peak = peak();
            return new Judgement(Verdict.WRONG, Optional.empty(), answer.first, List.of(),
                    peak.map(this::remark).stream().toList(), peak.map(this::right).orElse(""));
        }
        List<String> remarks = answer.verdict == Verdict.UNDECIDED
                ? List.of("whether " + stated.output().name() + " ever passes this bound isn't decided") : List.of();
        return new Judgement(answer.verdict, Optional.empty(), OptionalLong.empty(), List.of(), remarks,
                words() + number.text().text());
    }

    private String words() {
        return stated.output().name() + (stated.direction() == Direction.AT_MOST ? " at most " : " at least ");
    }

    /** An irrational bound by rationals on both sides of it. */
    private Answer between(Quantity face) {
        Ball ball = face.enclose(BITS).real();
        Answer low = against(ball.lower());
        Answer high = against(ball.upper());
        return low.equals(high) ? low : new Answer(Verdict.UNDECIDED, OptionalLong.empty());
    }

    private Answer against(Rational bound) {
        long from = claim.steps().from();
        OptionalLong to = claim.steps().to();
        if (to.isPresent() && to.getAsLong() - from <= SEARCHED) {
            return stepByStep(bound, from, to.getAsLong(), Verdict.EXACT);
        }
        When when = When.of(truth.chain(), truth.closedForm(), truth.longRun(), new When.Condition(
                stated.direction() == Direction.AT_MOST ? Kind.AT_MOST : Kind.AT_LEAST, bound));
        Optional<Long> forEver = when.forEverFrom();
        if (forEver.filter(step -> step <= from).isPresent()) {
            return new Answer(Verdict.EXACT, OptionalLong.empty());
        }
        long last = Math.min(from + SEARCHED, to.orElse(Long.MAX_VALUE));
        Answer found = stepByStep(bound, from, last, Verdict.UNDECIDED);
        boolean fails = forEver.isPresent() ? forEver.get() - 1 <= to.orElse(Long.MAX_VALUE)
                : when.decided() && to.isEmpty();
        return found.verdict == Verdict.UNDECIDED && fails ? new Answer(Verdict.WRONG, OptionalLong.empty()) : found;
    }

    /** The first step that fails, or what it means that none does. */
    private Answer stepByStep(Rational bound, long from, long to, Verdict none) {
        Verdict verdict = none;
        int untold = 0;
        for (long k = from; k <= to && untold <= MOST_UNTOLD; k++) {
            Optional<Boolean> holds = holds(bound, k);
            untold += holds.isEmpty() ? 1 : 0;
            if (holds.isPresent() && !holds.get()) {
                return new Answer(Verdict.WRONG, OptionalLong.of(k));
            }
            verdict = holds.isEmpty() ? Verdict.UNDECIDED : verdict;
        }
        return new Answer(verdict, OptionalLong.empty());
    }

    private Optional<Boolean> holds(Rational bound, long k) {
        if (k > OutputTruth.STEPPED) {
            Ball value = FarValue.enclose(truth, k, BITS);
            if (value.lower().compareTo(bound) > 0 || value.upper().compareTo(bound) < 0) {
                return Optional.of(isOnSide(value.middle(), bound));
            }
            if (k > EXACT) {
                return Optional.empty();
            }
        }
        return Optional.of(isOnSide(truth.valueAt(k), bound));
    }

    private boolean isOnSide(Rational value, Rational bound) {
        int sign = value.compareTo(bound);
        return stated.direction() == Direction.AT_MOST ? sign <= 0 : sign >= 0;
    }

    /** The highest or the lowest value of all steps; empty where it isn't found, or where some steps aren't claimed. */
    private Optional<Peak> peak() {
        if (claim.steps().from() > 0 || claim.steps().to().isPresent() || !truth.isOfChain()) {
            return Optional.empty();
        }
        return stated.direction() == Direction.AT_MOST
                ? Peak.highest(truth.chain(), truth.closedForm(), truth.longRun())
                : Peak.lowest(truth.chain(), truth.output());
    }

    private String remark(Peak peak) {
        String value = AuthorDigits.significant(Quantity.of(extreme(peak)), RightNumber.DIGITS);
        return (stated.direction() == Direction.AT_MOST ? "the largest value is " : "the smallest value is ") + value
                + peak.at().map(k -> ", at k = " + k).orElse(", that of the long run");
    }

    /** Rounded to the author's digits on the safe side. */
    private String right(Peak peak) {
        List<Written> written = number.value().decimals();
        Rational extreme = extreme(peak);
        if (written.isEmpty()) {
            return words() + (peak.value().exact().isPresent() ? extreme.toString()
                    : AuthorDigits.significant(Quantity.of(extreme), RightNumber.DIGITS));
        }
        Rational unit = written.get(0).lastPlace();
        Rational units = extreme.dividedBy(unit);
        Rational whole = stated.direction() == Direction.AT_MOST
                ? Rational.of(units.negate().floor().negate()) : Rational.of(units.floor());
        return words() + AuthorDigits.like(written.get(0), Quantity.of(whole.times(unit)));
    }

    /** The value itself, or the end of a short enclosure that is on the safe side. */
    private Rational extreme(Peak peak) {
        return peak.value().exact().orElseGet(() -> {
            Ball ball = peak.value().enclosure().enclose(BITS);
            return stated.direction() == Direction.AT_MOST ? ball.upper() : ball.lower();
        });
    }
}
