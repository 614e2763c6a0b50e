package org.pofk.report;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.pofk.chain.Entry.Subject;
import org.pofk.chain.Model;
import org.pofk.chain.ModelChanges.Change;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Table;
import org.pofk.report.OutputPair.Standing;
import org.pofk.steps.StepValue;

/** What is other than in an earlier issue: the input, then each result before and after. */
final class ChangeBlocks {
    private static final Prose NOTHING = Prose.of("–");
    private static final String BEFORE = "before";
    private static final String NOW = "now";
    private static final int CHANGE_DIGITS = 3;
    /** What fits into a column of a table with two of its kind. */
    private static final int SHORT = 24;
    private static final Set<Subject> NUMBERS = EnumSet.of(Subject.START, Subject.PARAMETER, Subject.MOVE,
            Subject.ACTION_MOVE, Subject.PHASE_MOVE, Subject.COST_OF_STATE, Subject.COST_OF_MOVE,
                    Subject.COST_OF_ACTION,
            Subject.COST_AT_START, Subject.DISCOUNT);

    private final Reissue reissue;
    private final Style style;
    private final List<Block> blocks = new ArrayList<>();

    private ChangeBlocks(Reissue reissue, Style style) {
        this.reissue = reissue;
        this.style = style;
    }

    static List<Block> of(Reissue reissue, Style style) {
        ChangeBlocks section = new ChangeBlocks(reissue, style);
        section.write();
        return section.blocks;
    }

    private void write() {
        blocks.add(new Heading(2, Prose.of("What has changed ").and(reissue.since())));
        blocks.add(file(BEFORE, reissue.earlier().origin()));
        blocks.add(file(NOW, reissue.later().origin()));
        if (!reissue.settings().isEmpty()) {
            blocks.add(new Paragraph(Prose.of("Before is ").and(reissue.settings()).and(".")));
        }
        input();
        reissue.outputs().stream().filter(pair -> pair.standing() == Standing.MOVED).forEach(this::output);
        others();
        answers();
        blocks.add(new Paragraph("What differs from this report of the earlier file has a rule in the margin, where the"
                + " format has one."));
    }

    private static Labelled file(String label, Model.Origin origin) {
        return new Labelled(label, Prose.name(origin.file()).and(", SHA-256 ").andName(origin.sha256()));
    }

    /** Words and numbers in tables, longer words below each other. */
    private void input() {
        List<Change> changes = reissue.changes().changes();
        blocks.add(new Heading(3, "What has changed in the input"));
        if (changes.isEmpty()) {
            blocks.add(new Paragraph("Nothing has changed in the input: " + reissue.sameInput() + "."));
        }
        table(changes.stream().filter(ChangeBlocks::isShort).filter(change -> !isNumber(change)).toList(), NOTHING);
        table(changes.stream().filter(ChangeBlocks::isShort).filter(ChangeBlocks::isNumber).toList(), Prose.EMPTY);
        changes.stream().filter(change -> !isShort(change)).forEach(change ->
                beforeAndNow(EntryProse.of(change.entry()),
                change.before().map(Prose::name), change.after().map(Prose::name)));
    }

    /** Numbers apart from words, so that both columns are aligned alike. */
    private void table(List<Change> changes, Prose nothing) {
        if (!changes.isEmpty()) {
            blocks.add(new Table(Prose.EMPTY, List.of(Prose.of("entry"), Prose.of(BEFORE), Prose.of(NOW)),
                    changes.stream().map(change -> List.of(EntryProse.of(change.entry()),
                            cell(change, change.before(), nothing), cell(change, change.after(), nothing))).toList()));
        }
    }

    /** An amount that a model doesn't name is zero in it; a parameter that it doesn't have is none. */
    private static Prose cell(Change change, Optional<String> value, Prose nothing) {
        return value.map(Prose::name).orElse(isNumber(change) && change.entry().subject() != Subject.PARAMETER
                && change.entry().subject() != Subject.DISCOUNT ? Prose.of("0") : nothing);
    }

    private static boolean isNumber(Change change) {
        return NUMBERS.contains(change.entry().subject());
    }

    private static boolean isShort(Change change) {
        return Stream.concat(change.before().stream(), change.after().stream()).allMatch(text ->
                text.length() <= SHORT);
    }

    private void beforeAndNow(Prose label, Optional<Prose> was, Optional<Prose> is) {
        if (was.isPresent() && was.equals(is)) {
            blocks.add(new Labelled(label, was.get().and(", as before")));
        } else {
            was.ifPresent(text -> blocks.add(new Labelled(label.and(is.isPresent() ? ", " + BEFORE : ", gone"), text)));
            is.ifPresent(text -> blocks.add(new Labelled(label.and(was.isPresent() ? ", " + NOW : ", new"), text)));
        }
    }

    private void output(OutputPair pair) {
        blocks.add(new Heading(3, Prose.name(pair.name()).and(": " + pair.compared())));
        FoundOutput old = pair.before().orElseThrow();
        FoundOutput now = pair.now().orElseThrow();
        beforeAndNow(Prose.of("formula"), old.shape(), now.shape());
        pairs(old.facts(style), now.facts(style));
        Map<Integer, StepValue> was = values(old);
        Map<Integer, StepValue> is = values(now);
        if (!is.isEmpty()) {
            blocks.add(new Table(now.reading(), List.of(Prose.of("k"), Prose.of(BEFORE), Prose.of(NOW),
                    Prose.of("change")),
                    is.keySet().stream().map(k -> row(k, Optional.ofNullable(was.get(k)), Optional.of(is.get(k))))
                            .toList()));
        }
    }

    /** A line for all that have nothing to be compared. */
    private void others() {
        Map<String, Standing> words = new LinkedHashMap<>();
        words.put("not in the earlier report", Standing.NEW);
        words.put("no longer in the report", Standing.GONE);
        words.put("the formula is the same", Standing.AS_BEFORE);
        words.values().removeIf(standing -> reissue.named(standing).isEmpty());
        if (!words.isEmpty()) {
            blocks.add(new Heading(3, "Outputs new, gone or as before"));
            words.forEach((label, standing) -> blocks.add(new Labelled(label, Prose.names(reissue.named(standing)))));
        }
    }

    private List<Prose> row(int k, Optional<StepValue> was, Optional<StepValue> is) {
        return List.of(Prose.of(String.valueOf(k)), shown(was), shown(is), Prose.of(difference(was, is)));
    }

    private static Map<Integer, StepValue> values(FoundOutput found) {
        Map<Integer, StepValue> values = new LinkedHashMap<>();
        found.values().forEach(value -> values.put(value.k(), value));
        return values;
    }

    private Prose shown(Optional<StepValue> value) {
        return value.map(each -> Prose.of(ValueText.of(each, style.digits()))).orElse(NOTHING);
    }

    /** Exact, then rounded; where a value is known by an enclosure alone, nothing is said. */
    private static String difference(Optional<StepValue> was, Optional<StepValue> is) {
        Optional<Rational> from = was.flatMap(StepValue::exact);
        Optional<Rational> to = is.flatMap(StepValue::exact);
        if (from.isEmpty() || to.isEmpty()) {
            return "";
        }
        Rational difference = to.get().minus(from.get());
        return difference.isZero() ? "none" : (difference.signum() > 0 ? "+" : "")
                + ChartNumber.minus(Decimals.of(difference, CHANGE_DIGITS).text());
    }

    private void answers() {
        List<Labelled> same = reissue.answersAsBefore();
        List<Labelled> was = Reissue.keyFigures(reissue.before()).stream().filter(each -> !same.contains(each))
                .toList();
        List<Labelled> is = Reissue.keyFigures(reissue.after()).stream().filter(each -> !same.contains(each)).toList();
        if (!was.isEmpty() || !is.isEmpty() || !same.isEmpty()) {
            blocks.add(new Heading(3, "Answers"));
            pairs(was, is);
        }
        if (!same.isEmpty()) {
            blocks.add(new Labelled("as before", Prose.joined(same.stream().map(Labelled::label).toList(), "; ")));
        }
    }

    /** What stands behind each label, in the later order. */
    private void pairs(List<Labelled> was, List<Labelled> is) {
        is.forEach(now -> beforeAndNow(now.label(), text(was, now.label()), Optional.of(now.text())));
        was.stream().filter(gone -> text(is, gone.label()).isEmpty())
                .forEach(gone -> beforeAndNow(gone.label(), Optional.of(gone.text()), Optional.empty()));
    }

    private static Optional<Prose> text(List<Labelled> all, Prose label) {
        return all.stream().filter(each -> each.label().equals(label)).map(Labelled::text).findFirst();
    }
}
