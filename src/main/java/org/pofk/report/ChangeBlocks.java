package org.pofk.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.KeyFigures;
import org.pofk.answer.StepValue;
import org.pofk.chain.Model;
import org.pofk.chain.ModelChanges;
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
    private static final int CHANGE_DIGITS = 3;

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
        blocks.add(file("before", old.origin()));
        blocks.add(file("now", after.derived().model().origin()));
        input();
        List<Found> was = Found.in(before);
        List<Found> is = Found.in(after);
        is.forEach(now -> output(was.stream().filter(old -> isSame(old, now)).findFirst(), Optional.of(now), now.name()));
        was.stream().filter(old -> is.stream().noneMatch(now -> isSame(old, now)))
                .forEach(old -> output(Optional.of(old), Optional.empty(), old.name()));
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

    private void input() {
        if (changes.isEmpty()) {
            blocks.add(new Paragraph("Nothing has changed in the input: every exact value and every word is the same."));
            return;
        }
        blocks.add(new Table(Prose.of("What has changed in the input"), header("entry"), changes.changes().stream()
                .map(change -> List.of(EntryProse.of(change.entry()), named(change.before()), named(change.after())))
                .toList()));
    }

    private static List<Prose> header(String first) {
        return List.of(Prose.of(first), Prose.of("before"), Prose.of("now"));
    }

    private static Prose named(Optional<String> value) {
        return value.map(Prose::name).orElse(NOTHING);
    }

    private void output(Optional<Found> old, Optional<Found> now, String name) {
        List<List<Prose>> rows = new ArrayList<>();
        rows.add(row(Prose.of("formula"), old.flatMap(Found::shape), now.flatMap(Found::shape)));
        pair(old.map(each -> each.facts(style)).orElse(List.of()), now.map(each -> each.facts(style)).orElse(List.of()))
                .forEach((label, texts) -> rows.add(row(label, texts.get(0), texts.get(1))));
        values(values(old), values(now), name, rows);
        blocks.add(new Table(Prose.of("Results for ").andName(name).and(": ").and(compared(old, now)),
                List.of(Prose.of("result"), Prose.of("before"), Prose.of("now"), Prose.of("change")), rows));
    }

    /** Which of the formula's shape and numbers are other ones. */
    private static String compared(Optional<Found> old, Optional<Found> now) {
        if (old.isEmpty() || now.isEmpty()) {
            return old.isEmpty() ? "not in the earlier report" : "in the earlier report alone";
        }
        Optional<Prose> was = old.get().shape();
        Optional<Prose> is = now.get().shape();
        if (was.isEmpty() || is.isEmpty()) {
            return MissingBlocks.NOT_DECIDED;
        }
        boolean isSame = old.get().output().transform().map(Transform::y)
                .equals(now.get().output().transform().map(Transform::y));
        return isSame ? "the formula is the same" : was.equals(is)
                ? "the formula has the same shape, with other numbers" : "the formula has another shape";
    }

    private static List<Prose> row(Prose name, Optional<Prose> was, Optional<Prose> is) {
        return List.of(name, was.orElse(NOTHING), is.orElse(NOTHING),
                Prose.of(was.equals(is) ? "none" : "changed"));
    }

    private void values(Map<Integer, StepValue> was, Map<Integer, StepValue> is, String name,
            List<List<Prose>> rows) {
        for (int k : (is.isEmpty() ? was : is).keySet()) {
            Optional<StepValue> earlier = Optional.ofNullable(was.get(k));
            Optional<StepValue> later = Optional.ofNullable(is.get(k));
            rows.add(List.of(Prose.name(name).and("(" + k + ")"), shown(earlier), shown(later),
                    Prose.of(difference(earlier, later))));
        }
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
                + Decimals.of(difference, CHANGE_DIGITS).text();
    }

    private void answers() {
        List<Labelled> was = before.answers().stream().flatMap(answer -> answer.keyFigures().stream()).toList();
        List<Labelled> is = after.answers().stream().flatMap(answer -> answer.keyFigures().stream()).toList();
        if (was.isEmpty() && is.isEmpty()) {
            return;
        }
        List<List<Prose>> rows = new ArrayList<>();
        pair(was, is).forEach((label, texts) -> rows.add(row(label, texts.get(0), texts.get(1))));
        blocks.add(new Table(Prose.of("Answers"),
                List.of(Prose.of("answer"), Prose.of("before"), Prose.of("now"), Prose.of("change")), rows));
    }

    /** What stands behind each label, before and after, in the later order. */
    private static Map<Prose, List<Optional<Prose>>> pair(List<Labelled> was, List<Labelled> is) {
        Map<Prose, List<Optional<Prose>>> pairs = new LinkedHashMap<>();
        is.forEach(now -> pairs.put(now.label(), List.of(text(was, now.label()), Optional.of(now.text()))));
        was.forEach(old -> pairs.putIfAbsent(old.label(), List.of(Optional.of(old.text()), Optional.empty())));
        return pairs;
    }

    private static Optional<Prose> text(List<Labelled> all, Prose label) {
        return all.stream().filter(each -> each.label().equals(label)).map(Labelled::text).findFirst();
    }
}
