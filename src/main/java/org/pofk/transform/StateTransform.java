package org.pofk.transform;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.exact.Factorization;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;

/**
 * All states at once over one denominator: Σ x(k) z^(−k) = z · numerators(z) / recurrence(z), nothing cancelled, so
 * that partial fractions of numerator_s/recurrence are the modes of state s, with z/(z−λ)^j for 1/(z−λ)^j. Exact.
 *
 * @param recurrence D, the monic polynomial of least degree d with D(A) x(0) = 0; keeps z^m
 * @param numerators one for each state of the chain, degree below d; zero for a state never reached
 * @param factors    the factors of D
 * @param proof      why D(A) x(0) = 0
 */
public record StateTransform(Polynomial<Rational> recurrence, List<Polynomial<Rational>> numerators,
        Factorization<Rational> factors, RecurrenceProof proof) {
    public StateTransform {
        numerators = List.copyOf(numerators);
    }

    /** The transform of x(k) for the chain's start. Cost: d·n numbers of the length of D's. */
    public static StateTransform of(Chain chain) {
        Reduction reduction = Reduction.ofState(chain);
        Recurrence recurrence = Recurrences.ofState(reduction.reduced());
        List<Polynomial<Rational>> numerators = new ArrayList<>(Collections.nCopies(chain.size(),
                Polynomial.zero(recurrence.denominator().field())));
        List<List<Integer>> blocks = reduction.lumpings().isEmpty()
                ? IntStream.range(0, reduction.kept().size()).mapToObj(List::of).toList()
                : reduction.lumpings().get(0).blocks();
        for (int block = 0; block < blocks.size(); block++) {
            Polynomial<Rational> share =
                    recurrence.numerators().get(block).times(Rational.of(1, blocks.get(block).size()));
            blocks.get(block).forEach(place -> numerators.set(reduction.kept().get(place), share));
        }
        return new StateTransform(recurrence.denominator(), numerators,
                new DenominatorFactors(chain).of(recurrence.denominator()), recurrence.proof());
    }
}
