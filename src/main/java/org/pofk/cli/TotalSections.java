package org.pofk.cli;

import java.util.ArrayList;
import java.util.List;
import org.pofk.answer.Increment;
import org.pofk.answer.TotalModel;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.report.Prose;
import org.pofk.report.Style;
import org.pofk.report.TotalDocument;
import picocli.CommandLine.Option;

/** What a report adds up over steps: what is asked for, and costs wherever the model names them. */
final class TotalSections {
    @Option(names = "--total", paramLabel = "NAME",
            description = "a state, a set or an output to be added up over steps; repeatable")
    private List<String> names = new ArrayList<>();

    @Option(names = "--entries-into", paramLabel = "NAME",
            description = "a state or a set whose entries are counted; repeatable")
    private List<String> entered = new ArrayList<>();

    List<AskedSection> sections(Model read, List<Integer> at, Style style) throws UsageException {
        List<AskedSection> sections = new ArrayList<>();
        List<TotalModel.Asked> asked = new ArrayList<>();
        if (!names.isEmpty()) {
            for (Output output : AskedOutputs.of(read.chain(), names)) {
                asked.add(TotalModel.Asked.of(Increment.of(read.chain(), output)));
            }
        }
        if (!entered.isEmpty()) {
            for (Output output : AskedOutputs.of(read.chain(), entered)) {
                asked.add(TotalModel.Asked.of(TotalOptions.entries(read.chain(), output)));
            }
        }
        if (!asked.isEmpty()) {
            sections.add(section("Totals", read, asked, at, style));
        }
        if (read.costs().isPresent()) {
            sections.add(section("Costs", read, TotalModel.costs(read), at, style));
        }
        return sections;
    }

    private static AskedSection section(String title, Model read, List<TotalModel.Asked> asked, List<Integer> at,
            Style style) {
        return new AskedSection(Prose.of(title), () -> TotalDocument.section(
                TotalModel.of(read, asked, at, partly -> { }), Prose.of(title), style));
    }
}
