package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

/** What the README shows of a report issued again. */
class ReissuedReportTest {
    private static final Pattern SHOWN = Pattern.compile("(?s)## Issued again.*?```text\\n(.*?)```");

    @Test
    void theReadmeShowsAPartOfARunThatIsTested() throws IOException {
        Matcher shown = SHOWN.matcher(Files.readString(Path.of("README.md")));
        assertTrue(shown.find());
        assertTrue(Files.readString(Path.of("src/test/resources/runs/report-since/expected-output"))
                .contains(shown.group(1)), shown.group(1));
    }
}
