package org.pofk.bench;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDateTime;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.OptionsBuilder;

/** Runs every benchmark from the project's folder and writes what was measured, with date, machine and commit. */
public final class Measure {
    private Measure() {
    }

    /** The arguments are patterns of benchmark names, none for all. */
    public static void main(String[] arguments) throws RunnerException, IOException, InterruptedException {
        LocalDateTime now = LocalDateTime.now(ZoneOffset.UTC).withNano(0);
        List<String> page = new ArrayList<>(heading(now));
        Map<String, Double> processes = WholeProcess.medians();
        double hello = processes.values().iterator().next();
        page.addAll(List.of("", "## Whole processes, median of 12 taken in turns (slower than 10 s: one run)", "", "| | ms | times the bare hello |",
                "|---|---|---|"));
        processes.forEach((name, time) -> page.add(String.format(Locale.ROOT, "| %s | %.0f | %.1f |", name, time,
                time / hello)));
        page.addAll(List.of("", "## Every question of a hundred states, whole process, ms (median of 3)", ""));
        page.addAll(LargeChainTimes.table());
        OptionsBuilder options = new OptionsBuilder();
        options.include(arguments.length == 0 ? "org.pofk.bench" : String.join("|", arguments));
        page.addAll(List.of("", "## Warm, by JMH 1.37", "", "| benchmark | | ms | ± (99.9 %) |", "|---|---|---|---|"));
        page.addAll(rows(new Runner(options.build()).run()));
        Path results = Files.createDirectories(Path.of("src", "bench", "results"));
        Files.writeString(results.resolve(now.format(DateTimeFormatter.ofPattern("yyyy-MM-dd-HHmm")) + ".md"),
                String.join("\n", page) + "\n");
    }

    private static List<String> heading(LocalDateTime now) throws IOException, InterruptedException {
        return List.of("# Benchmarks of " + now + " UTC", "",
                "- commit " + said("git", "rev-parse", "--short=12", "HEAD")
                        + (said("git", "status", "--porcelain", "src/main").isEmpty() ? "" : " with changes"),
                "- " + processor() + ", " + Runtime.getRuntime().availableProcessors() + " cores, load "
                        + load() + " at the start, " + System.getProperty("os.name"),
                "- Java " + System.getProperty("java.vm.version"));
    }

    private static String load() {
        return String.format(Locale.ROOT, "%.1f",
                java.lang.management.ManagementFactory.getOperatingSystemMXBean().getSystemLoadAverage());
    }

    private static String processor() throws IOException {
        Path description = Path.of("/proc/cpuinfo");
        if (!Files.isReadable(description)) {
            return System.getProperty("os.arch");
        }
        return Files.readAllLines(description).stream().filter(line -> line.startsWith("model name"))
                .map(line -> line.substring(line.indexOf(':') + 2)).findFirst().orElse(System.getProperty("os.arch"));
    }

    private static String said(String... command) throws IOException, InterruptedException {
        Process process = new ProcessBuilder(command).start();
        String text = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8).strip();
        process.waitFor();
        return text;
    }

    private static List<String> rows(Collection<RunResult> results) {
        return results.stream().map(result -> {
            String name = result.getParams().getBenchmark();
            List<String> parameters = new ArrayList<>();
            for (String key : result.getParams().getParamsKeys()) {
                parameters.add(key + " " + result.getParams().getParam(key));
            }
            return String.format(Locale.ROOT, "| %s | %s | %.1f | %.1f |", name.substring("org.pofk.bench.".length()),
                    String.join(", ", parameters), result.getPrimaryResult().getScore(),
                    result.getPrimaryResult().getScoreError());
        }).toList();
    }
}
