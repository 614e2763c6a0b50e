package org.pofk.longrun;

import java.math.BigInteger;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.chain.Structure;
import org.pofk.transform.Transform;

/**
 * The same long run three ways.
 *
 * @param byPoles     from the poles of Y(z); exact, the one that is shown
 * @param byClasses   from the null spaces and weights of the closed classes; exact; empty for a recursion or above
 *                    {@link ClosedClassLongRun#UNKNOWNS_AT_MOST} unknowns
 * @param highPowers  how close high powers come (certified for a chain, exact for a recursion), and where comparing
 *                    two of them misleads; empty where there is no long run, for cycles longer than what was computed,
 *                    and for recursions of more than {@link RecursionPowers#STATES_AT_MOST} states
 * @param chainPeriod the period of the chain itself (least common multiple over the reached closed classes), of which
 *                    the output's is a divisor; 1 for a recursion
 */
public record LongRunChecks(LongRun byPoles, Optional<LongRun> byClasses, Optional<HighPowers.Verdict> highPowers,
        BigInteger chainPeriod) {
    private static final BigInteger CYCLE_AT_MOST = BigInteger.valueOf(1_000);

    /** For a chain, its structure and closed classes worked out once for all outputs. */
    public record Ground(Chain chain, Structure structure, Optional<ClosedClassLongRun> classes,
            Optional<HighPowers> powers) {

        public static Ground of(Chain chain) {
            Structure structure = Structure.of(chain);
            BigInteger period = periodOf(chain, structure);
            Optional<HighPowers> powers = chain.kind() == Chain.Kind.CHAIN && period.compareTo(CYCLE_AT_MOST) <= 0
                    ? Optional.of(HighPowers.of(chain, period.intValueExact()))
                    : Optional.empty();
            return new Ground(chain, structure, ClosedClassLongRun.of(chain, structure), powers);
        }
    }

    /** Ways (a) and (b) must agree; an {@link AssertionError} names the output when they don't. */
    public static LongRunChecks of(Ground ground, Transform transform) {
        Chain chain = ground.chain;
        LongRun byPoles = chain.kind() == Chain.Kind.CHAIN
                ? LongRunByPoles.ofChain(ground.structure, transform.y())
                : LongRun.of(transform);
        Optional<LongRun> byClasses = ground.classes.map(each -> each.of(transform.output()));
        if (byClasses.isPresent() && !byClasses.get().equals(byPoles)) {
            throw new AssertionError("long run of " + transform.output() + ": " + byPoles + " from the poles, "
                    + byClasses.get() + " from the classes of " + chain);
        }
        return new LongRunChecks(byPoles, byClasses,
                chain.kind() == Chain.Kind.CHAIN
                        ? ground.powers.flatMap(each -> each.against(byPoles, transform.output()))
                        : RecursionPowers.against(chain, byPoles, transform.output()),
                periodOf(chain, ground.structure));
    }

    private static BigInteger periodOf(Chain chain, Structure structure) {
        return chain.kind() == Chain.Kind.RECURSION ? BigInteger.ONE : structure.period();
    }
}
