package org.pofk.cli;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Consumer;
import java.util.function.Function;
import java.util.function.Supplier;
import org.pofk.answer.Given;
import org.pofk.answer.Passage;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Timetable;
import org.pofk.exact.Rational;
import org.pofk.report.PassageDocument;
import org.pofk.report.Prose;
import org.pofk.report.ReportSection;
import org.pofk.report.ScheduledPassageDocument;
import org.pofk.report.Style;
import org.pofk.schedule.ScheduledPassage;
import org.pofk.text.Suggestion;
import picocli.CommandLine.Option;

/** Which first passage is meant. */
final class PassageOptions {
    @Option(names = "--into", paramLabel = "NAME",
            description = "a state or set to be entered; repeatable")
    private List<String> into = new ArrayList<>();

    @Option(names = "--avoiding", paramLabel = "NAME",
            description = "a state or set that ends the wait without success; repeatable")
    private List<String> avoiding = new ArrayList<>();

    @Option(names = "--from", paramLabel = "STATE", description = "the state waited in first; otherwise the start")
    private Optional<String> from = Optional.empty();

    @Option(names = "--percentile", paramLabel = "SHARE", converter = Amount.Converter.class,
            description = "the step by which it has happened with this probability; repeatable; 50%%, 90%% and 99%%"
                    + " otherwise")
    private List<Amount> percentiles = new ArrayList<>();

    /** True when a passage is asked for. */
    boolean isAsked() throws UsageException {
        if (into.isEmpty() && !(avoiding.isEmpty() && from.isEmpty() && percentiles.isEmpty())) {
            throw new UsageException("--avoiding, --from and --percentile are about the passage into what --into NAME"
                    + " names; there is no --into");
        }
        return !into.isEmpty();
    }

    /** Finds the passage, of a chain that is started, at these steps; what was typed is checked before. */
    Supplier<Passage> work(Chain chain, List<Integer> at) throws UsageException {
        return work(chain, Optional.empty(), at);
    }

    /** The same of a model with a schedule. */
    Function<Consumer<ScheduledPassage>, ScheduledPassage> scheduled(Model started, Optional<Given> atTheEnd,
            List<Integer> at) throws UsageException {
        Chain chain = started.chain();
        Ends ends = ends(chain, atTheEnd);
        List<Rational> shares = shares();
        return published -> ScheduledPassage.of(chain, Timetable.of(chain, started.schedule().orElseThrow()),
                ends.target, ends.avoided, shares, at, published);
    }

    /** The same given what is known when it ends. */
    Supplier<Passage> work(Chain chain, Optional<Given> atTheEnd, List<Integer> at) throws UsageException {
        Ends ends = ends(chain, atTheEnd);
        List<Rational> shares = shares();
        return () -> Passage.of(chain, ends.target, ends.avoided, shares, at);
    }

    /** The states that end the wait, with success and without. */
    private record Ends(Set<Integer> target, Set<Integer> avoided) {
    }

    /** Given what is known at the end, what else is entered then ends the wait without success. */
    private Ends ends(Chain chain, Optional<Given> atTheEnd) throws UsageException {
        Set<Integer> target = states(chain, into, "--into");
        Set<Integer> avoided = states(chain, avoiding, "--avoiding");
        requireApart(chain, target, avoided);
        if (atTheEnd.isPresent()) {
            avoided.addAll(target);
            avoided.addAll(atTheEnd.get().never());
            target.retainAll(atTheEnd.get().in());
            avoided.removeAll(target);
            if (target.isEmpty()) {
                throw new UsageException("--given: none of the states under --into is one of those known to be"
                        + " entered, so that has probability zero and nothing is defined given it");
            }
        }
        return new Ends(target, avoided);
    }

    /** What a report says of it. */
    List<AskedSection> sections(Model read, List<Integer> at, Style style) throws UsageException {
        if (!isAsked()) {
            return List.of();
        }
        Chain chain = started(read.chain());
        return List.of(new AskedSection(Prose.of("First passage into ").and(Prose.names(into)),
                section(read.with(chain), at, style)));
    }

    private Supplier<ReportSection> section(Model started, List<Integer> at, Style style) throws UsageException {
        Chain chain = started.chain();
        if (started.schedule().isPresent()) {
            Function<Consumer<ScheduledPassage>, ScheduledPassage> work = scheduled(started, Optional.empty(), at);
            return () -> ScheduledPassageDocument.section(chain, work.apply(partly -> { }), style);
        }
        Supplier<Passage> work = work(chain, at);
        return () -> PassageDocument.section(chain, work.get(), style);
    }

    /** The chain as it is waited in. */
    Chain started(Chain chain) throws UsageException {
        if (chain.kind() != Chain.Kind.CHAIN) {
            throw new UsageException("a passage needs a chain of probabilities; this model is a recursion");
        }
        if (from.isEmpty()) {
            return chain;
        }
        int state = chain.states().indexOf(from.get());
        if (state < 0) {
            throw new UsageException("--from: there is no state '" + from.get() + "'"
                    + Suggestion.didYouMeanOrAll(chain.states(), from.get()));
        }
        List<Rational> start = new ArrayList<>();
        for (int i = 0; i < chain.size(); i++) {
            start.add(i == state ? Rational.ONE : Rational.ZERO);
        }
        return new Chain(chain.kind(), chain.states(), chain.matrix(), start, chain.sets(), chain.outputs());
    }

    private static Set<Integer> states(Chain chain, List<String> names, String option) throws UsageException {
        Set<Integer> states = new TreeSet<>();
        for (String name : names) {
            if (chain.sets().containsKey(name)) {
                states.addAll(chain.sets().get(name));
            } else if (chain.states().contains(name)) {
                states.add(chain.states().indexOf(name));
            } else {
                List<String> known = new ArrayList<>(chain.states());
                known.addAll(chain.sets().keySet());
                throw new UsageException(option + ": there is no state or set '" + name + "'"
                        + Suggestion.didYouMeanOrAll(known, name));
            }
        }
        return states;
    }

    private static void requireApart(Chain chain, Set<Integer> target, Set<Integer> avoided) throws UsageException {
        for (int state : avoided) {
            if (target.contains(state)) {
                throw new UsageException("'" + chain.states().get(state)
                        + "' can't be entered and avoided; name it under --into or --avoiding");
            }
        }
    }

    private List<Rational> shares() throws UsageException {
        List<Rational> shares = percentiles.isEmpty()
                ? List.of(Rational.HALF, Rational.of(9, 10), Rational.of(99, 100))
                : percentiles.stream().map(Amount::value).sorted().distinct().toList();
        for (Rational share : shares) {
            if (share.signum() <= 0 || share.compareTo(Rational.ONE) > 0) {
                throw new UsageException("--percentile takes a probability above 0 and up to 1, like 90%, not " + share);
            }
        }
        return shares;
    }
}
