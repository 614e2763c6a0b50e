package org.pofk.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.function.Consumer;
import java.util.function.Function;
import org.pofk.chain.Model;
import org.pofk.report.Style;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Mixin;

/**
 * What every command takes that answers something about a model: which model, how its numbers are shown, as what and
 * where the answer is written, how long it may take. A command adds the options of its own question.
 */
final class AnswerOptions {
    @Mixin
    private ModelOptions model;

    @Mixin
    private ShowingOptions showing;

    @Mixin
    private WritingOptions writing;

    @Mixin
    private RunOptions run;

    /** For a command that writes its answer in the formats of any document and in some besides. */
    AnswerOptions(CommandName command, Format... besides) {
        writing = new WritingOptions(command, besides);
    }

    /** Digits and angles as asked for. */
    Style style() throws UsageException {
        return showing.style();
    }

    /** The convention asked for, else that of the model. */
    Model.Convention convention(Model read) {
        return showing.convention(read);
    }

    /** As what and where the answer is written; to be asked before the work, since it may be refused. */
    Destination destination() throws UsageException {
        return writing.destination(model.file());
    }

    /** The model as the file and the command line say it. */
    Model model() throws RefusedException, UsageException {
        return model.read();
    }

    /** The model, and then that of another file, read as the model's own is, their schedules included. */
    List<Model> modelWith(Path other) throws RefusedException, UsageException {
        return model.readWith(other);
    }

    /** The same for a command that takes a schedule into account. */
    Model modelWithSchedule() throws RefusedException, UsageException {
        return model.readWithSchedule();
    }

    /** The same, its schedule included, where the command takes a start in each state in turn. */
    Model modelForEachStart() throws RefusedException, UsageException {
        return model.readForEachStart();
    }

    /** What the command line puts in place of the file's own words. */
    SettingOptions settings() {
        return model.settings();
    }

    /** Does the work within the budget; what it publishes last is kept. */
    <T> Worker.Outcome<T> within(Streams streams, Consumer<Consumer<T>> work) throws UsageException {
        return run.within(streams, work);
    }

    /** The same, and who waits is told what is published. */
    <T> Worker.Outcome<T> within(Streams streams, Function<T, String> soFar, Consumer<Consumer<T>> work)
            throws UsageException {
        return run.within(streams, soFar, work);
    }

    /** Says that the budget ran out before anything was decided. */
    ExitCode undecided(Streams streams) {
        return run.undecided(streams);
    }
}
