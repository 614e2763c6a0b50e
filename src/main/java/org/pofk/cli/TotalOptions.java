package org.pofk.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.answer.Increment;
import org.pofk.answer.TotalModel;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.exact.Rational;
import org.pofk.schedule.ScheduledTotal;
import picocli.CommandLine.Option;

/** What is added up, and up to which steps. */
final class TotalOptions {
    private static final int ADDED_UNASKED = 12;

    @Option(names = "--of", paramLabel = "NAME", description = "a state, a set or an output; repeatable")
    private List<String> of = new ArrayList<>();

    @Option(names = "--entries", description = "counts the moves into it from outside instead of the steps spent there")
    private boolean entries;

    @Option(names = "--costs", description = "adds up the costs of the model; the same without --of, where it has some")
    private boolean costs;

    @Option(names = {"--to", "--at"}, paramLabel = "STEPS", converter = StepList.Converter.class,
            description = "also gives the totals up to these steps, like 52,104 or 0..20")
    private Optional<StepList> to = Optional.empty();

    /** The steps asked for. */
    Optional<StepList> to() {
        return to;
    }

    /** What is asked for, in the order of the answer. */
    List<TotalModel.Asked> asked(Model model) throws UsageException {
        return ofChain(model.chain(), ofAnyMatrix(model));
    }

    /** What is asked for of one that moves by a single matrix. */
    static List<TotalModel.Asked> ofChain(Chain chain, List<ScheduledTotal.Asked> asked) {
        return asked.stream().map(each -> new TotalModel.Asked(each.increment().apply(chain), each.factor())).toList();
    }

    /** The same for a model whose schedule moves it by several matrices. */
    List<ScheduledTotal.Asked> ofAnyMatrix(Model model) throws UsageException {
        List<ScheduledTotal.Asked> asked = new ArrayList<>();
        if (costs && model.costs().isEmpty()) {
            throw new UsageException("'" + model.origin().file() + "' names no costs; write for example"
                    + " costs: {unit: kEUR, each step in: {STATE: 12}}");
        }
        boolean namesNothing = of.isEmpty() && !entries;
        if (!of.isEmpty() || entries || namesNothing && model.costs().isEmpty()) {
            List<Output> outputs = outputs(model.chain());
            asked.addAll(entries ? entries(model.chain(), outputs) : values(outputs));
        }
        if (costs || namesNothing) {
            asked.addAll(costs(model));
        }
        return asked;
    }

    /** Steps spent in a state or a set, values of other outputs. */
    static List<ScheduledTotal.Asked> values(List<Output> outputs) {
        return outputs.stream().map(output -> new ScheduledTotal.Asked(chain -> Increment.of(chain, output),
                Rational.ONE)).toList();
    }

    /** Entries, of a chain and into what can be entered. */
    static List<ScheduledTotal.Asked> entries(Chain chain, List<Output> outputs) throws UsageException {
        for (Output output : outputs) {
            requireCounted(chain, output);
        }
        return outputs.stream().map(output -> new ScheduledTotal.Asked(each -> Increment.ofEntries(each, output),
                Rational.ONE)).toList();
    }

    /** The costs of a model, in the order of the answer; none where it names none. */
    static List<ScheduledTotal.Asked> costs(Model model) {
        return TotalModel.costs(model).stream().map(each -> new ScheduledTotal.Asked(chain ->
                Increment.ofCosts(chain, model.costs().orElseThrow()), each.factor())).toList();
    }

    private List<Output> outputs(Chain chain) throws UsageException {
        if (of.isEmpty() && chain.outputs().isEmpty() && chain.size() > ADDED_UNASKED) {
            throw new UsageException("which of " + chain.size() + " states is it to be added up for? Name states or"
                    + " sets with --of");
        }
        return AskedOutputs.of(chain, of);
    }

    private static void requireCounted(Chain chain, Output output) throws UsageException {
        if (chain.kind() == Chain.Kind.RECURSION) {
            throw new UsageException("--entries counts moves of a chain of probabilities; this model is a recursion");
        }
        if (!Increment.isSet(output)) {
            throw new UsageException("'" + output.name() + "' weighs states and can't be entered; --entries takes a"
                    + " state or a set");
        }
    }
}
