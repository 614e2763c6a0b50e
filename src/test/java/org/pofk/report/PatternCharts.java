package org.pofk.report;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import org.pofk.Pofk;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.Deriving;
import org.pofk.chain.Model;
import org.pofk.chain.Outputs;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.text.RefusedException;

/** The patterns' charts, each derived once for all tests. */
final class PatternCharts {
    private static final Map<String, DerivedModel> DERIVED = new ConcurrentHashMap<>();
    private static final Map<String, List<Chart>> CHARTS = new ConcurrentHashMap<>();

    private PatternCharts() {
    }

    /** Those of up to twenty states; a larger one is a pattern for the time it takes. */
    static List<String> names() throws IOException {
        return Files.readAllLines(Path.of("test-data/models/index.txt")).stream().map(String::strip)
                .filter(name -> !name.isEmpty() && !name.equals("cable-route")).toList();
    }

    static DerivedModel derived(String pattern) {
        return DERIVED.computeIfAbsent(pattern, name -> {
            try {
                return derived(Pofk.read(Path.of("test-data/models", name + ".yaml")));
            } catch (RefusedException refused) {
                throw new AssertionError(refused);
            }
        });
    }

    static DerivedModel derived(Model model) {
        return Deriving.of(model, Outputs.byDefault(model.chain()), List.of(), EnumSet.noneOf(Deriving.Extra.class),
                published -> { });
    }

    static Chart.Course course(String pattern) {
        return (Chart.Course) charts(pattern).get(0);
    }

    static Chart.PoleMap poles(String pattern) {
        return (Chart.PoleMap) charts(pattern).get(1);
    }

    static List<Chart> charts(String pattern) {
        return CHARTS.computeIfAbsent(pattern, name -> charts(derived(name)));
    }

    /** Course, poles and, where there are few enough, states. */
    static List<Chart> charts(DerivedModel derived) {
        List<Chart> charts = new ArrayList<>();
        charts.add(CourseChart.of(derived).orElseThrow());
        charts.add(PoleChart.of(derived).orElseThrow());
        StateChart.of(derived.model()).ifPresent(charts::add);
        return charts;
    }

    /** Of a model in text, whose names are hard to write. */
    static DerivedModel hard() throws RefusedException {
        return derived(ModelReader.read(Source.ofText("hard.yaml", """
                pofk: 1
                title: '50% & <rising>_#1 "θ" ]]> {x} \\~^$ --'
                step: 1 <shift> & more
                states: ['50% & <rising>_#1', 'θερμα "x"', ']]> --> {x} \\~^$', 'a name that is far too long for a box']
                start: '50% & <rising>_#1'
                transitions:
                  '50% & <rising>_#1': {'θερμα "x"': 1/3, '50% & <rising>_#1': rest}
                  'θερμα "x"': {']]> --> {x} \\~^$': 1/7, '50% & <rising>_#1': rest}
                  ']]> --> {x} \\~^$': {'a name that is far too long for a box': 1}
                  'a name that is far too long for a box': {'50% & <rising>_#1': 12345/54321, 'a name that is far too long for a box': rest}
                """), Optional.empty(), Overrides.NONE));
    }
}
