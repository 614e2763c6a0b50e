package org.pofk.report;

import java.util.Optional;
import java.util.stream.Stream;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.DerivedOutput;
import org.pofk.chain.Chain;
import org.pofk.schedule.CycleFormula;
import org.pofk.transform.Transform;

/**
 * A formula with what proves it for every k.
 *
 * @param left     what stands on the left of its displays
 * @param chain    whose output it is
 * @param stepped  what that chain is called: {@code model}
 * @param repeated where all windows are compared once more
 */
record Proved(Prose left, Chain chain, String stepped, Transform transform, Repeated repeated) {

    /** Where a reader finds all windows of a proof. */
    enum Repeated { IN_NOTEBOOK, NOWHERE }

    /** The outputs that are derived, as far as they are. */
    static Stream<Proved> of(DerivedModel derived) {
        Chain chain = derived.model().chain();
        String stepped = chain.kind() == Chain.Kind.CHAIN ? "model" : "recursion";
        return derived.outputs().stream().flatMap(output -> output.transform().stream().map(transform ->
                new Proved(OutputProse.atStep(output.output()), chain, stepped, transform, Repeated.IN_NOTEBOOK)));
    }

    /** A formula over the cycles of a schedule, which the chain has that moves once a cycle. */
    static Proved overCycles(Prose left, String stepped, CycleFormula formula) {
        return new Proved(left, formula.chain(), stepped, formula.closedForm().transform(), Repeated.NOWHERE);
    }

    /** A formula that stands in a section of its own. */
    static Optional<Proved> of(Prose left, Chain chain, String stepped, DerivedOutput output) {
        return output.transform().map(transform -> new Proved(left, chain, stepped, transform, Repeated.NOWHERE));
    }
}
