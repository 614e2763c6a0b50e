package org.pofk.chain;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain.Kind;
import org.pofk.exact.Rational;

class ChainCheckTest {
    private static final Rational HALF = Rational.HALF;
    private static final Rational ONE = Rational.ONE;
    private static final Rational ZERO = Rational.ZERO;
    private static final SparseMatrix SOUND = SparseMatrix.ofRows(List.of(List.of(HALF, ONE), List.of(HALF, ZERO)));
    private static final SparseMatrix UNSOUND =
            SparseMatrix.ofRows(List.of(List.of(HALF, Rational.TWO), List.of(ZERO, Rational.of(-1))));

    private static List<String> violations(Kind kind, List<String> states, SparseMatrix matrix, List<Rational> start) {
        return ChainCheck.violations(new Chain(kind, states, matrix, start, Map.of(), List.of()));
    }

    @Test
    void aSoundChainBreaksNoRule() {
        assertEquals(List.of(), violations(Kind.CHAIN, List.of("a", "b"), SOUND, List.of(ONE, ZERO)));
    }

    @Test
    void sumsAndSignsAreForChainsAlone() {
        assertEquals(List.of("moves from a: the sum is not one", "moves from b: negative", "start: the sum is not one"),
                violations(Kind.CHAIN, List.of("a", "b"), UNSOUND, List.of(HALF, ZERO)));
        assertEquals(List.of(), violations(Kind.RECURSION, List.of("a", "b"), UNSOUND, List.of(HALF, ZERO)));
    }

    @Test
    void namesAndSizesAreForAll() {
        assertEquals(List.of("two states of one name"),
                violations(Kind.RECURSION, List.of("a", "a"), SOUND, List.of(ONE, ZERO)));
        assertEquals(List.of("start of another size than the states"),
                violations(Kind.RECURSION, List.of("a", "b"), SOUND, List.of(ONE)));
        assertEquals(List.of("matrix of another size than the states", "start of another size than the states"),
                violations(Kind.RECURSION, List.of("a", "b", "c"), SOUND, List.of(ONE)));
    }
}
