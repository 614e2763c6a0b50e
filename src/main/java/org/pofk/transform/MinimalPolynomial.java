package org.pofk.transform;

import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.RationalField;

/**
 * The monic polynomial m of least degree with m(A) = 0: the least common multiple of those that annihilate the single
 * states, each with its proof. Exact. It has the eigenvalues of the characteristic polynomial, each as often as its
 * largest Jordan block is long. Cost: the recurrence of the state, n times at most.
 */
public final class MinimalPolynomial {
    private MinimalPolynomial() {
    }

    public static Polynomial<Rational> of(Chain chain) {
        Polynomial<Rational> common = Polynomial.one(RationalField.Q);
        for (int state = 0; state < chain.size() && common.degree() < chain.size(); state++) {
            Polynomial<Rational> own = Recurrences.ofState(Reduction.ofState(startedIn(chain, state)).reduced())
                    .denominator();
            common = common.times(own.dividedExactlyBy(common.greatestCommonDivisor(own)));
        }
        return common;
    }

    private static Chain startedIn(Chain chain, int state) {
        return new Chain(chain.kind(), chain.states(), chain.matrix(), IntStream.range(0, chain.size())
                .mapToObj(i -> i == state ? Rational.ONE : Rational.ZERO).toList(), chain.sets(), chain.outputs());
    }
}
