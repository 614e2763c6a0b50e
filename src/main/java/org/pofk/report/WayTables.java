package org.pofk.report;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import org.pofk.formula.Formula;
import org.pofk.modes.Derivation;
import org.pofk.modes.Derivation.FactorStep;
import org.pofk.modes.Derivation.PairStep;
import org.pofk.modes.Mode;
import org.pofk.modes.TablePair;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Table;

/** The pairs of the table of transforms that are used, numbered, and the terms with the pair each of them comes from. */
final class WayTables {
    private final Derivation derivation;
    private final NumberFormula numbers;
    private final List<TablePair> pairs;

    WayTables(Derivation derivation, NumberFormula numbers) {
        this.derivation = derivation;
        this.numbers = numbers;
        Set<TablePair> used = new LinkedHashSet<>();
        derivation.impulses().forEach(step -> used.add(step.pair()));
        derivation.factors().forEach(step -> {
            step.real().forEach(real -> used.add(real.pair()));
            step.pairs().forEach(pair -> used.add(pair.pair()));
        });
        this.pairs = List.copyOf(used);
    }

    List<Block> blocks() {
        List<List<Prose>> used = IntStream.range(0, pairs.size()).mapToObj(i -> List.of(Prose.of("(" + (i + 1) + ")"),
                Prose.formula(pairs.get(i).transform()), Prose.formula(pairs.get(i).sequence()))).toList();
        return List.of(new Table(Prose.of("Pairs of the table of transforms"),
                List.of(Prose.of("pair"), Prose.of("in z"), Prose.of("in k")), used),
                new Table(Prose.of("Poles λ, coefficients R and the terms they become"), List.of(Prose.of("λ"),
                        Prose.of("R"), Prose.of("by pair"), Prose.of("term")), terms()));
    }

    private List<List<Prose>> terms() {
        List<List<Prose>> rows = new ArrayList<>();
        derivation.impulses().forEach(step -> rows.add(row(Prose.of("none"), Prose.formula(numbers.of(
                step.mode().value())), step.pair(), term(step.mode()))));
        int joined = 0;
        for (FactorStep step : derivation.factors()) {
            step.real().forEach(real -> rows.add(row(Prose.formula(numbers.of(real.mode().base())),
                    Prose.formula(numbers.of(real.mode().coefficient())), real.pair(), term(real.mode()))));
            for (PairStep pair : step.pairs()) {
                rows.add(pair(pair, joined++ < PairBlocks.WORKED_UP_TO ? Prose.of("joined below") : term(pair.mode())));
            }
        }
        return rows;
    }

    private Prose term(Mode mode) {
        return Prose.formula(mode.accept(new ModeTerm(numbers)));
    }

    private List<Prose> row(Prose pole, Prose coefficient, TablePair pair, Prose term) {
        return List.of(pole, coefficient, Prose.of("(" + (pairs.indexOf(pair) + 1) + ")"), term);
    }

    private List<Prose> pair(PairStep pair, Prose term) {
        return row(polar(numbers.of(pair.mode().modulus()), numbers.angle(pair.mode().angle())),
                polar(numbers.of(pair.modulus()), numbers.angle(pair.argument())), pair.pair(), term);
    }

    /** A complex number of a pair, the other with the angle turned round. */
    static Prose polar(Formula modulus, Formula angle) {
        return Prose.formula(modulus).and(" at ").andFormula(angle);
    }
}
