package org.pofk.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.pofk.chain.Model;
import org.pofk.input.FileKind;
import org.pofk.input.MatrixFileReader;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.input.TableOptions;
import org.pofk.text.Fault;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Which model is read, and what the command line puts in place of the file's own words. */
final class ModelOptions {
    @Parameters(paramLabel = "MODEL", description = "a model file (YAML or JSON), or a matrix in a CSV file")
    private Path file;

    @Option(names = "--set", paramLabel = "NAME=VALUE",
            description = "gives a parameter another value than the file does; repeatable")
    private List<String> settings = new ArrayList<>();

    @Option(names = "--start", paramLabel = "STATE", description = "starts in this state, whatever the file says")
    private Optional<String> start = Optional.empty();

    @Option(names = "--orientation", paramLabel = "WAY",
            description = "for a CSV file: rows or columns, which of the two sums to one")
    private Optional<Orientation> orientation = Optional.empty();

    @Option(names = "--separator", paramLabel = "SIGN",
            description = "for a CSV file that can be read two ways: comma or semicolon")
    private Optional<TableOptions.Separator> separator = Optional.empty();

    @Option(names = "--names", paramLabel = "WHERE",
            description = "for a CSV file that can be read two ways: where names stand, nowhere, row, column or both")
    private Optional<TableOptions.NamesIn> names = Optional.empty();

    /** The model as the file and the command line say it. */
    Model read() throws RefusedException, UsageException {
        Map<String, String> values = values();
        Source source = Source.read(file);
        try {
            return read(source, values);
        } catch (RefusedException refused) {
            if (refused.faults().stream().allMatch(ModelOptions::isOfAnOption)) {
                throw new UsageException(refused.getMessage());
            }
            throw refused;
        }
    }

    /** The faults of a file have a line in it; those of what was typed name the option. */
    private static boolean isOfAnOption(Fault fault) {
        return fault.position().isWhole() && fault.position().source().startsWith("--");
    }

    private Model read(Source source, Map<String, String> values) throws RefusedException, UsageException {
        if (FileKind.of(source) != FileKind.MATRIX) {
            refuseTableOptions();
            return ModelReader.read(source, Optional.ofNullable(file.toAbsolutePath().getParent()),
                    new Overrides(values, start));
        }
        if (!values.isEmpty()) {
            throw new UsageException("'" + file + "' is a table of numbers: it has no parameters for --set");
        }
        return MatrixFileReader.read(source, new MatrixFileReader.Options(
                orientation.map(Orientation::convention), start, new TableOptions(separator, names)));
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

    private void refuseTableOptions() throws UsageException {
        if (orientation.isPresent() || separator.isPresent() || names.isPresent()) {
            throw new UsageException("--orientation, --separator and --names are for CSV files; '" + file
                    + "' says these itself, under 'matrix'");
        }
    }
}
