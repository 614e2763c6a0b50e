package org.pofk.page;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import org.pofk.Pofk;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.Deriving;
import org.pofk.answer.KeyFigures;
import org.pofk.chain.Model;
import org.pofk.chain.Outputs;
import org.pofk.report.CourseChart;
import org.pofk.report.CourseCharts;
import org.pofk.report.DerivationDocument;
import org.pofk.report.Document;
import org.pofk.report.PoleChart;
import org.pofk.report.Provenance;
import org.pofk.report.Report;
import org.pofk.report.ReportDocument;
import org.pofk.report.StateChart;
import org.pofk.report.Style;
import org.pofk.text.RefusedException;

/** Every pattern derived, and its document with all there is to it. */
final class Pages {
    static final int LAST_VALUE = 20;

    private static final Map<String, DerivedModel> DERIVED = new HashMap<>();

    private Pages() {
    }

    static List<String> patterns() {
        try {
            return Files.readAllLines(Path.of("test-data/models/index.txt")).stream()
                    .map(line -> line.split("[\\s:]")[0].replace(".yaml", "")).filter(name -> !name.isBlank()).toList();
        } catch (IOException unreadable) {
            throw new UncheckedIOException(unreadable);
        }
    }

    /** Derived once for all tests. */
    static synchronized DerivedModel derived(String pattern) throws RefusedException {
        if (!DERIVED.containsKey(pattern)) {
            DERIVED.put(pattern, derivedAnew(pattern));
        }
        return DERIVED.get(pattern);
    }

    private static DerivedModel derivedAnew(String pattern) throws RefusedException {
        Model model = Pofk.read(Path.of("test-data", "models", pattern + ".yaml"));
        List<Integer> steps = IntStream.rangeClosed(0, LAST_VALUE).boxed().toList();
        return Deriving.of(model, Outputs.byDefault(model.chain()), steps,
                EnumSet.of(Deriving.Extra.COMPARISON, Deriving.Extra.STATE_MODES), published -> { });
    }

    /** The whole report. */
    static Document report(DerivedModel derived) {
        List<KeyFigures> figures = derived.outputs().stream()
                .map(output -> KeyFigures.of(derived.model().chain(), output)).toList();
        return ReportDocument.of(new Report(derived, figures, CourseCharts.of(derived, figures), List.of(),
                new Provenance("pofk", "pofk report", List.of(derived.model().origin()))), Report.Depth.FULL,
                new Style(6, Style.Angles.RADIANS), Model.Convention.COLUMNS);
    }

    /** The derivation with figures. */
    static Document document(DerivedModel derived) {
        Document words = DerivationDocument.all(derived, new Style(6, Style.Angles.DEGREES), Model.Convention.COLUMNS);
        List<Document.Block> blocks = new ArrayList<>(words.blocks());
        CourseChart.of(derived).ifPresent(chart -> blocks.add(new Document.Figure(chart.title(), chart)));
        PoleChart.of(derived).ifPresent(chart -> blocks.add(new Document.Figure(chart.title(), chart)));
        StateChart.of(derived.model()).ifPresent(chart -> blocks.add(new Document.Figure(chart.title(), chart)));
        return new Document(blocks, words.sequences());
    }
}
