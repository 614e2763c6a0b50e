package org.pofk.report;

import java.util.List;
import org.pofk.chain.Model;

/** What of a report compares with another issue of it. */
record Issue(Model model, List<ReportSection> answers, List<FoundOutput> outputs) {
    Issue {
        answers = List.copyOf(answers);
        outputs = List.copyOf(outputs);
    }

    static Issue of(Report report) {
        return new Issue(report.derived().model(), report.answers(), DerivedFound.in(report));
    }

    static Issue of(ScheduledReport report) {
        return new Issue(report.found().model(), report.answers(), ScheduledFound.in(report.found()));
    }
}
