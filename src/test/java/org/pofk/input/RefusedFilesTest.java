package org.pofk.input;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.pofk.chain.Model;
import org.pofk.chain.Model.Convention;
import org.pofk.text.Fault;
import org.pofk.text.RefusedException;

/**
 * Every input in {@code test-data/refused} is refused with exactly the messages in the text file beside it. A file of
 * options beside it, one a line, says what the command line adds.
 */
class RefusedFilesTest {
    private static final Path FOLDER = Path.of("test-data/refused");

    private static List<Path> inputs() throws IOException {
        try (Stream<Path> files = Files.list(FOLDER)) {
            return files.filter(file -> file.toString().matches(".*\\.(yaml|json|csv)")).sorted().toList();
        }
    }

    private static Path beside(Path file, String extension) {
        return file.resolveSibling(file.getFileName().toString().replaceFirst("\\.[a-z]+$", "." + extension));
    }

    private static List<Fault> faults(Path file) throws IOException {
        return assertThrows(RefusedException.class, () -> read(file), file.toString()).faults();
    }

    private static Model read(Path file) throws IOException, RefusedException {
        Map<String, String> parameters = new LinkedHashMap<>();
        Map<String, String> options = new LinkedHashMap<>();
        Path list = beside(file, "options");
        for (String line : Files.exists(list) ? Files.readAllLines(list) : List.<String>of()) {
            String[] words = line.split(" ", 2);
            if (words[0].equals("set")) {
                parameters.put(words[1].split("=")[0], words[1].split("=")[1]);
            } else {
                options.put(words[0], words[1]);
            }
        }
        Optional<String> start = Optional.ofNullable(options.get("start"));
        return file.toString().endsWith(".csv")
                ? MatrixFileReader.read(file, new MatrixFileReader.Options(
                        Optional.ofNullable(options.get("orientation"))
                                .map(word -> Convention.valueOf(word.toUpperCase(Locale.ROOT))),
                        start, TableOptions.AS_IT_LOOKS))
                : ModelReader.read(file, new Overrides(parameters, start));
    }

    @TestFactory
    Stream<DynamicTest> eachFileIsRefusedWithTheseMessages() throws IOException {
        return inputs().stream().map(file -> DynamicTest.dynamicTest(file.getFileName().toString(), () -> {
            String found = faults(file).stream().map(fault -> fault.toString().replace(FOLDER + "/", "") + "\n")
                    .collect(Collectors.joining());
            assertEquals(Files.readString(beside(file, "txt")), found);
        }));
    }

    @Test
    void everyInputHasMessagesOfItsOwn() throws IOException {
        Set<Path> expected = inputs().stream().map(file -> beside(file, "txt")).collect(Collectors.toSet());
        assertEquals(inputs().size(), expected.size());
        try (Stream<Path> files = Files.list(FOLDER)) {
            assertEquals(expected, files.filter(file -> file.toString().endsWith(".txt")).collect(Collectors.toSet()));
        }
    }

    @Test
    void theyHoldAtLeastFortyKindsOfFault() throws IOException {
        Set<String> codes = new TreeSet<>();
        for (Path file : inputs()) {
            faults(file).forEach(fault -> codes.add(fault.code()));
        }
        assertTrue(codes.size() >= 80, codes.size() + " kinds: " + codes);
    }

    @Test
    void elevenFilesHaveThreeToEightFaultsAtOnce() throws IOException {
        int files = 0;
        for (Path file : inputs()) {
            if (file.getFileName().toString().startsWith("many-")) {
                int faults = faults(file).size();
                assertTrue(faults >= 3 && faults <= 8, file + ": " + faults);
                files++;
            }
        }
        assertEquals(11, files);
    }

    @Test
    void everyFaultHasAPlaceInALineOrNamesAnOption() throws IOException {
        for (Path file : inputs()) {
            for (Fault fault : faults(file)) {
                boolean ofWhole = Set.of("empty-file", "wrong-kind-of-file").contains(fault.code());
                assertTrue(!fault.position().isWhole() || ofWhole || fault.position().source().startsWith("--"),
                        fault.toString());
            }
        }
    }
}
