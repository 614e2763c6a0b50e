package org.pofk.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Rational;
import org.pofk.report.Picture.Anchor;
import org.pofk.report.Picture.Dash;
import org.pofk.report.Picture.Form;
import org.pofk.report.Picture.Ink;
import org.pofk.report.Picture.Label;
import org.pofk.report.Picture.Mark;
import org.pofk.report.Picture.Point;
import org.pofk.report.Picture.Ring;
import org.pofk.report.Picture.Setting;
import org.pofk.report.Picture.Shape;
import org.pofk.report.Picture.Stroke;

/** Poles around the unit circle as a picture, a map for each set of outputs; both parts are equal to scale. */
final class PolePicture {
    private static final int LEFT = 48;
    private static final int HEAD = 58;
    private static final int FOOT = 46;
    private static final int GAP = 26;
    private static final int SIZE = 13;
    private static final int SMALL = 11;
    private static final int BITS = 64;
    private static final double REACH = 5;
    /** With fewer poles in the upper half each is labelled with its value, as far as there is room. */
    private static final int LABELLED = 12;

    /** With more poles than this the marks are smaller. */
    private static final int MANY = 24;

    private final List<Shape> shapes = new ArrayList<>();

    private PolePicture() {
    }

    static Picture of(Chart.PoleMap map) {
        PolePicture picture = new PolePicture();
        int columns = Math.min(map.sets().size(), 3);
        double side = columns == 1 ? 380 : columns == 2 ? 290 : 230;
        double width = LEFT + side + GAP;
        double height = HEAD + side + FOOT;
        for (int i = 0; i < map.sets().size(); i++) {
            picture.panel(map.sets().get(i), new Box(i % columns * width + LEFT, i / columns * height + HEAD, side, side));
        }
        int rows = (map.sets().size() + columns - 1) / columns;
        return new Picture(columns * width, rows * height, picture.shapes);
    }

    private void panel(Chart.PoleSet set, Box plot) {
        Axis axis = set.axis();
        head(set, plot);
        double zeroX = plot.x() + plot.width() * axis.part(Rational.ZERO).approximate();
        double zeroY = plot.bottom() - plot.height() * axis.part(Rational.ZERO).approximate();
        for (Rational tick : axis.ticks()) {
            double along = axis.part(tick).approximate();
            double x = plot.x() + plot.width() * along;
            double y = plot.bottom() - plot.height() * along;
            Ink ink = tick.isZero() ? Ink.MUTED : Ink.GRID;
            shapes.add(Stroke.line(x, plot.y(), x, plot.bottom(), ink, 1, Dash.SOLID));
            shapes.add(Stroke.line(plot.x(), y, plot.right(), y, ink, 1, Dash.SOLID));
            shapes.add(text(x, plot.bottom() + 16, Anchor.MIDDLE, axis.text(tick), SMALL));
            shapes.add(text(plot.x() - 7, y + 4, Anchor.END, axis.text(tick), SMALL));
        }
        shapes.add(text(plot.right(), plot.bottom() + 34, Anchor.END, "real part", SMALL));
        shapes.add(text(plot.x() - LEFT + 14, plot.y() - 10, Anchor.START, "imaginary part", SMALL));
        double radius = plot.width() / axis.to().minus(axis.from()).approximate();
        shapes.add(new Ring(new Point(zeroX, zeroY), radius, Ink.TEXT, 1.2));
        List<Point> places = set.poles().stream().map(pole -> place(pole, axis, plot)).toList();
        for (int i = 0; i < places.size(); i++) {
            shapes.add(new Mark(places.get(i), places.size() > MANY ? Form.SMALL_CROSS : Form.CROSS,
                    ink(set.poles().get(i).side()), tip(set.poles().get(i))));
        }
        label(set.poles(), places, plot);
    }

    private void head(Chart.PoleSet set, Box plot) {
        String names = String.join(", ", set.outputs());
        double room = plot.width() + LEFT / 2.0;
        shapes.add(new Label(new Point(plot.x() - LEFT + 14, plot.y() - 34), Anchor.START,
                Prose.name(TextWidth.cut(names, SIZE, room / TextWidth.BOLD)), Ink.TEXT, SIZE, Setting.BOLD));
    }

    private static Label text(double x, double y, Anchor anchor, String words, int size) {
        return new Label(new Point(x, y), anchor, Prose.of(words), Ink.MUTED, size, Setting.PLAIN);
    }

    private static Ink ink(Chart.Side side) {
        return switch (side) {
            case INSIDE -> Ink.BLUE;
            case ON -> Ink.ORANGE;
            case OUTSIDE -> Ink.PLUM;
        };
    }

    private static String tip(Chart.Pole pole) {
        return "pole " + PoleProse.of(pole) + PoleProse.times(pole.multiplicity()) + switch (pole.side()) {
            case INSIDE -> ", inside the unit circle";
            case ON -> ", on the unit circle";
            case OUTSIDE -> ", outside the unit circle";
        };
    }

    private static Point place(Chart.Pole pole, Axis axis, Box plot) {
        ComplexBall ball = pole.root().enclose(BITS);
        return new Point(plot.x() + plot.width() * axis.part(ball.real().middle()).approximate(),
                plot.bottom() - plot.height() * axis.part(ball.imaginary().middle()).approximate());
    }

    /** Multiplicities always, values where there is room; those of the upper half stand for their conjugates too. */
    private void label(List<Chart.Pole> poles, List<Point> places, Box plot) {
        List<Box> taken = new ArrayList<>(places.stream()
                .map(at -> Box.around(at.x(), at.y(), 2 * REACH, 2 * REACH)).toList());
        List<Integer> left = new ArrayList<>();
        for (int i = 0; i < poles.size(); i++) {
            if (poles.get(i).root().index() <= poles.get(i).root().conjugateIndex()) {
                left.add(i);
            }
        }
        boolean isFew = left.size() <= LABELLED;
        left.removeIf(i -> isFew && poles.get(i).side() == Chart.Side.ON && outside(poles.get(i), places.get(i), taken, plot));
        if (isFew) {
            left.removeAll(onTheAxis(left.stream().filter(i -> poles.get(i).root().isReal()).toList(), poles, places, taken,
                    plot));
        }
        left.sort(Comparator.comparingInt(i -> -poles.get(i).multiplicity()));
        for (int i : left) {
            Chart.Pole pole = poles.get(i);
            String times = PoleProse.times(pole.multiplicity()).strip();
            String full = isFew ? text(pole) : times;
            boolean placed = !full.isEmpty() && put(full, places.get(i), ink(pole.side()), taken, plot, 9);
            if (!placed && !times.isEmpty()) {
                put(times, places.get(i), ink(pole.side()), taken, plot, 16);
            }
        }
    }

    /** {@code 0.9565 (twice)}, a pair's once. */
    private static String text(Chart.Pole pole) {
        return PoleProse.both(pole) + PoleProse.times(pole.multiplicity());
    }

    /** A pole on the circle is labelled outside of it, where that is free. */
    private boolean outside(Chart.Pole pole, Point at, List<Box> taken, Box plot) {
        Label label = around(text(pole), at, ink(pole.side()), REACH + 3)
                .get((at.x() > plot.centerX() ? Around.RIGHT : Around.LEFT).ordinal());
        Box box = TextWidth.box(label);
        boolean isFree = plot.contains(box) && taken.stream().noneMatch(box::overlaps);
        if (isFree) {
            taken.add(box);
            shapes.add(label);
        }
        return isFree;
    }

    /** Real poles in their order, in turn in a row above and one below the axis; those that were labelled. */
    private List<Integer> onTheAxis(List<Integer> real, List<Chart.Pole> poles, List<Point> places, List<Box> taken,
            Box plot) {
        List<Integer> sorted = real.stream().sorted(Comparator.comparingDouble(i -> places.get(i).x())).toList();
        List<Integer> labelled = new ArrayList<>();
        for (int row = 0; row < 2; row++) {
            int first = row;
            List<Integer> its = sorted.stream().filter(i -> sorted.indexOf(i) % 2 == first).toList();
            List<Double> widths = its.stream().map(i -> TextWidth.of(text(poles.get(i)), SMALL) + 6).toList();
            if (widths.stream().mapToDouble(each -> each).sum() > plot.width() - 4) {
                continue;
            }
            List<Double> centers = Spread.apart(its.stream().map(i -> places.get(i).x()).toList(), widths, plot.x() + 2,
                    plot.right() - 2);
            for (int j = 0; j < its.size(); j++) {
                Point at = places.get(its.get(j));
                Ink ink = ink(poles.get(its.get(j)).side());
                double down = row == 0 ? -1 : 1;
                Label label = new Label(new Point(centers.get(j), at.y() + (row == 0 ? -19 : 27)), Anchor.MIDDLE,
                        Prose.of(text(poles.get(its.get(j)))), ink, SMALL, Setting.HALO);
                taken.add(TextWidth.box(label));
                shapes.add(label);
                shapes.add(Stroke.line(at.x(), at.y() + down * (REACH + 1), centers.get(j), at.y() + down * 16, ink, 0.7,
                        Dash.SOLID));
                labelled.add(its.get(j));
            }
        }
        return labelled;
    }

    /** Tries places around a pole, ring after ring; says whether one was free. */
    private boolean put(String text, Point at, Ink ink, List<Box> taken, Box plot, int rings) {
        for (int ring = 0; ring < rings; ring++) {
            double away = REACH + 3 + 10 * ring;
            for (Label label : around(text, at, ink, away)) {
                Box box = TextWidth.box(label);
                if (plot.grown(-1).contains(box) && taken.stream().noneMatch(box::overlaps)) {
                    taken.add(box);
                    shapes.add(label);
                    if (ring > 0) {
                        shapes.add(Stroke.line(at.x(), at.y(), box.centerX(), box.centerY() < at.y() ? box.bottom()
                                : box.y(), ink, 0.7, Dash.SOLID));
                    }
                    return true;
                }
            }
        }
        return false;
    }

    private static List<Label> around(String text, Point at, Ink ink, double away) {
        List<Label> labels = new ArrayList<>();
        for (Around place : Around.values()) {
            double x = switch (place.anchor) {
                case START -> at.x() + away;
                case MIDDLE -> at.x();
                case END -> at.x() - away;
            };
            labels.add(new Label(new Point(x, at.y() + place.down * away + place.drop), place.anchor, Prose.of(text), ink,
                    SMALL, Setting.HALO));
        }
        return labels;
    }

    /** Where a label may stand beside a mark, in the order of what is liked best. */
    private enum Around {
        ABOVE(Anchor.MIDDLE, -1, -2), BELOW(Anchor.MIDDLE, 1, 9), RIGHT(Anchor.START, 0, 4), LEFT(Anchor.END, 0, 4),
        ABOVE_RIGHT(Anchor.START, -1, 0), ABOVE_LEFT(Anchor.END, -1, 0), BELOW_RIGHT(Anchor.START, 1, 8),
        BELOW_LEFT(Anchor.END, 1, 8);

        private final Anchor anchor;
        private final int down;
        private final int drop;

        Around(Anchor anchor, int down, int drop) {
            this.anchor = anchor;
            this.down = down;
            this.drop = drop;
        }
    }
}
