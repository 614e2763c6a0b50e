package org.pofk.cli;

import java.util.ArrayList;
import java.util.List;
import org.pofk.answer.TotalModel;
import org.pofk.chain.Model;
import org.pofk.report.Prose;
import org.pofk.report.ScheduledTotalDocument;
import org.pofk.report.Style;
import org.pofk.report.TotalDocument;
import org.pofk.schedule.ScheduledTotal;
import org.pofk.schedule.ScheduledTotalModel;
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
        List<ScheduledTotal.Asked> asked = new ArrayList<>();
        if (!names.isEmpty()) {
            asked.addAll(TotalOptions.values(AskedOutputs.of(read.chain(), names)));
        }
        if (!entered.isEmpty()) {
            asked.addAll(TotalOptions.entries(read.chain(), AskedOutputs.of(read.chain(), entered)));
        }
        if (!asked.isEmpty()) {
            sections.add(section("Totals", read, asked, at, style));
        }
        if (read.costs().isPresent()) {
            sections.add(section("Costs", read, TotalOptions.costs(read), at, style));
        }
        return sections;
    }

    private static AskedSection section(String title, Model read, List<ScheduledTotal.Asked> asked, List<Integer> at,
            Style style) {
        if (read.schedule().isPresent()) {
            return new AskedSection(Prose.of(title), () -> ScheduledTotalDocument.section(
                    ScheduledTotalModel.of(read, asked, at, partly -> { }), Prose.of(title), style));
        }
        List<TotalModel.Asked> ofChain = TotalOptions.ofChain(read.chain(), asked);
        return new AskedSection(Prose.of(title), () -> TotalDocument.section(
                TotalModel.of(read, ofChain, at, partly -> { }), Prose.of(title), style));
    }
}
