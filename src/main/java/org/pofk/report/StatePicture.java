package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.pofk.report.Picture.Anchor;
import org.pofk.report.Picture.Area;
import org.pofk.report.Picture.Dash;
import org.pofk.report.Picture.Frame;
import org.pofk.report.Picture.Ink;
import org.pofk.report.Picture.Label;
import org.pofk.report.Picture.Point;
import org.pofk.report.Picture.Setting;
import org.pofk.report.Picture.Shape;
import org.pofk.report.Picture.Stroke;

/** States and moves as a picture. */
final class StatePicture {
    private static final double MARGIN = 14;
    private static final double LEAST_WIDTH = 360;
    private static final double ARROW = 8;
    /** With more moves a state than this, moves bear the hue of the state they leave. */
    private static final int PLAIN_MOVES = 3;
    private static final int EXACT_DIGITS = 12;

    private final Chart.StateDiagram diagram;
    private final StateLayout layout;

    private StatePicture(Chart.StateDiagram diagram) {
        this.diagram = diagram;
        this.layout = StateLayout.of(diagram);
    }

    static Picture of(Chart.StateDiagram diagram) {
        return new StatePicture(diagram).drawn();
    }

    private Picture drawn() {
        Box bounds = bounds();
        double width = Math.max(LEAST_WIDTH, bounds.width() + 2 * MARGIN);
        Moved moved = new Moved((width - bounds.width()) / 2 - bounds.x(), MARGIN - bounds.y());
        List<Shape> shapes = new ArrayList<>();
        for (int i = 0; i < layout.bends().size(); i++) {
            move(i, moved, shapes);
        }
        for (int i = 0; i < layout.nodes().size(); i++) {
            state(i, moved, shapes);
        }
        for (int i = 0; i < layout.labels().size(); i++) {
            Label label = layout.labels().get(i);
            shapes.add(new Label(moved.point(label.at()), label.anchor(), label.text(),
                    isDense() ? hue(diagram.moves().get(i)) : Ink.TEXT, label.size(), label.setting()));
        }
        double height = bounds.height() + 2 * MARGIN;
        List<String> key = key();
        for (String line : key) {
            shapes.add(new Label(new Point(MARGIN, height + 8), Anchor.START, Prose.of(line), Ink.MUTED,
                    StateLayout.LABEL_SIZE, Setting.PLAIN));
            height += 16;
        }
        double keyWidth = key.stream().mapToDouble(line -> TextWidth.of(line, StateLayout.LABEL_SIZE)).max().orElse(0);
        return new Picture(Math.ceil(Math.max(width, keyWidth + 2 * MARGIN)), Math.ceil(height), shapes);
    }

    /** From the layout's place to the picture's. */
    private record Moved(double x, double y) {
        Point point(Point at) {
            return new Point(at.x() + x, at.y() + y);
        }

        Box box(Box box) {
            return new Box(box.x() + x, box.y() + y, box.width(), box.height());
        }
    }

    /** What all ink lies in. */
    private Box bounds() {
        List<Box> all = Stream.of(layout.nodes().stream().map(node -> node.grown(4)), layout.labels().stream()
                .map(TextWidth::box), layout.bends().stream().flatMap(bend -> bend.samples().stream())
                .map(point -> new Box(point.x(), point.y(), 0, 0).grown(5))).flatMap(each -> each).toList();
        double left = all.stream().mapToDouble(Box::x).min().orElse(0);
        double top = all.stream().mapToDouble(Box::y).min().orElse(0);
        return new Box(left, top, all.stream().mapToDouble(Box::right).max().orElse(0) - left,
                all.stream().mapToDouble(Box::bottom).max().orElse(0) - top);
    }

    private boolean isDense() {
        return diagram.moves().size() > PLAIN_MOVES * diagram.states().size();
    }

    private static Ink hue(Chart.Move move) {
        return Ink.hue(move.from());
    }

    private void move(int i, Moved moved, List<Shape> shapes) {
        Chart.Move move = diagram.moves().get(i);
        Ink ink = isDense() ? hue(move) : Ink.MUTED;
        Bend bend = layout.bends().get(i);
        double likely = Math.min(1, Math.abs(move.probability().approximate()));
        shapes.add(new Stroke(bend.part(0, 0.985).controls().stream().map(moved::point).toList(),
                Picture.Course.CURVED, ink, 0.8 + 1.6 * Math.sqrt(likely), Dash.SOLID, Optional.of(tip(move))));
        shapes.add(new Area(arrow(bend).stream().map(moved::point).toList(), ink));
    }

    private String tip(Chart.Move move) {
        return "from " + diagram.states().get(move.from()).name() + " to " + diagram.states().get(move.to()).name()
                + ": " + ChartNumber.of(move.probability(), EXACT_DIGITS);
    }

    /** A triangle whose tip is the end of the curve. */
    private static List<Point> arrow(Bend bend) {
        double tipX = bend.xAt(1);
        double tipY = bend.yAt(1);
        double backX = bend.xAt(0.93) - tipX;
        double backY = bend.yAt(0.93) - tipY;
        double length = StrictMath.hypot(backX, backY);
        double x = backX / length * ARROW;
        double y = backY / length * ARROW;
        return List.of(new Point(tipX, tipY), new Point(tipX + x - y * 0.45, tipY + y + x * 0.45),
                new Point(tipX + x + y * 0.45, tipY + y - x * 0.45));
    }

    private void state(int i, Moved moved, List<Shape> shapes) {
        Chart.State state = diagram.states().get(i);
        Box box = moved.box(layout.nodes().get(i));
        Ink ink = !state.start().isZero() ? Ink.ORANGE : Ink.TEXT;
        Dash dash = state.reached() ? Dash.SOLID : Dash.SHORT;
        Ink ground = state.closed() ? Ink.TINT : Ink.PAPER;
        if (state.absorbing()) {
            shapes.add(new Frame(box.grown(3), 11, ink, ground, 1, dash, Optional.empty()));
        }
        shapes.add(new Frame(box, 8, ink, ground, !state.start().isZero() ? 2 : 1.3, dash, Optional.of(state.name())));
        List<String> lines = layout.lines().get(i);
        String note = StateLayout.note(state);
        double y = box.y() + 7 + 12;
        for (String line : lines) {
            shapes.add(new Label(new Point(box.centerX(), y), Anchor.MIDDLE, Prose.name(line), Ink.TEXT,
                    StateLayout.NAME_SIZE, Setting.PLAIN));
            y += 16;
        }
        if (!note.isEmpty()) {
            shapes.add(new Label(new Point(box.centerX(), y - 2), Anchor.MIDDLE, Prose.of(note), Ink.ORANGE,
                    StateLayout.NOTE_SIZE, Setting.PLAIN));
        }
    }

    /** What the frames mean, as far as they differ. */
    private List<String> key() {
        List<String> key = new ArrayList<>();
        if (diagram.states().stream().anyMatch(Chart.State::closed)
                && diagram.states().stream().anyMatch(state -> !state.closed())) {
            key.add("shaded: never left again as a group");
        }
        if (diagram.states().stream().anyMatch(Chart.State::absorbing)) {
            key.add("double frame: never left");
        }
        if (diagram.states().stream().anyMatch(state -> !state.reached())) {
            key.add("broken frame: never reached from the start");
        }
        return key;
    }
}
