package org.pofk.answer;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.KnownPoles;
import org.pofk.transform.Transforms;

/**
 * A sequence seen at every d-th step, as a closed form in m for k = r + d m: there poles whose d-th powers agree are
 * one, so that what cancels on a residue is gone. Exact as closed forms are; cost: that of A^d, bounded.
 */
final class ClassForms {
    private static final long MOST_WORK = 60_000;

    private final Chain chain;
    private final ClosedForm form;
    private final Map<Long, List<Chain>> chains = new HashMap<>();
    private final Map<List<Long>, ClosedForm> forms = new HashMap<>();
    private final KnownPoles poles = new KnownPoles();

    ClassForms(Chain chain, ClosedForm form) {
        this.chain = chain;
        this.form = form;
    }

    /** Empty where that is too much work. */
    Optional<ClosedForm> of(long residue, long modulus) {
        if (modulus == 1) {
            return Optional.of(form);
        }
        if (modulus * chain.size() * chain.size() > MOST_WORK) {
            return Optional.empty();
        }
        return Optional.of(forms.computeIfAbsent(List.of(residue, modulus), key -> ClosedForm.of(Transforms.of(
                chains.computeIfAbsent(modulus, d -> EveryFewSteps.of(chain, Math.toIntExact(d)))
                        .get(Math.toIntExact(residue)), List.of(form.transform().output())).get(0), poles)));
    }
}
