package org.pofk.cli;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Properties;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;

/** {@code pofk version}. */
@Command(description = "Says which version this is.")
final class VersionCommand implements Work {
    @Mixin
    private CommonOptions common;

    @Override
    public ExitCode run(Streams streams) {
        streams.answer().println(program());
        return ExitCode.ANSWERED;
    }

    /** What documents say wrote them, {@code pofk 0.1.0}. */
    static String program() {
        return "pofk " + version();
    }

    /** The version the build gave, {@code 0.1.0}. */
    static String version() {
        Properties properties = new Properties();
        try (InputStream stream = VersionCommand.class.getResourceAsStream("version.properties")) {
            properties.load(stream);
        } catch (IOException broken) {
            throw new UncheckedIOException(broken);
        }
        return properties.getProperty("version");
    }
}
