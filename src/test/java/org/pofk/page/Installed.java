package org.pofk.page;

import java.io.File;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import org.junit.jupiter.api.Assertions;
import org.junit.jupiter.api.Assumptions;

/** Programs of others that some tests run. */
public final class Installed {
    private Installed() {
    }

    /** Skips the test without the program, and says what isn't tested then; where everything is to be, it fails. */
    public static void require(String program, String leftOut) {
        boolean isInstalled = Arrays.stream(System.getenv().getOrDefault("PATH", "").split(File.pathSeparator))
                .anyMatch(folder -> Files.isExecutable(Path.of(folder, program)));
        String message = program + " isn't installed: " + leftOut;
        if (!isInstalled && System.getenv("CI") != null) {
            Assertions.fail(message);
        }
        Assumptions.assumeTrue(isInstalled, message);
    }
}
