package org.pofk.report;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Set;
import java.util.regex.Pattern;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.pofk.chain.Chain;
import org.pofk.chain.Costs;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Place;
import org.pofk.chain.Place.Part;
import org.pofk.exact.Rational;

/** The numbers without a source that stand beside the moves: those of the start, of outputs, of costs. */
final class OtherSources {
    private static final Pattern NUMBER = Pattern.compile("(?<![\\p{L}\\p{N}_.])[0-9]+(\\.[0-9]+)?");
    private static final Set<String> NONE_NEEDED = Set.of("0", "1");
    /** Longest first, so that no name is cut by one that is part of it. */
    private static final Comparator<String> LONGEST = Comparator.comparingInt(String::length).reversed();

    private final Model model;
    private final Set<Place> sourced;

    private OtherSources(Model model, Set<Place> sourced) {
        this.model = model;
        this.sourced = sourced;
    }

    /** @param sourced what sources are written on */
    static List<Prose> of(Model model, Set<Place> sourced) {
        if (sourced.contains(Place.of(Part.MODEL))) {
            return List.of();
        }
        OtherSources others = new OtherSources(model, sourced);
        List<Prose> open = new ArrayList<>();
        Chain chain = model.chain();
        if (!sourced.contains(Place.of(Part.START)) && chain.start().stream().anyMatch(OtherSources::isAmount)) {
            open.add(Prose.of("the start: ").and(StartProse.of(chain)));
        }
        chain.outputs().stream().filter(others::isOpen).forEach(output -> open.add(Prose.of("output ")
                .andName(output.name()).and(" = ").andName(output.definition())));
        model.costs().ifPresent(costs -> open.addAll(others.costs(costs)));
        return open;
    }

    private static boolean isAmount(Rational value) {
        return !value.isZero() && !value.isOne();
    }

    private boolean isOpen(Output output) {
        return !sourced.contains(Place.of(Part.OUTPUT, output.name()))
                && NUMBER.matcher(withoutNames(output.definition())).results()
                        .anyMatch(number -> !NONE_NEEDED.contains(number.group()));
    }

    private String withoutNames(String definition) {
        Chain chain = model.chain();
        String rest = definition;
        for (String name : Stream.of(chain.states().stream(), chain.sets().keySet().stream(),
                chain.outputs().stream().map(Output::name), model.parameters().stream().map(Model.Parameter::name))
                .flatMap(names -> names).sorted(LONGEST).toList()) {
            rest = NUMBER.matcher(name).matches() ? rest.replace("'" + name + "'", "n").replace(name + ":", "n:")
                    : rest.replace(name, "n");
        }
        return rest;
    }

    /** Amounts by state, those that aren't zero. */
    private List<Prose> inStates(List<Rational> amounts) {
        return IntStream.range(0, amounts.size()).filter(i -> !amounts.get(i).isZero())
                .mapToObj(i -> Prose.of(amounts.get(i) + " in ").andName(model.chain().states().get(i))).toList();
    }

    private List<Prose> costs(Costs costs) {
        List<Prose> open = new ArrayList<>();
        if (sourced.contains(Place.of(Part.COSTS))) {
            return open;
        }
        List<String> states = model.chain().states();
        List<Prose> eachStep = inStates(costs.eachStep());
        if (!eachStep.isEmpty() && !sourced.contains(Place.of(Part.COSTS_OF_EACH_STEP))) {
            open.add(Prose.of("costs of each step: ").and(Prose.joined(eachStep, ", ")));
        }
        if (!costs.moves().isEmpty() && !sourced.contains(Place.of(Part.COSTS_OF_MOVES))) {
            open.add(Prose.of("costs of moves: ").and(Prose.joined(costs.moves().stream().map(move ->
                    Prose.of(move.cost() + " from ").andName(states.get(move.from())).and(" to ")
                            .andName(states.get(move.to()))).toList(), ", ")));
        }
        costs.actions().forEach(each -> {
            List<Prose> inState = inStates(each.inState());
            if (!inState.isEmpty() && !sourced.contains(Place.named("costs of each " + each.action()))) {
                open.add(Prose.of("costs of each ").andName(each.action()).and(": ").and(Prose.joined(inState, ", ")));
            }
        });
        if (!costs.atStart().isZero() && !sourced.contains(Place.of(Part.COSTS_AT_START))) {
            open.add(Prose.of("costs at the start: " + costs.atStart()));
        }
        costs.discount().filter(rate -> !sourced.contains(Place.of(Part.DISCOUNT)))
                .ifPresent(rate -> open.add(Prose.of("discount: " + rate)));
        return open;
    }
}
