package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.HashSet;
import java.util.List;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class TradeWordsTest {
    private static final Pattern COMMAND = Pattern.compile("pofk ([a-z]+)");
    private final TradeWords words = TradeWords.read();

    @ParameterizedTest
    @ValueSource(strings = {"steady state", "availability", "mean time to failure", "MTTF", "transient", "burn-in",
        "mean time between failures", "second eigenvalue", "proof test", "eigenvalue", "monte carlo", "percentile", "quantile",
        "mean time to blockage", "replacement", "docx", "pdf", "Word"})
    void wordsOfTheTradeLeadToACommand(String word) {
        Run run = Run.of("help", word);
        assertEquals(0, run.exitCode(), run.notes());
        assertTrue(run.answer().contains("pofk ") || run.answer().contains("not built yet"), run.answer());
    }

    @Test
    void aWordDocumentIsMadeByPandoc() {
        for (String asked : List.of("word", "docx")) {
            Run run = Run.of("help", asked);
            assertTrue(run.answer().contains("pandoc FILE.tex -o FILE.docx") && run.answer().contains("FILE.pdf"),
                    run.answer());
        }
    }

    @Test
    void noWordStandsTwice() {
        assertEquals(words.words().size(), new HashSet<>(words.words()).size());
    }

    @Test
    void everyCommandAnAnswerNamesIsBuilt() {
        List<String> named = words.entries().stream().flatMap(entry -> entry.answer().stream())
                .flatMap(line -> COMMAND.matcher(line).results()).map(match -> match.group(1)).toList();
        assertFalse(named.isEmpty());
        assertTrue(CommandName.words().containsAll(named), named.toString());
    }

    @Test
    void everyCommandPromisedForLaterIsPlannedAndNotBuilt() {
        List<String> later = words.entries().stream().flatMap(entry -> entry.later().stream()).toList();
        assertFalse(later.isEmpty());
        later.forEach(word -> assertTrue(Planned.of(word).isPresent() && CommandName.of(word).isEmpty(), word));
    }

    @Test
    void everyPlannedCommandIsNamedSomewhere() {
        List<String> later = words.entries().stream().flatMap(entry -> entry.later().stream()).toList();
        for (Planned planned : Planned.values()) {
            assertTrue(later.contains(planned.word()) || planned == Planned.COMPARE, planned.word());
        }
    }

    @Test
    void answersFitEightyColumns() {
        words.entries().forEach(entry -> entry.shown().forEach(
                line -> assertTrue(line.length() <= 80, line)));
    }

    @Test
    void theMarkForLaterLeavesNoBraceBehind() {
        Matcher brace = Pattern.compile("[{}]").matcher("");
        words.entries().stream().filter(entry -> !entry.later().isEmpty()).flatMap(entry -> entry.shown().stream())
                .filter(line -> !line.contains("outputs:"))
                .forEach(line -> assertFalse(brace.reset(line).find(), line));
    }
}
