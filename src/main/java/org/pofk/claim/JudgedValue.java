package org.pofk.claim;

import java.util.List;
import java.util.OptionalLong;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.meaning.Quantity;
import org.pofk.text.RefusedException;

/**
 * p(k) at one step. A fraction that would be too long is known between two short ones instead; what is said is what
 * holds for both.
 */
final class JudgedValue {
    /** The last step whose value is held as a fraction. */
    private static final long EXACT = 4_000;
    /** The last step at which equality with a fraction is looked at. */
    private static final long COMPARED = 1_000_000;
    private static final int BITS = 512;

    private JudgedValue() {
    }

    static Judgement of(Statement.Value stated, Claim claim, Truth truth) throws RefusedException {
        OutputTruth output = truth.about(stated.output());
        if (stated.at() <= EXACT) {
            return against(output.valueAt(stated.at()), stated, claim);
        }
        Ball value = FarValue.enclose(output, stated.at(), BITS);
        StatedNumber number = StatedNumber.of(stated.is(), claim);
        Ball face = number.value().enclose(BITS).real();
        if (value.overlaps(face)) {
            return meeting(number, value, stated, claim, output);
        }
        return alike(against(value.lower(), stated, claim), against(value.upper(), stated, claim));
    }

    /** The stated number can't be told from the value by enclosures. */
    private static Judgement meeting(StatedNumber number, Ball value, Statement.Value stated, Claim claim,
            OutputTruth output) throws RefusedException {
        Quantity face = AtFaceValue.of(number.value());
        if (face.rational().isPresent() && stated.at() <= COMPARED
                && output.sequence().isAt(stated.at(), face.rational().get())) {
            return against(face.rational().get(), stated, claim);
        }
        Judgement judgement = alike(against(value.lower(), stated, claim), against(value.upper(), stated, claim));
        return judgement.verdict() == Verdict.EXACT ? undecided(judgement) : judgement;
    }

    private static Judgement against(Rational value, Statement.Value stated, Claim claim) throws RefusedException {
        Holding holding = new Holding(claim);
        holding.hold(stated.is(), Quantity.of(value));
        return holding.judgement(texts -> texts.all().get(0), OptionalLong.of(stated.at()));
    }

    private static Judgement alike(Judgement low, Judgement high) {
        return low.verdict() == high.verdict() ? low : undecided(low);
    }

    private static Judgement undecided(Judgement judgement) {
        return new Judgement(Verdict.UNDECIDED, judgement.difference(), OptionalLong.empty(), List.of(),
                List.of("the value is too near to what is stated for enclosures to tell"), judgement.right());
    }
}
