package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.exception.MathRuntimeException;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Guess;
import org.pofk.exact.Root;
import org.pofk.exact.Roots;
import org.pofk.modes.ClosedForm;

/**
 * The certified poles of an output beside the eigenvalues of A that Commons Math finds in doubles. A comparison, no
 * verdict: multiple eigenvalues come out of doubles only to a fraction of their digits.
 *
 * @param poles           how many different poles were compared
 * @param largestDistance of a pole from the eigenvalue nearest to it; empty when there was no comparison
 * @param reason          why there was none; empty otherwise
 */
public record PoleCheck(int poles, Optional<Double> largestDistance, Optional<String> reason) {
    /** Larger matrices aren't taken apart in doubles. */
    public static final int STATES_AT_MOST = 400;
    private static final int BITS = 60;

    public static PoleCheck of(Chain chain, ClosedForm closedForm) {
        if (chain.size() > STATES_AT_MOST) {
            return none("more than " + STATES_AT_MOST + " states");
        }
        try {
            List<Complex> eigenvalues = eigenvalues(chain, closedForm.transform().output());
            int poles = 0;
            double largest = 0;
            for (Roots roots : closedForm.roots()) {
                for (Root root : roots.all()) {
                    double distance = distance(root.enclose(BITS), eigenvalues);
                    largest = Math.max(largest, distance);
                    poles++;
                }
            }
            return new PoleCheck(poles, Optional.of(largest), Optional.empty());
        } catch (MathRuntimeException failure) {
            return none("the eigenvalue iteration in doubles doesn't converge");
        }
    }

    private static PoleCheck none(String reason) {
        return new PoleCheck(0, Optional.empty(), Optional.of(reason));
    }

    /** Those of A, and the one of the constant that an output may add. */
    private static List<Complex> eigenvalues(Chain chain, Output output) {
        List<Complex> eigenvalues = new ArrayList<>();
        for (Guess each : Eigenvalues.inDoubles(chain.matrix())) {
            eigenvalues.add(new Complex(each.real(), each.imaginary()));
        }
        if (!output.constant().isZero()) {
            eigenvalues.add(Complex.ONE);
        }
        return eigenvalues;
    }

    private static double distance(ComplexBall pole, List<Complex> eigenvalues) {
        Complex middle = new Complex(pole.real().middle().approximate(), pole.imaginary().middle().approximate());
        return eigenvalues.stream().mapToDouble(each -> each.subtract(middle).abs()).min()
                .orElse(Double.POSITIVE_INFINITY);
    }
}
