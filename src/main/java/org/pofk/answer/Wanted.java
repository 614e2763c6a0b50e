package org.pofk.answer;

import java.util.List;
import java.util.Set;

/**
 * What was asked for besides formulas and long runs, so that what a limit of time left out can be told from what
 * nobody wanted.
 *
 * @param at     steps in ascending order whose values are wanted
 * @param extras in no order
 */
public record Wanted(List<Integer> at, Set<Deriving.Extra> extras) {
    public Wanted {
        at = List.copyOf(at);
        extras = Set.copyOf(extras);
    }

    /** True when the output's values are wanted and not known. */
    public boolean isMissingValues(DerivedOutput output) {
        return !at.isEmpty() && output.values().isEmpty();
    }

    /** True when the output's comparison is wanted and not known. */
    public boolean isMissingComparison(DerivedOutput output) {
        return extras.contains(Deriving.Extra.COMPARISON) && output.comparison().isEmpty();
    }

    /** True when a second opinion on the output is wanted and not known. */
    public boolean isMissingSecondOpinion(DerivedOutput output) {
        return extras.contains(Deriving.Extra.SECOND_OPINION) && output.secondOpinion().isEmpty();
    }

    /** True when the modes of the whole state are wanted and not known. */
    public boolean isMissingState(DerivedModel derived) {
        return extras.contains(Deriving.Extra.STATE_MODES) && derived.state().isEmpty();
    }
}
