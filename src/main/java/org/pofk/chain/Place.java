package org.pofk.chain;

import java.util.List;

/**
 * What a note or a source in a model is written on: {@code MOVE both, one} is the move from both to one.
 *
 * @param of names of states, outputs and the like, as many as the part needs
 */
public record Place(Part part, List<String> of) {

    /** A section of a model, or an entry of one; {@code OTHER} is named by a word alone. */
    public enum Part {
        MODEL, TRANSITIONS, MATRIX, MOVES_FROM, MOVE, START, OUTPUT, PARAMETER, COSTS, COSTS_OF_EACH_STEP,
        COSTS_OF_MOVES, COSTS_AT_START, DISCOUNT, OTHER
    }

    public Place {
        of = List.copyOf(of);
    }

    public static Place of(Part part, String... of) {
        return new Place(part, List.of(of));
    }

    /** A place that nothing but its words is asked of. */
    public static Place named(String words) {
        return of(Part.OTHER, words);
    }

    /** {@code from 'both' to 'one'}. */
    public String words() {
        return switch (part) {
            case MODEL -> "model";
            case TRANSITIONS -> "transitions";
            case MATRIX -> "matrix";
            case MOVES_FROM -> "from '" + of.get(0) + "'";
            case MOVE -> "from '" + of.get(0) + "' to '" + of.get(1) + "'";
            case START -> "start";
            case OUTPUT -> "output '" + of.get(0) + "'";
            case PARAMETER -> "parameter '" + of.get(0) + "'";
            case COSTS -> "costs";
            case COSTS_OF_EACH_STEP -> "costs of each step";
            case COSTS_OF_MOVES -> "costs of moves";
            case COSTS_AT_START -> "costs at start";
            case DISCOUNT -> "discount";
            case OTHER -> of.get(0);
        };
    }
}
