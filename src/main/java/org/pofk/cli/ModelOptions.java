package org.pofk.cli;

import java.nio.file.Path;
import java.util.Optional;
import org.pofk.chain.Model;
import org.pofk.input.FileKind;
import org.pofk.input.MatrixFileReader;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.input.TableOptions;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Which model is read, and what the command line puts in place of the file's own words. */
final class ModelOptions {
    @Parameters(paramLabel = "MODEL", description = "a model file (YAML or JSON), or a matrix in a CSV file")
    private Path file;

    @Mixin
    private SettingOptions settings = new SettingOptions();

    @Option(names = "--orientation", paramLabel = "WAY",
            description = "for a CSV file: rows or columns, which of the two sums to one")
    private Optional<Orientation> orientation = Optional.empty();

    @Option(names = "--separator", paramLabel = "SIGN",
            description = "for a CSV file that can be read two ways: comma or semicolon")
    private Optional<TableOptions.Separator> separator = Optional.empty();

    @Option(names = "--names", paramLabel = "WHERE",
            description = "for a CSV file that can be read two ways: where names stand, nowhere, row, column or both")
    private Optional<TableOptions.NamesIn> names = Optional.empty();

    /** The model's file. */
    Path file() {
        return file;
    }

    /** What the command line puts in place of the file's own words. */
    SettingOptions settings() {
        return settings;
    }

    /** The model as the file and the command line say it; not one with a schedule, of which most commands know nothing. */
    Model read() throws RefusedException, UsageException {
        return ScheduleRefusal.unlessScheduled(readWithSchedule());
    }

    /** The model as the file and the command line say it, its schedule included. */
    Model readWithSchedule() throws RefusedException, UsageException {
        return refusingEachStart(readForEachStart());
    }

    /** The same where the command takes a start in each state in turn. */
    Model readForEachStart() throws RefusedException, UsageException {
        return readFile(file);
    }

    /** Another file, as this one is read; its schedule included. */
    Model readAsWell(Path other) throws RefusedException, UsageException {
        return refusingEachStart(readFile(other));
    }

    private Model refusingEachStart(Model read) throws UsageException {
        if (settings.isStartInEach(read.chain())) {
            throw new UsageException("--start each is a start in each state in turn, which derive alone takes; name one"
                    + " state");
        }
        return read;
    }

    private Model readFile(Path other) throws RefusedException, UsageException {
        Overrides overrides = settings.overrides();
        Source source = Source.read(other);
        return settings.read(() -> read(other, source, overrides));
    }

    private Model read(Path path, Source source, Overrides overrides) throws RefusedException, UsageException {
        if (FileKind.of(source) != FileKind.MATRIX) {
            refuseTableOptions();
            return ModelReader.read(source, Optional.ofNullable(path.toAbsolutePath().getParent()),
                    overrides);
        }
        if (!overrides.parameters().isEmpty()) {
            throw new UsageException("'" + path + "' is a table of numbers: it has no parameters for --set");
        }
        return MatrixFileReader.read(source, new MatrixFileReader.Options(
                orientation.map(Orientation::convention), settings.start(), new TableOptions(separator, names)));
    }

    private void refuseTableOptions() throws UsageException {
        if (orientation.isPresent() || separator.isPresent() || names.isPresent()) {
            throw new UsageException("--orientation, --separator and --names are for CSV files; '" + file
                    + "' says these itself, under 'matrix'");
        }
    }
}
