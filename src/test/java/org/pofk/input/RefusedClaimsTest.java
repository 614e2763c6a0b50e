package org.pofk.input;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.pofk.text.Fault;
import org.pofk.text.RefusedException;

/** Every claims file in {@code test-data/refused/claims} is refused with exactly the messages in the text beside it. */
class RefusedClaimsTest {
    private static final Path FOLDER = Path.of("test-data/refused/claims");

    private static List<Path> inputs() throws IOException {
        try (Stream<Path> files = Files.list(FOLDER)) {
            return files.filter(file -> file.toString().endsWith(".yaml")).sorted().toList();
        }
    }

    private static List<Fault> faults(Path file) {
        return assertThrows(RefusedException.class, () -> ClaimsReader.read(file, Overrides.NONE), file.toString())
                .faults();
    }

    @TestFactory
    Stream<DynamicTest> eachFileIsRefusedWithTheseMessages() throws IOException {
        return inputs().stream().map(file -> DynamicTest.dynamicTest(file.getFileName().toString(), () -> {
            String found = faults(file).stream().map(fault -> fault.toString().replace(FOLDER + "/", "") + "\n")
                    .collect(Collectors.joining());
            assertEquals(Files.readString(Path.of(file.toString().replaceFirst("yaml$", "txt"))), found);
        }));
    }

    @Test
    void theyHoldAtLeastFortyKindsOfFault() throws IOException {
        Set<String> codes = new TreeSet<>();
        inputs().forEach(file -> faults(file).forEach(fault -> codes.add(fault.code())));
        assertTrue(inputs().size() >= 40, inputs().size() + " files");
        assertTrue(codes.size() >= 40, codes.size() + " kinds: " + codes);
    }

    @Test
    void everyFaultButThatOfAWholeFileHasALine() throws IOException {
        inputs().forEach(file -> faults(file).forEach(fault -> assertTrue(!fault.position().isWhole()
                || fault.code().equals("wrong-kind-of-file"), fault.toString())));
    }
}
