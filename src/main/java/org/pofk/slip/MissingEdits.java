package org.pofk.slip;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.pofk.claim.AuthorText;
import org.pofk.claim.AuthorText.Replacement;
import org.pofk.exact.Ball;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.Formulas;
import org.pofk.modes.Mode;
import org.pofk.modes.ModeFormula;
import org.pofk.modes.RealValue;

/** One term of the right formula added at the end, with its numbers as the author would write them. */
final class MissingEdits {
    private static final int DIGITS = 6;

    private final AuthorText text;
    private final AuthorNotation notation;
    private final int digits;

    /** @param digits significant digits of decimals; 0 where the author writes none */
    MissingEdits(AuthorText text, int digits) {
        this.text = text;
        this.notation = AuthorNotation.of(text.notation());
        this.digits = digits;
    }

    /** One edit for each mode, in k. */
    List<Edit> ofSteps(List<Mode> modes) {
        StatedPoles stated = StatedPoles.ofSteps(text, digits);
        List<Edit> edits = new ArrayList<>();
        for (Mode mode : modes) {
            if (!stated.have(mode)) {
                edits.add(added(kind(mode), mode.accept(new InSteps())));
                mode.accept(new OtherShapes()).forEach(term -> edits.add(added(SlipKind.TERM_MISSING, term)));
                isNegativePole(mode).ifPresent(pole -> edits.add(added(SlipKind.SIGN_OF_A_POLE, turned(pole))));
            }
        }
        edits.addAll(impulses(modes, stated, new InSteps()::impulse));
        return edits;
    }

    /** One edit for each mode, in z, times a power of z: 0 where the author expands Y(z)/z. */
    List<Edit> ofTransform(List<Mode> modes, int powerOfZ) {
        StatedPoles stated = StatedPoles.ofTransform(text, digits);
        List<Edit> edits = new ArrayList<>();
        for (Mode mode : modes) {
            if (!stated.have(mode)) {
                mode.accept(new InZ(powerOfZ)).forEach(term -> edits.add(added(SlipKind.TERM_MISSING, term)));
            }
        }
        edits.addAll(impulses(modes, stated, impulse -> new InZ(powerOfZ).impulse(impulse).get(0)));
        return edits;
    }

    /** All of several impulses at once, which go when the pole at zero is left out. */
    private List<Edit> impulses(List<Mode> modes, StatedPoles stated, Function<Mode.Impulse, Formula> term) {
        List<Mode.Impulse> missing = modes.stream().filter(mode -> !stated.have(mode))
                .filter(Mode.Impulse.class::isInstance).map(Mode.Impulse.class::cast).toList();
        if (missing.size() < 2) {
            return List.of();
        }
        String right = missing.stream().map(impulse -> written(term.apply(impulse))).collect(Collectors.joining(" "));
        return List.of(added(SlipKind.IMPULSE_MISSING, right));
    }

    private static Optional<Mode.Geometric> isNegativePole(Mode mode) {
        return Optional.of(mode).filter(Mode.Geometric.class::isInstance).map(Mode.Geometric.class::cast)
                .filter(pole -> pole.power() == 0 && pole.base().rational().filter(base -> base.signum() < 0).isPresent());
    }

    /** What a negative pole's term is more than that of its opposite. */
    private Formula turned(Mode.Geometric mode) {
        Formula k = new Formula.Symbol("k");
        RealValue opposite = RealValue.of(mode.base().rational().orElseThrow().negate());
        return Formulas.product(number(mode.coefficient()), Formulas.sum(List.of(
                Formulas.power(number(mode.base()), k), Formulas.negated(Formulas.power(number(opposite), k)))));
    }

    private boolean isComplex() {
        return text.tree().nodes().anyMatch(node -> node.formula() == Formula.Constant.I);
    }

    private static SlipKind kind(Mode mode) {
        return mode instanceof Mode.Impulse impulse && impulse.at() == 0
                ? SlipKind.IMPULSE_MISSING : SlipKind.TERM_MISSING;
    }

    private Edit added(SlipKind kind, Formula term) {
        return added(kind, written(term));
    }

    /** With its sign. */
    private String written(Formula term) {
        boolean negative = term instanceof Formula.Negation;
        return (negative ? "- " : "+ ") + notation.write(negative ? ((Formula.Negation) term).operand() : term);
    }

    private Edit added(SlipKind kind, String right) {
        int end = text.text().length();
        return new Edit(kind, List.of(new Replacement(end, end, " " + right)), text.place(), "", right);
    }

    private Formula number(RealValue value) {
        if (digits == 0 && value.exact().isPresent()) {
            return value.exact().get();
        }
        boolean whole = value.rational().filter(Rational::isInteger).isPresent();
        int shown = digits == 0 ? DIGITS : digits;
        return whole ? value.exact().orElseThrow()
                : Formulas.decimal(TrueNumber.padded(value.decimal(shown).text(), shown));
    }

    /** The term in k. */
    private final class InSteps implements Mode.Visitor<Formula> {
        @Override
        public Formula impulse(Mode.Impulse impulse) {
            return ModeFormula.impulse(number(impulse.value()), impulse.at());
        }

        @Override
        public Formula geometric(Mode.Geometric mode) {
            return ModeFormula.geometric(number(mode.coefficient()), mode.power(), number(mode.base()));
        }

        @Override
        public Formula oscillating(Mode.Oscillating mode) {
            return ModeFormula.oscillating(number(mode.amplitude()), mode.power(), number(mode.modulus()),
                    number(mode.angle()), number(mode.phase()));
        }
    }

    /** The term in z, times a power of z. */
    private final class InZ implements Mode.Visitor<List<Formula>> {
        private static final Formula.Symbol Z = new Formula.Symbol("z");

        private final int powerOfZ;

        InZ(int powerOfZ) {
            this.powerOfZ = powerOfZ;
        }

        @Override
        public List<Formula> impulse(Mode.Impulse impulse) {
            int power = impulse.at() + 1 - powerOfZ;
            Formula value = number(impulse.value());
            return List.of(power == 0 ? value
                    : Formulas.quotient(value, Formulas.power(Z, Formulas.number(power))));
        }

        @Override
        public List<Formula> geometric(Mode.Geometric mode) {
            Formula above = Formulas.product(number(mode.coefficient()), Formulas.power(Z, Formulas.number(powerOfZ)));
            Formula below = Formulas.power(Formulas.sum(List.of(Z, Formulas.opposite(number(mode.base())))),
                    Formulas.number(mode.power() + 1));
            return List.of(Formulas.quotient(above, below));
        }

        @Override
        public List<Formula> oscillating(Mode.Oscillating mode) {
            PairTerms pair = new PairTerms(mode, MissingEdits.this::number);
            return isComplex() ? pair.inZ(powerOfZ) : pair.together(powerOfZ).stream().toList();
        }
    }

    /** Parts of a mode as others write it: c k^p r^k, and the cosine and the sine without a phase. */
    private final class OtherShapes implements Mode.Visitor<List<Formula>> {
        private static final Formula.Symbol K = new Formula.Symbol("k");

        @Override
        public List<Formula> impulse(Mode.Impulse impulse) {
            return List.of();
        }

        @Override
        public List<Formula> geometric(Mode.Geometric mode) {
            if (mode.power() == 0) {
                return List.of();
            }
            Formula base = number(mode.base());
            List<Formula> terms = new ArrayList<>();
            Optional<Rational> exact = mode.base().rational().filter(value -> mode.coefficient().rational().isPresent());
            for (int power = 1; power <= mode.power(); power++) {
                // the highest power of k in binomial(k, p) r^(k−p), and the lower ones as far as p = 2 has them
                Rational weight = power == mode.power() ? factorial(power).inverse() : Rational.HALF.negate();
                int p = mode.power();
                RealValue value = exact.map(r -> RealValue.of(mode.coefficient().rational().get().times(weight)
                        .dividedBy(r.pow(p)))).orElseGet(() -> new RealValue(Optional.empty(),
                                mode.coefficient().enclosure().times(Enclosed.of(weight))
                                        .dividedBy(mode.base().enclosure().map(ball -> ball.pow(p)))));
                terms.add(Formulas.product(List.of(number(value), Formulas.power(K, Formulas.number(power)),
                        Formulas.power(base, K))));
            }
            return terms;
        }

        private static Rational factorial(int n) {
            return n < 2 ? Rational.ONE : Rational.of(n).times(factorial(n - 1));
        }

        @Override
        public List<Formula> oscillating(Mode.Oscillating mode) {
            return isComplex() ? new PairTerms(mode, MissingEdits.this::number).inSteps()
                    : List.of(part(mode, Formula.Function.COS, mode.phase().enclosure().map(Ball::cos)),
                    part(mode, Formula.Function.SIN, mode.phase().enclosure().map(Ball::sin).negate()));
        }

        private Formula part(Mode.Oscillating mode, Formula.Function function, Enclosed share) {
            RealValue value = new RealValue(Optional.empty(), mode.amplitude().enclosure().times(share));
            return Formulas.product(List.of(number(value), ModeFormula.binomial(mode.power()),
                    Formulas.power(number(mode.modulus()), ModeFormula.kMinus(mode.power())), Formulas.call(function,
                            Formulas.overDenominator(number(mode.angle()), ModeFormula.kMinus(mode.power())))));
        }
    }
}
