package org.pofk.slip;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;

/**
 * A chain that an author may have worked with by mistake.
 *
 * @param found what he did
 * @param right what the model says
 */
record OtherChain(SlipKind kind, String found, String right, Chain chain) {
    /** Most exits of an absorbing state that are tried. */
    private static final int MOST_EXITS = 60;
    /** Most moves left out that are tried. */
    private static final int MOST_MOVES = 200;

    /** All of them, simplest first; the moves least likely first. */
    static List<OtherChain> allOf(Model model, Variants variants) {
        Chain chain = model.chain();
        List<OtherChain> others = new ArrayList<>();
        SparseMatrix transposed = transposed(chain.matrix());
        if (!transposed.equals(chain.matrix())) {
            others.add(new OtherChain(SlipKind.MATRIX_TRANSPOSED, "the matrix transposed", "the matrix as in the model",
                    with(chain, transposed, chain.start())));
        }
        others.addAll(starts(chain));
        others.addAll(shifted(chain));
        others.addAll(parameters(model, variants));
        others.addAll(forgotten(chain));
        others.addAll(exits(model));
        return others;
    }

    /** With another matrix and start; no longer a chain where its columns don't sum to one. */
    static Chain with(Chain chain, SparseMatrix matrix, List<Rational> start) {
        boolean stochastic = chain.kind() == Chain.Kind.CHAIN && isDistribution(start) && matrix.columns().stream()
                .allMatch(column -> isDistribution(column.stream().map(SparseMatrix.Entry::value).toList()));
        return new Chain(stochastic ? Chain.Kind.CHAIN : Chain.Kind.RECURSION, chain.states(), matrix, start,
                chain.sets(), chain.outputs());
    }

    private static boolean isDistribution(List<Rational> values) {
        return values.stream().noneMatch(value -> value.signum() < 0)
                && values.stream().reduce(Rational.ZERO, Rational::plus).isOne();
    }

    private static SparseMatrix transposed(SparseMatrix matrix) {
        List<List<SparseMatrix.Entry>> columns = new ArrayList<>();
        IntStream.range(0, matrix.size()).forEach(i -> columns.add(new ArrayList<>()));
        for (int j = 0; j < matrix.size(); j++) {
            for (SparseMatrix.Entry entry : matrix.columns().get(j)) {
                columns.get(entry.row()).add(new SparseMatrix.Entry(j, entry.value()));
            }
        }
        return new SparseMatrix(columns);
    }

    private static List<OtherChain> starts(Chain chain) {
        List<OtherChain> others = new ArrayList<>();
        for (int state = 0; state < chain.size(); state++) {
            List<Rational> start = unit(chain.size(), state);
            if (!start.equals(chain.start())) {
                others.add(new OtherChain(SlipKind.START_MISREAD, "start " + chain.states().get(state),
                        "start " + startInWords(chain), with(chain, chain.matrix(), start)));
            }
        }
        return others;
    }

    static List<Rational> unit(int size, int place) {
        return IntStream.range(0, size).mapToObj(i -> i == place ? Rational.ONE : Rational.ZERO).toList();
    }

    private static String startInWords(Chain chain) {
        List<Integer> held = IntStream.range(0, chain.size()).filter(i -> !chain.start().get(i).isZero()).boxed()
                .toList();
        return held.size() == 1 && chain.start().get(held.get(0)).isOne() ? chain.states().get(held.get(0))
                : held.stream().map(i -> chain.states().get(i) + ": " + chain.start().get(i))
                        .collect(Collectors.joining(", "));
    }

    private static List<OtherChain> shifted(Chain chain) {
        List<Rational> next = chain.matrix().times(chain.start());
        return next.equals(chain.start()) ? List.of() : List.of(new OtherChain(SlipKind.INDEX_SHIFTED, "p(k+1)",
                "p(k)", with(chain, chain.matrix(), next)));
    }

    /** Each parameter with the value of each other one. */
    private static List<OtherChain> parameters(Model model, Variants variants) {
        List<OtherChain> others = new ArrayList<>();
        for (Model.Parameter own : model.parameters()) {
            for (Model.Parameter other : model.parameters()) {
                if (!own.name().equals(other.name()) && !own.value().equals(other.value())) {
                    number(other.value()).flatMap(value -> variants.with(own.name(), value)).ifPresent(chain ->
                            others.add(new OtherChain(SlipKind.RATE_AS_PROBABILITY, other.name() + " for "
                                    + own.name(), own.name() + " = " + own.value(), chain)));
                }
            }
        }
        for (Model.Parameter own : model.parameters()) {
            for (Rational rate : Rates.behind(own)) {
                variants.with(own.name(), rate).ifPresent(chain -> others.add(new OtherChain(
                        SlipKind.RATE_AS_PROBABILITY, own.name() + " = " + rate, own.name() + " = " + own.value(),
                        chain)));
            }
        }
        return others;
    }

    static Optional<Rational> number(String text) {
        try {
            return Optional.of(Rational.parse(text));
        } catch (NumberFormatException symbolic) {
            return Optional.empty();
        }
    }

    /** Each move left out and its probability given to staying. */
    private static List<OtherChain> forgotten(Chain chain) {
        record Move(int from, int to, Rational probability) {
        }
        List<Move> moves = new ArrayList<>();
        for (int j = 0; j < chain.size(); j++) {
            for (SparseMatrix.Entry entry : chain.matrix().columns().get(j)) {
                if (entry.row() != j) {
                    moves.add(new Move(j, entry.row(), entry.value()));
                }
            }
        }
        moves.sort(Comparator.comparing(Move::probability));
        return moves.stream().limit(MOST_MOVES).map(move -> new OtherChain(SlipKind.TWO_EVENT_MOVE_FORGOTTEN,
                "no move from " + chain.states().get(move.from()) + " to " + chain.states().get(move.to()),
                "from " + chain.states().get(move.from()) + " to " + chain.states().get(move.to()) + " with "
                        + move.probability(),
                with(chain, moved(chain.matrix(), move.from(), move.to(), move.from(), move.probability()),
                        chain.start()))).toList();
    }

    /** The matrix with some probability of a column taken from one row to another. */
    private static SparseMatrix moved(SparseMatrix matrix, int column, int from, int to, Rational probability) {
        List<List<SparseMatrix.Entry>> columns = new ArrayList<>(matrix.columns());
        List<SparseMatrix.Entry> own = new ArrayList<>(columns.get(column).stream()
                .filter(entry -> entry.row() != from && entry.row() != to).toList());
        own.add(new SparseMatrix.Entry(from, matrix.at(from, column).minus(probability)));
        own.add(new SparseMatrix.Entry(to, matrix.at(to, column).plus(probability)));
        columns.set(column, own);
        return new SparseMatrix(columns);
    }

    /** Each absorbing state left to each other state, with each probability that occurs. */
    private static List<OtherChain> exits(Model model) {
        Chain chain = model.chain();
        Set<Rational> probabilities = new LinkedHashSet<>();
        chain.matrix().columns().forEach(column -> column.forEach(entry -> probabilities.add(entry.value())));
        model.parameters().forEach(parameter -> number(parameter.value()).ifPresent(probabilities::add));
        List<OtherChain> others = new ArrayList<>();
        for (int state = 0; state < chain.size(); state++) {
            if (chain.matrix().at(state, state).isOne()) {
                for (int to = 0; to < chain.size(); to++) {
                    for (Rational probability : probabilities) {
                        if (to != state && probability.signum() > 0 && probability.compareTo(Rational.ONE) <= 0
                                && others.size() < MOST_EXITS) {
                            others.add(new OtherChain(SlipKind.ABSORBING_STATE_LEFT, "from "
                                    + chain.states().get(state) + " to " + chain.states().get(to) + " with "
                                    + probability, chain.states().get(state) + " is never left",
                                    with(chain, moved(chain.matrix(), state, state, to, probability), chain.start())));
                        }
                    }
                }
            }
        }
        return others;
    }
}
