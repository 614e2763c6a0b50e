package org.pofk.check;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.pofk.chain.Output;
import org.pofk.exact.Rational;
import org.pofk.slip.SlipKind;

/** Slips on the way to a number: the root and the quadrant of a pair, a residue's factor, what a bound or a value is of. */
final class OtherSlips {
    private static final Pattern UNITS = Pattern.compile("([0-9]+) .*");

    private final Subject subject;
    private final Author author;
    private final Random random;
    private final List<Claimed> wrong = new ArrayList<>();

    private OtherSlips(Subject subject, Random random) {
        this.subject = subject;
        this.author = new Author(subject, random);
        this.random = random;
        subject.outputs().forEach(output -> {
            inPair(output);
            inResidues(output);
            inBound(output);
            inValue(output);
        });
    }

    static List<Claimed> of(Subject subject, Random random) {
        return new OtherSlips(subject, random).wrong;
    }

    private static String text(BigDecimal positive, Style style) {
        return Token.number(Token.Role.OTHER, 0, Real.of(positive), style).plain();
    }

    /** r² for r, and π − θ for θ. */
    private void inPair(Output output) {
        Style style = Style.significant(5 + random.nextInt(4));
        Optional<Map<String, String>> right = author.pairParts(output, style);
        if (right.isEmpty()) {
            return;
        }
        PolarNumber pole = PolarNumber.of(subject.modes(output).poles().stream().filter(each -> !each.isReal())
                .findFirst().orElseThrow().lambda());
        BigDecimal radius = pole.modulus().value();
        Map<String, String> squared = new LinkedHashMap<>(right.get());
        squared.put("radius", text(radius.multiply(radius), style));
        wrong.add(author.pair(output, squared, style).wrongBy(SlipKind.SQUARE_ROOT_FORGOTTEN));
        Map<String, String> turned = new LinkedHashMap<>(right.get());
        Real angle = Real.of(Elementary.PI.subtract(pole.positiveAngle().value()));
        turned.put("angle", turned.get("angle").endsWith("deg")
                ? text(PolarNumber.inDegrees(angle).value(), style) + " deg" : text(angle.value(), style));
        wrong.add(author.pair(output, turned, style).wrongBy(SlipKind.ANGLE_IN_ANOTHER_QUADRANT));
    }

    private void inResidues(Output output) {
        Modes modes = subject.modes(output);
        List<Modes.Pole> poles = modes.poles();
        if (poles.size() < 2 || !modes.impulses().isEmpty()
                || poles.stream().anyMatch(pole -> !pole.isReal() || pole.multiplicity() > 1)) {
            return;
        }
        Modes.Pole own = poles.get(random.nextInt(poles.size()));
        Modes.Pole other = poles.get((poles.indexOf(own) + 1) % poles.size());
        Num without = own.coefficients().get(0).times(own.lambda().plus(other.lambda().negate()));
        wrong.add(author.residues(output, poles.stream().map(pole -> pole == own
                        ? new Modes.Pole(pole.lambda(), List.of(without)) : pole).toList(),
                Style.significant(6)).wrongBy(SlipKind.RESIDUE_WITHOUT_A_FACTOR));
    }

    /** The limit, where p(k) goes clearly beyond it. */
    private void inBound(Output output) {
        List<Rational> limits = subject.longRun(output);
        if (limits.size() != 1 || !Approximations.settlesSoon(subject.modes(output))) {
            return;
        }
        BigDecimal limit = Near.of(limits.get(0)).real();
        BigDecimal clearly = new BigDecimal("0.001");
        boolean isMost = random.nextBoolean();
        boolean isPassed = subject.values(output).stream().anyMatch(value ->
                value.real().subtract(limit).multiply(BigDecimal.valueOf(isMost ? 1 : -1)).compareTo(clearly) > 0);
        if (isPassed) {
            wrong.add(author.bound(output, isMost, limit.setScale(6, RoundingMode.HALF_EVEN).toPlainString())
                    .wrongBy(SlipKind.LONG_RUN_FOR_THE_LARGEST));
        }
    }

    private void inValue(Output output) {
        int at = 1 + random.nextInt(6);
        Optional<Integer> units = subject.model().step().lasts().map(UNITS::matcher).filter(Matcher::matches)
                .map(found -> Integer.parseInt(found.group(1))).filter(count -> count > 1 && count * at <= Steps.LAST);
        units.ifPresent(count -> wrong.add(author.value(output, at, author.written(
                subject.steps().value(output, at * count), Style.significant(6))).wrongBy(SlipKind.TIME_FOR_STEPS)));
        BigDecimal value = subject.values(output).get(at).real();
        BigDecimal cut = value.setScale(2, RoundingMode.DOWN);
        if (cut.signum() > 0 && value.subtract(cut).compareTo(new BigDecimal("0.001")) > 0
                && new BigDecimal("0.0099").compareTo(value.subtract(cut)) > 0) {
            wrong.add(author.estimate(output, at, cut.toPlainString()).wrongBy(SlipKind.ROUNDED_TO_THE_UNSAFE_SIDE));
        }
    }
}
