package org.pofk.cli;

import java.util.Optional;
import java.util.function.Supplier;
import org.pofk.answer.Given;
import org.pofk.answer.Known;
import org.pofk.answer.Passage;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.report.CsvWriter;
import org.pofk.report.GivenProse;
import org.pofk.report.NotebookWriter;
import org.pofk.report.PassageDocument;
import org.pofk.report.PassageJson;
import org.pofk.report.PassageTable;
import org.pofk.report.Style;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** {@code pofk passage MODEL}: how long until a set of states is entered. */
@Command(description = {"Says whether and when a set of states is first entered: the law of the first",
    "passage as a formula, mean, variance and percentiles; and from every state."})
final class PassageCommand implements Work {
    @Mixin
    private AnswerOptions options = new AnswerOptions(CommandName.PASSAGE, Format.JSON, Format.CSV, Format.NOTEBOOK);

    @Mixin
    private PassageOptions passage = new PassageOptions();

    @Option(names = "--at", paramLabel = "STEPS", converter = StepList.Converter.class,
            description = "also gives law, distribution and hazard at these steps, like 0..20,100")
    private Optional<StepList> at = Optional.empty();

    @Mixin
    private GivenOptions given = new GivenOptions();

    @Override
    public ExitCode run(Streams streams) throws RefusedException, UsageException, WritingException {
        Style style = options.style();
        Destination destination = options.destination();
        if (!passage.isAsked()) {
            throw new UsageException("what is to be entered? Name a state or set with --into NAME");
        }
        Model read = options.modelWithSchedule();
        if (read.schedule().isPresent()) {
            return scheduled(read.with(passage.started(read.chain())), destination, streams);
        }
        Model started = read.with(passage.started(read.chain()));
        Optional<Integer> step = given.at();
        if (step.isEmpty()) {
            Optional<Given> atTheEnd = given.isAsked() ? Optional.of(given.given(started.chain())) : Optional.empty();
            return passage(read, started.chain(), Optional.empty(), atTheEnd, style, destination, streams);
        }
        Optional<Known> known = given.known(started, step.get());
        return known.isEmpty() ? given.nothing(started, step.get(), CommandName.PASSAGE, destination, streams)
                : passage(known.get().model(), known.get().model().chain(), known, Optional.empty(), style,
                        destination, streams);
    }

    private ExitCode scheduled(Model started, Destination destination, Streams streams)
            throws RefusedException, UsageException, WritingException {
        Optional<Integer> step = given.at();
        if (step.isEmpty()) {
            return ScheduledAnswers.passage(options, started, Optional.empty(), passage.scheduled(started,
                    given.isAsked() ? Optional.of(given.given(started.chain())) : Optional.empty(),
                    destination.steps(at)), destination, streams);
        }
        Optional<Known> known = given.known(started, step.get());
        return known.isEmpty() ? given.nothing(started, step.get(), CommandName.PASSAGE, destination, streams)
                : ScheduledAnswers.passage(options, known.get().model(), known, passage.scheduled(known.get().model(),
                        Optional.empty(), destination.steps(at)), destination, streams);
    }

    private ExitCode passage(Model read, Chain chain, Optional<Known> known, Optional<Given> atTheEnd, Style style,
            Destination destination, Streams streams) throws RefusedException, UsageException, WritingException {
        Supplier<Passage> work = passage.work(chain, atTheEnd, destination.steps(at));
        Worker.Outcome<Passage> outcome = options.within(streams, published -> published.accept(work.get()));
        if (outcome.published().isEmpty()) {
            return options.undecided(streams);
        }
        Passage found = outcome.published().get();
        destination.write(Answer.of(() -> GivenProse.in(PassageDocument.of(read, chain, found, style), known, style))
                .with(Format.JSON, () -> PassageJson.write(read, chain, known, found, style.digits()))
                .with(Format.CSV, () -> CsvWriter.write(PassageTable.of(read, chain, found, style.digits())))
                .with(Format.NOTEBOOK, () -> NotebookWriter.write(read, chain, found, style, options.convention(read))),
                streams);
        return ExitCode.ANSWERED;
    }
}
