package org.pofk.text;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class AlphabetTest {

    @ParameterizedTest
    @CsvSource(quoteCharacter = '"', delimiter = ';', value = {
        "x0 → x(k); x0 -> x(k)", "2·3 − 1; 2*3 - 1", "λ ≤ 1; lambda <= 1", "|λ|²; |lambda|^2", "30°; 30 deg",
        "“as is” – so; \"as is\" - so", "Σ over λ₂; Σ over λ₂"
    })
    void oursIsWrittenInAscii(String text, String ascii) {
        assertEquals(ascii.replace("Σ", "sum").replace("λ₂", "lambda₂"), Alphabet.ASCII.write(text));
        assertEquals(text, Alphabet.UNICODE.write(text));
    }

    @Test
    void lettersInsideWordsStay() {
        assertEquals("λ_pump Überlauf πρ", Alphabet.ASCII.write("λ_pump Überlauf πρ"));
    }
}
