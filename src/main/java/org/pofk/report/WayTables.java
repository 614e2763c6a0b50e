package org.pofk.report;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import org.pofk.modes.Derivation;
import org.pofk.modes.Derivation.FactorStep;
import org.pofk.modes.Derivation.PairStep;
import org.pofk.modes.Mode;
import org.pofk.modes.RealValue;
import org.pofk.modes.TablePair;
import org.pofk.report.Document.Block;
import org.pofk.report.Document.Table;

/** The pairs of the table of transforms that a way uses, and the terms that become of its poles. */
final class WayTables {
    /** More of them stand in the formula alone. */
    private static final int TERMS_WRITTEN_UP_TO = 12;
    private static final String AT_ANGLE = "; a complex number is written as its modulus at its angle";

    private final NumberFormula numbers;
    private final List<Term> terms = new ArrayList<>();
    private final List<TablePair> pairs;

    /** What stands for a term: of which kind its pole is, the pole and the coefficient as shown, and what it becomes. */
    private record Term(Kind kind, Prose pole, Prose coefficient, TablePair pair, Mode mode) {
    }

    private enum Kind {
        IMPULSE("impulse"), REAL("real"), PAIR("pair");

        private final String word;

        Kind(String word) {
            this.word = word;
        }
    }

    WayTables(Derivation derivation, NumberFormula numbers) {
        this.numbers = numbers;
        derivation.impulses().forEach(step -> terms.add(new Term(Kind.IMPULSE, Prose.EMPTY, Prose.EMPTY, step.pair(),
                step.mode())));
        for (FactorStep step : derivation.factors()) {
            step.real().forEach(real -> terms.add(new Term(Kind.REAL, numbers.marked(real.mode().base()),
                    numbers.marked(real.mode().coefficient()), real.pair(), real.mode())));
            step.pairs().forEach(pair -> terms.add(new Term(Kind.PAIR, pole(pair, numbers), polar(
                    pair.modulus(), pair.argument(), numbers), pair.pair(), pair.mode())));
        }
        Set<TablePair> used = new LinkedHashSet<>();
        terms.forEach(term -> used.add(term.pair));
        this.pairs = List.copyOf(used);
    }

    private boolean hasPairs() {
        return terms.stream().anyMatch(term -> term.kind == Kind.PAIR);
    }

    /** With each term in full. */
    List<Block> inFull() {
        return List.of(new Table(Prose.of("Table pairs used"), List.of(Prose.of("in z"), Prose.of("in k")),
                pairs.stream().map(WayTables::pair).toList()),
                new Table(Prose.of("Poles, coefficients and the terms they become" + (hasPairs()
                        ? "; λ, R and their conjugates join to 2|R| |λ|^k cos(arg λ · k + arg R)" + AT_ANGLE : "")),
                        List.of(Prose.of("pole"), Prose.of("λ"), Prose.of("R"), Prose.of("term")),
                        terms.stream().map(term -> List.of(Prose.of(term.kind.word), term.pole, term.coefficient,
                                formula(term))).toList()));
    }

    /** With the number of the pair that each term comes from; the conjugate pairs that are worked out below say so. */
    List<Block> numbered() {
        List<List<Prose>> used = IntStream.range(0, pairs.size()).mapToObj(i -> List.of(number(pairs.get(i)),
                pair(pairs.get(i)).get(0), pair(pairs.get(i)).get(1))).toList();
        Table first = new Table(Prose.of("Pairs of the table of transforms"),
                List.of(Prose.of("pair"), Prose.of("in z"), Prose.of("in k")), used);
        String angles = hasPairs() ? AT_ANGLE : "";
        if (terms.size() > TERMS_WRITTEN_UP_TO) {
            return List.of(first, new Table(Prose.of("Poles λ and coefficients R; the terms they become are those of the"
                    + " formula below" + angles), List.of(Prose.of("λ"), Prose.of("R"), Prose.of("by pair")),
                    terms.stream().map(term -> List.of(pole(term), term.coefficient, number(term.pair))).toList()));
        }
        List<Mode> joined = terms.stream().filter(term -> term.kind == Kind.PAIR).map(Term::mode)
                .limit(PairBlocks.WORKED_UP_TO).toList();
        return List.of(first,
                new Table(Prose.of("Poles λ, coefficients R and the terms they become" + angles), List.of(Prose.of("λ"),
                        Prose.of("R"), Prose.of("by pair"), Prose.of("term")), terms.stream().map(term -> List.of(
                                pole(term), term.coefficient,
                                number(term.pair), joined.contains(term.mode) ? Prose.of("joined below")
                                        : formula(term))).toList()));
    }

    private static Prose pole(Term term) {
        return term.kind == Kind.IMPULSE ? Prose.of("none") : term.pole;
    }

    private Prose number(TablePair pair) {
        return Prose.of("(" + (pairs.indexOf(pair) + 1) + ")");
    }

    private static List<Prose> pair(TablePair pair) {
        return List.of(Prose.formula(pair.transform()), Prose.formula(pair.sequence()));
    }

    private Prose formula(Term term) {
        return ModeRounding.marked(term.mode, numbers);
    }

    /** The pole of a pair that lies above the real axis. */
    static Prose pole(PairStep pair, NumberFormula numbers) {
        return polar(pair.mode().modulus(), pair.mode().angle(), numbers);
    }

    /** Modulus and angle; one mark is enough for both. */
    private static Prose polar(RealValue modulus, RealValue angle, NumberFormula numbers) {
        return Prose.of(numbers.isRounded(modulus) || numbers.isRoundedAngle(angle) ? NumberFormula.ROUNDED : "")
                .andFormula(numbers.of(modulus)).and(" at ").andFormula(numbers.angle(angle));
    }
}
