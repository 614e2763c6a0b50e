package org.pofk.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.DerivedOutput;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;
import org.pofk.modes.ClosedForm;

/** The poles of outputs: those whose transforms have the same denominator share a map. */
public final class PoleChart {
    private static final int INTERVALS = 6;
    private static final int BITS = 64;
    /** Room around the unit circle. */
    private static final Rational LEAST = Rational.of(5, 4);

    private PoleChart() {
    }

    /** Of the outputs whose formula is known; empty when there is none. */
    public static Optional<Chart.PoleMap> of(DerivedModel derived) {
        Map<Polynomial<Rational>, List<DerivedOutput>> shared = new LinkedHashMap<>();
        derived.outputs().stream().filter(each -> each.closedForm().isPresent()).forEach(each ->
                shared.computeIfAbsent(each.closedForm().orElseThrow().transform().y().denominator(),
                        denominator -> new ArrayList<>()).add(each));
        List<Chart.PoleSet> sets = shared.values().stream().map(PoleChart::set).toList();
        if (sets.isEmpty()) {
            return Optional.empty();
        }
        Prose names = Prose.names(sets.stream().flatMap(set -> set.outputs().stream()).toList());
        return Optional.of(new Chart.PoleMap(Prose.of("Poles of ").and(names).and(" — ")
                .andName(derived.model().title()), PoleProse.of(sets), sets));
    }

    private static Chart.PoleSet set(List<DerivedOutput> outputs) {
        List<Chart.Pole> poles = poles(outputs.get(0).closedForm().orElseThrow());
        Rational farthest = poles.stream().map(PoleChart::reach).reduce(LEAST, Rational::max);
        Rational end = farthest.equals(LEAST) ? LEAST : farthest.times(Rational.of(11, 10));
        return new Chart.PoleSet(outputs.stream().map(each -> each.output().name()).toList(), poles,
                Axis.between(end.negate(), end, INTERVALS));
    }

    private static List<Chart.Pole> poles(ClosedForm form) {
        List<Chart.Pole> poles = new ArrayList<>();
        List<Factor<Rational>> factors = form.transform().factors().factors();
        for (int i = 0; i < factors.size(); i++) {
            Polynomial<Rational> polynomial = factors.get(i).polynomial();
            List<Root> roots = form.roots().get(i).all();
            List<Chart.Side> sides = PoleSides.of(polynomial, roots);
            for (int j = 0; j < roots.size(); j++) {
                Optional<Rational> exact = polynomial.degree() == 1
                        ? Optional.of(polynomial.coefficient(0).negate()) : Optional.empty();
                poles.add(new Chart.Pole(roots.get(j), exact, factors.get(i).multiplicity(), sides.get(j)));
            }
        }
        return poles;
    }

    /** A bound on the size of both parts, little above it. */
    private static Rational reach(Chart.Pole pole) {
        ComplexBall ball = pole.root().enclose(BITS);
        return Rational.max(ball.real().abs().upper(), ball.imaginary().abs().upper());
    }
}
