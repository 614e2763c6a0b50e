package org.pofk.answer;

import java.util.List;

/**
 * Something a reviewer would ask the author of a model; not a fault.
 *
 * @param text   one line, ending in a question mark
 * @param states the states it is about, ascending; none when it is about the model as a whole
 */
public record Question(Kind kind, String text, List<Integer> states) {

    /** What may be behind it. */
    public enum Kind {
        /** States the start never reaches. */
        NEVER_REACHED,
        /** A state that is never left. */
        NEVER_LEFT,
        /** A state that looks as if it were never left, and has an exit. */
        HARDLY_LEFT,
        /** Several closed classes can be reached: the long run depends on the start. */
        DEPENDS_ON_START,
        /** A closed class in which states take strict turns. */
        PERIODIC,
        /** Groups of states left hardly ever. */
        SETTLES_LATE,
        /** Rows that were changed on entry. */
        CHANGED_ON_ENTRY,
        /** Numbers for which no source is named. */
        WITHOUT_SOURCE,
        /** No assumption is stated. */
        WITHOUT_ASSUMPTIONS
    }

    public Question {
        states = List.copyOf(states);
    }
}
