package org.pofk.report;

import java.util.List;
import java.util.Optional;

/**
 * A drawing as shapes, in units of a pixel from the top left, later shapes above earlier ones. Positions are rounded to
 * hundredths; they decide nothing but where ink goes.
 */
record Picture(double width, double height, List<Shape> shapes) {
    Picture {
        shapes = List.copyOf(shapes);
    }

    /** What a writer for pictures has to know; each handles every variant. */
    sealed interface Shape {
        <R> R accept(Visitor<R> visitor);
    }

    /** One method per variant. */
    interface Visitor<R> {
        R stroke(Stroke stroke);

        R area(Area area);

        R mark(Mark mark);

        R label(Label label);

        R frame(Frame frame);

        R ring(Ring ring);
    }

    /** A place; hundredths of a pixel are more than is seen. */
    record Point(double x, double y) {
        Point {
            x = Math.rint(x * 100) / 100 + 0.0;
            y = Math.rint(y * 100) / 100 + 0.0;
        }
    }

    /** What a colour is for; the hues keep apart for every kind of colour vision, and on light and dark grounds. */
    enum Ink {
        TEXT("#1d2328", "#eef1f4"), MUTED("#5a646d", "#a9b4bd"), GRID("#dde2e6", "#39424a"),
        PAPER("#ffffff", "#14191d"), TINT("#e6eef6", "#22344a"),
        BLUE("#0a5fb4", "#6db3f2"), ORANGE("#c2500a", "#ff9d5c"), GREEN("#1c5b1c", "#b6e8a0"),
        PLUM("#8a2f74", "#e795d4"), BROWN("#4d4200", "#fff1a8"), SLATE("#6b7681", "#8f9aa3");

        private static final List<Ink> HUES = List.of(BLUE, ORANGE, GREEN, PLUM, BROWN, SLATE);
        private final String light;
        private final String dark;

        Ink(String light, String dark) {
            this.light = light;
            this.dark = dark;
        }

        /** One of the hues, again from the first after the last. */
        static Ink hue(int i) {
            return HUES.get(i % HUES.size());
        }

        static int hues() {
            return HUES.size();
        }

        /** On a light ground: {@code #0a5fb4}. */
        String light() {
            return light;
        }

        String dark() {
            return dark;
        }
    }

    /** How a line is broken: lengths of ink and gap in turn. */
    enum Dash {
        SOLID(List.of()), DASHED(List.of(8, 4)), SHORT(List.of(4, 3)), DASH_DOT(List.of(9, 3, 2, 3)),
        LONG(List.of(14, 4)), DASH_DOT_DOT(List.of(9, 3, 2, 3, 2, 3)), DOTTED(List.of(1, 4));

        private final List<Integer> lengths;

        Dash(List<Integer> lengths) {
            this.lengths = lengths;
        }

        List<Integer> lengths() {
            return lengths;
        }
    }

    /** Through its points, straight or as one cubic curve of four. */
    enum Course { STRAIGHT, CURVED }

    /** A line without an inside. */
    record Stroke(List<Point> points, Course course, Ink ink, double width, Dash dash, Optional<String> tip)
            implements Shape {
        Stroke {
            points = List.copyOf(points);
            if (course == Course.CURVED && points.size() != 4) {
                throw new IllegalArgumentException("a cubic curve of " + points.size() + " points");
            }
        }

        static Stroke line(double x1, double y1, double x2, double y2, Ink ink, double width, Dash dash) {
            return new Stroke(List.of(new Point(x1, y1), new Point(x2, y2)), Course.STRAIGHT, ink, width, dash,
                    Optional.empty());
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.stroke(this);
        }
    }

    /** A filled polygon. */
    record Area(List<Point> points, Ink ink) implements Shape {
        Area {
            points = List.copyOf(points);
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.area(this);
        }
    }

    /** Forms that are told apart without colour; {@code UNSEEN} only carries a tip. */
    enum Form { DISC, SQUARE, TRIANGLE, DIAMOND, DOWN, PLUS, CROSS, SMALL_CROSS, CIRCLE, UNSEEN }

    /** A mark at a place, with what is told of it when it is pointed at. */
    record Mark(Point at, Form form, Ink ink, String tip) implements Shape {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.mark(this);
        }
    }

    /** Which part of a text stands at its place. */
    enum Anchor { START, MIDDLE, END }

    /** How a text is set. */
    enum Setting { PLAIN, BOLD, HALO }

    /** A line of text, its baseline at its place. */
    record Label(Point at, Anchor anchor, Prose text, Ink ink, int size, Setting setting) implements Shape {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.label(this);
        }
    }

    /** A box with round corners. */
    record Frame(Box box, double corner, Ink ink, Ink ground, double width, Dash dash, Optional<String> tip)
            implements Shape {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.frame(this);
        }
    }

    /** A circle without an inside. */
    record Ring(Point center, double radius, Ink ink, double width) implements Shape {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.ring(this);
        }
    }
}
