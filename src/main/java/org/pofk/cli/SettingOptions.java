package org.pofk.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.input.Overrides;
import org.pofk.text.Fault;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Option;

/** What the command line puts in place of a model's own words. */
final class SettingOptions {
    @Option(names = "--set", paramLabel = "NAME=VALUE",
            description = "gives a parameter another value than the file does; repeatable")
    private List<String> settings = new ArrayList<>();

    @Option(names = "--start", paramLabel = "STATE", description = "starts in this state, whatever the file says; 'long run', and for derive 'each'")
    private Optional<String> start = Optional.empty();

    /** Something that reads a file. */
    interface FileReading<T> {
        T read() throws RefusedException, UsageException;
    }

    /** What is read; where it is refused for what was typed alone, that is a wrong usage. */
    <T> T read(FileReading<T> reading) throws RefusedException, UsageException {
        return read("", reading);
    }

    /** The same of one of several files, which a refusal of what was typed then names. */
    <T> T readOf(Path file, FileReading<T> reading) throws RefusedException, UsageException {
        return read("for '" + file + "': ", reading);
    }

    private static <T> T read(String about, FileReading<T> reading) throws RefusedException, UsageException {
        try {
            return reading.read();
        } catch (RefusedException refused) {
            if (refused.faults().stream().allMatch(SettingOptions::isOfAnOption)) {
                throw new UsageException(about + refused.getMessage());
            }
            throw refused;
        }
    }

    /** The faults of a file have a line in it; those of what was typed name the option. */
    private static boolean isOfAnOption(Fault fault) {
        return fault.position().isWhole() && fault.position().source().startsWith("--");
    }

    Optional<String> start() {
        return start;
    }

    /** Whether the start is each state in turn: the word, which no state bears as its name. */
    boolean isStartInEach(Chain chain) {
        return start.equals(Optional.of(Overrides.EACH)) && !chain.states().contains(Overrides.EACH);
    }

    Overrides overrides() throws UsageException {
        return new Overrides(values(), start);
    }

    private Map<String, String> values() throws UsageException {
        Map<String, String> values = new LinkedHashMap<>();
        for (String setting : settings) {
            int sign = setting.indexOf('=');
            if (sign < 1) {
                throw new UsageException("--set takes NAME=VALUE, like --set f=1/10; '" + setting + "' isn't that");
            }
            String name = setting.substring(0, sign).strip();
            String earlier = values.put(name, setting.substring(sign + 1).strip());
            if (earlier != null) {
                throw new UsageException("--set gives '" + name + "' twice, as " + earlier + " and as "
                        + values.get(name) + "; give it one value");
            }
        }
        return values;
    }
}
