package org.pofk.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import javax.imageio.ImageIO;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.DerivedOutput;
import org.pofk.chain.Chain;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.text.RefusedException;
import org.w3c.dom.Element;

class SvgChartTest {
    private static final Pattern TIP = Pattern.compile("(?s)(.*)\\((\\d+)\\) [=≈] .*");
    private static final double PIXEL = 0.02;
    private static final int VALUES = 2014;
    private static final int POLES = 77;
    private static final String[] HARD = {"50% & <rising>_#1", "θερμα \"x\"", "]]> --> {x} \\~^$",
        "a name that is far too long for a box"};

    static List<String> patterns() throws IOException {
        return PatternCharts.names();
    }

    @ParameterizedTest
    @MethodSource("patterns")
    void figuresAreWellFormedSayWhatIsSeenAndAreTheSameBytesInEveryLocale(String pattern) {
        for (Chart chart : PatternCharts.charts(pattern)) {
            String svg = SvgChart.file(chart);
            DrawnSvg drawn = DrawnSvg.of(svg);
            Element root = drawn.root();
            assertEquals("img", root.getAttribute("role"));
            String id = root.getAttribute("id");
            assertEquals(id + "-title " + id + "-desc", root.getAttribute("aria-labelledby"));
            assertEquals(words(chart.title()), DrawnSvg.inside(root, "title"));
            assertEquals(words(chart.alternative()), DrawnSvg.inside(root, "desc"));
            List<String> ids = drawn.all().stream().map(each -> each.getAttribute("id")).filter(each -> !each.isEmpty())
                    .toList();
            assertEquals(2, ids.size());
            assertTrue(ids.stream().allMatch(each -> each.startsWith(id + "-")));
            assertSameInTurkish(chart, svg);
        }
    }

    private static String words(Prose prose) {
        return TextWidth.text(prose).replace(Spelling.NO_BREAK, ' ');
    }

    private static void assertSameInTurkish(Chart chart, String svg) {
        Locale before = Locale.getDefault();
        try {
            Locale.setDefault(Locale.forLanguageTag("tr-TR"));
            assertEquals(svg, SvgChart.file(chart));
        } finally {
            Locale.setDefault(before);
        }
    }

    @Test
    void idsDifferForAllFigures() throws IOException {
        Set<String> ids = new HashSet<>();
        int charts = 0;
        for (String pattern : PatternCharts.names()) {
            for (Chart chart : PatternCharts.charts(pattern)) {
                ids.add(DrawnSvg.of(SvgChart.file(chart)).root().getAttribute("id"));
                ids.add(DrawnSvg.of(SvgChart.part(chart)).root().getAttribute("id"));
                charts += 2;
            }
        }
        assertEquals(90, charts);
        assertEquals(charts, ids.size());
    }

    /** Every drawn value against stepping of its own, by what the ticks' texts say of the scale. */
    @Test
    void valuesStandWhereTheirExactNumbersSay() throws IOException {
        int compared = 0;
        for (String pattern : PatternCharts.names()) {
            DerivedModel derived = PatternCharts.derived(pattern);
            Chart.Course course = PatternCharts.course(pattern);
            DrawnSvg drawn = DrawnSvg.of(SvgChart.file(course));
            Scale steps = Scale.of(drawn, course.steps(), false);
            Scale values = Scale.of(drawn, course.values(), true);
            int last = course.curves().get(0).points().get(course.curves().get(0).points().size() - 1).k();
            Map<String, List<Rational>> exact = last > 1_000 ? Map.of() : stepped(derived, last);
            for (DrawnSvg.Told mark : drawn.marks()) {
                Matcher tip = TIP.matcher(mark.tip());
                if (tip.matches() && !exact.isEmpty()) {
                    int k = Integer.parseInt(tip.group(2));
                    assertEquals(steps.at(k), mark.x(), PIXEL, pattern + " " + mark.tip());
                    assertEquals(values.at(exact.get(tip.group(1)).get(k).approximate()), mark.y(), PIXEL,
                            pattern + " " + mark.tip());
                    compared++;
                }
            }
        }
        assertEquals(VALUES, compared);
    }

    /** Two ticks and where they stand. */
    private record Scale(double value, double place, double otherValue, double otherPlace) {
        static Scale of(DrawnSvg drawn, Axis axis, boolean upward) {
            List<DrawnSvg.Text> ticks = drawn.texts().stream().filter(text -> text.words().matches("−?[0-9.]+")
                    && (upward ? text.x() < 60 : text.y() > 350 && text.y() < 360)).toList();
            DrawnSvg.Text first = ticks.get(0);
            DrawnSvg.Text last = ticks.get(ticks.size() - 1);
            double unit = Math.pow(10, axis.exponent());
            return new Scale(value(first) * unit, upward ? first.y() - 4 : first.x(), value(last) * unit,
                    upward ? last.y() - 4 : last.x());
        }

        private static double value(DrawnSvg.Text text) {
            return Double.parseDouble(text.words().replace('−', '-'));
        }

        double at(double wanted) {
            return place + (wanted - value) / (otherValue - value) * (otherPlace - place);
        }
    }

    private static Map<String, List<Rational>> stepped(DerivedModel derived, int last) {
        Chain chain = derived.model().chain();
        Map<String, List<Rational>> values = new HashMap<>();
        List<Rational> state = chain.start();
        for (int k = 0; k <= last; k++) {
            for (DerivedOutput output : derived.outputs()) {
                values.computeIfAbsent(output.output().name(), name -> new ArrayList<>()).add(output.output().of(state));
            }
            state = chain.matrix().times(state);
        }
        return values;
    }

    /** A point is a root where one step of Newton's from there is shorter than is seen. */
    @Test
    void polesStandAtTheRootsOfTheirDenominators() throws IOException {
        int compared = 0;
        for (String pattern : PatternCharts.names()) {
            Chart.PoleMap map = PatternCharts.poles(pattern);
            DrawnSvg drawn = DrawnSvg.of(SvgChart.file(map));
            List<Element> circles = drawn.elements("circle");
            List<DrawnSvg.Told> marks = drawn.marks();
            int next = 0;
            for (int i = 0; i < map.sets().size(); i++) {
                double radius = DrawnSvg.number(circles.get(i), "r");
                for (Chart.Pole pole : map.sets().get(i).poles()) {
                    DrawnSvg.Told mark = marks.get(next++);
                    double x = (mark.x() - DrawnSvg.number(circles.get(i), "cx")) / radius;
                    double y = (DrawnSvg.number(circles.get(i), "cy") - mark.y()) / radius;
                    assertTrue(newton(pole.root().polynomial(), x, y) < PIXEL / radius, pattern + " " + mark);
                    compared++;
                }
            }
            assertEquals(marks.size(), next);
            int degrees = map.sets().stream().mapToInt(set -> degree(PatternCharts.derived(pattern), set)).sum();
            assertEquals(degrees, map.sets().stream().flatMap(set -> set.poles().stream())
                    .mapToInt(Chart.Pole::multiplicity).sum());
        }
        assertEquals(POLES, compared);
    }

    private static int degree(DerivedModel derived, Chart.PoleSet set) {
        return derived.outputs().stream().filter(each -> each.output().name().equals(set.outputs().get(0))).findFirst()
                .orElseThrow().transform().orElseThrow().y().denominator().degree();
    }

    private static double newton(Polynomial<Rational> polynomial, double x, double y) {
        double re = 0;
        double im = 0;
        double slopeRe = 0;
        double slopeIm = 0;
        for (int i = polynomial.degree(); i >= 0; i--) {
            double nextSlopeRe = slopeRe * x - slopeIm * y + re;
            slopeIm = slopeRe * y + slopeIm * x + im;
            slopeRe = nextSlopeRe;
            double nextRe = re * x - im * y + polynomial.coefficient(i).approximate();
            im = re * y + im * x;
            re = nextRe;
        }
        return Math.hypot(re, im) / Math.hypot(slopeRe, slopeIm);
    }

    /** Boxes reckoned for wide letters, of all texts of all figures. */
    @ParameterizedTest
    @MethodSource("patterns")
    void noTextTouchesAnotherOrLeavesTheFigure(String pattern) {
        PatternCharts.charts(pattern).forEach(chart -> assertKeptApart(pattern, chart));
    }

    private static void assertKeptApart(String name, Chart chart) {
        DrawnSvg drawn = DrawnSvg.of(SvgChart.file(chart));
        List<DrawnSvg.Text> texts = drawn.texts();
        assertFalse(texts.isEmpty());
        for (int i = 0; i < texts.size(); i++) {
            assertTrue(drawn.viewBox().contains(texts.get(i).box()), name + ": " + texts.get(i) + drawn.viewBox());
            for (int j = 0; j < i; j++) {
                assertFalse(texts.get(i).box().overlaps(texts.get(j).box()), name + ": " + texts.get(i) + texts.get(j));
            }
        }
    }

    @Test
    void anyNameIsShownAsItIsWritten() throws RefusedException {
        DerivedModel hard = PatternCharts.hard();
        List<Chart> charts = PatternCharts.charts(hard);
        assertEquals(3, charts.size());
        for (Chart chart : charts) {
            assertKeptApart("hard", chart);
            DrawnSvg drawn = DrawnSvg.of(SvgChart.part(chart));
            String seen = DrawnSvg.inside(drawn.root(), "desc");
            for (String name : HARD) {
                assertTrue(seen.contains(name), seen);
            }
            assertTrue(drawn.texts().stream().anyMatch(text -> text.words().replace(Spelling.NO_BREAK, ' ')
                    .startsWith("50% &")), chart.title().toString());
        }
    }

    @Test
    void twelveOutputsThatEndAtOneValueAreLabelledApart() {
        List<Chart.Curve> curves = new ArrayList<>();
        Chart.Course course = PatternCharts.course("pump-pair");
        for (int i = 0; i < CourseChart.MOST_CURVES; i++) {
            Chart.Curve like = course.curves().get(0);
            curves.add(new Chart.Curve("output " + i, like.points(), like.longRun(), like.settled()));
        }
        Chart crowded = new Chart.Course(course.title(), course.alternative(), course.step(), course.drawing(),
                course.steps(), course.values(), course.within(), curves);
        assertKeptApart("crowded", crowded);
        DrawnSvg drawn = DrawnSvg.of(SvgChart.file(crowded));
        Set<String> looks = new HashSet<>();
        drawn.elements("path").stream().filter(path -> path.getAttribute("d").split(" ").length > 10)
                .forEach(path -> looks.add(path.getAttribute("stroke") + path.getAttribute("stroke-dasharray")));
        assertEquals(CourseChart.MOST_CURVES, looks.size());
    }

    @Test
    void huesStandOutOnLightAndDarkGroundAndFromEachOther() {
        List<Picture.Ink> hues = new ArrayList<>();
        for (int i = 0; i < Picture.Ink.hues(); i++) {
            hues.add(Picture.Ink.hue(i));
        }
        for (Picture.Ink ink : hues) {
            assertTrue(Colours.contrast(ink.light(), Picture.Ink.PAPER.light()) >= 4.5, ink + " on light");
            assertTrue(Colours.contrast(ink.dark(), Picture.Ink.PAPER.dark()) >= 4.5, ink + " on dark");
        }
        for (Colours.Eye eye : Colours.Eye.values()) {
            for (int i = 0; i < hues.size(); i++) {
                for (int j = 0; j < i; j++) {
                    int least = i < 3 ? 12 : 6;
                    assertTrue(Colours.distance(eye, hues.get(i).light(), hues.get(j).light()) > least, eye + " " + i + j);
                    assertTrue(Colours.distance(eye, hues.get(i).dark(), hues.get(j).dark()) > least, eye + " " + i + j);
                }
            }
        }
    }

    @Test
    void aStyleSheetGivesBothGroundsAndAPageDrawsNone() {
        Chart chart = PatternCharts.course("pump-pair");
        String file = SvgChart.file(chart);
        String id = DrawnSvg.of(file).root().getAttribute("id");
        assertTrue(file.contains("@media screen and (prefers-color-scheme:dark){#" + id + "{"), file);
        assertTrue(file.contains("<!-- Exact for the model as entered."), file);
        String part = SvgChart.part(chart);
        assertFalse(part.contains("class=\"f-paper\"") || part.contains("style"), part);
        assertTrue(part.contains("class=\"chart\"") && SvgChart.sheet().contains(".chart .f-blue{fill:var(--blue)}"), part);
        assertFalse(SvgChart.light(chart).contains("<style"));
        assertNotEquals(file, SvgChart.part(chart));
    }

    @Test
    void pixelsAreAsManyAsAskedAndNotAllOfOneColour() throws IOException {
        for (Chart chart : PatternCharts.charts("pump-pair")) {
            byte[] png = PngChart.of(chart, 500);
            var image = ImageIO.read(new ByteArrayInputStream(png));
            assertEquals(500, image.getWidth());
            Set<Integer> colours = new HashSet<>();
            for (int x = 0; x < image.getWidth(); x++) {
                for (int y = 0; y < image.getHeight(); y++) {
                    colours.add(image.getRGB(x, y));
                }
            }
            assertTrue(colours.size() > 20 && colours.contains(0xffffffff), colours.size() + " colours");
        }
    }
}
