package org.pofk.answer;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.KnownPoles;
import org.pofk.modes.LimitOfQuotient;
import org.pofk.transform.Transforms;

/**
 * Outputs given what is known, on the chain seen every few steps, where one pole leads: for each residue of k the
 * chain, the closed forms of the numerators, and that of the denominator. Exact and certified as closed forms are.
 */
record ConditionalForms(List<Residue> residues) {
    private static final BigInteger PERIOD_AT_MOST = BigInteger.valueOf(60);

    /** For k = r + d m: sequences in m. */
    record Residue(Chain chain, ClosedForm event, List<ClosedForm> joints) {
    }

    ConditionalForms {
        residues = List.copyOf(residues);
    }

    /** How many steps one step in m is. */
    int period() {
        return residues.size();
    }

    /**
     * Empty where the classes' common period is too long.
     *
     * @param in    states in which what is known holds, so that the event's coefficients are zero elsewhere
     * @param known forms on the chain itself, event first
     */
    static Optional<ConditionalForms> of(Set<Integer> in, Chain chain, List<ClosedForm> known) {
        BigInteger period = EveryFewSteps.period(chain, in);
        if (period.compareTo(PERIOD_AT_MOST) > 0) {
            return Optional.empty();
        }
        if (period.equals(BigInteger.ONE)) {
            return Optional.of(new ConditionalForms(List.of(residue(chain, known))));
        }
        List<Output> outputs = known.stream().map(form -> form.transform().output()).toList();
        KnownPoles poles = new KnownPoles();
        return Optional.of(new ConditionalForms(EveryFewSteps.of(chain, period.intValueExact()).stream().map(every ->
                residue(every, Transforms.of(every, outputs).stream()
                        .map(transform -> ClosedForm.of(transform, poles)).toList())).toList()));
    }

    private static Residue residue(Chain chain, List<ClosedForm> forms) {
        return new Residue(chain, forms.get(0), forms.subList(1, forms.size()));
    }

    /** What one output tends to. */
    ConditionalLongRun longRun(int output) {
        return ConditionalLongRun.of(residues.stream().map(residue ->
                LimitOfQuotient.of(residue.joints.get(output), residue.event)).toList());
    }

    /** The long runs of all outputs. */
    static List<ConditionalLongRun> longRuns(Optional<ConditionalForms> forms, int outputs) {
        return IntStream.range(0, outputs).mapToObj(i -> forms.map(each -> each.longRun(i)).orElseGet(() ->
                ConditionalLongRun.without(ConditionalLongRun.Kind.PERIOD_TOO_LONG))).toList();
    }
}
