package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;

/**
 * What is shown, in order, independent of the format it is written in.
 *
 * @param sequences what a writer whose readers can calculate may offer any step of
 * @param changed   the places of blocks that differ from an earlier issue; a writer puts a rule in the margin there
 */
public record Document(List<Block> blocks, List<Sequence> sequences, Set<Integer> changed) {

    public Document {
        blocks = List.copyOf(blocks);
        sequences = List.copyOf(sequences);
        changed = Set.copyOf(changed);
    }

    public Document(List<Block> blocks, List<Sequence> sequences) {
        this(blocks, sequences, Set.of());
    }

    public Document(List<Block> blocks) {
        this(blocks, List.of());
    }

    /** Whether the block at a place and the one before it are labelled, and so stand in one list. */
    static boolean isListed(List<Block> blocks, int place) {
        return place > 0 && place < blocks.size() && blocks.get(place - 1) instanceof Labelled
                && blocks.get(place) instanceof Labelled;
    }

    /** Whether the block at a place differs from an earlier issue. */
    boolean isChanged(int place) {
        return changed.contains(place);
    }

    Document withChanged(Set<Integer> places) {
        return new Document(blocks, sequences, places);
    }

    /** With more blocks before the one at a place, or at the end; these don't count as changed. */
    Document with(int place, List<Block> more) {
        List<Block> all = new ArrayList<>(blocks);
        all.addAll(place, more);
        return new Document(all, sequences, changed.stream().map(each -> each < place ? each : each + more.size())
                .collect(Collectors.toSet()));
    }

    /**
     * A sequence as the recurrence it satisfies: y(k+d) = −Σ recurrence_i · y(k+i) for every k ≥ 0. Exact.
     *
     * @param left       what the displays of its formulas have on their left
     * @param recurrence the coefficients of y(k) … y(k+d−1) where that of y(k+d) is one
     * @param first      y(0) … y(d−1)
     */
    public record Sequence(Prose left, List<Rational> recurrence, List<Rational> first) {
        public Sequence {
            recurrence = List.copyOf(recurrence);
            first = List.copyOf(first);
            if (recurrence.size() != first.size()) {
                throw new IllegalArgumentException(first.size() + " values for an order of " + recurrence.size());
            }
        }
    }

    /** One block; each writer handles every variant. */
    public sealed interface Block {
        <R> R accept(Visitor<R> visitor);
    }

    /** One method per variant. */
    public interface Visitor<R> {
        R heading(Heading heading);

        R paragraph(Paragraph paragraph);

        R labelled(Labelled labelled);

        R items(Items items);

        R display(Display display);

        R table(Table table);

        R excerpt(Excerpt excerpt);

        R figure(Figure figure);
    }

    /** A heading, level 1 the highest. */
    public record Heading(int level, Prose text) implements Block {
        public Heading(int level, String text) {
            this(level, Prose.of(text));
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.heading(this);
        }
    }

    /** The same block in a document whose headings lie one level deeper. */
    static Block lowered(Block block) {
        return block instanceof Heading heading ? new Heading(heading.level() + 1, heading.text()) : block;
    }

    /** Running text; broken into lines by the writer. */
    public record Paragraph(Prose text) implements Block {
        public Paragraph(String text) {
            this(Prose.of(text));
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.paragraph(this);
        }
    }

    /** A short label and what belongs to it: {@code long run   20/2447}. Neighbours are aligned with each other. */
    public record Labelled(Prose label, Prose text) implements Block {
        public Labelled(String label, String text) {
            this(Prose.of(label), Prose.of(text));
        }

        public Labelled(String label, Prose text) {
            this(Prose.of(label), text);
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.labelled(this);
        }
    }

    /** An unnumbered list. */
    public record Items(List<Prose> items) implements Block {
        public Items {
            items = List.copyOf(items);
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.items(this);
        }
    }

    /** How the two sides of a display compare. */
    public enum Relation {
        /** Exactly. */
        EQUAL,
        /** Up to an error that is stated. */
        ROUNDED
    }

    /**
     * left = right, set apart; broken at top-level signs where it is too long for a line.
     *
     * @param condition what it holds for, {@code k ≥ 2}; may be empty
     */
    public record Display(Prose left, Relation relation, Formula right, Prose condition) implements Block {
        public Display(Prose left, Relation relation, Formula right) {
            this(left, relation, right, Prose.EMPTY);
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.display(this);
        }
    }

    /**
     * A table; every row has as many cells as the header. Numbers are aligned by the writer, and a table that is too
     * wide is folded so that every part begins with the first column again.
     *
     * @param caption may be empty
     */
    public record Table(Prose caption, List<Prose> header, List<List<Prose>> rows) implements Block {
        public Table {
            header = List.copyOf(header);
            rows = rows.stream().map(List::copyOf).toList();
            for (List<Prose> row : rows) {
                if (row.size() != header.size()) {
                    throw new IllegalArgumentException(row.size() + " cells under " + header.size() + " headings");
                }
            }
        }

        /** A table of words and numbers alone. */
        public static Table ofText(String caption, List<String> header, List<List<String>> rows) {
            return new Table(Prose.of(caption), header.stream().map(Prose::of).toList(),
                    rows.stream().map(row -> row.stream().map(Prose::of).toList()).toList());
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.table(this);
        }
    }

    /**
     * A line as somebody wrote it, with the part that is meant marked.
     *
     * @param from where the part begins, in UTF-16 units
     * @param to   where it ends; at {@code from} where something is missing there
     */
    public record Excerpt(String line, int from, int to) implements Block {
        public Excerpt {
            if (from < 0 || to < from || to > line.length()) {
                throw new IllegalArgumentException(from + " to " + to + " in a line of " + line.length());
            }
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.excerpt(this);
        }
    }

    /** A drawing; a format that has none says in words what is seen. */
    public record Figure(Prose caption, Chart chart) implements Block {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.figure(this);
        }
    }
}
