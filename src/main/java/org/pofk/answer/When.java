package org.pofk.answer;

import java.util.List;
import java.util.Optional;
import java.util.stream.LongStream;
import org.pofk.chain.Chain;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.modes.ClosedForm;
import org.pofk.steps.ExactSteps;
import org.pofk.transform.Sequence;

/**
 * At which steps an output meets a condition: the first one, and the one from which it does for ever. Proved: no step
 * is passed over that could be one.
 *
 * @param first       the first step that meets it; empty when none does, or when that isn't decided
 * @param forEverFrom the least step from which all do; empty when there is none, or when that isn't decided
 * @param classes     how it ends, by residue of the step: one class where all steps end alike
 * @param decided     whether both answers are proved
 * @param reason      why there is no answer, or none for ever
 */
public record When(Condition condition, Optional<Long> first, Optional<Long> forEverFrom, List<ResidueClass> classes,
        boolean decided, Reason reason) {

    /** What is asked. */
    public record Condition(Kind kind, Rational bound) {
        /** {@code SETTLED}: within the bound of the long run, of each of its values where it is a cycle. */
        public enum Kind { AT_LEAST, AT_MOST, SETTLED }

        public Band around(Rational limit) {
            return switch (kind) {
                case AT_LEAST -> new Band(Optional.of(bound), Optional.empty()).minus(limit);
                case AT_MOST -> new Band(Optional.empty(), Optional.of(bound)).minus(limit);
                case SETTLED -> new Band(Optional.of(bound.negate()), Optional.of(bound));
            };
        }
    }

    /** How it ends at the steps k ≡ residue modulo modulus. */
    public record ResidueClass(long residue, long modulus, End end, Optional<Long> first, Optional<Long> forEverFrom) {
    }

    /** How a residue class ends. */
    public enum End {
        MET, FAILED,
        /** Met and failed again and again. */
        BOTH_FOR_EVER,
        /** The bound is the limit, and no theorem decides on which side p(k) approaches it. */
        APPROACH_NOT_DECIDED,
        /** The search reached its limit on work. */
        TOO_MANY_STEPS;

        boolean isDecided() {
            return this == MET || this == FAILED || this == BOTH_FOR_EVER;
        }
    }

    /** What is to be said besides. */
    public enum Reason {
        /** From a step on it is met for ever. */
        FOR_EVER,
        /** Some residue classes meet it for ever, others don't. */
        ONLY_IN_SOME_CLASSES,
        /** Met and failed again and again. */
        AGAIN_AND_AGAIN,
        /** Met at some steps only, and at none from some step on. */
        ONLY_FOR_A_WHILE,
        /** At no step. */
        NEVER,
        /** What is given has probability zero at every step: there is nothing that could be met or missed. */
        NOTHING_DEFINED,
        /** The long run is neither a limit nor a cycle that is listed. */
        NO_LONG_RUN,
        /** The bound is a value of the long run, and no theorem decides on which side p(k) approaches it. */
        APPROACH_NOT_DECIDED,
        /** The search reached its limit on work. */
        TOO_MANY_STEPS
    }

    public When {
        classes = List.copyOf(classes);
    }

    /** The answer for one output. */
    public static When of(Chain chain, ClosedForm closedForm, LongRun longRun, Condition condition) {
        Optional<Constraint> constraint = Constraint.of(chain, closedForm, longRun, condition);
        if (constraint.isEmpty()) {
            return withoutLongRun(chain, closedForm, condition);
        }
        WhenSearch search = new WhenSearch(List.of(constraint.get()));
        return WhenSummary.of(condition, search.classes(search.modulus(1)));
    }

    /** Settling on nothing is never decided; a bound often is, by the sign that p(k) less the bound has in the end. */
    private static When withoutLongRun(Chain chain, ClosedForm form, Condition condition) {
        if (condition.kind != Condition.Kind.SETTLED) {
            When found = ScaledDifference.of(form.transform(), condition.bound).when(condition.kind);
            if (found.decided) {
                return new When(condition, found.first, found.forEverFrom, found.classes, true, found.reason);
            }
        }
        return new When(condition, firstOfFew(chain, form, condition), Optional.empty(), List.of(), false,
                Reason.NO_LONG_RUN);
    }

    private static Optional<Long> firstOfFew(Chain chain, ClosedForm form, Condition condition) {
        if (condition.kind == Condition.Kind.SETTLED) {
            return Optional.empty();
        }
        Sequence exact = Sequence.of(chain, form.transform());
        Band band = condition.around(Rational.ZERO);
        return LongStream.rangeClosed(0, ExactSteps.FEW).filter(k -> band.contains(exact.at(k))).boxed().findFirst();
    }
}
