package org.pofk.cli;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.pofk.answer.ConditionalModel;
import org.pofk.answer.DerivedModel;
import org.pofk.answer.DerivedOutput;
import org.pofk.answer.Deriving;
import org.pofk.answer.Given;
import org.pofk.answer.InspectedModel;
import org.pofk.answer.Known;
import org.pofk.answer.PowerModel;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.report.ConditionalDocument;
import org.pofk.report.ConditionalJson;
import org.pofk.report.ConditionalTable;
import org.pofk.report.CsvWriter;
import org.pofk.report.DerivationDocument;
import org.pofk.report.DerivationJson;
import org.pofk.report.DerivationTable;
import org.pofk.report.Document;
import org.pofk.report.GivenProse;
import org.pofk.report.NotebookWriter;
import org.pofk.report.PowerDocument;
import org.pofk.report.PowerJson;
import org.pofk.report.PowerTable;
import org.pofk.report.StructureDocument;
import org.pofk.report.StructureJson;
import org.pofk.report.Style;
import org.pofk.schedule.Scheduling;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** {@code pofk derive MODEL}: the formulas, here and now. */
@Command(description = "Derives formulas p(k) that hold for every k, with their proof and the long run.")
final class DeriveCommand implements Work {
    private static final int DERIVED_UNASKED = 12;
    private static final String WITHOUT_THE_WAY = "with --given at k itself derive shows its result, without the way to"
            + " it; with --given-at STEP everything is there";

    @Mixin
    private AnswerOptions options = new AnswerOptions(CommandName.DERIVE, Format.JSON, Format.CSV, Format.NOTEBOOK);

    @Option(names = "--of", paramLabel = "NAME",
            description = "an output, a set or a state; repeatable; 'all' for every state")
    private List<String> of = new ArrayList<>();

    @Option(names = "--at", paramLabel = "STEPS", converter = StepList.Converter.class,
            description = "also gives the values at these steps, like 0..20,100")
    private Optional<StepList> at = Optional.empty();

    @Option(names = "--show", paramLabel = "PART", defaultValue = "result",
            description = "result, derivation or all; ${DEFAULT-VALUE} otherwise")
    private Part show;

    @Option(names = "--second-opinion", description = "asks a general algebra system whether it agrees")
    private boolean secondOpinion;

    @Mixin
    private GivenOptions given = new GivenOptions();

    /** How much is shown. */
    enum Part {
        RESULT, DERIVATION, ALL;

        @Override
        public String toString() {
            return Words.lowerCase(this);
        }
    }

    @Override
    public ExitCode run(Streams streams) throws RefusedException, UsageException, WritingException {
        Style style = options.style();
        Destination destination = options.destination();
        Model read = options.modelForEachStart();
        boolean isInEach = options.settings().isStartInEach(read.chain());
        if (read.schedule().isPresent() && isInEach) {
            throw new UsageException("--start each gives powers of one matrix; this model has a schedule");
        }
        if (read.schedule().isPresent()) {
            return scheduled(read, destination, streams);
        }
        if (isInEach) {
            return fromEach(read, style, destination, streams);
        }
        Optional<Integer> step = given.at();
        if (given.isAsked() && step.isEmpty()) {
            return conditional(read, style, destination, streams);
        }
        if (step.isEmpty()) {
            return derive(read, Optional.empty(), style, destination, streams);
        }
        Optional<Known> known = given.known(read, step.get());
        return known.isEmpty() ? given.nothing(read, step.get(), CommandName.DERIVE, destination, streams)
                : derive(known.get().model(), known, style, destination, streams);
    }

    private ExitCode scheduled(Model read, Destination destination, Streams streams)
            throws RefusedException, UsageException, WritingException {
        if (secondOpinion || show == Part.DERIVATION) {
            throw new UsageException("'" + read.origin().file() + "' has a schedule: --second-opinion and"
                    + " --show derivation aren't there for it; --show result and --show all are");
        }
        if (isTooLargeForAll(read.chain())) {
            throw new UsageException(StructureDocument.askingForOutputs(read.chain()));
        }
        ScheduledDerivation derivation = new ScheduledDerivation(options, AskedOutputs.of(read.chain(), of),
                at.map(StepList::steps).orElse(List.of()), show == Part.ALL ? Scheduling.Formulas.ALL
                        : Scheduling.Formulas.WITHIN_REACH, destination, streams);
        Optional<Integer> step = given.at();
        if (given.isAsked() && step.isEmpty()) {
            refuseNotebook(destination);
            return derivation.given(read, given.given(read.chain()));
        }
        if (step.isEmpty()) {
            return derivation.of(read, Optional.empty());
        }
        Optional<Known> known = given.known(read, step.get());
        return known.isEmpty() ? given.nothing(read, step.get(), CommandName.DERIVE, destination, streams)
                : derivation.of(known.get().model(), known);
    }

    private void refuseNotebook(Destination destination) throws UsageException {
        if (destination.takes(Format.NOTEBOOK)) {
            throw new UsageException(WITHOUT_THE_WAY);
        }
    }

    private ExitCode derive(Model read, Optional<Known> known, Style style, Destination destination, Streams streams)
            throws RefusedException, UsageException, WritingException {
        if (isTooLargeForAll(read.chain())) {
            return askedForOutputs(read, style, destination, streams);
        }
        List<Output> outputs = AskedOutputs.of(read.chain(), of);
        Worker.Outcome<DerivedModel> outcome = options.within(streams, DeriveCommand::soFar, published ->
                Deriving.of(read, outputs, destination.steps(at), extras(read, destination), published));
        if (outcome.published().isEmpty()) {
            return options.undecided(streams);
        }
        DerivedModel derived = outcome.published().get();
        destination.write(answer(derived, known, style), streams);
        return derived.isDecided() && outcome.finished() ? ExitCode.ANSWERED : ExitCode.NOT_DECIDED;
    }

    /** From each state in turn. */
    private ExitCode fromEach(Model read, Style style, Destination destination, Streams streams)
            throws RefusedException, UsageException, WritingException {
        if (destination.takes(Format.NOTEBOOK) || show != Part.RESULT || secondOpinion || given.isAsked()) {
            throw new UsageException("with --start each derive shows its result, without the way to it and with nothing"
                    + " given; with --start STATE everything is there");
        }
        if (read.chain().size() > DERIVED_UNASKED && of.isEmpty()) {
            throw new UsageException("from each of " + read.chain().size() + " states: into which? Name states, sets or"
                    + " outputs with --of");
        }
        List<Output> outputs = of.isEmpty() ? Outputs.states(read.chain()) : AskedOutputs.of(read.chain(), of);
        Worker.Outcome<PowerModel> outcome = options.within(streams, partly ->
                partly.found().size() + " of " + outputs.size() + " outputs derived", published ->
                PowerModel.of(read, outputs, destination.steps(at), published));
        if (outcome.published().isEmpty()) {
            return options.undecided(streams);
        }
        PowerModel found = outcome.published().get();
        destination.write(Answer.of(() -> PowerDocument.of(found, style))
                .with(Format.JSON, () -> PowerJson.write(found, style.digits()))
                .with(Format.CSV, () -> CsvWriter.write(PowerTable.of(found, style.digits()))), streams);
        return found.isComplete() ? ExitCode.ANSWERED : ExitCode.NOT_DECIDED;
    }

    private static String soFar(DerivedModel derived) {
        long found = derived.outputs().stream().filter(DerivedOutput::isDecided).count();
        return found + " of " + derived.outputs().size() + " outputs derived";
    }

    private ExitCode conditional(Model read, Style style, Destination destination, Streams streams)
            throws RefusedException, UsageException, WritingException {
        if (show != Part.RESULT || secondOpinion) {
            throw new UsageException(WITHOUT_THE_WAY);
        }
        refuseNotebook(destination);
        Given what = given.given(read.chain());
        List<Output> outputs = AskedOutputs.of(read.chain(), of);
        Worker.Outcome<ConditionalModel> outcome = options.within(streams, published ->
                ConditionalModel.of(read, what, outputs, destination.steps(at), published));
        if (outcome.published().isEmpty()) {
            return options.undecided(streams);
        }
        ConditionalModel found = outcome.published().get();
        destination.write(Answer.of(() -> ConditionalDocument.of(found, style))
                .with(Format.JSON, () -> ConditionalJson.write(found, style.digits()))
                .with(Format.CSV, () -> CsvWriter.write(ConditionalTable.of(found, style.digits()))), streams);
        return found.isDecided() && outcome.finished() ? ExitCode.ANSWERED : ExitCode.NOT_DECIDED;
    }

    private Answer answer(DerivedModel derived, Optional<Known> known, Style style) {
        return Answer.of(() -> GivenProse.in(document(derived, style), known, style))
                .with(Format.JSON, () -> DerivationJson.write(derived, known, style.digits()))
                .with(Format.CSV, () -> CsvWriter.write(DerivationTable.of(derived, style.digits())))
                .with(Format.NOTEBOOK, () -> NotebookWriter.write(derived, style,
                        options.convention(derived.model())));
    }

    private ExitCode askedForOutputs(Model read, Style style, Destination destination, Streams streams)
            throws RefusedException, UsageException, WritingException {
        if (destination.takes(Format.NOTEBOOK) || destination.takes(Format.CSV)) {
            throw new UsageException("which outputs is the " + (destination.takes(Format.CSV) ? "table" : "notebook")
                    + " to be about? Name them with --of");
        }
        InspectedModel inspected = InspectedModel.of(read, List.of());
        if (destination.takes(Format.JSON)) {
            streams.notes().println("pofk: " + StructureDocument.askingForOutputs(read.chain()));
        }
        destination.write(Answer.of(() -> StructureDocument.tooLargeForAll(inspected, style)).with(Format.JSON,
                () -> StructureJson.write(CommandName.DERIVE.word(), inspected, style.digits())), streams);
        return ExitCode.ANSWERED;
    }

    /** So many formulas are no answer to somebody who didn't ask for them. */
    private boolean isTooLargeForAll(Chain chain) {
        return chain.size() > DERIVED_UNASKED && chain.outputs().isEmpty() && of.isEmpty();
    }

    private Document document(DerivedModel derived, Style style) {
        return switch (show) {
            case RESULT -> DerivationDocument.result(derived, style);
            case DERIVATION -> DerivationDocument.derivation(derived, style, options.convention(derived.model()));
            case ALL -> DerivationDocument.all(derived, style, options.convention(derived.model()));
        };
    }

    /** The modes of the whole state are a vector each: as text for few states only, as data for any number. */
    private Set<Deriving.Extra> extras(Model read, Destination destination) {
        Set<Deriving.Extra> extras = EnumSet.of(Deriving.Extra.COMPARISON);
        if (show != Part.RESULT) {
            extras.add(Deriving.Extra.POLE_CHECK);
        }
        if (show != Part.RESULT && (destination.takes(Format.JSON) || read.chain().size() <= DERIVED_UNASKED)) {
            extras.add(Deriving.Extra.STATE_MODES);
        }
        if (secondOpinion) {
            extras.add(Deriving.Extra.SECOND_OPINION);
        }
        return extras;
    }
}
