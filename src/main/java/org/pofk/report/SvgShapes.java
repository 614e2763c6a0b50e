package org.pofk.report;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.stream.Collectors;
import org.pofk.report.Picture.Area;
import org.pofk.report.Picture.Frame;
import org.pofk.report.Picture.Ink;
import org.pofk.report.Picture.Label;
import org.pofk.report.Picture.Mark;
import org.pofk.report.Picture.Point;
import org.pofk.report.Picture.Ring;
import org.pofk.report.Picture.Stroke;

/**
 * Shapes as elements of SVG. Colours stand as attributes, for readers that know no style sheet, and as classes, by which
 * a style sheet changes them on a dark ground.
 */
final class SvgShapes implements Picture.Visitor<SvgElement> {
    private static final double MARK = 4;

    private static SvgElement filled(SvgElement element, Ink ink) {
        return element.with("fill", ink.light()).with("class", "f-" + name(ink));
    }

    private static SvgElement drawn(SvgElement element, Ink ink, double width) {
        return element.with("fill", "none").with("stroke", ink.light()).with("stroke-width", width)
                .with("class", "s-" + name(ink));
    }

    static String name(Ink ink) {
        return ink.name().toLowerCase(Locale.ROOT);
    }

    private static SvgElement dashed(SvgElement element, Picture.Dash dash) {
        return dash == Picture.Dash.SOLID ? element : element.with("stroke-dasharray",
                dash.lengths().stream().map(String::valueOf).collect(Collectors.joining(" ")));
    }

    private static SvgElement told(SvgElement element, Optional<String> tip) {
        return tip.map(element::tip).orElse(element);
    }

    private static String at(Point point) {
        return SvgElement.number(point.x()) + " " + SvgElement.number(point.y());
    }

    @Override
    public SvgElement stroke(Stroke stroke) {
        List<Point> points = stroke.points();
        String rest = points.subList(1, points.size()).stream().map(SvgShapes::at).collect(Collectors.joining(" "));
        String path = "M" + at(points.get(0)) + (points.size() == 1 ? "" : stroke.course() == Picture.Course.CURVED
                ? "C" + rest : "L" + rest);
        return told(dashed(drawn(SvgElement.of("path").with("d", path), stroke.ink(), stroke.width())
                .with("stroke-linejoin", "round"), stroke.dash()), stroke.tip());
    }

    @Override
    public SvgElement area(Area area) {
        return filled(polygon(area.points()), area.ink());
    }

    private static SvgElement polygon(List<Point> points) {
        return SvgElement.of("polygon").with("points",
                points.stream().map(SvgShapes::at).collect(Collectors.joining(" ")));
    }

    @Override
    public SvgElement mark(Mark mark) {
        double x = mark.at().x();
        double y = mark.at().y();
        SvgElement element = switch (mark.form()) {
            case DISC -> filled(circle(x, y, MARK - 0.5), mark.ink());
            case SQUARE -> filled(square(x, y, MARK * 0.85), mark.ink());
            case TRIANGLE -> filled(polygon(List.of(new Point(x, y - MARK), new Point(x + MARK, y + MARK - 1),
                    new Point(x - MARK, y + MARK - 1))), mark.ink());
            case DIAMOND -> filled(polygon(List.of(new Point(x, y - MARK - 0.5), new Point(x + MARK + 0.5, y),
                    new Point(x, y + MARK + 0.5), new Point(x - MARK - 0.5, y))), mark.ink());
            case DOWN -> filled(polygon(List.of(new Point(x, y + MARK), new Point(x + MARK, y - MARK + 1),
                    new Point(x - MARK, y - MARK + 1))), mark.ink());
            case PLUS -> drawn(path(x - MARK, y, x + MARK, y, x, y - MARK, x, y + MARK), mark.ink(), 2.2);
            case CROSS -> drawn(path(x - 5, y - 5, x + 5, y + 5, x - 5, y + 5, x + 5, y - 5), mark.ink(), 2.2);
            case SMALL_CROSS -> drawn(path(x - 3, y - 3, x + 3, y + 3, x - 3, y + 3, x + 3, y - 3), mark.ink(), 1);
            case CIRCLE -> drawn(circle(x, y, MARK + 3), mark.ink(), 1.8);
            case UNSEEN -> circle(x, y, MARK).with("fill", "none").with("pointer-events", "all");
        };
        return element.with("data-x", x).with("data-y", y).tip(mark.tip());
    }

    private static SvgElement circle(double x, double y, double radius) {
        return SvgElement.of("circle").with("cx", x).with("cy", y).with("r", radius);
    }

    private static SvgElement square(double x, double y, double half) {
        return SvgElement.of("rect").with("x", x - half).with("y", y - half).with("width", 2 * half)
                .with("height", 2 * half);
    }

    private static SvgElement path(double x1, double y1, double x2, double y2, double x3, double y3, double x4,
            double y4) {
        return SvgElement.of("path").with("d", "M" + at(new Point(x1, y1)) + "L" + at(new Point(x2, y2)) + "M"
                + at(new Point(x3, y3)) + "L" + at(new Point(x4, y4)));
    }

    @Override
    public SvgElement label(Label label) {
        SvgElement element = filled(SvgElement.of("text").with("x", label.at().x()).with("y", label.at().y()),
                label.ink()).with("font-size", label.size());
        element = switch (label.anchor()) {
            case START -> element;
            case MIDDLE -> element.with("text-anchor", "middle");
            case END -> element.with("text-anchor", "end");
        };
        String words = TextWidth.text(label.text());
        return switch (label.setting()) {
            case PLAIN -> element.saying(words);
            case BOLD -> element.with("font-weight", "bold").saying(words);
            case HALO -> SvgElement.of("g").holding(List.of(ground(TextWidth.box(label)), element.saying(words)));
        };
    }

    /** What keeps a text apart from the lines below it. */
    private static SvgElement ground(Box box) {
        return filled(SvgElement.of("rect").with("x", box.x()).with("y", box.y()).with("width", box.width())
                .with("height", box.height()).with("rx", 3), Ink.PAPER).with("fill-opacity", 0.88);
    }

    @Override
    public SvgElement frame(Frame frame) {
        Box box = frame.box();
        return told(dashed(SvgElement.of("rect").with("x", box.x()).with("y", box.y()).with("width", box.width())
                .with("height", box.height()).with("rx", frame.corner()).with("fill", frame.ground().light())
                .with("stroke", frame.ink().light()).with("stroke-width", frame.width())
                .with("class", "f-" + name(frame.ground()) + " s-" + name(frame.ink())), frame.dash()), frame.tip());
    }

    @Override
    public SvgElement ring(Ring ring) {
        return drawn(circle(ring.center().x(), ring.center().y(), ring.radius()), ring.ink(), ring.width());
    }
}
