package org.pofk.report;

import java.nio.charset.Charset;
import java.util.ArrayList;
import java.util.List;
import org.pofk.formula.PlainText;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Labelled;
import org.pofk.report.Document.Relation;
import org.pofk.text.Alphabet;
import org.pofk.text.Columns;

/**
 * Writes documents as text for a screen. Only a number, a name or a word that is longer than a line makes a line
 * longer than {@code width}.
 *
 * @param charset what the screen can be sent; characters outside are written by their number
 */
public record TextWriter(Alphabet alphabet, Charset charset, int width) {
    private static final int INDENT = 2;
    private static final int LONGEST_LABEL = 24;
    private static final String CHANGED = "| ";

    /** Eighty columns. */
    public static TextWriter of(Alphabet alphabet, Charset charset) {
        return new TextWriter(alphabet, charset, 80);
    }

    /** The document's lines, each ended by a line feed; a margin for what has changed only where something has. */
    public String write(Document document) {
        return document.changed().isEmpty() ? written(document, "", "")
                : new TextWriter(alphabet, charset, width - CHANGED.length()).written(document, CHANGED,
                        " ".repeat(CHANGED.length()));
    }

    private String written(Document document, String beforeChanged, String beforeOthers) {
        List<String> lines = new ArrayList<>();
        for (int i = 0; i < document.blocks().size(); i++) {
            Block block = document.blocks().get(i);
            if (i > 0 && needsBlankLine(document.blocks(), i)) {
                lines.add("");
            }
            String before = document.isChanged(i) ? beforeChanged : beforeOthers;
            block.accept(new Lines(labelWidth(document.blocks(), i))).forEach(line -> lines.add(before + line));
        }
        StringBuilder text = new StringBuilder();
        lines.forEach(line -> text.append(line.stripTrailing()).append('\n'));
        return text.toString();
    }

    private static boolean needsBlankLine(List<Block> blocks, int place) {
        return !(blocks.get(place - 1) instanceof Document.Heading
                && !(blocks.get(place) instanceof Document.Heading)) && !Document.isListed(blocks, place);
    }

    /** The width of the widest label among the labelled lines that stand together with the one given. */
    private int labelWidth(List<Block> blocks, int index) {
        Spelling spelling = new Spelling(alphabet, charset);
        int first = index;
        while (Document.isListed(blocks, first)) {
            first--;
        }
        int widest = 0;
        for (int i = first; i < blocks.size() && blocks.get(i) instanceof Labelled labelled; i++) {
            int labelWidth = Columns.width(spelling.of(labelled.label()));
            widest = labelWidth <= LONGEST_LABEL ? Math.max(widest, labelWidth) : widest;
        }
        return widest;
    }

    /** The lines of one block. */
    private final class Lines implements Document.Visitor<List<String>> {
        private final Spelling spelling = new Spelling(alphabet, charset);
        private final int labelWidth;

        Lines(int labelWidth) {
            this.labelWidth = labelWidth;
        }

        private String line(String unicode, String ascii) {
            return alphabet == Alphabet.UNICODE ? unicode : ascii;
        }

        @Override
        public List<String> heading(Document.Heading heading) {
            List<String> lines = new ArrayList<>(Wrapping.lines(spelling.of(heading.text()), width));
            int widest = Math.min(width, lines.stream().mapToInt(Columns::width).max().orElse(0));
            switch (heading.level()) {
                case 1 -> lines.add(line("═", "=").repeat(widest));
                case 2 -> lines.add(line("─", "-").repeat(widest));
                default -> lines.add(line("┄", ".").repeat(widest));
            }
            return lines;
        }

        @Override
        public List<String> paragraph(Document.Paragraph paragraph) {
            return Wrapping.lines(spelling.of(paragraph.text()), width);
        }

        /** The label in a column of its own; one that is longer than all columns stands in a line of its own. */
        @Override
        public List<String> labelled(Labelled labelled) {
            String label = spelling.of(labelled.label()).replace(Spelling.NO_BREAK, ' ');
            int column = INDENT + labelWidth + INDENT;
            List<String> lines = new ArrayList<>();
            List<String> text = Wrapping.lines(spelling.of(labelled.text()), width - column);
            boolean standsAlone = Columns.width(label) > labelWidth;
            if (standsAlone) {
                Wrapping.lines(label, width - INDENT).forEach(each -> lines.add(" ".repeat(INDENT) + each));
            }
            for (int i = 0; i < text.size(); i++) {
                String before = i == 0 && !standsAlone ? " ".repeat(INDENT) + label : "";
                lines.add(Columns.left(before, column) + text.get(i));
            }
            return lines;
        }

        @Override
        public List<String> items(Document.Items items) {
            List<String> lines = new ArrayList<>();
            for (Prose item : items.items()) {
                List<String> text = Wrapping.lines(spelling.of(item), width - 2 * INDENT);
                for (int i = 0; i < text.size(); i++) {
                    lines.add(Columns.left(i == 0 ? "  " + line("•", "*") : "", 2 * INDENT) + text.get(i));
                }
            }
            return lines;
        }

        @Override
        public List<String> display(Document.Display display) {
            String left = spelling.of(display.left()).replace(Spelling.NO_BREAK, ' ');
            String relation = display.relation() == Relation.EQUAL ? "=" : line("≈", "~");
            String start = " ".repeat(INDENT) + (left.isEmpty() ? "" : left + " " + relation + " ");
            int hanging = Math.min(Columns.width(start), width / 3);
            boolean startsBelow = Columns.width(start) > hanging;
            List<String> lines = new ArrayList<>();
            if (startsBelow) {
                lines.add(start);
                hanging = 2 * INDENT;
            }
            List<String> right = PlainText.in(alphabet).lines(display.right(), width, hanging);
            for (int i = 0; i < right.size(); i++) {
                String before = i > 0 ? "" : startsBelow ? " ".repeat(hanging) : start;
                lines.add(before + spelling.shown(right.get(i)));
            }
            appendCondition(lines, spelling.of(display.condition()).replace(Spelling.NO_BREAK, ' '), hanging);
            return lines;
        }

        private void appendCondition(List<String> lines, String condition, int hanging) {
            String last = lines.get(lines.size() - 1);
            if (condition.isEmpty()) {
                return;
            }
            if (Columns.width(last) + 4 + Columns.width(condition) <= width) {
                lines.set(lines.size() - 1, last + "    " + condition);
            } else {
                Wrapping.lines(condition, width - hanging).forEach(each -> lines.add(" ".repeat(hanging) + each));
            }
        }

        /** The line with its part marked below; of a longer one what is around the part. */
        @Override
        public List<String> excerpt(Document.Excerpt excerpt) {
            return TextExcerpt.lines(spelling.shown(excerpt.line().substring(0, excerpt.from())),
                    spelling.shown(excerpt.line().substring(excerpt.from(), excerpt.to())),
                    spelling.shown(excerpt.line().substring(excerpt.to())), width - 2 * INDENT, line("…", "...")).stream()
                    .map(each -> " ".repeat(2 * INDENT) + each).toList();
        }

        /** What is seen, in words: a picture of characters is read by nobody, least of all aloud. */
        @Override
        public List<String> figure(Document.Figure figure) {
            List<String> lines = new ArrayList<>(Wrapping.lines(spelling.of(Prose.of("Figure: ").and(figure.caption())),
                    width));
            Wrapping.lines(spelling.of(figure.chart().alternative()), width - INDENT)
                    .forEach(each -> lines.add(" ".repeat(INDENT) + each));
            return lines;
        }

        @Override
        public List<String> table(Document.Table table) {
            List<String> lines = new ArrayList<>();
            if (!table.caption().isEmpty()) {
                lines.addAll(Wrapping.lines(spelling.of(table.caption()), width));
            }
            List<List<String>> rows = table.rows().stream()
                    .map(row -> row.stream().map(spelling::of).toList()).toList();
            List<String> header = table.header().stream().map(spelling::of).toList();
            TextTable.lines(header, rows, width - INDENT, line("─", "-"))
                    .forEach(each -> lines.add(" ".repeat(INDENT) + each));
            return lines;
        }
    }
}
