package org.pofk.check;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.function.UnaryOperator;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.check.Token.Role;

/**
 * Formulas that are right only nearly and say how nearly: some coefficients are off by about a percent; what that makes
 * at most is found by evaluating, and claimed with some room, or with too little.
 */
final class Approximations {
    /** How much of the largest error is claimed. */
    enum Room {
        ENOUGH("1.25"), TOO_LITTLE("0.8");

        private final BigDecimal part;

        Room(String part) {
            this.part = new BigDecimal(part);
        }
    }

    private static final BigDecimal SLOW = new BigDecimal("0.93");
    /** More than all poles but the one at one, rounded or not, come to where the steps end. */
    private static final BigDecimal STAYS = new BigDecimal("0.0001");

    private Approximations() {
    }

    /** Only where 200 steps tell the largest error over all: poles within 0.93 but for one at one. */
    static Optional<Claimed> of(Subject subject, Output output, Author author, Room room, Random random) {
        Modes modes = subject.modes(output);
        Optional<List<Token>> tokens = FormulaWriter.write(modes, Style.significant(5), Notation.PLAIN, random);
        if (!settlesSoon(modes) || tokens.isEmpty() || subject.chain().kind() != Chain.Kind.CHAIN) {
            return Optional.empty();
        }
        List<Token> near = new ArrayList<>();
        for (Token token : tokens.get()) {
            near.add(token.role() == Role.COEFFICIENT && token.isDecimal() && !token.plain().contains("e")
                    ? token.as(new BigDecimal(token.plain()).multiply(BigDecimal.valueOf(990 + random.nextInt(20), 3))
                            .setScale(new BigDecimal(token.plain()).scale(), RoundingMode.HALF_EVEN).toPlainString())
                    : token);
        }
        return claimed(subject, output, near, room, random);
    }

    /** Whether what is true of 200 steps of sixty digits is true of all that a claim's digits can tell. */
    static boolean settlesSoon(Modes modes) {
        return modes.poles().stream().allMatch(pole -> pole.lambda().isOne()
                ? pole.multiplicity() == 1 : pole.lambda().value().upperModulus().compareTo(SLOW) < 0);
    }

    private static Optional<Claimed> claimed(Subject subject, Output output, List<Token> tokens, Room room,
            Random random) {
        String text = Pieces.plain(tokens);
        List<Near> values = subject.values(output);
        UnaryOperator<Near> formula = Evaluator.of(text, "0");
        boolean isRelative = random.nextBoolean()
                && values.stream().allMatch(value -> value.real().compareTo(new BigDecimal("0.001")) > 0);
        BigDecimal largest = BigDecimal.ZERO;
        boolean isAbove = true;
        boolean isBelow = true;
        BigDecimal last = BigDecimal.ZERO;
        for (int k = 0; k <= Steps.LAST; k += k < 40 ? 1 : 20) {
            BigDecimal error = formula.apply(Near.exactly(k)).minus(values.get(k)).real();
            BigDecimal size = isRelative ? error.divide(values.get(k).real(), Near.CENTRE) : error;
            largest = largest.max(size.abs());
            last = error.abs();
            isAbove &= error.signum() >= 0 && error.abs().compareTo(BigDecimal.ONE.movePointLeft(40)) > 0;
            isBelow &= error.signum() <= 0 && error.abs().compareTo(BigDecimal.ONE.movePointLeft(40)) > 0;
        }
        if (largest.compareTo(new BigDecimal("0.00001")) < 0) {
            return Optional.empty();
        }
        BigDecimal within = largest.multiply(room.part).round(new MathContext(2,
                room == Room.ENOUGH ? RoundingMode.CEILING : RoundingMode.FLOOR));
        String amount = isRelative ? within.movePointRight(2).toPlainString() + "%" : within.toPlainString();
        List<String> keys = new ArrayList<>(List.of("formula", Claimed.quoted(output.name()), "is",
                Claimed.quoted(text), "within", amount));
        if ((isAbove || isBelow) && last.compareTo(STAYS) > 0) {
            keys.addAll(List.of("safe side", isAbove == (room == Room.ENOUGH) ? "above" : "below"));
        }
        boolean isRight = room == Room.ENOUGH;
        return Optional.of(new Claimed(subject, "formula approximate", Claimed.line(keys.toArray(String[]::new)),
                List.of(), isRight ? Claimed.Truly.RIGHT : Claimed.Truly.WRONG,
                units -> !isRight));
    }
}
