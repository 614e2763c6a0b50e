package org.pofk.slip;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.pofk.claim.Claim;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Rational;
import org.pofk.meaning.StepEvaluation;

/**
 * What a statement says at face value at a few points, all of its texts; two that can't be told apart there are taken
 * to say the same, which decides only whether both are told.
 */
record Meaning(List<Optional<ComplexBall>> values) {
    private static final int BITS = 96;
    private static final List<Rational> POINTS =
            List.of(Rational.of(2), Rational.of(3), Rational.of(4), Rational.of(5), Rational.of(6));

    Meaning {
        values = List.copyOf(values);
    }

    static Meaning of(Claim claim) {
        List<Optional<ComplexBall>> values = new ArrayList<>();
        for (StatementPart part : StatementPart.of(claim.statement())) {
            for (Rational point : POINTS) {
                Rational step = point.plus(Rational.of(claim.steps().from()));
                values.add(Stream.of("k", "z").flatMap(variable -> StepEvaluation
                        .atFaceValue(part.text().parsed(), variable, step, BITS).stream()).findFirst());
            }
        }
        return new Meaning(values);
    }

    boolean isLike(Meaning other) {
        if (values.size() != other.values.size()) {
            return false;
        }
        for (int i = 0; i < values.size(); i++) {
            Optional<ComplexBall> own = values.get(i);
            if (own.isEmpty() || other.values.get(i).filter(each -> each.overlaps(own.get())).isEmpty()) {
                return false;
            }
        }
        return true;
    }
}
