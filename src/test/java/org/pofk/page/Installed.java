package org.pofk.page;

import java.io.File;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import org.junit.jupiter.api.Assertions;
import org.junit.jupiter.api.Assumptions;

/** Programs of others that some tests run. */
final class Installed {
    private Installed() {
    }

    /** Skips the test without the program; where everything is to be tested, it fails. */
    static void require(String program) {
        boolean isInstalled = Arrays.stream(System.getenv("PATH").split(File.pathSeparator))
                .anyMatch(folder -> Files.isExecutable(Path.of(folder, program)));
        if (!isInstalled && System.getenv("CI") != null) {
            Assertions.fail(program + " isn't installed");
        }
        Assumptions.assumeTrue(isInstalled, program + " isn't installed");
    }
}
