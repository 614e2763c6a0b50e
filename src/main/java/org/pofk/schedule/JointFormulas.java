package org.pofk.schedule;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Rational;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.Expansion;
import org.pofk.modes.PartialFractions;
import org.pofk.transform.StateTransform;
import org.pofk.transform.Transforms;

/**
 * Formulas in cycles and steps together: x(P + m T) = Σ μ^m v_μ over the poles of S, and what each v_μ becomes within a
 * cycle is a closed form of its own. Only where all poles are simple rational numbers but zero, and the formulas short.
 */
final class JointFormulas {
    private final Chain chain;
    private final SparseMatrix move;
    private final int to;
    private final List<Rational> poles = new ArrayList<>();
    private final List<List<Rational>> vectors = new ArrayList<>();

    private JointFormulas(Chain chain, SparseMatrix move, int to) {
        this.chain = chain;
        this.move = move;
        this.to = to;
    }

    /**
     * Empty where the poles aren't of that kind.
     *
     * @param cycles the chain that moves by S
     * @param move   what each cycle begins with, for {@code to} steps
     */
    static Optional<JointFormulas> of(Chain cycles, SparseMatrix move, int to) {
        StateTransform transform = StateTransform.of(cycles);
        List<Factor<Rational>> factors = transform.factors().factors();
        boolean isSimple = factors.stream().allMatch(factor -> factor.polynomial().degree() == 1
                && factor.multiplicity() == 1 && !factor.polynomial().coefficient(0).isZero());
        if (!isSimple) {
            return Optional.empty();
        }
        JointFormulas found = new JointFormulas(cycles, move, to);
        List<Expansion<Rational>> states =
                PartialFractions.ofEach(transform.numerators(), transform.recurrence(), transform.factors());
        for (int i = 0; i < states.get(0).parts().size(); i++) {
            int part = i;
            found.poles.add(states.get(0).parts().get(i).factor().polynomial().coefficient(0).negate());
            found.vectors.add(states.stream().map(state ->
                    state.parts().get(part).coefficients().get(0).numerator().coefficient(0)).toList());
        }
        return Optional.of(found);
    }

    /** Empty where some part has no short exact form. */
    Optional<JointFormula> of(Output output) {
        List<JointFormula.Term> terms = new ArrayList<>();
        for (int i : IntStream.range(0, poles.size()).toArray()) {
            Chain within = new Chain(Chain.Kind.RECURSION, chain.states(), move, vectors.get(i), Map.of(), List.of());
            Output plain = new Output(output.name(), output.coefficients(), Rational.ZERO, output.definition());
            ClosedForm form = ClosedForm.of(Transforms.of(within, List.of(plain)).get(0));
            if (!form.isExactThroughout()) {
                return Optional.empty();
            }
            if (!form.modes().isEmpty()) {
                terms.add(new JointFormula.Term(poles.get(i), form));
            }
        }
        return output.constant().isZero() ? Optional.of(new JointFormula(to, terms)) : Optional.empty();
    }
}
