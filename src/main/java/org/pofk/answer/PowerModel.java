package org.pofk.answer;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Consumer;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.Structure;
import org.pofk.longrun.LongRunByPoles;
import org.pofk.longrun.LongRunChecks;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.KnownPoles;
import org.pofk.steps.StepValue;
import org.pofk.steps.StepValues;
import org.pofk.transform.Transform;
import org.pofk.transform.Transforms;

/**
 * Outputs of a chain from each of its states in turn: c A^k e_j, which for all states are the entries of A^k. One
 * engine serves all starts of an output: with A turned, c is the start and e_j what is read. Exact or certified as any
 * formula.
 *
 * @param model  started in all states with equal chances, which no formula here depends on
 * @param found  one for each output by now, in the order asked for
 * @param wanted how many outputs were asked for
 */
public record PowerModel(Model model, List<FromEach> found, int wanted) {

    /**
     * One output.
     *
     * @param byStart its formula from each state, in the order of the states
     */
    public record FromEach(Output output, List<DerivedOutput> byStart) {
        public FromEach {
            byStart = List.copyOf(byStart);
        }
    }

    public PowerModel {
        found = List.copyOf(found);
    }

    /** One output after the other, published after each; steps ascending. */
    public static PowerModel of(Model model, List<Output> outputs, List<Integer> steps,
            Consumer<PowerModel> published) {
        List<FromEach> found = new ArrayList<>();
        Structure structure = Structure.of(model.chain());
        KnownPoles poles = new KnownPoles(() -> Eigenvalues.guesses(model.chain().matrix()));
        for (Output output : outputs) {
            found.add(fromEach(turned(model.chain(), output), output, structure, poles, steps));
            published.accept(new PowerModel(model, found, outputs.size()));
        }
        return new PowerModel(model, found, outputs.size());
    }

    public boolean isComplete() {
        return found.size() == wanted;
    }

    /** x(k+1) = Aᵀ x(k) from the output's coefficients: component j is the output after k steps from state j. */
    private static Chain turned(Chain chain, Output output) {
        List<List<SparseMatrix.Entry>> columns = new ArrayList<>();
        chain.states().forEach(state -> columns.add(new ArrayList<>()));
        for (int from = 0; from < chain.size(); from++) {
            for (SparseMatrix.Entry entry : chain.matrix().columns().get(from)) {
                columns.get(entry.row()).add(new SparseMatrix.Entry(from, entry.value()));
            }
        }
        return new Chain(Chain.Kind.RECURSION, chain.states(), new SparseMatrix(columns), output.coefficients(),
                Map.of(), List.of());
    }

    private static FromEach fromEach(Chain turned, Output output, Structure structure, KnownPoles poles,
            List<Integer> steps) {
        List<Transform> transforms = Transforms.of(turned, Outputs.states(turned));
        List<ClosedForm> forms = transforms.stream().parallel()
                .map(transform -> ClosedForm.of(transform, poles)).toList();
        List<List<StepValue>> values = steps.isEmpty() ? Collections.nCopies(forms.size(), List.of())
                : StepValues.of(turned, forms, steps);
        return new FromEach(output, IntStream.range(0, forms.size()).mapToObj(from -> {
            Transform transform = named(output, transforms.get(from));
            ClosedForm form = forms.get(from);
            return DerivedOutput.of(output).with(transform)
                    .with(new ClosedForm(transform, form.expansion(), form.roots(), form.modes()))
                    .with(new LongRunChecks(LongRunByPoles.ofChain(structure, transform.y()), Optional.empty(),
                            Optional.empty(), BigInteger.ONE)).with(values.get(from));
        }).toList());
    }

    private static Transform named(Output output, Transform transform) {
        return new Transform(output, transform.recurrence(), transform.y(), transform.factors(), transform.proof());
    }
}
