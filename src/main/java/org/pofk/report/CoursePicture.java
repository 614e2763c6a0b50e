package org.pofk.report;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.report.Picture.Anchor;
import org.pofk.report.Picture.Dash;
import org.pofk.report.Picture.Form;
import org.pofk.report.Picture.Ink;
import org.pofk.report.Picture.Label;
import org.pofk.report.Picture.Mark;
import org.pofk.report.Picture.Point;
import org.pofk.report.Picture.Setting;
import org.pofk.report.Picture.Shape;
import org.pofk.report.Picture.Stroke;
import org.pofk.steps.StepValue;

/** Outputs over steps as a picture: the names stand beside the ends of their lines, with where they tend to. */
final class CoursePicture {
    static final int WIDTH = 720;
    private static final int LEFT = 64;
    private static final int TOP = 40;
    private static final int PLOT_HEIGHT = 300;
    private static final int BELOW = 76;
    private static final int SIZE = 13;
    private static final int SMALL = 11;
    private static final int LABEL_GAP = 16;
    private static final double WIDEST_LABEL = 190;
    private static final int VALUES_BESIDE = 8;
    private static final int CYCLE_LINES = 6;
    private static final int DIGITS = 3;
    private static final int TIP_DIGITS = 6;
    private static final List<Form> FORMS =
            List.of(Form.DISC, Form.SQUARE, Form.TRIANGLE, Form.DIAMOND, Form.DOWN, Form.PLUS);
    private static final List<Dash> DASHES =
            List.of(Dash.SOLID, Dash.DASHED, Dash.SHORT, Dash.DASH_DOT, Dash.LONG, Dash.DASH_DOT_DOT);

    private final Chart.Course course;
    private final List<Shape> shapes = new ArrayList<>();
    private final double plotWidth;

    private CoursePicture(Chart.Course course) {
        this.course = course;
        double widest = course.curves().stream().mapToDouble(this::labelWidth).max().orElse(0);
        this.plotWidth = Math.floor(WIDTH - LEFT - widest - LABEL_GAP - 8);
    }

    static Picture of(Chart.Course course) {
        CoursePicture picture = new CoursePicture(course);
        picture.axes();
        for (int i = 0; i < course.curves().size(); i++) {
            picture.longRun(course.curves().get(i), hue(i));
        }
        for (int i = 0; i < course.curves().size(); i++) {
            picture.curve(course.curves().get(i), i);
        }
        picture.names();
        picture.settling();
        return new Picture(WIDTH, TOP + PLOT_HEIGHT + BELOW, picture.shapes);
    }

    private static Ink hue(int curve) {
        return Ink.hue(curve);
    }

    /** Forms and dashes move on by one where the hues begin again. */
    private static <T> T beside(List<T> all, int curve) {
        return all.get((curve + curve / Ink.hues()) % all.size());
    }

    /** The place of a value at a step, rounded from exact numbers. */
    private Point place(Rational k, Rational value) {
        return new Point(pixels(course.steps().part(k), plotWidth) + LEFT,
                TOP + PLOT_HEIGHT - pixels(course.values().part(value), PLOT_HEIGHT));
    }

    private static double pixels(Rational part, double length) {
        Rational scaled = part.times(Rational.of(BigDecimal.valueOf(length)));
        return new BigDecimal(scaled.numerator())
                .divide(new BigDecimal(scaled.denominator()), 2, RoundingMode.HALF_EVEN).doubleValue();
    }

    private Point place(StepValue value) {
        return place(Rational.of(value.k()), CourseChart.rounded(value));
    }

    private void axes() {
        double right = LEFT + plotWidth;
        double bottom = TOP + PLOT_HEIGHT;
        for (Rational tick : course.values().ticks()) {
            double y = place(course.steps().from(), tick).y();
            shapes.add(Stroke.line(LEFT, y, right, y, tick.isZero() ? Ink.MUTED : Ink.GRID, 1, Dash.SOLID));
            shapes.add(text(LEFT - 8, y + 4, Anchor.END, Prose.of(course.values().text(tick)), Ink.MUTED, SMALL));
        }
        for (Rational tick : course.steps().ticks()) {
            double x = place(tick, course.values().from()).x();
            shapes.add(Stroke.line(x, bottom, x, bottom + 5, Ink.MUTED, 1, Dash.SOLID));
            shapes.add(text(x, bottom + 18, Anchor.MIDDLE, Prose.of(course.steps().text(tick)), Ink.MUTED, SMALL));
        }
        shapes.add(Stroke.line(LEFT, bottom, right, bottom, Ink.MUTED, 1, Dash.SOLID));
        shapes.add(text(LEFT - 50, TOP - 18, Anchor.START, Prose.of("p(k)" + unit(course.values())), Ink.TEXT, SIZE));
        shapes.add(text(LEFT + plotWidth / 2, bottom + 40, Anchor.MIDDLE, Prose.of("step k" + unit(course.steps()))
                .and(course.step().map(is -> Prose.of(" (one step is ").andName(TextWidth.cut(is, SIZE, 220)).and(")"))
                        .orElse(Prose.EMPTY)), Ink.TEXT, SIZE));
    }

    /** {@code  in 10⁻⁵}, where the ticks leave it out. */
    private static String unit(Axis axis) {
        if (axis.exponent() == 0) {
            return "";
        }
        String raised = String.valueOf(axis.exponent()).chars().mapToObj(c -> c == '-' ? "⁻"
                : String.valueOf("⁰¹²³⁴⁵⁶⁷⁸⁹".charAt(c - '0'))).reduce("", String::concat);
        return ", in units of 10" + raised;
    }

    private static Label text(double x, double y, Anchor anchor, Prose prose, Ink ink, int size) {
        return new Label(new Point(x, y), anchor, prose, ink, size, Setting.PLAIN);
    }

    private void longRun(Chart.Curve curve, Ink ink) {
        List<Rational> levels = curve.longRun().stream().distinct().toList();
        if (levels.size() <= CYCLE_LINES) {
            for (Rational level : levels) {
                double y = place(course.steps().from(), level).y();
                shapes.add(Stroke.line(LEFT, y, LEFT + plotWidth, y, ink, 1.2, Dash.DOTTED));
            }
        }
    }

    private void curve(Chart.Curve curve, int i) {
        List<Point> points = curve.points().stream().map(this::place).toList();
        if (course.drawing() == Chart.Drawing.STEMS) {
            double zero = place(course.steps().from(), Rational.ZERO).y();
            points.forEach(point -> shapes.add(Stroke.line(point.x(), zero, point.x(), point.y(), hue(i), 1.4,
                    Dash.SOLID)));
        } else {
            shapes.add(new Stroke(points, Picture.Course.STRAIGHT, hue(i),
                    course.drawing() == Chart.Drawing.LINE ? 1.8 : 0.9, beside(DASHES, i), Optional.empty()));
        }
        Form form = course.drawing() == Chart.Drawing.LINE ? Form.UNSEEN : beside(FORMS, i);
        for (int j = 0; j < points.size(); j++) {
            shapes.add(new Mark(points.get(j), form, hue(i), tip(curve, curve.points().get(j))));
        }
    }

    private static String tip(Chart.Curve curve, StepValue value) {
        String decimal = value.exact().map(exact -> ChartNumber.of(exact, TIP_DIGITS))
                .orElseGet(() -> ValueText.of(value, TIP_DIGITS));
        boolean isExact = value.exact().filter(exact -> ChartNumber.isExact(exact)).isPresent();
        return curve.name() + "(" + value.k() + ")" + (isExact ? " = " : " ≈ ") + decimal;
    }

    /** A ring around the first drawn value from which on the output stays near its long run. */
    private void settling() {
        boolean isMarked = false;
        for (int i = 0; i < course.curves().size(); i++) {
            Chart.Curve curve = course.curves().get(i);
            Optional<StepValue> first = curve.settled().flatMap(settled -> curve.points().stream()
                    .filter(value -> value.k() >= settled).findFirst());
            if (first.isPresent()) {
                isMarked = true;
                shapes.add(new Mark(place(first.get()), Form.CIRCLE, hue(i), curve.name() + " stays within "
                        + withinText() + " of its long run from k = " + curve.settled().orElseThrow() + " on"));
            }
        }
        if (isMarked) {
            double y = TOP + PLOT_HEIGHT + 62;
            shapes.add(new Mark(new Point(LEFT + 7, y), Form.CIRCLE, Ink.MUTED, "settled"));
            shapes.add(text(LEFT + 20, y + 4, Anchor.START, Prose.of("from this step on within " + withinText()
                    + " of the long run, which is dotted"), Ink.MUTED, SMALL));
        }
    }

    private String withinText() {
        return ChartNumber.minus(Decimals.of(course.within(), 1).text());
    }

    private Prose name(Chart.Curve curve) {
        return Prose.name(TextWidth.cut(curve.name(), SIZE, WIDEST_LABEL / TextWidth.BOLD));
    }

    /** {@code → 23/2813}; empty without a long run, or where there is no room for it. */
    private Optional<String> tendency(Chart.Curve curve) {
        if (course.curves().size() > VALUES_BESIDE || curve.longRun().isEmpty()) {
            return Optional.empty();
        }
        return Optional.of(curve.longRun().size() > 1 ? "→ a cycle of " + curve.longRun().size()
                : "→ " + ChartNumber.of(curve.longRun().get(0), DIGITS));
    }

    private double labelWidth(Chart.Curve curve) {
        return Math.max(TextWidth.of(TextWidth.text(name(curve)), SIZE) * TextWidth.BOLD,
                tendency(curve).map(text -> TextWidth.of(text, SMALL)).orElse(0.0));
    }

    /** Beside the last values, in their order, moved apart where they would touch. */
    private void names() {
        List<Double> wanted = course.curves().stream().map(this::lastHeight).toList();
        List<Double> heights = course.curves().stream().map(curve -> tendency(curve).isPresent() ? 31.0 : 18.0).toList();
        List<Double> centers = Spread.apart(wanted, heights, TOP - 10, TOP + PLOT_HEIGHT + 10);
        double x = LEFT + plotWidth;
        for (int i = 0; i < course.curves().size(); i++) {
            Chart.Curve curve = course.curves().get(i);
            double y = centers.get(i);
            shapes.add(Stroke.line(x + 3, wanted.get(i), x + LABEL_GAP - 3, y, hue(i), 0.8, Dash.SOLID));
            Optional<String> tendency = tendency(curve);
            shapes.add(new Label(new Point(x + LABEL_GAP, tendency.isPresent() ? y - 2 : y + 4), Anchor.START, name(curve),
                    hue(i), SIZE, Setting.BOLD));
            Ink ink = hue(i);
            tendency.ifPresent(text -> shapes.add(text(x + LABEL_GAP, y + 11, Anchor.START, Prose.of(text), ink, SMALL)));
        }
    }

    private double lastHeight(Chart.Curve curve) {
        return place(curve.points().get(curve.points().size() - 1)).y();
    }
}
