package org.pofk.text;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class ColumnsTest {

    @Test
    void widthIsThatOfTheScreen() {
        assertEquals(4, Columns.width("both"));
        assertEquals(4, Columns.width("泵一"));
        assertEquals(4, Columns.width("cafe\u0301"));
        assertEquals(4, Columns.width("ＡＢ"));
        assertEquals(6, Columns.width("밸브함"));
        assertEquals(2, Columns.width("−√"));
        assertEquals(2, Columns.width("a\u200bb"));
        assertEquals(0, Columns.width(""));
    }

    @Test
    void paddingCountsColumns() {
        assertEquals("泵  |", Columns.left("泵", 4) + "|");
        assertEquals("  泵|", Columns.right("泵", 4) + "|");
        assertEquals("both", Columns.left("both", 2));
    }
}
