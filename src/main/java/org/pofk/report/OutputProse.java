package org.pofk.report;

import org.pofk.chain.Output;

/** How an output is named. */
final class OutputProse {
    private OutputProse() {
    }

    /** {@code lost = none}; the name alone where that is its definition. */
    static Prose title(Output output) {
        Prose name = Prose.name(output.name());
        return output.definition().equals(output.name()) ? name : name.and(" = ").andName(output.definition());
    }

    /** {@code lost(k)}. */
    static Prose atStep(Output output) {
        return Prose.name(output.name()).and("(k)");
    }
}
