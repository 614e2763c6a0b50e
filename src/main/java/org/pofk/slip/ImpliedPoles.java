package org.pofk.slip;

import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import org.pofk.chain.Output;
import org.pofk.claim.Claim;
import org.pofk.claim.Statement;
import org.pofk.claim.Statement.MatrixPolynomial.Which;
import org.pofk.claim.Truth;

/**
 * What a wrong characteristic or minimal polynomial implies: the poles of each output, and what is worked out with them.
 * The numerator is the right one, as it doesn't come from the polynomial. Each output is worked out once.
 */
final class ImpliedPoles {
    private final Statement.MatrixPolynomial stated;
    private final Truth truth;
    private final Map<Output, Optional<Truth>> known = new ConcurrentHashMap<>();

    ImpliedPoles(Statement.MatrixPolynomial stated, Truth truth) {
        this.stated = stated;
        this.truth = truth;
    }

    /** A later claim made of poles, as one about the recursion with these poles. */
    Optional<Claim> seen(Claim later) {
        Statement statement = later.statement();
        boolean isOfPoles = statement instanceof Statement.Poles || statement instanceof Statement.Pair
                || statement instanceof Statement.TransformOf || statement instanceof Statement.Residues
                || statement instanceof Statement.PofK;
        return Outcomes.only(statement).filter(output -> isOfPoles).flatMap(output -> of(output)
                .map(implied -> Candidate.with(later, Outcomes.mapped(statement,
                        each -> FaceValue.output(output.name(), implied.chain().size())))));
    }

    /** What is true of the output of such a claim. */
    Truth truth(Claim later) {
        return Outcomes.only(later.statement()).flatMap(this::of)
                .orElseThrow(() -> new AssertionError("nothing is implied of claim " + later.number()));
    }

    private Optional<Truth> of(Output output) {
        return known.computeIfAbsent(output, each -> (stated.which() == Which.MINIMAL
                ? Optional.of(truth.minimalPolynomial()) : truth.characteristicPolynomial())
                .flatMap(right -> FaceValue.of(stated, right, truth.about(each))).map(Truth::of));
    }
}
