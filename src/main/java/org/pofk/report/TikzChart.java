package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
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
 * A chart as a picture of TikZ, as wide as the text at most. The same shapes at the same places as {@link SvgChart}
 * draws; marks at data are exact to hundredths of a pixel, 0.02 mm on paper.
 */
final class TikzChart implements Picture.Visitor<String> {
    /** What the picture needs. */
    static final String PACKAGE = "tikz";
    /** Text of this width on paper, in points, of which an inch has 72.27. */
    private static final double TEXT_WIDTH = 440;
    private static final double LARGEST_SCALE = 0.75;
    private static final double MARK = 3.5;
    /** The letters are narrower than what was reckoned for screens. */
    private static final double LARGER = 1.12;

    private final double scale;

    private TikzChart(double scale) {
        this.scale = scale;
    }

    static List<String> lines(Chart chart) {
        Picture picture = Pictures.of(chart);
        double scale = Math.min(LARGEST_SCALE, TEXT_WIDTH / picture.width());
        List<String> lines = new ArrayList<>();
        for (Ink ink : Ink.values()) {
            lines.add("\\definecolor{" + name(ink) + "}{HTML}{" + ink.light().substring(1).toUpperCase(Locale.ROOT) + "}");
        }
        lines.add("\\begin{tikzpicture}[x=" + number(scale) + "pt,y=-" + number(scale)
                + "pt,every node/.style={inner sep=1pt,outer sep=0pt}]");
        picture.shapes().forEach(shape -> lines.add(shape.accept(new TikzChart(scale))));
        lines.add("\\end{tikzpicture}");
        return lines.stream().filter(line -> !line.isEmpty()).toList();
    }

    private static String name(Ink ink) {
        return "pofk" + ink.name().toLowerCase(Locale.ROOT);
    }

    private static String number(double value) {
        return SvgElement.number(value);
    }

    private static String at(Point point) {
        return at(point.x(), point.y());
    }

    private static String at(double x, double y) {
        return "(" + number(x) + "," + number(y) + ")";
    }

    /** A width of a line in points. */
    private String width(double pixels) {
        return "line width=" + number(pixels * scale) + "pt";
    }

    private String dash(Picture.Dash dash) {
        StringBuilder pattern = new StringBuilder();
        for (int i = 0; i < dash.lengths().size(); i++) {
            pattern.append(i % 2 == 0 ? " on " : " off ").append(number(dash.lengths().get(i) * scale)).append("pt");
        }
        return pattern.isEmpty() ? "" : ",dash pattern=" + pattern.toString().strip();
    }

    @Override
    public String stroke(Stroke stroke) {
        List<Point> points = stroke.points();
        String start = "\\draw[" + name(stroke.ink()) + "," + width(stroke.width()) + dash(stroke.dash()) + "] ";
        return start + (stroke.course() == Picture.Course.CURVED
                ? at(points.get(0)) + " .. controls " + at(points.get(1)) + " and " + at(points.get(2)) + " .. "
                        + at(points.get(3))
                : points.stream().map(TikzChart::at).collect(Collectors.joining(" -- "))) + ";";
    }

    @Override
    public String area(Area area) {
        return filled(area.ink(), area.points());
    }

    private static String filled(Ink ink, List<Point> points) {
        return "\\fill[" + name(ink) + "] " + points.stream().map(TikzChart::at).collect(Collectors.joining(" -- "))
                + " -- cycle;";
    }

    @Override
    public String mark(Mark mark) {
        double x = mark.at().x();
        double y = mark.at().y();
        return switch (mark.form()) {
            case DISC -> "\\fill[" + name(mark.ink()) + "] " + circle(mark.at(), MARK) + ";";
            case SQUARE -> filled(mark.ink(), around(x, y, -1, -1, 1, -1, 1, 1, -1, 1));
            case TRIANGLE -> filled(mark.ink(), around(x, y, 0, -1.2, 1.2, 0.9, -1.2, 0.9));
            case DIAMOND -> filled(mark.ink(), around(x, y, 0, -1.3, 1.3, 0, 0, 1.3, -1.3, 0));
            case DOWN -> filled(mark.ink(), around(x, y, 0, 1.2, 1.2, -0.9, -1.2, -0.9));
            case PLUS -> drawn(mark.ink(), 2.2, around(x, y, -1.2, 0, 1.2, 0, 0, -1.2, 0, 1.2));
            case CROSS -> drawn(mark.ink(), 2, around(x, y, -1.4, -1.4, 1.4, 1.4, -1.4, 1.4, 1.4, -1.4));
            case SMALL_CROSS -> drawn(mark.ink(), 1, around(x, y, -0.8, -0.8, 0.8, 0.8, -0.8, 0.8, 0.8, -0.8));
            case CIRCLE -> "\\draw[" + name(mark.ink()) + "," + width(1.8) + "] " + circle(mark.at(), 2 * MARK) + ";";
            case UNSEEN -> "";
        };
    }

    private String circle(Point center, double radius) {
        return at(center) + " circle[radius=" + number(radius * scale) + "pt]";
    }

    private static List<Point> around(double x, double y, double... offsets) {
        List<Point> points = new ArrayList<>();
        for (int i = 0; i < offsets.length; i += 2) {
            points.add(new Point(x + MARK * offsets[i], y + MARK * offsets[i + 1]));
        }
        return points;
    }

    /** Two lines by their ends. */
    private String drawn(Ink ink, double width, List<Point> ends) {
        return "\\draw[" + name(ink) + "," + width(width) + "] " + at(ends.get(0)) + " -- " + at(ends.get(1)) + " "
                + at(ends.get(2)) + " -- " + at(ends.get(3)) + ";";
    }

    @Override
    public String label(Label label) {
        String anchor = switch (label.anchor()) {
            case START -> "base west";
            case MIDDLE -> "base";
            case END -> "base east";
        };
        double size = label.size() * scale * LARGER;
        String bold = label.setting() == Picture.Setting.BOLD ? "\\bfseries" : "";
        String ground = label.setting() == Picture.Setting.HALO ? ",fill=white,fill opacity=0.88,text opacity=1" : "";
        return "\\node[anchor=" + anchor + ",text=" + name(label.ink()) + ground + ",font={\\fontsize{" + number(size)
                + "}{" + number(size * 1.2) + "}\\sffamily" + bold + "\\selectfont}] at " + at(label.at()) + " {"
                + LatexSpelling.unbroken(label.text()) + "};";
    }

    @Override
    public String frame(Frame frame) {
        Box box = frame.box();
        return "\\draw[" + name(frame.ink()) + ",fill=" + name(frame.ground()) + "," + width(frame.width())
                + dash(frame.dash()) + ",rounded corners=" + number(frame.corner() * scale) + "pt] "
                + at(box.x(), box.y()) + " rectangle " + at(box.right(), box.bottom()) + ";";
    }

    @Override
    public String ring(Ring ring) {
        return "\\draw[" + name(ring.ink()) + "," + width(ring.width()) + "] " + at(ring.center()) + " circle[radius="
                + number(ring.radius() * scale) + "pt];";
    }
}
