package org.pofk.report;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HexFormat;
import java.util.List;
import java.util.stream.Collectors;
import org.pofk.report.Picture.Ink;

/**
 * A chart as SVG: scales with the room it is given, says its title and what is seen to those who don't see it, follows a
 * light or dark ground, and needs no script and nothing from elsewhere. The same bytes every run.
 */
public final class SvgChart {
    private static final int TITLE_SIZE = 15;
    private static final double MARGIN = 14;
    private static final int LINE = 20;
    private static final String FONTS = "Source Sans 3, Noto Sans, Segoe UI, Helvetica Neue, Arial, sans-serif";
    private static final int ID_LENGTH = 8;
    private static final String PART = "chart";

    private SvgChart() {
    }

    /** A file of its own: its title above it, on its own ground. */
    public static String file(Chart chart) {
        return "<?xml version=\"1.0\" encoding=\"UTF-8\"?>\n<!-- " + TextWidth.text(Prose.of(Caution.TEXT))
                .replace("--", "-") + " -->\n" + titled(chart).write();
    }

    /** A file of its own on a light ground alone, for readers that know no style sheet. */
    public static String light(Chart chart) {
        SvgElement titled = titled(chart);
        return new SvgElement(titled.name(), titled.attributes(), titled.text(), titled.inside().stream()
                .filter(each -> !each.name().equals("style")).toList()).with("font-family", "SansSerif").write();
    }

    /**
     * A part of a page that shows the title itself, on the page's ground and with {@link #sheet} among its styles; ids
     * differ for charts that differ.
     */
    public static String part(Chart chart) {
        Picture picture = Pictures.of(chart);
        return root(chart, picture, 0, "part").with("class", PART).holding(shapes(picture)).write();
    }

    /** The styles of all parts of a page. */
    public static String sheet() {
        return style("." + PART) + "." + PART + "{max-width:100%;height:auto}\n";
    }

    private static SvgElement titled(Chart chart) {
        Picture picture = Pictures.of(chart);
        List<String> title = lines(words(chart.title()), picture.width() - 2 * MARGIN);
        double above = 10 + LINE * title.size();
        SvgElement ground = SvgElement.of("rect").with("x", 0).with("y", -above).with("width", picture.width())
                .with("height", picture.height() + above).with("fill", Ink.PAPER.light()).with("class", "f-paper");
        List<SvgElement> all = new ArrayList<>(List.of(ground));
        for (int i = 0; i < title.size(); i++) {
            all.add(new SvgShapes().label(new Picture.Label(new Picture.Point(MARGIN, LINE * (i + 1) - above + 3),
                    Picture.Anchor.START, Prose.of(title.get(i)), Ink.TEXT, TITLE_SIZE, Picture.Setting.BOLD)));
        }
        all.addAll(shapes(picture));
        SvgElement root = root(chart, picture, above, "file").with("style", "max-width:100%;height:auto");
        return root.holding(List.of(SvgElement.of("style").saying(style("#" + root.attributes().get("id")))))
                .holding(all);
    }

    private static List<SvgElement> shapes(Picture picture) {
        return picture.shapes().stream().map(shape -> shape.accept(new SvgShapes())).toList();
    }

    /** For what is spoken or broken by others: blanks are plain ones. */
    private static String words(Prose prose) {
        return TextWidth.text(prose).replace(Spelling.NO_BREAK, ' ');
    }

    private static SvgElement root(Chart chart, Picture picture, double above, String kind) {
        String title = words(chart.title());
        String seen = words(chart.alternative());
        String id = "chart-" + digest(kind + "\n" + title + "\n" + seen);
        String width = SvgElement.number(picture.width());
        String height = SvgElement.number(picture.height() + above);
        return SvgElement.of("svg").with("xmlns", "http://www.w3.org/2000/svg").with("id", id).with("role", "img")
                .with("aria-labelledby", id + "-title " + id + "-desc").with("width", width).with("height", height)
                .with("viewBox", "0 " + SvgElement.number(-above) + " " + width + " " + height)
                .with("font-family", FONTS)
                .holding(List.of(SvgElement.of("title").with("id", id + "-title").saying(title),
                        SvgElement.of("desc").with("id", id + "-desc").saying(seen)));
    }

    /** The colours on a light and on a dark ground. */
    private static String style(String scope) {
        String light = Arrays.stream(Ink.values()).map(ink -> "--" + SvgShapes.name(ink) + ":" + ink.light())
                .collect(Collectors.joining(";"));
        String dark = Arrays.stream(Ink.values()).map(ink -> "--" + SvgShapes.name(ink) + ":" + ink.dark())
                .collect(Collectors.joining(";"));
        String uses = Arrays.stream(Ink.values()).map(SvgShapes::name).map(name -> scope + " .f-" + name
                + "{fill:var(--" + name + ")}" + scope + " .s-" + name + "{stroke:var(--" + name + ")}")
                .collect(Collectors.joining("\n"));
        return "\n" + scope + "{" + light + "}\n@media screen and (prefers-color-scheme:dark){" + scope + "{" + dark + "}}\n" + uses
                + "\n";
    }

    private static String digest(String text) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256")
                    .digest(text.getBytes(StandardCharsets.UTF_8))).substring(0, ID_LENGTH);
        } catch (NoSuchAlgorithmException missing) {
            throw new AssertionError("every Java has SHA-256", missing);
        }
    }

    /** Words in lines of a title, the third and last one cut off where there are more. */
    private static List<String> lines(String title, double width) {
        List<String> lines = new ArrayList<>(List.of(""));
        for (String word : title.split(" +")) {
            String last = lines.get(lines.size() - 1);
            String longer = last.isEmpty() ? word : last + " " + word;
            if (last.isEmpty() || lines.size() == 3 || TextWidth.of(longer, TITLE_SIZE) * TextWidth.BOLD <= width) {
                lines.set(lines.size() - 1, longer);
            } else {
                lines.add(word);
            }
        }
        return lines.stream().map(line -> TextWidth.cut(line, TITLE_SIZE, width / TextWidth.BOLD)).toList();
    }
}
