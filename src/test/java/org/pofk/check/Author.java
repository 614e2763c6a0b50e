package org.pofk.check;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.function.Function;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.check.Modes.Pole;
import org.pofk.check.Real.Radicals;
import org.pofk.exact.Rational;
import org.pofk.slip.SlipKind;

/**
 * Writes the steps of a derivation about one model: what is written comes from {@code believed}, what it is held
 * against from {@code subject}. For right claims both are the same.
 */
final class Author {
    private final Subject subject;
    private final Subject believed;
    private final List<SlipKind> slips;
    private final Random random;

    Author(Subject subject, Random random) {
        this(subject, subject, List.of(), random);
    }

    /** An author who takes the model for another. */
    Author(Subject subject, Subject believed, List<SlipKind> slips, Random random) {
        this.subject = subject;
        this.believed = believed;
        this.slips = slips;
        this.random = random;
    }

    private Claimed claim(String shape, String yaml, Function<String, Boolean> provenWrong) {
        return new Claimed(subject, shape, yaml, slips, slips.isEmpty() ? Claimed.Truly.RIGHT : Claimed.Truly.WRONG,
                provenWrong);
    }


    List<SlipKind> slips() {
        return slips;
    }

    // ---- formulas

    /** p(k) in a notation, for every k. */
    Optional<Claimed> formula(Output output, Output written, Style style, Notation notation) {
        String[] carried = style.trim() ? new String[] {"carried", style.carried()} : new String[0];
        return FormulaWriter.write(believed.modes(written), style, notation, random)
                .map(tokens -> formula(output, tokens, notation + " " + style.kind() + (style.trim() ? " trimmed" : ""),
                        0, random.nextInt(6) == 0, carried));
    }

    /** p(k) from the step on at which the impulses are over. */
    Optional<Claimed> formulaWithoutImpulses(Output output, Style style, Notation notation) {
        Modes modes = believed.modes(output);
        int from = Math.max(modes.impulses().size(), random.nextInt(3));
        return FormulaWriter.writeWithoutImpulses(modes, style, notation, random)
                .map(tokens -> formula(output, tokens, "from a later step " + style.kind(), from));
    }

    Claimed formula(Output output, List<Token> tokens, String shape, int from) {
        String[] steps = from == 0 ? new String[0] : new String[] {"for", "k >= " + from};
        return formula(output, tokens, shape, from, random.nextInt(6) == 0, steps);
    }

    private Claimed formula(Output output, List<Token> tokens, String shape, int from, boolean isLatex,
            String... more) {
        String text = Pieces.plain(tokens);
        List<String> keys = new ArrayList<>(List.of("formula", Claimed.quoted(output.name()),
                isLatex ? "is-latex" : "is", Claimed.quoted(isLatex ? Pieces.latex(tokens) : text)));
        keys.addAll(List.of(more));
        return claim("formula " + shape + (isLatex ? " in LaTeX" : ""), Claimed.line(keys.toArray(String[]::new)),
                Arbiter.formula(text, subject.values(output), from));
    }

    // ---- transforms

    Optional<Claimed> transform(Output output, Output written, Style style, TransformWriter.Shape shape) {
        boolean isOverZ = random.nextInt(3) == 0;
        Modes modes = believed.modes(written);
        return (isOverZ ? TransformWriter.writeOverZ(modes, style, shape, random)
                : TransformWriter.write(modes, style, shape, random))
                .map(tokens -> transform(output, tokens, style, shape, isOverZ));
    }

    Claimed transform(Output output, List<Token> tokens, Style style, TransformWriter.Shape shape, boolean isOverZ) {
        boolean isFractions = shape == TransformWriter.Shape.FRACTIONS
                || shape == TransformWriter.Shape.COMPLEX_FRACTIONS;
        String kind = isOverZ ? "transform over z" : isFractions && random.nextBoolean() ? "expansion" : "transform";
        String text = Pieces.plain(tokens);
        boolean isLatex = random.nextInt(6) == 0;
        List<Near> points = subject.points(output);
        List<Near> values = subject.transformValues(output, isOverZ);
        return claim(kind + " " + shape + " " + style.kind() + (isLatex ? " in LaTeX" : ""),
                Claimed.line(kind, Claimed.quoted(output.name()), isLatex ? "is-latex" : "is",
                        Claimed.quoted(isLatex ? Pieces.latex(tokens) : text)),
                Arbiter.transform(text, points, values));
    }

    // ---- numbers

    private String number(Num value, Style style) {
        String digits = Token.number(Token.Role.OTHER, 0, Real.of(value.abs(), Radicals.APART), style).plain();
        return (value.signum() < 0 ? "-" : "") + digits;
    }


    String written(Rational value, Style style) {
        return value.isZero() ? "0" : number(Num.of(value), style);
    }

    Claimed value(Output output, Output written, Style style) {
        int at = random.nextInt(12);
        Rational value = believed.steps().value(written, at);
        Style own = style.isExact() && value.denominator().bitLength() > 80 ? Style.significant(6) : style;
        return value(output, at, written(value, own));
    }

    Claimed value(Output output, int at, String text) {
        return claim("value", Claimed.line("value", Claimed.quoted(output.name()), "at", "" + at, "is",
                        Claimed.quoted(text)),
                Arbiter.number(text, Near.of(subject.steps().value(output, at))));
    }

    /** A value that is meant to be above the true one, and isn't. */
    Claimed estimate(Output output, int at, String text) {
        BigDecimal truth = subject.values(output).get(at).real();
        return claim("estimate", Claimed.line("value", Claimed.quoted(output.name()), "at", "" + at, "is",
                Claimed.quoted(text), "within", "0.02", "safe side", "above"),
                units -> new BigDecimal(text).compareTo(truth) < 0);
    }

    /** The poles of Y(z) with their multiplicities. */
    Optional<Claimed> poles(Output output, Output written, Style style) {
        return Optional.of(poles(output, poleTexts(written, style), style));
    }

    List<String> poleTexts(Output written, Style style) {
        Modes modes = believed.modes(written);
        List<String> texts = new ArrayList<>();
        for (Pole pole : modes.poles()) {
            texts.add(poleText(pole.lambda(), style) + times(pole.multiplicity()));
        }
        int atZero = modes.form().transform().y().denominator().lowestPower();
        if (atZero > 0) {
            texts.add("0" + times(atZero));
        }
        Collections.shuffle(texts, random);
        return texts;
    }

    private static String times(int multiplicity) {
        return multiplicity == 1 ? "" : multiplicity == 2 ? " (twice)" : " (" + multiplicity + " times)";
    }

    private String poleText(Num lambda, Style style) {
        if (lambda.isReal()) {
            return number(lambda, style);
        }
        Num x = lambda.realPart();
        String imaginary = number(lambda.imaginaryPart(), style);
        return (x.isNothing() ? "" : number(x, style) + " ") + "± " + imaginary + "*i";
    }

    Claimed poles(Output output, List<String> texts, Style style) {
        List<Near> truth = subject.poles(output);
        return claim("poles " + style.kind(), Claimed.line("poles", Claimed.quoted(output.name()), "are",
                        texts.stream().map(Claimed::quoted).toList().toString()),
                units -> Arbiter.cannotBePaired(PoleText.read(texts, units), truth));
    }

    /** Coefficients by pole; only of outputs without impulses. */
    Optional<Claimed> residues(Output output, Style style) {
        Modes modes = believed.modes(output);
        return modes.impulses().isEmpty() ? Optional.of(residues(output, modes.poles(), style)) : Optional.empty();
    }

    /** Stated for these poles, in the order of the true ones. */
    Claimed residues(Output output, List<Pole> poles, Style style) {
        Map<String, String> entries = new LinkedHashMap<>();
        List<Function<String, Boolean>> checks = new ArrayList<>();
        for (int place = 0; place < poles.size(); place++) {
            Pole pole = poles.get(place);
            List<Num> truth = subject.modes(output).poles().get(place).coefficients();
            for (int side = 1; side >= (pole.isReal() ? 1 : -1); side -= 2) {
                List<String> coefficients = new ArrayList<>();
                for (int power = 0; power < pole.coefficients().size(); power++) {
                    Num coefficient = pole.coefficients().get(power);
                    String text = coefficient.isNothing() ? "0" : complexText(coefficient, side, style);
                    coefficients.add(Claimed.quoted(text));
                    Near value = truth.get(power).value().widened(BigDecimal.ONE.movePointLeft(50));
                    checks.add(Arbiter.number(text, side > 0 ? value : value.conjugate()));
                }
                entries.put(complexText(pole.lambda(), side, style),
                        coefficients.size() == 1 ? coefficients.get(0) : coefficients.toString());
            }
        }
        return claim("residues " + style.kind(), Claimed.line("residues", Claimed.quoted(output.name()),
                "are", Claimed.mapping(entries)), Arbiter.some(checks));
    }

    private String complexText(Num value, int side, Style style) {
        if (value.isReal() || value.imaginaryPart().isNothing()) {
            return number(value.isReal() ? value : value.realPart(), style);
        }
        Num x = value.realPart();
        Num y = value.imaginaryPart();
        boolean isMinus = y.signum() * side < 0;
        return (x.isNothing() ? isMinus ? "-" : "" : number(x, style) + (isMinus ? " - " : " + "))
                + number(y.abs(), style) + "*i";
    }

    /** Radius, angle, amplitude and phase of the only pair. */
    Optional<Claimed> pair(Output output, Style style) {
        return pairParts(output, style).map(parts -> pair(output, parts, style));
    }

    Optional<Map<String, String>> pairParts(Output output, Style style) {
        List<Pole> pairs = believed.modes(output).poles().stream().filter(pole -> !pole.isReal()).toList();
        if (pairs.size() != 1 || pairs.get(0).multiplicity() > 1) {
            return Optional.empty();
        }
        PolarNumber lambda = PolarNumber.of(pairs.get(0).lambda());
        PolarNumber c = PolarNumber.of(pairs.get(0).coefficients().get(0));
        boolean isDegrees = random.nextBoolean();
        Map<String, String> parts = new LinkedHashMap<>();
        parts.put("radius", positive(lambda.modulus(), style));
        parts.put("angle", angleText(lambda.positiveAngle(), 1, style, isDegrees));
        parts.put("amplitude", positive(c.twiceModulus(), style));
        parts.put("phase", PhaseOf.of(c, PhaseOf.Turn.NONE)
                .map(phase -> angleText(phase.size(), phase.sign(), style, isDegrees)).orElse("0"));
        return Optional.of(parts);
    }

    private static String positive(Real value, Style style) {
        return Token.number(Token.Role.OTHER, 0, value, style).plain();
    }

    private static String angleText(Real angle, int sign, Style style, boolean isDegrees) {
        return (sign < 0 ? "-" : "")
                + (isDegrees ? positive(PolarNumber.inDegrees(angle), style) + " deg" : positive(angle, style));
    }

    Claimed pair(Output output, Map<String, String> parts, Style style) {
        Pole pole = subject.modes(output).poles().stream().filter(each -> !each.isReal()).findFirst().orElseThrow();
        PolarNumber lambda = PolarNumber.of(pole.lambda());
        PolarNumber c = PolarNumber.of(pole.coefficients().get(0));
        List<Function<String, Boolean>> checks = List.of(
                Arbiter.number(parts.get("radius"), known(lambda.modulus().value())),
                Arbiter.number(parts.get("angle"), known(lambda.angle())),
                Arbiter.number(parts.get("amplitude"), known(c.twiceModulus().value())),
                units -> Evaluator.constant(parts.get("phase"), units).differsFrom(known(c.angle()))
                        && Evaluator.constant(parts.get("phase"), units).differsFrom(known(c.angle().negate())
                                .plus(Near.exactly(c.angle().abs().compareTo(new BigDecimal("3.14159")) > 0
                                        ? BigDecimal.ZERO : new BigDecimal("1e9")))));
        List<String> keys = new ArrayList<>(List.of("pair", Claimed.quoted(output.name())));
        parts.forEach((key, text) -> keys.addAll(List.of(key, Claimed.quoted(text))));
        return claim("pair " + style.kind(), Claimed.line(keys.toArray(String[]::new)), Arbiter.some(checks));
    }

    /** What arithmetic to sixty digits knows of a number. */
    private static Near known(BigDecimal value) {
        return Near.exactly(value).widened(BigDecimal.ONE.movePointLeft(50));
    }

    // ---- long runs

    Optional<Claimed> longRun(Output output, Output written, Style style) {
        List<Rational> values = believed.longRun(written);
        List<String> texts = values.stream().map(value -> written(value, style)).toList();
        return values.isEmpty() ? Optional.empty() : Optional.of(longRun(output, texts, style));
    }

    Claimed longRun(Output output, List<String> texts, Style style) {
        List<Rational> truth = subject.longRun(output);
        String is = texts.size() == 1 ? Claimed.quoted(texts.get(0))
                : texts.stream().map(Claimed::quoted).toList().toString();
        return claim("long run " + style.kind(), Claimed.line("long run", Claimed.quoted(output.name()),
                texts.size() == 1 ? "is" : "are", is), units -> texts.size() != truth.size()
                        || anyDiffers(texts, truth, units));
    }

    private static boolean anyDiffers(List<String> texts, List<Rational> truth, String units) {
        for (int i = 0; i < texts.size(); i++) {
            if (Evaluator.constant(texts.get(i), units).differsFrom(Near.of(truth.get(i)))) {
                return true;
            }
        }
        return false;
    }

    /** Limits of every state; nothing where some state has none. */
    Optional<Claimed> longRuns(Style style) {
        return longRunTexts(style).map(texts -> longRuns(texts, style));
    }

    Optional<Map<String, String>> longRunTexts(Style style) {
        Map<String, String> texts = new LinkedHashMap<>();
        if (subject.chain().states().contains("all")) {
            return Optional.empty();
        }
        longRunValues().forEach((name, value) -> texts.put(name, written(value, style)));
        return texts.isEmpty() ? Optional.empty() : Optional.of(texts);
    }

    /** The limit of each state; none where some state has no limit. */
    Map<String, Rational> longRunValues() {
        Map<String, Rational> limits = new LinkedHashMap<>();
        for (Output state : Outputs.states(believed.chain())) {
            List<Rational> values = believed.longRun(state);
            if (values.size() != 1) {
                return Map.of();
            }
            limits.put(state.name(), values.get(0));
        }
        return limits;
    }

    Claimed longRuns(Map<String, String> texts, Style style) {
        List<Function<String, Boolean>> checks = new ArrayList<>();
        for (Output state : Outputs.states(subject.chain())) {
            Rational truth = subject.longRun(state).get(0);
            checks.add(Arbiter.number(texts.get(state.name()), Near.of(truth)));
        }
        Map<String, String> quoted = new LinkedHashMap<>();
        texts.forEach((name, text) -> quoted.put(name, Claimed.quoted(text)));
        return claim("long run of all " + style.kind(),
                Claimed.line("long run", "all", "are", Claimed.mapping(quoted)), Arbiter.some(checks));
    }

    // ---- start, matrix, polynomial, bound

    Claimed start(Style style) {
        Map<String, String> texts = new LinkedHashMap<>();
        List<Function<String, Boolean>> checks = new ArrayList<>();
        for (int i = 0; i < subject.chain().size(); i++) {
            String text = written(believed.chain().start().get(i), style);
            texts.put(subject.chain().states().get(i), Claimed.quoted(text));
            checks.add(Arbiter.number(text, Near.of(subject.chain().start().get(i))));
        }
        return claim("start", Claimed.line("start", "all", "are", Claimed.mapping(texts)), Arbiter.some(checks));
    }

    /** The matrix in the convention of the model. */
    Claimed matrix(Style style) {
        Chain chain = believed.chain();
        boolean isRows = subject.model().convention() == org.pofk.chain.Model.Convention.ROWS;
        List<String> rows = new ArrayList<>();
        List<Function<String, Boolean>> checks = new ArrayList<>();
        for (int i = 0; i < chain.size(); i++) {
            List<String> row = new ArrayList<>();
            for (int j = 0; j < chain.size(); j++) {
                String text = written(isRows ? chain.matrix().at(j, i) : chain.matrix().at(i, j), style);
                Rational truth = isRows ? subject.chain().matrix().at(j, i) : subject.chain().matrix().at(i, j);
                row.add(Claimed.quoted(text));
                checks.add(Arbiter.number(text, Near.of(truth)));
            }
            rows.add(row.toString());
        }
        return claim("matrix", Claimed.line("matrix", "all", "are", rows.toString()), Arbiter.some(checks));
    }

    /** The characteristic polynomial multiplied out. */
    Claimed characteristicPolynomial(Style style) {
        List<Rational> ascending = believed.characteristicPolynomial();
        StringBuilder text = new StringBuilder();
        for (int n = ascending.size() - 1; n >= 0; n--) {
            Rational c = ascending.get(n);
            if (!c.isZero()) {
                text.append(text.isEmpty() ? "" : c.signum() < 0 ? " - " : " + ");
                String power = n == 0 ? "" : n == 1 ? "s" : "s^" + n;
                text.append(c.abs().isOne() && n > 0 ? power
                        : number(Num.of(c.abs()), style) + (n == 0 ? "" : "*" + power));
            }
        }
        return characteristicPolynomial(text.toString(), style);
    }

    Claimed characteristicPolynomial(String text, Style style) {
        List<Rational> truth = subject.characteristicPolynomial();
        return claim("characteristic polynomial " + style.kind(),
                Claimed.line("characteristic polynomial", "all", "is", Claimed.quoted(text)),
                units -> subject.differsFromPolynomial(Evaluator.of(text, units), truth));
    }

    /** A bound that holds: the largest or smallest value over all steps, and some room. */
    Optional<Claimed> bound(Output output) {
        if (!Approximations.settlesSoon(subject.modes(output))) {
            return Optional.empty();
        }
        boolean isMost = random.nextBoolean();
        BigDecimal extreme = subject.values(output).stream().map(Near::real)
                .reduce((a, b) -> isMost ? a.max(b) : a.min(b)).orElseThrow();
        BigDecimal room = new BigDecimal("0.0013");
        BigDecimal bound = (isMost ? extreme.add(room) : extreme.subtract(room)).setScale(4, RoundingMode.HALF_EVEN);
        return Optional.of(bound(output, isMost, bound.toPlainString()));
    }

    Claimed bound(Output output, boolean isMost, String text) {
        BigDecimal bound = new BigDecimal(text);
        List<Near> values = subject.values(output);
        return claim("bound", Claimed.line("bound", Claimed.quoted(output.name()), isMost ? "at most" : "at least",
                Claimed.quoted(text)), units -> values.stream().anyMatch(value -> isMost
                        ? value.real().subtract(value.radius()).compareTo(bound) > 0
                        : value.real().add(value.radius()).compareTo(bound) < 0));
    }

}
