package org.pofk.slip;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.claim.Claim;
import org.pofk.claim.FormulaText;
import org.pofk.claim.Statement;
import org.pofk.claim.Truth;
import org.pofk.exact.Ball;
import org.pofk.exact.ComplexBall;
import org.pofk.exact.Rational;
import org.pofk.meaning.Precision;
import org.pofk.meaning.StepEvaluation;
import org.pofk.slip.FormulaSurvey.Role;

/**
 * Refutes what can't be stated of any pair of an output: a radius or an amplitude that is none of them up to its sign,
 * an angle or a phase that is none of them up to its sign and half turns. What isn't refuted is still to be judged.
 */
final class PairScreen {
    private static final int BITS = 96;
    private static final int HALF_TURNS = 6;
    private static final Rational ALLOWANCE = Rational.of(3);
    private static final Rational NOISE = Rational.TWO.pow(-48);

    private final List<StatementPart> parts;
    private final List<List<Rational>> right;
    private final Precision precision;
    private final List<Integer> wrong;

    private PairScreen(List<StatementPart> parts, List<List<Rational>> right, Precision precision) {
        this.parts = parts;
        this.right = right;
        this.precision = precision;
        this.wrong = IntStream.range(0, parts.size()).filter(part -> !isNearAny(part, parts.get(part).text())).boxed()
                .toList();
    }

    /** For a claim about a pair. */
    static Optional<PairScreen> of(Claim claim, Truth truth) {
        if (!(claim.statement() instanceof Statement.Pair)) {
            return Optional.empty();
        }
        List<StatementPart> parts = StatementPart.of(claim.statement());
        return Optional.of(new PairScreen(parts, parts.stream().map(part -> values(claim, part, truth)).toList(),
                new Precision(claim.carried())));
    }

    private static List<Rational> values(Claim claim, StatementPart part, Truth truth) {
        boolean turns = part.name().equals("angle") || part.name().equals("phase");
        Role role = switch (part.name()) {
            case "radius" -> Role.POLE;
            case "amplitude" -> Role.COEFFICIENT;
            case "angle" -> Role.ANGLE;
            default -> Role.PHASE;
        };
        List<Rational> values = new ArrayList<>();
        for (TrueNumber number : TrueNumbers.ofRole(claim.statement(), role, truth)) {
            Ball value = number.enclosure().enclose(BITS);
            for (int n = turns ? -HALF_TURNS : 0; n <= (turns ? HALF_TURNS : 0); n++) {
                Ball turned = value.plus(Ball.pi(BITS).times(n));
                values.add(turned.middle());
                values.add(turned.middle().negate());
            }
        }
        return values;
    }

    /** Whether every part may be right, with another text in the place of one. */
    boolean mayBeRight(int changed, FormulaText text) {
        return wrong.stream().allMatch(part -> part == changed) && isNearAny(changed, text);
    }

    private boolean isNearAny(int part, FormulaText text) {
        Optional<Ball> value = StepEvaluation.spread(text.parsed(), precision, 0, BITS).map(ComplexBall::real);
        return value.isEmpty() || right.get(part).isEmpty()
                || isNearAny(value.get(), right.get(part));
    }

    private static boolean isNearAny(Ball spread, List<Rational> right) {
        Rational open = spread.upper().minus(spread.lower()).times(Rational.HALF).times(ALLOWANCE).plus(NOISE);
        Rational middle = spread.middle();
        return right.stream().anyMatch(each -> middle.minus(each).abs().compareTo(open) <= 0);
    }
}
