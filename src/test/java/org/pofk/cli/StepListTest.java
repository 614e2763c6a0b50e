package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class StepListTest {

    @Test
    void rangesAndSingleStepsAreListedOnceInOrder() {
        assertEquals(List.of(0, 1, 2, 3, 100), StepList.parse("100, 1..3,0,2").steps());
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', value = {
        "1 year|whole numbers", "-1|whole numbers", "3..1|backwards", "''|whole numbers", "1,,2|whole numbers",
        "0..10000|more than", "0..9999,10000|more than", "1000000001|beyond", "9999999999|beyond", "1..2..3|whole",
    })
    void whatIsNoStepIsRefusedWithWhatWouldBeRight(String text, String said) {
        String message = assertThrows(IllegalArgumentException.class, () -> StepList.parse(text)).getMessage();
        assertTrue(message.contains(said), message);
    }

    @Test
    void theLongestListIsAccepted() {
        assertEquals(StepList.MOST_STEPS, StepList.parse("1..10000").steps().size());
    }
}
