package org.pofk.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Pattern;

/** The words of the trade, each leading to the commands that answer it. Read from {@code words.txt} beside this. */
record TradeWords(List<Entry> entries) {
    private static final Pattern LATER = Pattern.compile("\\{later ([a-z]+)}");

    /** Words that mean the same question, and the lines that answer it. */
    record Entry(List<String> words, List<String> answer) {
        Entry {
            words = List.copyOf(words);
            answer = List.copyOf(answer);
        }

        /** The commands the answer names that aren't built yet. */
        List<String> later() {
            return answer.stream().flatMap(line -> LATER.matcher(line).results()).map(match -> match.group(1)).toList();
        }

        /** The answer as it is shown. */
        List<String> shown() {
            return answer.stream().map(line -> LATER.matcher(line).replaceAll("'$1' (not built yet)")).toList();
        }
    }

    TradeWords {
        entries = List.copyOf(entries);
    }

    static TradeWords read() {
        try (InputStream stream = TradeWords.class.getResourceAsStream("words.txt")) {
            return parse(new String(stream.readAllBytes(), StandardCharsets.UTF_8));
        } catch (IOException broken) {
            throw new UncheckedIOException(broken);
        }
    }

    private static TradeWords parse(String text) {
        List<Entry> entries = new ArrayList<>();
        for (String block : text.split("\n\n")) {
            List<String> lines = block.lines().filter(line -> !line.startsWith("#")).toList();
            if (!lines.isEmpty()) {
                entries.add(new Entry(Arrays.stream(lines.get(0).split(";")).map(String::strip).toList(),
                        lines.stream().skip(1).toList()));
            }
        }
        return new TradeWords(entries);
    }

    /** The entry one of whose words is the one asked for; else the first in which all asked words occur. */
    Optional<Entry> about(String asked) {
        String sought = asked.toLowerCase(Locale.ROOT).strip();
        return entries.stream().filter(entry -> entry.words.contains(sought)).findFirst()
                .or(() -> entries.stream().filter(entry -> entry.words.stream().anyMatch(word -> holds(word, sought)))
                        .findFirst());
    }

    private static boolean holds(String word, String sought) {
        return List.of(word.split("[ -]")).containsAll(List.of(sought.split("[ -]")));
    }

    /** All words, for suggestions. */
    List<String> words() {
        return entries.stream().flatMap(entry -> entry.words.stream()).toList();
    }
}
