package org.pofk.chain;

import java.util.List;

/**
 * What one statement of a model is about: {@code MOVE both, one} is the move from both to one.
 *
 * @param of names of states, outputs and the like, as many as the subject needs
 */
public record Entry(Subject subject, List<String> of) {

    /** In the order in which a reader is told of them. */
    public enum Subject {
        TITLE, DOCUMENT, REVISION, PREPARED_BY, CONCERNS, ASSUMPTION, KIND, CONVENTION, STEP, STEP_LASTS, FIRST_STEP,
        STATE, START, START_IN_FILE, PARAMETER, PARAMETER_IN_FILE, DEFINITION, RANGE, MEANING, MOVE, ACTION, ACTION_MOVE,
        PHASE, PHASE_MOVE, AFTER_PHASES, COST_UNIT, COST_OF_STATE, COST_OF_MOVE, COST_OF_ACTION, COST_AT_START, DISCOUNT, SET,
        OUTPUT, ADJUSTED, NOTE, ORDER
    }

    public Entry {
        of = List.copyOf(of);
    }

    public static Entry of(Subject subject, String... of) {
        return new Entry(subject, List.of(of));
    }
}
