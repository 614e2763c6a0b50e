package org.pofk.input;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.pofk.chain.Chain;
import org.pofk.chain.Model.Convention;
import org.pofk.exact.Rational;
import org.pofk.input.MatrixFileReader.Options;
import org.pofk.input.TableOptions.NamesIn;
import org.pofk.input.TableOptions.Separator;
import org.pofk.text.RefusedException;

/** The same chain in every form a table can have. */
class MatrixFileReaderTest {

    private static Chain read(String table, String start, TableOptions options) throws RefusedException {
        return MatrixFileReader.read(Source.ofText("deck.csv", table),
                new Options(Optional.of(Convention.ROWS), Optional.of(start), options)).chain();
    }

    private static void assertDeck(Chain chain) {
        assertEquals(Rational.of(9, 10), chain.matrix().at(0, 0));
        assertEquals(Rational.of(1, 10), chain.matrix().at(1, 0));
        assertEquals(Rational.of(1, 4), chain.matrix().at(0, 1));
        assertEquals(Rational.of(3, 4), chain.matrix().at(1, 1));
        assertEquals(List.of(Rational.ONE, Rational.ZERO), chain.start());
    }

    @Test
    void withCommasOrSemicolonsWithNamesOrWithout() throws RefusedException {
        for (String table : List.of("0.9,0.1\n0.25,0.75\n", "0,9;0,1\n1/4;75%\n", "0.9,rest\r\n25%,rest\r\n",
                "\n0.9 , 0.1\n\n 2.5e-1 , 0.75", "\"0.9\",\"0.1\"\n0.25,0.75")) {
            Chain chain = read(table, "1", TableOptions.AS_IT_LOOKS);
            assertDeck(chain);
            assertEquals(List.of("1", "2"), chain.states());
        }
        for (String table : List.of("9,8\n0.9,0.1\n0.25,0.75\n", "9;0,9;0,1\n8;0,25;0,75\n",
                ",9,8\n9,0.9,0.1\n8,0.25,0.75\n", "from/to;\"9\";8\n9;0,9;rest\n8;0,25;0,75\n")) {
            Chain chain = read(table, "9", TableOptions.AS_IT_LOOKS);
            assertDeck(chain);
            assertEquals(List.of("9", "8"), chain.states());
        }
    }

    @Test
    void quotedNamesMayHoldAnything() throws RefusedException {
        Chain chain = read("\"a, b\",\"c \"\"d\"\"\"\n0.9,0.1\n0.25,0.75\n", "a, b", TableOptions.AS_IT_LOOKS);
        assertEquals(List.of("a, b", "c \"d\""), chain.states());
    }

    @Test
    void theOrientationIsNeverGuessed() throws RefusedException {
        RefusedException refused = assertThrows(RefusedException.class, () -> MatrixFileReader.read(
                Source.ofText("deck.csv", "0.9,0.1\n0.25,0.75\n"),
                new Options(Optional.empty(), Optional.of("1"), TableOptions.AS_IT_LOOKS)));
        assertEquals("--orientation: say --orientation columns when each column adds up to 1, --orientation rows when "
                + "each row does; here only rows would fit", refused.getMessage());
    }

    @Test
    void byColumnsTheSameTableTurned() throws RefusedException {
        assertDeck(MatrixFileReader.read(Source.ofText("deck.csv", "0.9,0.25\n0.1,0.75\n"),
                new Options(Optional.of(Convention.COLUMNS), Optional.of("1"), TableOptions.AS_IT_LOOKS)).chain());
    }

    @Test
    void whatCanBeReadInTwoWaysIsReadAsSaid() throws RefusedException {
        String names = "0,1\n1,0\n0,1\n";
        assertThrows(RefusedException.class, () -> read(names, "0", TableOptions.AS_IT_LOOKS));
        Chain chain = read(names, "0", new TableOptions(Optional.empty(), Optional.of(NamesIn.ROW)));
        assertEquals(List.of("0", "1"), chain.states());
        assertEquals(Rational.ONE, chain.matrix().at(0, 0));

        String separators = "a;b,c\n0.9,0.1\n0.25,0.75\n";
        assertThrows(RefusedException.class, () -> read(separators, "c", TableOptions.AS_IT_LOOKS));
        assertDeck(read(separators, "a;b", new TableOptions(Optional.of(Separator.COMMA), Optional.empty())));
    }

    @Test
    void emptyCellsAreNoZeros() {
        RefusedException refused = assertThrows(RefusedException.class,
                () -> read("1,\n0.25,0.75\n", "1", TableOptions.AS_IT_LOOKS));
        assertEquals("deck.csv:1:3: a number is missing here; write 0 where nothing happens", refused.getMessage());
    }
}
