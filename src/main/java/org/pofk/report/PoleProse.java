package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import org.pofk.answer.PoleCheck;
import org.pofk.exact.Enclosed;
import org.pofk.modes.RealValue;
import org.pofk.steps.StepValue;

/** Poles in words. */
final class PoleProse {
    private static final int DIGITS = 4;
    private static final int LISTED = 12;

    private PoleProse() {
    }

    static Prose of(List<Chart.PoleSet> sets) {
        return Prose.joined(sets.stream().map(set -> Prose.names(set.outputs()).and(": " + poles(set.poles()) + "."))
                .toList(), " ");
    }

    /** How far the eigenvalues of the matrix, as doubles have them, lie from the poles. */
    static String of(PoleCheck check) {
        return check.largestDistance()
                .map(distance -> "The eigenvalues of the matrix as found in doubles lie within "
                        + SampledNumber.text(distance) + " of these poles; a comparison, no proof.")
                .orElseGet(() -> "Not compared with eigenvalues in doubles: " + check.reason().orElse(""));
    }

    private static String poles(List<Chart.Pole> poles) {
        if (poles.isEmpty()) {
            return "no pole";
        }
        List<String> parts = new ArrayList<>();
        for (Chart.Side side : List.of(Chart.Side.OUTSIDE, Chart.Side.ON, Chart.Side.INSIDE)) {
            List<Chart.Pole> there = poles.stream().filter(pole -> pole.side() == side).toList();
            if (!there.isEmpty()) {
                parts.add(list(there) + " " + place(side));
            }
        }
        return (poles.size() == 1 ? "pole " : "poles ") + String.join("; ", parts);
    }

    /** Each pair once; only how many where there are many. */
    private static String list(List<Chart.Pole> poles) {
        List<Chart.Pole> once = poles.stream().filter(pole -> pole.root().index() <= pole.root().conjugateIndex())
                .toList();
        return once.size() > LISTED ? poles.size() + " different ones"
                : once.stream().map(pole -> both(pole) + times(pole.multiplicity())).collect(Collectors.joining(", "));
    }

    private static String place(Chart.Side side) {
        return switch (side) {
            case INSIDE -> "inside the unit circle";
            case ON -> "on the unit circle";
            case OUTSIDE -> "outside the unit circle";
        };
    }

    /** A pole, or it and its conjugate: {@code 0.2 ± 0.55i}. */
    static String both(Chart.Pole pole) {
        return text(pole, " ± ");
    }

    static String times(int multiplicity) {
        return switch (multiplicity) {
            case 1 -> "";
            case 2 -> " (twice)";
            default -> " (" + multiplicity + " times)";
        };
    }

    /** The pole alone: {@code 0.2 − 0.55i}. */
    static String of(Chart.Pole pole) {
        return text(pole, pole.root().index() < pole.root().conjugateIndex() ? " + " : " − ");
    }

    private static String text(Chart.Pole pole, String sign) {
        if (pole.exact().isPresent()) {
            return ChartNumber.of(pole.exact().get(), DIGITS);
        }
        if (pole.root().isReal()) {
            return ChartNumber.minus(ValueText.of(new StepValue(0, Optional.empty(), pole.root().realPart()), DIGITS));
        }
        String real = decimal(pole.root().realPart());
        String imaginary = decimal(pole.root().imaginaryPart()).replace("−", "") + "i";
        return real.equals("0") ? (sign.equals(" + ") ? "" : sign.strip()) + imaginary : real + sign + imaginary;
    }

    /** Zero as such where it can't be told from zero. */
    private static String decimal(Enclosed value) {
        String text = new RealValue(Optional.empty(), value).decimal(DIGITS).text();
        return text.matches("-?0?\\.?0*") ? "0" : ChartNumber.minus(text);
    }
}
