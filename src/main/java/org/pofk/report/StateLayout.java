package org.pofk.report;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.pofk.report.Picture.Anchor;
import org.pofk.report.Picture.Ink;
import org.pofk.report.Picture.Label;
import org.pofk.report.Picture.Point;
import org.pofk.report.Picture.Setting;

/**
 * Where states, moves and the probabilities beside them stand: states on a circle in the model's order, moves bent to
 * the left so that there and back keep apart, moves to themselves outward. Probabilities are put one after the other
 * where they touch least; the circle grows until none touches another. Doubles that decide nothing but where ink goes.
 *
 * @param nodes  the states' boxes
 * @param lines  the lines of each state's name
 * @param bends  one for each move, between the boxes' edges
 * @param labels one for each move
 */
record StateLayout(List<Box> nodes, List<List<String>> lines, List<Bend> bends, List<Label> labels) {
    static final int NAME_SIZE = 13;
    static final int LABEL_SIZE = 11;
    static final int NOTE_SIZE = 10;
    private static final double WIDEST_NAME = 92;
    private static final double LINE_HEIGHT = 16;
    private static final double GROWTH = 1.12;
    private static final int TRIES = 9;
    /** How far a move to itself goes out, and how far to the sides at its feet and between. */
    private static final double LOOP = 37;
    private static final double LOOP_FOOT = 8;
    private static final double LOOP_SIDE = 28;
    private static final double[] THERE_AND_BACK = {0.15, 0.2, 0.11, 0.26, 0.34};
    private static final double[] ONE_WAY = {0.06, -0.06, 0.14, -0.14, 0.24, -0.24, 0.36, -0.36};
    private static final double[] ALONG = {0.5, 0.42, 0.58, 0.34, 0.66, 0.26, 0.74, 0.2, 0.8};
    private static final int ROUNDS = 3;

    static StateLayout of(Chart.StateDiagram diagram) {
        double radius = firstRadius(diagram);
        StateLayout layout = at(diagram, radius);
        for (int i = 1; i < TRIES && layout.touches() > 0; i++) {
            radius *= GROWTH;
            StateLayout larger = at(diagram, radius);
            layout = larger.touches() < layout.touches() ? larger : layout;
        }
        return layout;
    }

    private static double firstRadius(Chart.StateDiagram diagram) {
        int n = diagram.states().size();
        double around = n == 1 ? 0 : Math.max(90, n * 148 / (2 * StrictMath.PI));
        return n == 2 ? 120 : around + 5.0 * diagram.moves().size() / n;
    }

    private static StateLayout at(Chart.StateDiagram diagram, double radius) {
        int n = diagram.states().size();
        List<Box> nodes = new ArrayList<>();
        List<List<String>> lines = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            double angle = angle(i, n);
            List<String> name = wrapped(diagram.states().get(i).name());
            lines.add(name);
            nodes.add(box(radius * StrictMath.cos(angle), radius * StrictMath.sin(angle), name,
                    diagram.states().get(i)));
        }
        return new StateLayout(nodes, lines, List.of(), List.of()).withMoves(diagram);
    }

    /** From the top around by the hands of a clock; two stand side by side. */
    private static double angle(int i, int n) {
        return n == 2 ? StrictMath.PI * (1 - i) : 2 * StrictMath.PI * i / n - StrictMath.PI / 2;
    }

    private static Box box(double x, double y, List<String> name, Chart.State state) {
        double width = name.stream().mapToDouble(line -> TextWidth.of(line, NAME_SIZE)).max().orElse(0);
        String note = note(state);
        double noteWidth = TextWidth.of(note, NOTE_SIZE);
        double height = LINE_HEIGHT * name.size() + (note.isEmpty() ? 0 : 12) + 14;
        return Box.around(x, y, Math.max(44, Math.max(width, noteWidth) + 20), height);
    }

    /** What stands below a state's name: whether the chain starts there, and how likely. */
    static String note(Chart.State state) {
        return state.start().isZero() ? "" : state.start().isOne() ? "start"
                : "start " + ChartNumber.of(state.start(), 3);
    }

    /** In two lines at most, each cut off where it is too wide. */
    private static List<String> wrapped(String name) {
        if (TextWidth.of(name, NAME_SIZE) <= WIDEST_NAME || !name.strip().contains(" ")) {
            return List.of(TextWidth.cut(name, NAME_SIZE, WIDEST_NAME));
        }
        int best = name.indexOf(' ');
        for (int i = 0; i < name.length(); i++) {
            if (name.charAt(i) == ' ' && Math.abs(2 * i - name.length()) < Math.abs(2 * best - name.length())) {
                best = i;
            }
        }
        return List.of(TextWidth.cut(name.substring(0, best).strip(), NAME_SIZE, WIDEST_NAME),
                TextWidth.cut(name.substring(best).strip(), NAME_SIZE, WIDEST_NAME));
    }

    private StateLayout withMoves(Chart.StateDiagram diagram) {
        List<Bend> chosen = new ArrayList<>();
        for (Chart.Move move : diagram.moves()) {
            chosen.add(move.from() == move.to() ? loop(nodes.get(move.from())) : bend(diagram, move));
        }
        return new StateLayout(nodes, lines, chosen, labelled(diagram, chosen));
    }

    /** Outward from the middle, the middle state of one alone upward; from inside the box, so that it meets its edge. */
    private static Bend loop(Box node) {
        double length = StrictMath.hypot(node.centerX(), node.centerY());
        double outX = length < 1 ? 0 : node.centerX() / length;
        double outY = length < 1 ? -1 : node.centerY() / length;
        double reach = Math.min(Math.abs(outX) < 1e-9 ? 1e9 : node.width() / 2 / Math.abs(outX),
                Math.abs(outY) < 1e-9 ? 1e9 : node.height() / 2 / Math.abs(outY));
        double far = (reach + LOOP) * 4 / 3;
        double[] along = {0, far, far, 0};
        double[] aside = {LOOP_FOOT, LOOP_SIDE, -LOOP_SIDE, -LOOP_FOOT};
        double[] x = new double[4];
        double[] y = new double[4];
        for (int i = 0; i < 4; i++) {
            x[i] = node.centerX() + outX * along[i] - outY * aside[i];
            y[i] = node.centerY() + outY * along[i] + outX * aside[i];
        }
        return new Bend(x, y).outside(node.grown(1), node.grown(2));
    }

    private Bend bend(Chart.StateDiagram diagram, Chart.Move move) {
        boolean isMutual = diagram.moves().stream()
                .anyMatch(other -> other.from() == move.to() && other.to() == move.from());
        Box from = nodes.get(move.from());
        Box to = nodes.get(move.to());
        List<Bend> candidates = new ArrayList<>();
        for (double part : isMutual ? THERE_AND_BACK : ONE_WAY) {
            candidates.add(Bend.between(from.centerX(), from.centerY(), to.centerX(), to.centerY(), part)
                    .outside(from.grown(1), to.grown(2)));
        }
        return candidates.stream().min(Comparator.comparingLong(bend -> hits(bend, move))).orElseThrow();
    }

    /** How many points of a move lie on other states. */
    private long hits(Bend bend, Chart.Move move) {
        long hits = 0;
        for (int i = 0; i < nodes.size(); i++) {
            if (i != move.from() && i != move.to()) {
                Box near = nodes.get(i).grown(7);
                hits += bend.samples().stream().filter(point -> near.contains(point.x(), point.y())).count();
            }
        }
        return hits;
    }

    private List<Label> labelled(Chart.StateDiagram diagram, List<Bend> chosen) {
        List<List<Point>> samples = chosen.stream().map(Bend::samples).toList();
        List<Optional<Label>> placed = new ArrayList<>(Collections.nCopies(chosen.size(), Optional.empty()));
        for (int round = 0; round < ROUNDS; round++) {
            for (int i = 0; i < chosen.size(); i++) {
                placed.set(i, Optional.empty());
                int move = i;
                placed.set(i, candidates(diagram.moves().get(i), chosen.get(i)).stream()
                        .min(Comparator.comparingLong(label -> cost(TextWidth.box(label), move, placed, samples))));
            }
        }
        return placed.stream().map(Optional::orElseThrow).toList();
    }

    private static List<Label> candidates(Chart.Move move, Bend bend) {
        List<Label> labels = new ArrayList<>();
        for (double t : ALONG) {
            labels.add(new Label(new Point(bend.xAt(t), bend.yAt(t) + 4), Anchor.MIDDLE, Prose.of(move.text()), Ink.TEXT,
                    LABEL_SIZE, Setting.HALO));
        }
        return labels;
    }

    /** Touching a state or another probability is worst, covering another move next; the middle is liked best. */
    private long cost(Box box, int move, List<Optional<Label>> placed, List<List<Point>> samples) {
        long cost = 0;
        for (Box node : nodes) {
            cost += box.overlaps(node.grown(1)) ? 1000 : 0;
        }
        for (int i = 0; i < placed.size(); i++) {
            if (i != move) {
                cost += placed.get(i).filter(label -> TextWidth.box(label).overlaps(box)).isPresent() ? 1000 : 0;
                cost += 6 * samples.get(i).stream().filter(point -> box.contains(point.x(), point.y())).count();
            }
        }
        return cost;
    }

    /** How many labels touch another one or a state. */
    private int touches() {
        int touches = 0;
        for (int i = 0; i < labels.size(); i++) {
            Box box = TextWidth.box(labels.get(i));
            boolean touchesNode = nodes.stream().anyMatch(box::overlaps);
            boolean touchesLabel = false;
            for (int j = 0; j < i; j++) {
                touchesLabel |= TextWidth.box(labels.get(j)).overlaps(box);
            }
            touches += touchesNode || touchesLabel ? 1 : 0;
        }
        return touches;
    }
}
