package org.pofk.input;

import java.util.Locale;
import java.util.Optional;

/**
 * How a table of numbers is written, where its own looks don't say.
 *
 * @param separator what stands between cells
 * @param names     where the names of the states stand
 */
public record TableOptions(Optional<Separator> separator, Optional<NamesIn> names) {
    public static final TableOptions AS_IT_LOOKS = new TableOptions(Optional.empty(), Optional.empty());

    /** What stands between the cells of a line. With semicolons a number may have a decimal comma. */
    public enum Separator implements Keyword {
        COMMA(','), SEMICOLON(';');

        private final char sign;

        Separator(char sign) {
            this.sign = sign;
        }

        char sign() {
            return sign;
        }

        @Override
        public String word() {
            return name().toLowerCase(Locale.ROOT);
        }
    }

    /** Where names of states stand: in a first row, a first column, both, or nowhere. */
    public enum NamesIn implements Keyword {
        NOWHERE("none", 0, 0), ROW("row", 1, 0), COLUMN("column", 0, 1), BOTH("both", 1, 1);

        private final String word;
        private final int rows;
        private final int columns;

        NamesIn(String word, int rows, int columns) {
            this.word = word;
            this.rows = rows;
            this.columns = columns;
        }

        int rows() {
            return rows;
        }

        int columns() {
            return columns;
        }

        @Override
        public String word() {
            return word;
        }
    }

    static TableOptions read(Fields fields, Reading reading) {
        return new TableOptions(
                fields.value("separator").flatMap(node -> reading.keyword(node, "the separator", Separator.values())),
                fields.value("names").flatMap(node -> reading.keyword(node, "'names'", NamesIn.values())));
    }
}
