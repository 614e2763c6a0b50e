package org.pofk.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.pofk.answer.ConditionalWhen;
import org.pofk.answer.Given;
import org.pofk.answer.Known;
import org.pofk.answer.WhenModel;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.report.ConditionalWhenDocument;
import org.pofk.report.CsvWriter;
import org.pofk.report.GivenProse;
import org.pofk.report.Style;
import org.pofk.report.WhenDocument;
import org.pofk.report.WhenJson;
import org.pofk.report.WhenTable;
import org.pofk.schedule.ScheduledWhen.Sides;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** {@code pofk when MODEL}: from which step a condition holds. */
@Command(description = {"Says at which step a condition on p(k) holds first, and from which on for ever;",
    "or that it never does. Proved: no step is passed over."})
final class WhenCommand implements Work {
    @Mixin
    private AnswerOptions options = new AnswerOptions(CommandName.WHEN, Format.JSON, Format.CSV);

    @Option(names = "--of", paramLabel = "NAME", description = "an output, a set or a state; repeatable")
    private List<String> of = new ArrayList<>();

    @Mixin
    private ConditionOptions conditions = new ConditionOptions();

    @Mixin
    private GivenOptions given = new GivenOptions();

    @Override
    public ExitCode run(Streams streams) throws RefusedException, UsageException, WritingException {
        Style style = options.style();
        Destination destination = options.destination();
        WhenModel.Asked asked = asked();
        Model read = options.modelWithSchedule();
        Sides sides = conditions.sides(read);
        if (read.schedule().isPresent()) {
            return scheduled(read, asked, sides, destination, streams);
        }
        Optional<Integer> step = given.at();
        if (given.isAsked() && step.isEmpty()) {
            return conditional(read, asked, style, destination, streams);
        }
        if (step.isEmpty()) {
            return when(read, Optional.empty(), asked, style, destination, streams);
        }
        Optional<Known> known = given.known(read, step.get());
        return known.isEmpty() ? given.nothing(read, step.get(), CommandName.WHEN, destination, streams)
                : when(known.get().model(), known, asked, style, destination, streams);
    }

    private ExitCode scheduled(Model read, WhenModel.Asked asked, Sides sides, Destination destination,
            Streams streams) throws RefusedException, UsageException, WritingException {
        List<Output> outputs = outputs(read, destination);
        Optional<Integer> step = given.at();
        if (given.isAsked() && step.isEmpty()) {
            if (sides != Sides.AFTER) {
                throw new UsageException("--side goes with --given-at K, not with what is known at k itself: there the"
                        + " values are those after what is done");
            }
            return ScheduledAnswers.when(options, read, given.given(read.chain()), outputs, asked,
                    destination, streams);
        }
        if (step.isEmpty()) {
            return ScheduledAnswers.when(options, read, Optional.empty(), outputs, asked, sides, destination,
                    streams);
        }
        Optional<Known> known = given.known(read, step.get());
        return known.isEmpty() ? given.nothing(read, step.get(), CommandName.WHEN, destination, streams)
                : ScheduledAnswers.when(options, known.get().model(), known, outputs, asked, sides,
                        destination, streams);
    }

    private ExitCode when(Model read, Optional<Known> known, WhenModel.Asked asked, Style style,
            Destination destination, Streams streams) throws RefusedException, UsageException, WritingException {
        List<Output> outputs = outputs(read, destination);
        Worker.Outcome<WhenModel> outcome = options.within(streams, partly ->
                partly.answers().size() + " of " + outputs.size() + " outputs answered", published ->
                WhenModel.of(read, outputs, asked, published));
        if (outcome.published().isEmpty()) {
            return options.undecided(streams);
        }
        WhenModel found = outcome.published().get();
        destination.write(Answer.of(() -> GivenProse.in(WhenDocument.of(found, style), known, style))
                .with(Format.JSON, () -> WhenJson.write(read, known, found.answers().get(0), style.digits()))
                .with(Format.CSV, () -> CsvWriter.write(WhenTable.of(found, style.digits()))), streams);
        return found.isDecided() && outcome.finished() ? ExitCode.ANSWERED : ExitCode.NOT_DECIDED;
    }

    private ExitCode conditional(Model read, WhenModel.Asked asked, Style style, Destination destination,
            Streams streams) throws RefusedException, UsageException, WritingException {
        List<Output> outputs = outputs(read, destination);
        Given what = given.given(read.chain());
        Worker.Outcome<ConditionalWhen> outcome = options.within(streams, published ->
                ConditionalWhen.of(read, what, outputs, asked, published));
        if (outcome.published().isEmpty()) {
            return options.undecided(streams);
        }
        ConditionalWhen found = outcome.published().get();
        destination.write(Answer.of(() -> ConditionalWhenDocument.of(found, style))
                .with(Format.JSON, () -> WhenJson.write(found, style.digits()))
                .with(Format.CSV, () -> CsvWriter.write(WhenTable.of(found, style.digits()))), streams);
        return found.isDecided() && outcome.finished() ? ExitCode.ANSWERED : ExitCode.NOT_DECIDED;
    }

    private List<Output> outputs(Model read, Destination destination) throws UsageException {
        List<Output> outputs = AskedOutputs.of(read.chain(), of);
        if (destination.takes(Format.JSON) && outputs.size() != 1) {
            throw new UsageException("as JSON one output is answered at a time; name it with --of");
        }
        return outputs;
    }

    private WhenModel.Asked asked() throws UsageException {
        List<WhenModel.Asked> all = conditions.asked();
        if (all.size() != 1) {
            throw new UsageException("say what is wanted: one of --at-least VALUE, --at-most VALUE and"
                    + " --settles-within VALUE");
        }
        return all.get(0);
    }
}
