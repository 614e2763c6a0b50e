package org.pofk.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.IntStream;
import org.pofk.answer.ConditionalModel;
import org.pofk.answer.Given;
import org.pofk.answer.Known;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.report.ConditionalDocument;
import org.pofk.report.ConditionalJson;
import org.pofk.report.ConditionalTable;
import org.pofk.report.CsvWriter;
import org.pofk.report.ScheduledConditionalDocument;
import org.pofk.report.Style;
import org.pofk.schedule.ConditionalSchedule;
import org.pofk.schedule.Scheduling;
import org.pofk.text.RefusedException;
import picocli.CommandLine.Option;

/** What is known of the state, at every step asked about or at one. */
final class GivenOptions {
    @Option(names = "--given", paramLabel = "NAME",
            description = "what is known to hold: a state, a set, or an output that is 0 or 1; repeatable")
    private List<String> in = new ArrayList<>();

    @Option(names = "--given-never", paramLabel = "NAME",
            description = "what is known not to have been entered up to then; repeatable")
    private List<String> never = new ArrayList<>();

    @Option(names = "--given-at", paramLabel = "STEP",
            description = "the step at which that is known; k counts the steps from there. Otherwise it is known at k"
                    + " itself, in a passage when that ends")
    private Optional<Integer> at = Optional.empty();

    /** True where something is known. */
    boolean isAsked() {
        return !in.isEmpty() || !never.isEmpty();
    }

    Optional<Integer> at() throws UsageException {
        if (at.isPresent() && !isAsked()) {
            throw new UsageException("--given-at says when; say what is known then with --given NAME or"
                    + " --given-never NAME");
        }
        if (at.isPresent() && (at.get() < 0 || at.get() > StepList.LAST_STEP)) {
            throw new UsageException("--given-at takes a step, 0 or later, not " + at.get());
        }
        return at;
    }

    /** What a report says given that. */
    List<AskedSection> sections(Model read, List<Output> outputs, List<Integer> steps, Style style)
            throws UsageException {
        if (at().isPresent()) {
            throw new UsageException("a report says what follows from what is known at k itself; derive, when and"
                    + " passage say what follows from --given-at STEP");
        }
        if (!isAsked()) {
            return List.of();
        }
        Given given = given(read.chain());
        if (read.schedule().isPresent()) {
            return List.of(new AskedSection(ConditionalDocument.title(given), () ->
                    ScheduledConditionalDocument.section(ConditionalSchedule.of(read, given, outputs, steps,
                            Scheduling.Formulas.WITHIN_REACH), style)));
        }
        return List.of(new AskedSection(ConditionalDocument.title(given), () -> ConditionalDocument.section(
                ConditionalModel.of(read, given, outputs, steps, partly -> { }), style)));
    }

    /** What is known, of a chain of probabilities. */
    Given given(Chain chain) throws UsageException {
        if (chain.kind() != Chain.Kind.CHAIN) {
            throw new UsageException("--given needs a chain of probabilities; this model is a recursion");
        }
        Set<Integer> holds = new TreeSet<>(IntStream.range(0, chain.size()).boxed().toList());
        for (String name : in) {
            holds.retainAll(states(chain, name, "--given"));
        }
        Set<Integer> avoided = new TreeSet<>();
        for (String name : never) {
            avoided.addAll(states(chain, name, "--given-never"));
        }
        return new Given(in, holds, never, avoided);
    }

    private static Set<Integer> states(Chain chain, String name, String option) throws UsageException {
        Set<Integer> states = new TreeSet<>();
        for (Output output : AskedOutputs.of(chain, List.of(name), option)) {
            for (int i = 0; i < chain.size(); i++) {
                if (output.coefficients().get(i).isOne()) {
                    states.add(i);
                } else if (!output.coefficients().get(i).isZero()) {
                    throw new UsageException(option + ": '" + name + "' is " + output.coefficients().get(i) + " in '"
                            + chain.states().get(i) + "'; only what is 0 or 1 in every state holds or doesn't");
                }
            }
        }
        return states;
    }

    /** The model seen from the step at which something is known; empty where that has probability zero. */
    Optional<Known> known(Model model, int step) throws UsageException {
        if (!Known.isNear(model, step)) {
            throw new UsageException("--given-at " + step + ": the exact state at that step has fractions of more than "
                    + Known.BITS_AT_MOST + " bits; name an earlier step");
        }
        return Known.of(model, given(model.chain()), step);
    }

    /** Says that nothing follows from what has probability zero. */
    ExitCode nothing(Model model, int step, CommandName command, Destination destination, Streams streams)
            throws RefusedException, UsageException, WritingException {
        Given given = given(model.chain());
        destination.write(Answer.of(() -> ConditionalDocument.ofNothing(model, given, step))
                .with(Format.JSON, () -> ConditionalJson.ofNothing(model, command.word(), given, step))
                .with(Format.CSV, () -> CsvWriter.write(ConditionalTable.ofNothing(model))), streams);
        return ExitCode.ANSWERED;
    }
}
