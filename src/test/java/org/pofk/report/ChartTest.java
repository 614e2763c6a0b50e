package org.pofk.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.pofk.Pofk;
import org.pofk.exact.Rational;
import org.pofk.steps.StepValue;
import org.pofk.text.Alphabet;
import org.pofk.text.RefusedException;

class ChartTest {
    private static final int VALUES_CHECKED = 1932;

    private static String text(Chart chart) {
        return TextWriter.of(Alphabet.UNICODE, StandardCharsets.UTF_8).write(
                new Document(List.of(new Document.Figure(chart.title(), chart))));
    }

    @Test
    void outputsOverStepsAreToldInWords() {
        assertEquals("""
                Figure: p(k) of running, crew needed — Campaigns of a lime kiln (invented)
                  Steps 0 to 10. running begins at 1, is lowest at k = 3 with 0.512 and ends at
                  0.6062; it tends to 20/33, and stays within 0.01 of it from k = 7 on.
                  crew needed begins at 0, is highest at k = 3 with 0.28 and ends at 0.2122; it
                  tends to 7/33, and stays within 0.01 of it from k = 7 on.
                """, text(PatternCharts.course("kiln-campaign")));
    }

    @Test
    void aCycleAndWhatGrowsAreToldAsSuch() {
        assertTrue(text(PatternCharts.course("alternating-filters")).contains("it tends to a cycle of\n  2: 21/136, 37/272"),
                text(PatternCharts.course("alternating-filters")));
        assertTrue(text(PatternCharts.course("maintenance-backlog")).contains("has no limit and no\n  cycle"),
                text(PatternCharts.course("maintenance-backlog")));
    }

    @Test
    void polesAreToldByWhereTheyLie() {
        assertEquals("""
                Figure: Poles of finished, second stage —
                Two filter presses in series, each with a three-part batch (invented)
                  finished: poles 1 on the unit circle; 0.9565 (twice), −0.4782 ± 0.8283i
                  (twice) inside the unit circle. second stage: poles 0.9565 (twice), −0.4782 ±
                  0.8283i (twice) inside the unit circle.
                """, text(PatternCharts.poles("tandem-presses")));
        assertTrue(text(PatternCharts.poles("maintenance-backlog")).contains("hours: poles 1.031 outside the unit circle"));
        assertTrue(text(PatternCharts.poles("storage-cavern")).contains("1 − 6.000e-7, 0.9950 inside"));
    }

    @Test
    void statesAndMovesAreToldInWords() {
        assertEquals("""
                Figure: States and moves — Old water main, relined or taken out of use (invented)
                """.replace("moves — ", "moves —\n") + """
                  6 states: new (never reached), sound (start with 0.7), leaking (start with
                  0.3), relined tight, relined leaking, out of use (never left). From new to new
                  29/30, sound 1/30; from sound to sound 0.96, leaking 0.04; from leaking to
                  leaking 0.7, relined tight 0.25, out of use 0.05; from relined tight to
                  relined tight 0.98, relined leaking 0.02; from relined leaking to
                  relined tight 0.5, relined leaking 0.5.
                """, text(PatternCharts.charts("relined-main").get(2)));
    }

    @Test
    void moreStatesThanCanBeReadAreNotDrawn() throws RefusedException {
        assertTrue(StateChart.of(Pofk.read(Path.of("test-data/models/cable-route.yaml"))).isEmpty());
        assertFalse(StateChart.of(Pofk.read(Path.of("test-data/models/tunnel-ventilation.yaml"))).isEmpty());
    }

    /** From its step on every value that is drawn is near, and the one before isn't. */
    @Test
    void theSettlingStepIsTheLeastOne() throws IOException {
        int checked = 0;
        for (String pattern : PatternCharts.names()) {
            Chart.Course course = PatternCharts.course(pattern);
            for (Chart.Curve curve : course.curves()) {
                if (curve.settled().isPresent() && curve.points().get(1).k() == 1) {
                    long settled = curve.settled().get();
                    for (StepValue point : curve.points()) {
                        boolean isNear = CourseChart.near(point).minus(curve.longRun().get(point.k() % curve.longRun().size()))
                                .abs().compareTo(course.within()) <= 0;
                        assertTrue(isNear || point.k() < settled, pattern + " " + curve.name() + " at " + point.k());
                        assertTrue(!isNear || point.k() != settled - 1, pattern + " " + curve.name());
                        checked++;
                    }
                }
            }
        }
        assertEquals(VALUES_CHECKED, checked);
    }

    @Test
    void axesHaveFewRoundTicksAndHoldTheirValues() {
        Random random = new Random(20261201);
        for (int i = 0; i < 2_000; i++) {
            Rational a = Rational.of(random.nextInt(2_000_001) - 1_000_000, 1 + random.nextInt(100_000));
            Rational b = a.plus(Rational.of(random.nextInt(1_000_000), 1 + random.nextInt(1_000_000)));
            Axis axis = Axis.around(a, b, 6);
            List<Rational> ticks = axis.ticks();
            assertTrue(axis.from().compareTo(a) <= 0 && axis.to().compareTo(b) >= 0, axis.toString());
            assertTrue(ticks.size() >= 2 && ticks.size() <= 8, axis.toString());
            assertEquals(axis.from(), ticks.get(0));
            assertEquals(axis.to(), ticks.get(ticks.size() - 1));
            Rational leading = axis.step().dividedBy(Axis.powerOfTenAtMost(axis.step()));
            assertTrue(List.of("1", "2", "5").contains(leading.toString()), axis.toString());
            Rational unit = Rational.of(10).pow(axis.exponent());
            for (Rational tick : ticks) {
                assertEquals(tick, Rational.parse(axis.text(tick).replace("−", "-")).times(unit));
            }
        }
    }
}
