package org.pofk.bench;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.DoubleStream;
import org.pofk.speed.LargeChains;

/** Whole processes that answer every question about chains of a hundred states; the median of three, in milliseconds. */
final class LargeChainTimes {
    private static final int SIZE = 100;
    private static final int RUNS = 3;
    private static final Map<String, List<String>> QUESTIONS = new LinkedHashMap<>();

    static {
        QUESTIONS.put("derive", List.of("derive", "--of", "lost"));
        QUESTIONS.put("when", List.of("when", "--of", "lost", "--at-least", "0.02"));
        QUESTIONS.put("settles", List.of("when", "--of", "lost", "--settles-within", "1e-6"));
        QUESTIONS.put("passage", List.of("passage", "--into", "failed"));
        QUESTIONS.put("total costs", List.of("total", "--costs"));
        QUESTIONS.put("given never", List.of("derive", "--of", "lost", "--given-never", "s50"));
        QUESTIONS.put("given at", List.of("derive", "--of", "lost", "--given", "s1", "--given-at", "5"));
        QUESTIONS.put("long run of s99", List.of("derive", "--of", "lost", "--start", "long run of s99"));
        QUESTIONS.put("each start", List.of("derive", "--of", "lost", "--start", "each"));
        QUESTIONS.put("inspect", List.of("inspect", "--of", "lost"));
    }

    private LargeChainTimes() {
    }

    /** A table with a row for each kind of chain. */
    static List<String> table() throws IOException, InterruptedException {
        List<String> lines = new ArrayList<>(List.of("| |" + String.join("|", QUESTIONS.keySet()) + "|",
                "|---|" + "---|".repeat(QUESTIONS.size())));
        Path folder = Files.createTempDirectory("large-chains");
        for (LargeChains kind : LargeChains.values()) {
            Path model = Files.writeString(folder.resolve(kind.name() + ".yaml"), kind.yaml(SIZE));
            StringBuilder row = new StringBuilder("| " + kind.name().toLowerCase(Locale.ROOT).replace('_', ' ') + " |");
            for (List<String> question : QUESTIONS.values()) {
                double[] times = new double[RUNS];
                for (int run = 0; run < RUNS; run++) {
                    times[run] = WholeProcess.milliseconds(question, model);
                }
                row.append(String.format(Locale.ROOT, " %.0f |", DoubleStream.of(times).sorted().toArray()[RUNS / 2]));
            }
            lines.add(row.toString());
            Files.delete(model);
        }
        Files.delete(folder);
        return lines;
    }
}
