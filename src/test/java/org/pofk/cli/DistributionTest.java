package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.TreeSet;
import java.util.jar.Attributes;
import java.util.jar.JarFile;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What is shipped, as the build has just packed it. Packed only when all tests run, so some of them alone skip this. */
class DistributionTest {
    private static final Path HOME = Path.of("target/pofk").toAbsolutePath();
    private static final Path LAUNCHER = HOME.resolve("bin/pofk");

    @TempDir
    Path folder;

    @BeforeEach
    void packed() {
        assumeTrue(Files.exists(LAUNCHER), "target/pofk is packed by  mvn verify");
    }

    @Test
    void theLauncherWorksThroughLinksFromAnyFolder() throws Exception {
        Path elsewhere = Files.createDirectory(folder.resolve("else where"));
        List<Path> links = List.of(
                Files.createSymbolicLink(elsewhere.resolve("absolute"), LAUNCHER),
                Files.createSymbolicLink(elsewhere.resolve("relative"), Path.of("absolute")),
                Files.createSymbolicLink(folder.resolve("pofk"), Path.of("else where/relative")));
        String version = "pofk " + VersionCommand.version() + "\n";
        assertEquals(version, started(folder, Map.of(), "./pofk", "version"));
        assertEquals(version, started(elsewhere, Map.of(), "../pofk", "version"));
        for (Path link : links) {
            Files.delete(link);
        }
    }

    @Test
    void theLauncherHandsOnTheExitCode() throws Exception {
        Process process = new ProcessBuilder(LAUNCHER.toString(), "derve").directory(folder.toFile())
                .redirectErrorStream(true).start();
        process.getInputStream().readAllBytes();
        assertEquals(2, process.waitFor());
    }

    @Test
    void outputIsUtf8AndNamesAreUnderstoodWhateverTheMachinesOwnEncodingIs() throws Exception {
        Map<String, String> ascii = Map.of("LC_ALL", "C", "LANG", "C");
        assertTrue(started(folder, ascii, LAUNCHER.toString(), "help").contains("…"));
        assertTrue(started(folder, ascii, LAUNCHER.toString(), "new", "pümp").contains("'pümp'"));
    }

    @Test
    void theClassPathIsWhatLiesInLib() throws IOException {
        List<String> named = new ArrayList<>(List.of("pofk.jar"));
        try (JarFile jar = new JarFile(HOME.resolve("lib/pofk.jar").toFile())) {
            named.addAll(Arrays.asList(jar.getManifest().getMainAttributes().getValue(Attributes.Name.CLASS_PATH)
                    .split(" ")));
        }
        assertEquals(new TreeSet<>(named), new TreeSet<>(libraries()));
    }

    @Test
    void everyLibraryIsNamedInTheNotice() throws IOException {
        String notice = Files.readString(HOME.resolve("NOTICE"));
        for (String jar : libraries()) {
            String name = jar.replaceAll("(-[0-9].*)?\\.jar", "").replaceAll("hipparchus-.*", "hipparchus-");
            assertTrue(notice.contains(name), jar);
        }
    }

    @Test
    void everyLicenceTheNoticeNamesIsThere() throws IOException {
        String notice = Files.readString(HOME.resolve("NOTICE"));
        List<String> texts = Pattern.compile("licences/[A-Za-z0-9.-]+\\.(txt|md)").matcher(notice)
                .results().map(MatchResult::group).distinct().toList();
        assertEquals(10, texts.size());
        for (String text : texts) {
            assertTrue(Files.size(HOME.resolve(text)) > 1000, text);
        }
    }

    @Test
    void theWindowsLauncherHasLinesAsWindowsWantsThem() throws IOException {
        String text = Files.readString(HOME.resolve("bin/pofk.bat"));
        assertTrue(text.contains("\r\n"));
        assertFalse(text.replace("\r\n", "").contains("\n"));
    }

    private static List<String> libraries() throws IOException {
        try (Stream<Path> files = Files.list(HOME.resolve("lib"))) {
            return files.map(file -> file.getFileName().toString()).filter(name -> name.endsWith(".jar")).toList();
        }
    }

    private static String started(Path folder, Map<String, String> environment, String... command) throws Exception {
        ProcessBuilder builder = new ProcessBuilder(command).directory(folder.toFile()).redirectErrorStream(true);
        builder.environment().putAll(environment);
        Process process = builder.start();
        String output = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        process.waitFor();
        return output;
    }
}
