package org.pofk.formula;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class LatexTextTest {
    @ParameterizedTest
    @CsvSource(quoteCharacter = '\0', value = {"Cayley–Hamilton; Cayley--Hamilton", "--show; -{}-show",
        "a–-b; a--{}-b", "a''b; a'{}'b", "<<x>>; <{}<x>{}>", "?`; ?\\textasciigrave{}", "“x” – “y”; ``x'' -- ``y''",
        "a,,b; a,{},b"}, delimiter = ';')
    void aDashIsSetAsOneSignAndSignsSideBySideAsTheyAreWritten(String text, String latex) {
        assertEquals(latex, LatexText.of(text));
    }
}
