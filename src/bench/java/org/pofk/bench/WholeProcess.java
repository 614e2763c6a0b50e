package org.pofk.bench;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Whole processes from start to end, the bare Java one and the launcher's taken in turns so that they share the noise. */
final class WholeProcess {
    private static final int RUNS = 12;
    /** A case that takes longer is run once and counts from the first run on. */
    private static final double SLOW = 10_000;
    private static final Path LAUNCHER = Path.of("target", "pofk", "bin", "pofk");

    private WholeProcess() {
    }

    /** The median milliseconds of each case, the bare hello first. */
    static Map<String, Double> medians() throws IOException, InterruptedException {
        Map<String, List<String>> commands = new LinkedHashMap<>();
        commands.put("bare Java hello", List.of("java", "-cp", Path.of("target", "test-classes").toString(),
                Hello.class.getName()));
        if (Files.isExecutable(LAUNCHER)) {
            commands.put("derive, 3 states (pump-pair)", derive("pump-pair.yaml"));
            commands.put("derive, 100 states, 12 digits (cable-route)", derive("cable-route.yaml", "--digits", "12"));
        }
        Map<String, List<Double>> times = new LinkedHashMap<>();
        for (int run = 0; run <= RUNS; run++) {
            for (Map.Entry<String, List<String>> command : commands.entrySet()) {
                List<Double> known = times.computeIfAbsent(command.getKey(), unseen -> new ArrayList<>());
                if (known.isEmpty() || known.get(0) < SLOW) {
                    known.add(milliseconds(command.getValue()));
                }
            }
        }
        Map<String, Double> medians = new LinkedHashMap<>();
        times.forEach((name, all) -> {
            List<Double> warm = all.size() == 1 ? all : all.subList(1, all.size());
            medians.put(name, warm.stream().sorted().toList().get(warm.size() / 2));
        });
        return medians;
    }

    private static List<String> derive(String model, String... options) {
        List<String> command = new ArrayList<>(List.of(LAUNCHER.toString(), "derive",
                Path.of("test-data", "models", model).toString()));
        command.addAll(List.of(options));
        return command;
    }

    /** One run of a command of the launcher on a model. */
    static double milliseconds(List<String> command, Path model) throws IOException, InterruptedException {
        List<String> all = new ArrayList<>(List.of(LAUNCHER.toString()));
        all.addAll(command);
        all.add(model.toString());
        return milliseconds(all);
    }

    private static double milliseconds(List<String> command) throws IOException, InterruptedException {
        long begin = System.nanoTime();
        Process process = new ProcessBuilder(command).redirectErrorStream(true)
                .redirectOutput(ProcessBuilder.Redirect.DISCARD).start();
        int code = process.waitFor();
        if (code != 0) {
            throw new IOException(command + " ended with " + code);
        }
        return (System.nanoTime() - begin) / 1e6;
    }
}
