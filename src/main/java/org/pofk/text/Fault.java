package org.pofk.text;

import java.util.Comparator;

/**
 * One thing that is wrong with an input, where it is and what would be right.
 *
 * @param code    kind of fault, in kebab case; stable, so that tests and scripts can count kinds
 * @param message what is wrong, with the value found and what would be right, without a full stop
 */
public record Fault(Position position, String code, String message) {

    /** Order of reading: source, line, column. */
    public static final Comparator<Fault> IN_ORDER_OF_READING =
            Comparator.comparing(Fault::position).thenComparing(Fault::message);

    /** {@code deck.yaml:9:3: from 'fair' the probabilities add up to 9/10, not 1}. */
    @Override
    public String toString() {
        return position + ": " + message;
    }
}
