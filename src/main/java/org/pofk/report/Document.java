package org.pofk.report;

import java.util.List;
import org.pofk.formula.Formula;

/** What is shown, in order, independent of the format it is written in. */
public record Document(List<Block> blocks) {

    public Document {
        blocks = List.copyOf(blocks);
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

        R display(Display display);

        R table(Table table);
    }

    /** A heading, level 1 the highest. */
    public record Heading(int level, String text) implements Block {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.heading(this);
        }
    }

    /** Running text; broken into lines by the writer. */
    public record Paragraph(String text) implements Block {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.paragraph(this);
        }
    }

    /** A short label and what belongs to it: {@code long run   20/2447}. */
    public record Labelled(String label, String text) implements Block {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.labelled(this);
        }
    }

    /** left = formula, set apart; broken at top-level signs where it is too long for a line. */
    public record Display(String label, Formula left, Formula right) implements Block {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.display(this);
        }
    }

    /** A table; every row has as many cells as the header. Numbers are aligned by the writer. */
    public record Table(String caption, List<String> header, List<List<String>> rows) implements Block {
        public Table {
            header = List.copyOf(header);
            rows = rows.stream().map(List::copyOf).toList();
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.table(this);
        }
    }
}
