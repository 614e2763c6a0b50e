package org.pofk.check;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import org.pofk.chain.Output;
import org.pofk.exact.Rational;
import org.pofk.slip.SlipKind;

/** Wrong claims about one model: right ones into whose text a slip of the pen was put. */
final class WrongClaims {
    private static final int ATTEMPTS = 8;

    private final Subject subject;
    private final Random random;
    private final Author author;

    private WrongClaims(Subject subject, Random random) {
        this.subject = subject;
        this.random = random;
        this.author = new Author(subject, random);
    }

    /** One claim at most for each output and kind of slip. */
    static List<Claimed> of(Subject subject, Random random) {
        WrongClaims claims = new WrongClaims(subject, random);
        List<Claimed> wrong = new ArrayList<>();
        for (Output output : subject.outputs()) {
            FormulaSlips.IN_K.forEach(kind -> claims.inFormula(output, kind).ifPresent(wrong::add));
            FormulaSlips.IN_Z.forEach(kind -> claims.inTransform(output, kind).ifPresent(wrong::add));
            claims.inNumbers(output, wrong);
        }
        claims.inLongRuns(wrong);
        return wrong;
    }

    /** Two slips in one formula. */
    static List<Claimed> twice(Subject subject, Random random) {
        WrongClaims claims = new WrongClaims(subject, random);
        List<Claimed> wrong = new ArrayList<>();
        subject.outputs().forEach(output -> claims.twoInFormula(output).ifPresent(wrong::add));
        return wrong;
    }

    /** Approximations that claim to be nearer than they are. */
    static List<Claimed> approximations(Subject subject, Random random) {
        Author author = new Author(subject, random);
        List<Claimed> wrong = new ArrayList<>();
        subject.outputs().forEach(output -> Approximations.of(subject, output, author,
                Approximations.Room.TOO_LITTLE, random).ifPresent(wrong::add));
        return wrong;
    }

    private Optional<Claimed> inFormula(Output output, SlipKind kind) {
        for (int i = 0; i < ATTEMPTS; i++) {
            Optional<List<Token>> edited = formula(output, kind)
                    .flatMap(tokens -> FormulaSlips.with(tokens, kind, random));
            if (edited.isPresent()) {
                return edited.map(tokens -> author.formula(output, tokens, "slip", 0).wrongBy(kind));
            }
        }
        return Optional.empty();
    }

    private Optional<List<Token>> formula(Output output, SlipKind kind) {
        Modes modes = subject.modes(output);
        List<Notation> notations = notationsFor(kind);
        Notation notation = notations.get(random.nextInt(notations.size()));
        boolean needsDecimals = List.of(SlipKind.DIGITS_TRANSPOSED, SlipKind.DECIMAL_POINT_MOVED,
                SlipKind.ROUNDED_TOO_EARLY, SlipKind.WRONG_POLE, SlipKind.WRONG_COEFFICIENT).contains(kind);
        return FormulaWriter.write(modes, needsDecimals ? RightClaims.rounded(modes, random)
                : RightClaims.style(modes, random), notation, random);
    }

    private static List<Notation> notationsFor(SlipKind kind) {
        return switch (kind) {
            case SIGN_OF_A_POLE -> List.of(Notation.PLAIN, Notation.SHUFFLED);
            case PAIR_NOT_DOUBLED, PAIR_DOUBLED_TWICE -> List.of(Notation.PLAIN, Notation.SHUFFLED, Notation.DEGREES);
            case DEGREES_AS_RADIANS -> List.of(Notation.DEGREES);
            case COSINE_FOR_SINE -> List.of(Notation.SINE_AND_COSINE, Notation.OTHER_PHASE);
            case REPEATED_POLE_AS_SIMPLE -> List.of(Notation.PLAIN, Notation.POLYNOMIAL_IN_K);
            case SIGN_OF_THE_PHASE, RADIANS_AS_DEGREES, POWER_NOT_LOWERED, SINE_FOR_COSINE ->
                    List.of(Notation.PLAIN, Notation.SHUFFLED);
            default -> List.of(Notation.PLAIN, Notation.SHUFFLED, Notation.SINE_AND_COSINE, Notation.DEGREES,
                    Notation.MINUS_ONE_POWER, Notation.SHIFTED_DOWN, Notation.POLYNOMIAL_IN_K,
                    Notation.RECIPROCAL_BASE, Notation.COMPLEX_POWERS);
        };
    }

    private Optional<Claimed> twoInFormula(Output output) {
        List<SlipKind> kinds = new ArrayList<>(FormulaSlips.IN_K);
        for (int i = 0; i < ATTEMPTS; i++) {
            Collections.shuffle(kinds, random);
            SlipKind first = kinds.get(0);
            SlipKind second = kinds.get(1);
            Modes modes = subject.modes(output);
            Optional<List<Token>> tokens = FormulaWriter.write(modes, RightClaims.rounded(modes, random),
                    random.nextBoolean() ? Notation.PLAIN : Notation.SHUFFLED, random)
                    .flatMap(right -> FormulaSlips.with(right, first, random))
                    .flatMap(once -> FormulaSlips.with(once, second, random));
            if (tokens.isPresent()) {
                return tokens.map(edited -> author.formula(output, edited, "two slips", 0).wrongBy(first, second));
            }
        }
        return Optional.empty();
    }

    private Optional<Claimed> inTransform(Output output, SlipKind kind) {
        boolean needsFractions = List.of(SlipKind.COEFFICIENTS_SWAPPED, SlipKind.TERM_MISSING).contains(kind);
        for (int i = 0; i < ATTEMPTS; i++) {
            TransformWriter.Shape[] shapes = TransformWriter.Shape.values();
            TransformWriter.Shape shape = needsFractions ? TransformWriter.Shape.FRACTIONS
                    : shapes[random.nextInt(shapes.length)];
            Modes modes = subject.modes(output);
            Style style = kind == SlipKind.Z_LOST || kind == SlipKind.TERM_MISSING
                    ? RightClaims.style(modes, random) : RightClaims.rounded(modes, random);
            boolean isOverZ = kind != SlipKind.Z_LOST && kind != SlipKind.Z_DOUBLED && random.nextInt(4) == 0;
            Optional<List<Token>> edited = (isOverZ ? TransformWriter.writeOverZ(modes, style, shape, random)
                    : TransformWriter.write(modes, style, shape, random))
                    .flatMap(tokens -> FormulaSlips.with(tokens, kind, random));
            if (edited.isPresent()) {
                return edited.map(tokens -> author.transform(output, tokens, style, shape, isOverZ).wrongBy(kind));
            }
        }
        return Optional.empty();
    }

    /** Values, pairs and poles with a slip in one number. */
    private void inNumbers(Output output, List<Claimed> wrong) {
        Modes modes = subject.modes(output);
        Style style = RightClaims.rounded(modes, random);
        for (SlipKind kind : List.of(SlipKind.DIGITS_TRANSPOSED, SlipKind.DECIMAL_POINT_MOVED)) {
            int at = 1 + random.nextInt(8);
            String text = author.written(subject.steps().value(output, at), Style.significant(5));
            edited(text, kind).ifPresent(other -> wrong.add(author.value(output, at, other).wrongBy(kind)));
        }
        author.poles(output, output, style).ifPresent(ignored -> wrongPoles(output, style, wrong));
        wrongPair(output, style, wrong);
        if (subject.longRun(output).size() > 1) {
            Rational average = subject.longRun(output).stream().reduce(Rational.ZERO, Rational::plus)
                    .dividedBy(Rational.of(subject.longRun(output).size()));
            String text = author.written(average, random.nextBoolean() ? Style.EXACT : Style.significant(5));
            wrong.add(author.longRun(output, List.of(text), style).wrongBy(SlipKind.LONG_RUN_OF_A_CYCLE));
        }
    }

    private Optional<String> edited(String text, SlipKind kind) {
        boolean isNegative = text.startsWith("-");
        Token token = Token.of(Token.Role.COEFFICIENT, 0, isNegative ? text.substring(1) : text);
        return FormulaSlips.with(List.of(token), kind, random)
                .map(tokens -> (isNegative ? "-" : "") + tokens.get(0).plain());
    }

    private void wrongPoles(Output output, Style style, List<Claimed> wrong) {
        List<String> texts = author.poleTexts(output, style);
        for (int i = 0; i < texts.size(); i++) {
            if (texts.get(i).contains("(")) {
                List<String> simple = new ArrayList<>(texts);
                simple.set(i, texts.get(i).replaceAll(" \\(.*", ""));
                wrong.add(author.poles(output, simple, style).wrongBy(SlipKind.REPEATED_POLE_AS_SIMPLE));
                return;
            }
        }
        int place = random.nextInt(texts.size());
        SlipKind kind = List.of(SlipKind.DIGITS_TRANSPOSED, SlipKind.DECIMAL_POINT_MOVED, SlipKind.WRONG_POLE)
                .get(random.nextInt(3));
        String text = texts.get(place);
        if (!text.contains("±")) {
            SlipKind inToken = kind == SlipKind.WRONG_POLE ? SlipKind.WRONG_COEFFICIENT : kind;
            edited(text, inToken).ifPresent(other -> {
                List<String> poles = new ArrayList<>(texts);
                poles.set(place, other);
                wrong.add(author.poles(output, poles, style).wrongBy(kind));
            });
        }
    }

    private void wrongPair(Output output, Style style, List<Claimed> wrong) {
        Optional<Map<String, String>> right = author.pairParts(output, style);
        if (right.isEmpty()) {
            return;
        }
        Modes.Pole pole = subject.modes(output).poles().stream().filter(each -> !each.isReal()).findFirst().orElseThrow();
        Map<String, String> halved = new LinkedHashMap<>(right.get());
        halved.put("amplitude", Token.number(Token.Role.OTHER, 0,
                PolarNumber.of(pole.coefficients().get(0)).modulus(), style).plain());
        wrong.add(author.pair(output, halved, style).wrongBy(SlipKind.PAIR_NOT_DOUBLED));
        if (!right.get().get("phase").equals("0")
                && !FormulaSlips.isEighthTurn(PolarNumber.of(pole.coefficients().get(0)).angle())) {
            String phase = right.get().get("phase");
            Map<String, String> turned = new LinkedHashMap<>(right.get());
            turned.put("phase", phase.startsWith("-") ? phase.substring(1) : "-" + phase);
            wrong.add(author.pair(output, turned, style).wrongBy(SlipKind.SIGN_OF_THE_PHASE));
        }
    }

    /** Long runs of every state, unscaled or with one that spoils the sum. */
    private void inLongRuns(List<Claimed> wrong) {
        Style style = Style.significant(5);
        Optional<Map<String, String>> right = author.longRunTexts(Style.significant(30));
        if (right.isEmpty() || right.get().values().stream().filter(text -> !text.equals("0")).count() < 2
                || subject.chain().kind() != org.pofk.chain.Chain.Kind.CHAIN) {
            return;
        }
        List<String> names = new ArrayList<>(right.get().keySet());
        names.removeIf(name -> right.get().get(name).equals("0"));
        Map<String, String> unscaled = new LinkedHashMap<>();
        Map<String, Rational> exact = author.longRunValues();
        Rational unit = exact.get(names.get(0));
        exact.forEach((name, value) -> unscaled.put(name, author.written(value.dividedBy(unit), style)));
        wrong.add(author.longRuns(unscaled, style).wrongBy(SlipKind.EIGENVECTOR_NOT_SCALED));
        Map<String, String> spoiled = author.longRunTexts(style).orElseThrow();
        String name = names.get(random.nextInt(names.size()));
        edited(spoiled.get(name), SlipKind.WRONG_COEFFICIENT).ifPresent(other -> {
            spoiled.put(name, other);
            wrong.add(author.longRuns(spoiled, style).wrongBy(SlipKind.NOT_SUMMING_TO_ONE));
        });
    }
}
