package org.pofk.report;

import java.util.List;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;

/** What is asked of a model, as somebody would ask it. */
final class QuestionProse {
    private static final int STATES_NAMED = 6;

    private QuestionProse() {
    }

    static Prose of(Output output, Model model) {
        Chain chain = model.chain();
        return chain.kind() == Chain.Kind.RECURSION
                ? Prose.of("What is ").andName(output.name()).and(" after k steps")
                        .and(model.step().named().map(is -> Prose.of(" of ").and(ModelHead.words(is)))
                                .orElse(Prose.EMPTY)).and("?")
                : subject(output, chain).and(" at the end of step k, ")
                        .and(model.step().named().map(is -> Prose.of("one step being ").and(ModelHead.words(is))
                                .and(" and the start ")).orElse(Prose.of("the start being ")))
                        .and(StartProse.of(chain)).and("?");
    }

    private static Prose subject(Output output, Chain chain) {
        List<Integer> read = IntStream.range(0, chain.size()).filter(i -> !output.coefficients().get(i).isZero())
                .boxed().toList();
        boolean isProbability = !read.isEmpty() && output.constant().isZero()
                && read.stream().allMatch(i -> output.coefficients().get(i).isOne());
        if (!isProbability) {
            return Prose.of("What is the expected value of ").andName(output.name());
        }
        boolean isItself = read.size() == 1 && chain.states().get(read.get(0)).equals(output.name());
        List<Prose> parts = StateNames.parts(read, chain.states());
        Prose which = parts.size() > STATES_NAMED ? Prose.of("one of " + read.size() + " states")
                : parts.size() < read.size() ? Prose.of("one of the " + read.size() + " states ")
                        .and(Prose.joined(parts, ", ")) : Prose.joined(parts, " or ");
        return isItself ? Prose.of("What is the probability of being in ").and(which)
                : Prose.of("What is the probability of ").andName(output.name()).and(" (being in ").and(which).and(")");
    }
}
