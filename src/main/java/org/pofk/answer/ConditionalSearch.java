package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.answer.When.Condition;
import org.pofk.answer.When.Condition.Kind;
import org.pofk.answer.When.ResidueClass;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.longrun.LongRunValues;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.KnownPoles;
import org.pofk.steps.PossibleSteps;
import org.pofk.transform.Transform;
import org.pofk.transform.Transforms;

/**
 * Answers {@link ConditionalWhen} for one output: for each residue of k the sign of a − t b on the chain seen every few
 * steps, for a distance from the limit two of them. A limit that is no fraction stands between two that are near; both
 * have to give the same answer.
 */
final class ConditionalSearch {
    private static final long MOST_CLASSES = 240;
    private static final Band NOT_NEGATIVE = new Band(Optional.of(Rational.ZERO), Optional.empty());
    private static final Band NOT_POSITIVE = new Band(Optional.empty(), Optional.of(Rational.ZERO));

    private final ConditionalForms forms;
    private final PossibleSteps possible;
    private final ConditionalLongRun longRun;
    private final int output;
    private final KnownPoles poles = new KnownPoles();

    private ConditionalSearch(ConditionalForms forms, PossibleSteps possible, ConditionalLongRun longRun, int output) {
        this.forms = forms;
        this.possible = possible;
        this.longRun = longRun;
        this.output = output;
    }

    static When of(ConditionalForms forms, PossibleSteps possible, ConditionalLongRun longRun, int output,
            WhenModel.Asked asked) {
        ConditionalSearch search = new ConditionalSearch(forms, possible, longRun, output);
        Rational size = asked.relative() ? longRun.largest() : Rational.ONE;
        Condition condition = new Condition(asked.kind(), asked.bound().times(size));
        if (condition.kind() != Kind.SETTLED || search.limitsAreFractions()) {
            return search.answer(condition, condition.bound());
        }
        When inner = search.answer(condition, condition.bound().minus(ConditionalLongRun.NEAR_WITHIN));
        When outer = search.answer(condition, condition.bound().plus(ConditionalLongRun.NEAR_WITHIN));
        return inner.equals(outer) ? inner : new When(condition, Optional.empty(), Optional.empty(), List.of(), false,
                When.Reason.TOO_MANY_STEPS);
    }

    private boolean limitsAreFractions() {
        return longRun.values().stream().flatMap(Optional::stream).allMatch(value -> value.rational().isPresent());
    }

    private When answer(Condition condition, Rational bound) {
        int period = forms.period();
        List<WhenSearch> searches = new ArrayList<>();
        long modulus = 1;
        for (int r = 0; r < period; r++) {
            searches.add(search(condition.kind(), bound, r));
            long next = searches.get(r).modulus(modulus);
            modulus = next * period <= MOST_CLASSES ? next : modulus;
        }
        ResidueClass[] classes = new ResidueClass[Math.toIntExact(modulus * period)];
        for (int r = 0; r < period; r++) {
            for (ResidueClass each : searches.get(r).classes(modulus)) {
                ResidueClass moved = inSteps(each, r, period);
                classes[(int) moved.residue()] = moved;
            }
        }
        return WhenSummary.of(condition, List.of(classes));
    }

    /** m and its residues told in k = r + d m. */
    private static ResidueClass inSteps(ResidueClass each, long r, long d) {
        return new ResidueClass(r + d * each.residue(), d * each.modulus(), each.end(),
                each.first().map(m -> r + d * m), each.forEverFrom().map(m -> r + d * m));
    }

    private WhenSearch.Possible possible(int r) {
        int d = forms.period();
        long from = possible.from() <= r ? 0 : (possible.from() - r + d - 1) / d;
        return new WhenSearch.Possible(m -> possible.at(r + d * m), from, !possible.at(r + d * from));
    }

    private WhenSearch search(Kind kind, Rational bound, int r) {
        return switch (kind) {
            case AT_LEAST -> new WhenSearch(List.of(constraint(r, bound, NOT_NEGATIVE)), possible(r));
            case AT_MOST -> new WhenSearch(List.of(constraint(r, bound, NOT_POSITIVE)), possible(r));
            case SETTLED -> limit(r).map(limit -> new WhenSearch(List.of(
                    constraint(r, limit.minus(bound), NOT_NEGATIVE), constraint(r, limit.plus(bound), NOT_POSITIVE)),
                    possible(r))).orElseGet(() -> new WhenSearch(List.of(), WhenSearch.Possible.NEVER));
        };
    }

    private Optional<Rational> limit(int r) {
        return longRun.at(r).map(ConditionalLongRun::near);
    }

    /** On a − t b. */
    private Constraint constraint(int r, Rational t, Band band) {
        Chain chain = forms.residues().get(r).chain();
        Output a = forms.residues().get(r).joints().get(output).transform().output();
        Output b = forms.residues().get(r).event().transform().output();
        List<Rational> coefficients = new ArrayList<>();
        for (int i = 0; i < a.coefficients().size(); i++) {
            coefficients.add(a.coefficients().get(i).minus(t.times(b.coefficients().get(i))));
        }
        Transform transform = Transforms.of(chain, List.of(new Output(a.name(), coefficients, Rational.ZERO, "a − t b")))
                .get(0);
        return new ClosedFormConstraint(chain, ClosedForm.of(transform, poles),
                LongRunValues.of(LongRun.of(chain, transform)), band::minus);
    }
}
