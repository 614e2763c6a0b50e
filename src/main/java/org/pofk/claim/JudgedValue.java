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
    /** The last step at which equality with a fraction is looked at. */
    private static final long COMPARED = 1_000_000;
    private static final int BITS = 512;

    private JudgedValue() {
    }

    static Judgement of(Statement.Value stated, Claim claim, Truth truth) throws RefusedException {
        OutputTruth output = truth.about(stated.output());
        if (stated.at() <= OutputTruth.EXACT) {
            return exactly(output.valueAt(stated.at()), stated, claim);
        }
        Ball value = FarValue.enclose(output, stated.at(), BITS);
        StatedNumber number = StatedNumber.of(stated.is(), claim);
        Ball face = number.value().enclose(BITS).real();
        if (value.overlaps(face)) {
            return meeting(number, value, stated, claim, output);
        }
        return between(value, stated, claim);
    }

    /** The stated number can't be told from the value by enclosures. */
    private static Judgement meeting(StatedNumber number, Ball value, Statement.Value stated, Claim claim,
            OutputTruth output) throws RefusedException {
        Quantity face = AtFaceValue.of(number.value());
        if (face.rational().isPresent() && stated.at() <= COMPARED
                && output.sequence().isAt(stated.at(), face.rational().get())) {
            return exactly(face.rational().get(), stated, claim);
        }
        return between(value, stated, claim);
    }

    private static Judgement exactly(Rational value, Statement.Value stated, Claim claim) throws RefusedException {
        return JudgedAnswer.between(value, value, stated.is(), claim, OptionalLong.of(stated.at()), List.of());
    }

    private static Judgement between(Ball value, Statement.Value stated, Claim claim) throws RefusedException {
        return JudgedAnswer.between(value.lower(), value.upper(), stated.is(), claim, OptionalLong.of(stated.at()),
                List.of());
    }
}
