package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Table;
import org.pofk.report.OutputPair.Standing;

/** What matters of the changes since an earlier issue, short enough for the first page. */
final class ChangeSummary {
    private static final int LISTED_UP_TO = 12;

    private final Reissue reissue;
    private final Style style;
    private final List<Block> blocks = new ArrayList<>();

    private ChangeSummary(Reissue reissue, Style style) {
        this.reissue = reissue;
        this.style = style;
    }

    static List<Block> of(Reissue reissue, Style style) {
        ChangeSummary summary = new ChangeSummary(reissue, style);
        summary.write();
        return summary.blocks;
    }

    private void write() {
        blocks.add(new Heading(2, Prose.of("Changes ").and(reissue.since())));
        int count = reissue.changes().changes().size();
        label("input", Prose.of(count == 0 ? "nothing has changed: " + reissue.sameInput()
                : (count == 1 ? "1 entry has" : count + " entries have") + " changed, listed behind the answers"));
        label("before", reissue.settings());
        label("new", names(reissue.named(Standing.NEW)));
        label("gone", names(reissue.named(Standing.GONE)));
        label("as before", names(reissue.named(Standing.AS_BEFORE)));
        answers();
        outputs();
    }

    private void label(String label, Prose text) {
        if (!text.isEmpty()) {
            blocks.add(new Labelled(label, text));
        }
    }

    private static Prose names(List<String> names) {
        return Prose.names(names.stream().limit(LISTED_UP_TO).toList())
                .and(names.size() > LISTED_UP_TO ? " and " + (names.size() - LISTED_UP_TO) + " more" : "");
    }

    private void answers() {
        List<Labelled> now = Reissue.keyFigures(reissue.after());
        List<Prose> other = now.stream().filter(each -> !reissue.answersAsBefore().contains(each)).map(Labelled::label)
                .toList();
        if (!now.isEmpty()) {
            label("answers", other.isEmpty() ? Prose.of("all as before")
                    : Prose.of("other now: ").and(Prose.joined(other, "; ")));
        }
    }

    private void outputs() {
        List<OutputPair> moved = reissue.outputs().stream().filter(pair -> pair.standing() == Standing.MOVED).toList();
        if (!moved.isEmpty()) {
            blocks.add(new Table(Prose.of(moved.size() > LISTED_UP_TO ? "The first " + LISTED_UP_TO + " of "
                    + moved.size() + " results that moved" : "Results that moved"), List.of(Prose.of("output"),
                    Prose.of("long run before"), Prose.of("long run now")),
                    moved.stream().limit(LISTED_UP_TO).map(this::row).toList()));
        }
    }

    private List<Prose> row(OutputPair pair) {
        Prose was = pair.before().orElseThrow().longRun(style);
        Prose is = pair.now().orElseThrow().longRun(style);
        return List.of(Prose.name(pair.name()), was, was.equals(is) ? Prose.of("as before, by another formula") : is);
    }
}
