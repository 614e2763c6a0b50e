package org.pofk.cli;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.pofk.chain.Model;
import org.pofk.input.FileKind;
import org.pofk.input.MatrixFileReader;
import org.pofk.input.ModelReader;
import org.pofk.input.Overrides;
import org.pofk.input.Source;
import org.pofk.input.TableOptions;
import org.pofk.text.Fault;
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
        return readAll(List.of(file)).get(0);
    }

    /** The model, and then another file that is read as it is, their schedules included. */
    List<Model> readWith(Path other) throws RefusedException, UsageException {
        List<Model> models = readAll(List.of(file, other));
        for (Model model : models) {
            refusingEachStart(model);
        }
        return models;
    }

    private Model refusingEachStart(Model read) throws UsageException {
        if (settings.isStartInEach(read.chain())) {
            throw new UsageException("--start each is a start in each state in turn, which derive alone takes; name one"
                    + " state");
        }
        return read;
    }

    /** What is said of tables is said of those files that are tables, one at least; the faults of all files are told. */
    private List<Model> readAll(List<Path> paths) throws RefusedException, UsageException {
        Overrides overrides = settings.overrides();
        List<Fault> faults = new ArrayList<>();
        Map<Path, Source> sources = new LinkedHashMap<>();
        for (Path path : paths) {
            gathering(faults, () -> sources.put(path, Source.read(path)));
        }
        if (faults.isEmpty()) {
            refuseTableOptionsWithoutTable(sources);
        }
        List<Model> models = new ArrayList<>();
        for (Path path : paths) {
            if (sources.containsKey(path)) {
                SettingOptions.FileReading<Model> reading = () -> read(path, sources.get(path), overrides);
                gathering(faults, () -> models.add(paths.size() == 1 ? settings.read(reading)
                        : settings.readOf(path, reading)));
            }
        }
        if (!faults.isEmpty()) {
            throw new RefusedException(faults);
        }
        return models;
    }

    private static void gathering(List<Fault> faults, SettingOptions.FileReading<?> reading) throws UsageException {
        try {
            reading.read();
        } catch (RefusedException refused) {
            faults.addAll(refused.faults());
        }
    }

    private Model read(Path path, Source source, Overrides overrides) throws RefusedException, UsageException {
        if (FileKind.of(source) != FileKind.MATRIX) {
            return ModelReader.read(source, Optional.ofNullable(path.toAbsolutePath().getParent()),
                    overrides);
        }
        if (!overrides.parameters().isEmpty()) {
            throw new UsageException("'" + path + "' is a table of numbers: it has no parameters for --set");
        }
        return MatrixFileReader.read(source, new MatrixFileReader.Options(
                orientation.map(Orientation::convention), settings.start(), new TableOptions(separator, names)));
    }

    private void refuseTableOptionsWithoutTable(Map<Path, Source> sources) throws UsageException {
        boolean areGiven = orientation.isPresent() || separator.isPresent() || names.isPresent();
        if (areGiven && sources.values().stream().noneMatch(each -> FileKind.of(each) == FileKind.MATRIX)) {
            throw new UsageException("--orientation, --separator and --names are for CSV files; "
                    + sources.keySet().stream().map(path -> "'" + path + "'").collect(Collectors.joining(" and "))
                    + (sources.size() == 1 ? " says these itself" : " say these themselves") + ", under 'matrix'");
        }
    }
}
