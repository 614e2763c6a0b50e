package org.pofk.claim;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.answer.When;
import org.pofk.answer.When.Condition;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;

/**
 * The least step from which an output stays within a distance of its long run, or of each value of its cycle, for
 * ever; a relative distance is one for each of them. Proved by {@link When}, class of steps by class.
 */
final class SettledFrom {
    private final OutputTruth truth;
    private final Claim.Within distance;
    private final Map<Rational, When> found = new LinkedHashMap<>();

    private SettledFrom(OutputTruth truth, Claim.Within distance) {
        this.truth = truth;
        this.distance = distance;
    }

    static Answer of(OutputTruth truth, Claim.Within distance) {
        return truth.longRun().accept(new LongRun.Visitor<>() {
            @Override
            public Answer limit(LongRun.Limit limit) {
                return new SettledFrom(truth, distance).answer(List.of(limit.value()));
            }

            @Override
            public Answer cycle(LongRun.Cycle cycle) {
                return new SettledFrom(truth, distance).answer(cycle.values());
            }

            @Override
            public Answer none(LongRun.None none) {
                return none.reason() == LongRun.Reason.CYCLE_TOO_LONG
                        ? Answer.notDecided("its cycle is too long to look at each of its values")
                        : Answer.none("never", "there is no long run to settle at: " + none.explanation());
            }
        });
    }

    private When when(Rational value) {
        Rational bound = distance.relative() ? distance.amount().times(value.abs()) : distance.amount();
        return found.computeIfAbsent(bound, each -> When.of(truth.chain(), truth.closedForm(), truth.longRun(),
                new Condition(Condition.Kind.SETTLED, each)));
    }

    /** One value for each residue of the step. */
    private Answer answer(List<Rational> values) {
        long from = 0;
        boolean isDecided = true;
        for (int residue = 0; residue < values.size(); residue++) {
            int own = residue;
            for (When.ResidueClass each : when(values.get(residue)).classes().stream()
                    .filter(each -> each.residue() % values.size() == own).toList()) {
                if (each.end() == When.End.FAILED || each.end() == When.End.BOTH_FOR_EVER) {
                    return Answer.none("never", "it never stays that close to its long run");
                }
                isDecided &= each.forEverFrom().isPresent();
                from = Math.max(from, each.forEverFrom().orElse(0L) - each.modulus() + 1);
            }
        }
        return isDecided ? remarked(from) : Answer.notDecided("how close it stays isn't decided");
    }

    /** That it comes close before it stays close is worth a word: it is what is read off a table. */
    private Answer remarked(long from) {
        Answer answer = Answer.of(Rational.of(from));
        List<When> whens = new ArrayList<>(found.values());
        Optional<Long> first = whens.size() == 1 ? whens.get(0).first() : Optional.empty();
        return first.filter(step -> step < from).map(step -> answer.remarking("it is that close for the first time at"
                + " k = " + step + ", and again further off until k = " + (from - 1))).orElse(answer);
    }
}
