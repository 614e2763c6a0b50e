package org.pofk.cli;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;

/** The outputs a command line asks for. */
final class AskedOutputs {
    private AskedOutputs() {
    }

    /** Those named, else those of the model, else every state; a name that stands for nothing is a wrong usage. */
    static List<Output> of(Chain chain, List<String> names) throws UsageException {
        if (names.isEmpty()) {
            return Outputs.byDefault(chain);
        }
        return of(chain, names, "--of");
    }

    /** Those named under an option. */
    static List<Output> of(Chain chain, List<String> names, String option) throws UsageException {
        try {
            return Outputs.named(chain, names, Position.ofWhole(option));
        } catch (RefusedException unknown) {
            throw new UsageException(unknown.getMessage());
        }
    }

    /** Of those named the ones that stand for something here; without names the model's, or none of too many states. */
    static List<Output> thoseOf(Chain chain, List<String> names) {
        if (names.isEmpty()) {
            return chain.outputs().isEmpty() && chain.size() > ReportCommand.REPORTED_UNASKED ? List.of()
                    : Outputs.byDefault(chain);
        }
        List<Output> outputs = new ArrayList<>();
        for (String name : names) {
            try {
                outputs.addAll(Outputs.named(chain, List.of(name), Position.ofWhole("--of")));
            } catch (RefusedException unknown) {
                continue;
            }
        }
        return outputs;
    }
}
