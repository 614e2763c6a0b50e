package org.pofk.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.KeyFigures;
import org.pofk.answer.StepValue;
import org.pofk.chain.Model;
import org.pofk.chain.ModelChanges;
import org.pofk.chain.ModelChanges.Change;
import org.pofk.exact.Decimals;
import org.pofk.exact.Rational;
import org.pofk.modes.FormulaShape;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Heading;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Paragraph;
import org.pofk.report.Document.Table;
import org.pofk.transform.Transform;

/** What is other than in an earlier issue: the input, then each result before and after. */
final class ChangeBlocks {
    private static final Prose NOTHING = Prose.of("–");
    private static final String BEFORE = "before";
    private static final String NOW = "now";
    private static final int CHANGE_DIGITS = 3;
    /** What fits into a column of a table with two of its kind. */
    private static final int SHORT = 24;

    private final Report before;
    private final Report after;
    private final ModelChanges changes;
    private final Style style;
    private final List<Block> blocks = new ArrayList<>();

    private ChangeBlocks(Report before, Report after, Style style) {
        this.before = before;
        this.after = after;
        this.changes = ModelChanges.of(before.derived().model(), after.derived().model());
        this.style = style;
    }

    static List<Block> of(Report before, Report after, Style style) {
        ChangeBlocks section = new ChangeBlocks(before, after, style);
        section.write();
        return section.blocks;
    }

    private void write() {
        Model old = before.derived().model();
        blocks.add(new Heading(2, old.about().revision().map(revision -> Prose.of("Changes since revision ")
                .andName(revision)).orElseGet(() -> Prose.of("Changes since ").andName(old.origin().file()))));
        blocks.add(file(BEFORE, old.origin()));
        blocks.add(file(NOW, after.derived().model().origin()));
        input();
        List<Found> was = Found.in(before);
        List<Found> is = Found.in(after);
        is.forEach(now -> output(was.stream().filter(each -> isSame(each, now)).findFirst(), Optional.of(now),
                now.name()));
        was.stream().filter(gone -> is.stream().noneMatch(now -> isSame(gone, now)))
                .forEach(gone -> output(Optional.of(gone), Optional.empty(), gone.name()));
        answers();
        blocks.add(new Paragraph("What differs from this report of the earlier file has a rule in the margin, where the"
                + " format has one."));
    }

    private static Labelled file(String label, Model.Origin origin) {
        return new Labelled(label, Prose.name(origin.file()).and(", SHA-256 ").andName(origin.sha256()));
    }

    /** An output with what was found of it. */
    private record Found(DerivedOutput output, KeyFigures figures) {
        static List<Found> in(Report report) {
            return IntStream.range(0, report.figures().size())
                    .mapToObj(i -> new Found(report.derived().outputs().get(i), report.figures().get(i))).toList();
        }

        String name() {
            return output.output().name();
        }

        Optional<Prose> shape() {
            return output.closedForm().map(form -> Prose.of(ShapeProse.of(FormulaShape.of(form))));
        }

        List<Labelled> facts(Style style) {
            return ReportSummary.facts(output, figures, style);
        }
    }

    /** Outputs of the same name; a renamed state goes by its later one. */
    private boolean isSame(Found old, Found now) {
        return changes.renamed().getOrDefault(old.name(), old.name()).equals(now.name());
    }

    /** Short values in a table, longer words below each other. */
    private void input() {
        if (changes.isEmpty()) {
            blocks.add(new Paragraph("Nothing has changed in the input: every exact value and every word is the same."));
            return;
        }
        blocks.add(new Heading(3, "What has changed in the input"));
        List<Change> inTable = changes.changes().stream().filter(ChangeBlocks::isShort).toList();
        if (!inTable.isEmpty()) {
            blocks.add(new Table(Prose.EMPTY, List.of(Prose.of("entry"), Prose.of(BEFORE), Prose.of(NOW)),
                    inTable.stream().map(change -> List.of(EntryProse.of(change.entry()), named(change.before()),
                            named(change.after()))).toList()));
        }
        changes.changes().stream().filter(change -> !isShort(change)).forEach(change ->
                beforeAndNow(EntryProse.of(change.entry()), change.before().map(Prose::name),
                        change.after().map(Prose::name)));
    }

    private static boolean isShort(Change change) {
        return Stream.concat(change.before().stream(), change.after().stream()).allMatch(text -> text.length() <= SHORT);
    }

    private static Prose named(Optional<String> value) {
        return value.map(Prose::name).orElse(NOTHING);
    }

    private void beforeAndNow(Prose label, Optional<Prose> was, Optional<Prose> is) {
        if (was.isPresent() && was.equals(is)) {
            blocks.add(new Labelled(label, was.get().and(", as before")));
        } else {
            was.ifPresent(text -> blocks.add(new Labelled(label.and(is.isPresent() ? ", " + BEFORE : ", gone"), text)));
            is.ifPresent(text -> blocks.add(new Labelled(label.and(was.isPresent() ? ", " + NOW : ", new"), text)));
        }
    }

    private void output(Optional<Found> old, Optional<Found> now, String name) {
        blocks.add(new Heading(3, Prose.name(name).and(": ").and(compared(old, now))));
        beforeAndNow(Prose.of("formula"), old.flatMap(Found::shape), now.flatMap(Found::shape));
        pairs(old.map(each -> each.facts(style)), now.map(each -> each.facts(style)));
        Map<Integer, StepValue> was = values(old);
        Map<Integer, StepValue> is = values(now);
        List<Integer> steps = List.copyOf(is.isEmpty() ? was.keySet() : is.keySet());
        if (!steps.isEmpty()) {
            blocks.add(new Table(Prose.EMPTY, List.of(Prose.of("k"), Prose.of(BEFORE), Prose.of(NOW), Prose.of("change")),
                    steps.stream().map(k -> row(k, Optional.ofNullable(was.get(k)), Optional.ofNullable(is.get(k))))
                            .toList()));
        }
    }

    private List<Prose> row(int k, Optional<StepValue> was, Optional<StepValue> is) {
        return List.of(Prose.of(String.valueOf(k)), shown(was), shown(is), Prose.of(difference(was, is)));
    }

    /** Which of the formula's shape and numbers are other ones. */
    private static String compared(Optional<Found> old, Optional<Found> now) {
        if (old.isEmpty() || now.isEmpty()) {
            return old.isEmpty() ? "not in the earlier report" : "in the earlier report alone";
        }
        Optional<Prose> was = old.get().shape();
        Optional<Prose> is = now.get().shape();
        if (was.isEmpty() || is.isEmpty()) {
            return "the formula is " + MissingBlocks.NOT_DECIDED;
        }
        boolean isSame = old.get().output().transform().map(Transform::y)
                .equals(now.get().output().transform().map(Transform::y));
        return isSame ? "the formula is the same" : was.equals(is)
                ? "the formula has the same shape, with other numbers" : "the formula has another shape";
    }

    private static Map<Integer, StepValue> values(Optional<Found> found) {
        Map<Integer, StepValue> values = new LinkedHashMap<>();
        found.ifPresent(each -> each.output().values().forEach(value -> values.put(value.k(), value)));
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
        List<Labelled> was = before.answers().stream().flatMap(answer -> answer.keyFigures().stream()).toList();
        List<Labelled> is = after.answers().stream().flatMap(answer -> answer.keyFigures().stream()).toList();
        if (!was.isEmpty() || !is.isEmpty()) {
            blocks.add(new Heading(3, "Answers"));
            pairs(Optional.of(was), Optional.of(is));
        }
    }

    /** What stands behind each label, in the later order. */
    private void pairs(Optional<List<Labelled>> earlier, Optional<List<Labelled>> later) {
        List<Labelled> was = earlier.orElse(List.of());
        List<Labelled> is = later.orElse(List.of());
        is.forEach(now -> beforeAndNow(now.label(), text(was, now.label()), Optional.of(now.text())));
        was.stream().filter(gone -> text(is, gone.label()).isEmpty())
                .forEach(gone -> beforeAndNow(gone.label(), Optional.of(gone.text()), Optional.empty()));
    }

    private static Optional<Prose> text(List<Labelled> all, Prose label) {
        return all.stream().filter(each -> each.label().equals(label)).map(Labelled::text).findFirst();
    }
}
