package org.pofk.input;

import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/**
 * What a command line says in place of the file.
 *
 * @param parameters values by parameter, as written
 * @param start      the state to start in, {@code long run}, or {@code each}
 */
public record Overrides(Map<String, String> parameters, Optional<String> start) {
    public static final Overrides NONE = new Overrides(Map.of(), Optional.empty());

    /** The word for a start in each state in turn; a state of that name goes before it. */
    public static final String EACH = "each";

    /** Source names for faults in these values. */
    static final String SET_OPTION = "--set";
    static final String START_OPTION = "--start";

    public Overrides {
        parameters = Collections.unmodifiableMap(new LinkedHashMap<>(parameters));
    }

    /** Whether each state is to be the start in turn: then the model starts in all of them with equal chances. */
    public boolean isStartEach() {
        return start.equals(Optional.of(EACH));
    }
}
