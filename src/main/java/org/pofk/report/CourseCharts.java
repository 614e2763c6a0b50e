package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.KeyFigures;
import org.pofk.exact.Rational;

/** Outputs over steps in as many figures as they need: beside one much larger a small one would be a line on the axis. */
public final class CourseCharts {
    private static final Rational MOST_TIMES_LARGER = Rational.of(5);

    private CourseCharts() {
    }

    /** Those whose highest values are of a like size share a figure, in the order of the outputs. */
    public static List<Chart.Course> of(DerivedModel derived, List<KeyFigures> figures) {
        List<List<Integer>> groups = new ArrayList<>();
        for (int i = 0; i < figures.size(); i++) {
            int place = i;
            groups.stream().filter(group -> isLike(figures.get(group.get(0)), figures.get(place))).findFirst()
                    .orElseGet(() -> {
                        groups.add(new ArrayList<>());
                        return groups.get(groups.size() - 1);
                    }).add(place);
        }
        return groups.stream().flatMap(group -> CourseChart.of(only(derived, group)).stream()).toList();
    }

    private static boolean isLike(KeyFigures one, KeyFigures other) {
        if (one.highest().isEmpty() || other.highest().isEmpty()) {
            return one.highest().isEmpty() == other.highest().isEmpty();
        }
        Rational first = CourseChart.near(one.highest().get().value()).abs();
        Rational second = CourseChart.near(other.highest().get().value()).abs();
        return first.compareTo(second.times(MOST_TIMES_LARGER)) <= 0
                && second.compareTo(first.times(MOST_TIMES_LARGER)) <= 0;
    }

    private static DerivedModel only(DerivedModel derived, List<Integer> places) {
        List<DerivedOutput> outputs = IntStream.range(0, derived.outputs().size()).filter(places::contains)
                .mapToObj(derived.outputs()::get).toList();
        return new DerivedModel(derived.model(), derived.structure(), outputs, derived.state(), derived.wanted());
    }
}
