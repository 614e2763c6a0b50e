package org.pofk.modes;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.formula.PlainText;
import org.pofk.transform.Transforms;

class CosineFormTest {

    /** Back at the start of a ring of n: 1/n Σ cos(2πj/n)^k (Feller, volume I, XVI.2, from memory), holding added. */
    @Test
    void walksOnRingsAreExactThroughout() {
        int irrational = 0;
        for (int n = 3; n <= 18; n++) {
            for (Rational hold : List.of(Rational.ZERO, Rational.of(1, 3))) {
                Rational move = Rational.ONE.minus(hold).times(Rational.HALF);
                List<List<Rational>> rows = zeros(n);
                for (int i = 0; i < n; i++) {
                    rows.get(i).set(i, hold);
                    rows.get((i + 1) % n).set(i, move);
                    rows.get((i + n - 1) % n).set(i, move);
                }
                Chain chain = Samples.chain(Chain.Kind.CHAIN, rows, Samples.unit(n, 0));
                ClosedForm form = ClosedForm.of(Transforms.of(chain, Samples.states(chain).subList(0, 1)).get(0));
                assertTrue(form.isExactThroughout(), "ring of " + n + " holding " + hold);
                List<Rational> series = PartialFractionsTest.series(form.transform().y(), 12);
                for (int k = 0; k < series.size(); k++) {
                    Ball value = FormulaValue.of(form.exactFormula().orElseThrow(), k, 160);
                    assertTrue(value.minus(Ball.of(series.get(k), 160)).abs().upper()
                            .compareTo(Rational.TWO.pow(-120)) < 0, "ring of " + n + " at " + k);
                }
                irrational += PlainText.ASCII.write(form.exactFormula().orElseThrow()).contains("cos") ? 1 : 0;
            }
        }
        assertTrue(irrational >= 15, "with cosines: " + irrational);
    }

    @Test
    void ringOfSevenReadsAsInTheBooks() {
        assertEquals(Optional.of("cos(2*pi/7)"), base("-1/8 -1/2 1/2 1"));
    }

    /** Ruin with chances p up and q down: poles 2√(pq) cos(πj/n) (Feller, volume I, XIV.5, from memory). */
    @Test
    void walkBetweenEndsHasItsClassicalPoles() {
        int n = 7;
        Rational up = Rational.of(2, 5);
        List<List<Rational>> rows = zeros(n + 1);
        rows.get(0).set(0, Rational.ONE);
        rows.get(n).set(n, Rational.ONE);
        for (int i = 1; i < n; i++) {
            rows.get(i + 1).set(i, up);
            rows.get(i - 1).set(i, Rational.ONE.minus(up));
        }
        Chain chain = Samples.chain(Chain.Kind.CHAIN, rows, Samples.unit(n + 1, 2));
        ClosedForm form = ClosedForm.of(Transforms.of(chain, Samples.states(chain).subList(0, 1)).get(0));
        List<String> bases = new ArrayList<>();
        for (Mode mode : form.modes()) {
            if (mode instanceof Mode.Geometric geometric) {
                bases.add(geometric.base().exact().map(PlainText.ASCII::write).orElse("none"));
                Ball worked = FormulaValue.of(geometric.base().exact().orElseThrow(), 0, 160);
                assertTrue(worked.overlaps(geometric.base().enclosure().enclose(120)));
            }
        }
        assertEquals(List.of("1", "2*sqrt(6)/5*cos(pi/7)", "2*sqrt(6)/5*cos(2*pi/7)", "2*sqrt(6)/5*cos(3*pi/7)",
                "-2*sqrt(6)/5*cos(3*pi/7)", "-2*sqrt(6)/5*cos(2*pi/7)", "-2*sqrt(6)/5*cos(pi/7)"), bases);
    }

    @Test
    void neighbourOfACosineIsNone() {
        assertTrue(CosineForm.of(Samples.polynomial("-1/8 -1/2 1/2 1")).isPresent());
        assertTrue(CosineForm.of(Samples.polynomial("-1/7 -1/2 1/2 1")).isEmpty());
    }

    private static Optional<String> base(String q) {
        return ((Mode.Geometric) Samples.closedForm("0 1", q).modes().get(0)).base().exact()
                .map(PlainText.ASCII::write);
    }

    private static List<List<Rational>> zeros(int n) {
        List<List<Rational>> rows = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            rows.add(new ArrayList<>(Collections.nCopies(n, Rational.ZERO)));
        }
        return rows;
    }
}
