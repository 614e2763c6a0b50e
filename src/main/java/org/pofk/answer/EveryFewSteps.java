package org.pofk.answer;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Collections;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Reach;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Structure;
import org.pofk.exact.LeastCommonMultiple;
import org.pofk.exact.Rational;

/**
 * A chain seen at every d-th step only, A^d from A^r x(0), where d is a multiple of the period of every class that
 * matters: then of its poles none of the outermost, of each class, shares its modulus with another but equal ones
 * (Perron and Frobenius; Seneta 1981, section 1.3, from memory). Exact.
 */
final class EveryFewSteps {
    private EveryFewSteps() {
    }

    /** The least common multiple of the periods of the classes that are reached and lead into these states. */
    static BigInteger period(Chain chain, Collection<Integer> into) {
        Set<Integer> leading = new HashSet<>(Reach.into(chain.matrix(), into));
        return Structure.of(chain).classes().stream()
                .filter(each -> each.reached() && each.period() > 1 && leading.contains(each.states().get(0)))
                .map(each -> BigInteger.valueOf(each.period()))
                .reduce(BigInteger.ONE, LeastCommonMultiple::of);
    }

    /** One chain for each residue r = 0 … d − 1; its m-th step is the step r + d m. */
    static List<Chain> of(Chain chain, int d) {
        if (d == 1) {
            return List.of(chain);
        }
        SparseMatrix power = power(chain.matrix(), d);
        List<Chain> chains = new ArrayList<>();
        List<Rational> start = chain.start();
        for (int r = 0; r < d; r++) {
            chains.add(new Chain(chain.kind(), chain.states(), power, start, chain.sets(), chain.outputs()));
            start = chain.matrix().times(start);
        }
        return chains;
    }

    private static SparseMatrix power(SparseMatrix matrix, int d) {
        List<List<SparseMatrix.Entry>> columns = new ArrayList<>();
        for (int j = 0; j < matrix.size(); j++) {
            List<Rational> column = new ArrayList<>(Collections.nCopies(matrix.size(), Rational.ZERO));
            column.set(j, Rational.ONE);
            List<Rational> image = column;
            for (int k = 0; k < d; k++) {
                image = matrix.times(image);
            }
            List<Rational> full = image;
            columns.add(IntStream.range(0, matrix.size())
                    .mapToObj(i -> new SparseMatrix.Entry(i, full.get(i))).toList());
        }
        return new SparseMatrix(columns);
    }
}
