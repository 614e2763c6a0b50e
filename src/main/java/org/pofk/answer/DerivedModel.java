package org.pofk.answer;

import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.chain.Model;
import org.pofk.chain.Structure;
import org.pofk.modes.StateModes;

/**
 * All that was found about some outputs of a model, in the order in which they were asked for.
 *
 * @param state  the whole state as a sum of modes, where it was asked for
 * @param wanted what was asked for, found by now or not
 */
public record DerivedModel(Model model, Structure structure, List<DerivedOutput> outputs, Optional<StateModes> state,
        Wanted wanted) {

    public DerivedModel {
        outputs = List.copyOf(outputs);
    }

    /** True when every output has its formula and its long run. */
    public boolean isDecided() {
        return outputs.stream().allMatch(DerivedOutput::isDecided);
    }

    DerivedModel with(int place, DerivedOutput known) {
        return new DerivedModel(model, structure, IntStream.range(0, outputs.size())
                .mapToObj(i -> i == place ? known : outputs.get(i)).toList(), state, wanted);
    }

    DerivedModel with(StateModes found) {
        return new DerivedModel(model, structure, outputs, Optional.of(found), wanted);
    }
}
