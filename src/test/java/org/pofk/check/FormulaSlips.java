package org.pofk.check;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.function.Predicate;
import java.util.function.UnaryOperator;
import java.util.stream.Collectors;
import org.pofk.check.Token.Role;
import org.pofk.exact.Rational;
import org.pofk.slip.SlipKind;

/** Puts slips of the pen into the text of formulas, by exchanging, dropping and moving pieces of it. */
final class FormulaSlips {
    /** The slips that are put into formulas in k. */
    static final List<SlipKind> IN_K = List.of(SlipKind.SIGN_OF_A_TERM, SlipKind.PAIR_NOT_DOUBLED,
            SlipKind.PAIR_DOUBLED_TWICE, SlipKind.SIGN_OF_THE_PHASE, SlipKind.DEGREES_AS_RADIANS,
            SlipKind.RADIANS_AS_DEGREES, SlipKind.SINE_FOR_COSINE, SlipKind.COSINE_FOR_SINE, SlipKind.INDEX_SHIFTED,
            SlipKind.COEFFICIENTS_SWAPPED, SlipKind.IMPULSE_MISSING, SlipKind.TERM_MISSING,
            SlipKind.REPEATED_POLE_AS_SIMPLE, SlipKind.POWER_NOT_LOWERED, SlipKind.POWER_FOR_BINOMIAL,
            SlipKind.SIGN_OF_A_POLE, SlipKind.DIGITS_TRANSPOSED,
            SlipKind.DECIMAL_POINT_MOVED, SlipKind.ROUNDED_TOO_EARLY, SlipKind.WRONG_POLE, SlipKind.WRONG_COEFFICIENT);
    /** The slips that are put into transforms. */
    static final List<SlipKind> IN_Z = List.of(SlipKind.SIGN_OF_A_TERM, SlipKind.Z_LOST, SlipKind.Z_DOUBLED,
            SlipKind.COEFFICIENTS_SWAPPED, SlipKind.TERM_MISSING, SlipKind.REPEATED_POLE_AS_SIMPLE,
            SlipKind.DIGITS_TRANSPOSED, SlipKind.DECIMAL_POINT_MOVED, SlipKind.ROUNDED_TOO_EARLY, SlipKind.WRONG_POLE,
            SlipKind.WRONG_COEFFICIENT);

    private final List<Token> tokens;
    private final Random random;

    private FormulaSlips(List<Token> tokens, Random random) {
        this.tokens = tokens;
        this.random = random;
    }

    /** The text with a slip of this kind; nothing where there is no place for one. */
    static Optional<List<Token>> with(List<Token> tokens, SlipKind kind, Random random) {
        return new FormulaSlips(tokens, random).put(kind).filter(edited -> !edited.equals(tokens));
    }

    private Optional<List<Token>> put(SlipKind kind) {
        return switch (kind) {
            case SIGN_OF_A_TERM -> exchangedOne(token -> token.role() == Role.SIGN, FormulaSlips::otherSign);
            case SIGN_OF_THE_PHASE -> exchangedOne(token -> token.role() == Role.PHASE_SIGN
                    && !hasEighthTurn(token.term()), FormulaSlips::otherSign);
            case PAIR_NOT_DOUBLED -> amplitudesTimes(Rational.HALF);
            case PAIR_DOUBLED_TWICE -> amplitudesTimes(Rational.TWO);
            case DEGREES_AS_RADIANS -> withoutDegrees();
            case RADIANS_AS_DEGREES -> asDegrees();
            case SINE_FOR_COSINE -> exchangedOne(token -> token.plain().equals("cos")
                    && !hasEighthTurn(token.term()), token -> function("sin", token));
            case COSINE_FOR_SINE -> exchangedOne(token -> token.plain().equals("sin")
                    && !hasEighthTurn(token.term()), token -> function("cos", token));
            case INDEX_SHIFTED -> shifted(random.nextBoolean() ? 1 : -1);
            case COEFFICIENTS_SWAPPED -> swapped();
            case IMPULSE_MISSING -> withoutTerm(token -> token.plain().equals("delta(k)"));
            case TERM_MISSING -> withoutTerm(token -> token.role() == Role.SIGN && !isImpulseAtStart(token.term()));
            case REPEATED_POLE_AS_SIMPLE -> asSimple();
            case POWER_FOR_BINOMIAL -> exchangedOne(token -> token.role() == Role.BINOMIAL
                    && List.of("k*(k-1)/2", "binomial(k, 2)").contains(token.plain()),
                    token -> Token.of(Role.BINOMIAL, token.term(), "k^2/2", "\\frac{k^2}{2}"));
            case SIGN_OF_A_POLE -> exchangedOne(token -> token.role() == Role.OTHER && token.plain().equals("(-")
                    && tokens.get(tokens.indexOf(token) + 1).role() == Role.BASE,
                    token -> Token.of(Role.OTHER, token.term(), "(", "\\left("));
            case POWER_NOT_LOWERED -> exchangedOne(token -> token.role() == Role.EXPONENT
                    && token.plain().matches("\\(k-[1-9]\\)") && hasFactorInK(token.term()),
                    token -> Token.of(Role.EXPONENT, token.term(), "k", "{k}"));
            case Z_LOST -> hasZInEveryTerm() ? onePieceLost() : Optional.empty();
            case Z_DOUBLED -> !hasZInEveryTerm() ? Optional.empty() : Optional.of(tokens.stream().map(token -> token.role() == Role.Z
                    && token.plain().equals("z") ? Token.of(Role.Z, token.term(), "z^2", "z^{2}") : token).toList());
            case DIGITS_TRANSPOSED -> exchangedOne(FormulaSlips::hasTwoDigits, this::transposed);
            case DECIMAL_POINT_MOVED -> exchangedOne(FormulaSlips::hasTwoDigits, this::pointMoved);
            case ROUNDED_TOO_EARLY -> exchangedOne(Token::isDecimal, FormulaSlips::roundedEarly);
            case WRONG_POLE -> exchangedOne(token -> token.isDecimal()
                    && (token.role() == Role.BASE || token.role() == Role.POLE), this::another);
            case WRONG_COEFFICIENT -> exchangedOne(token -> token.isDecimal() && token.role() == Role.COEFFICIENT,
                    this::another);
            default -> Optional.empty();
        };
    }

    private Optional<List<Token>> exchangedOne(Predicate<Token> which, UnaryOperator<Token> exchange) {
        List<Integer> places = new ArrayList<>();
        for (int i = 0; i < tokens.size(); i++) {
            if (which.test(tokens.get(i))) {
                places.add(i);
            }
        }
        Collections.shuffle(places, random);
        for (int place : places) {
            Token other = exchange.apply(tokens.get(place));
            if (!other.plain().equals(tokens.get(place).plain())) {
                List<Token> edited = new ArrayList<>(tokens);
                edited.set(place, other);
                return Optional.of(edited);
            }
        }
        return Optional.empty();
    }

    private static Token otherSign(Token sign) {
        return Token.of(sign.role(), sign.term(), sign.plain().equals(" - ") ? " + " : " - ");
    }

    private static Token function(String name, Token token) {
        return Token.of(Role.FUNCTION, token.term(), name, "\\" + name);
    }

    private boolean oscillates(int term) {
        return tokens.stream().anyMatch(token -> token.term() == term
                && (token.plain().equals("cos") || token.plain().equals("sin")));
    }

    private boolean hasFactorInK(int term) {
        return tokens.stream().anyMatch(token -> token.term() == term
                && (token.role() == Role.K || token.role() == Role.BINOMIAL));
    }

    /** A phase of 45 or 90 degrees: there another sign, another function and another phase are the same. */
    private boolean hasEighthTurn(int term) {
        return tokens.stream().anyMatch(token -> token.term() == term && token.role() == Role.PHASE
                && token.number().filter(number -> isEighthTurn(number.value().value())).isPresent());
    }

    static boolean isEighthTurn(BigDecimal angle) {
        BigDecimal radians = angle.multiply(BigDecimal.valueOf(4)).divide(Elementary.PI, Near.CENTRE);
        BigDecimal degrees = angle.divide(BigDecimal.valueOf(45), Near.CENTRE);
        return isWhole(radians) || isWhole(degrees);
    }

    private static boolean isWhole(BigDecimal value) {
        return value.subtract(value.setScale(0, java.math.RoundingMode.HALF_EVEN)).abs()
                .compareTo(BigDecimal.ONE.movePointLeft(30)) < 0;
    }

    /** In k an impulse at the start, in z a term that is a number alone. */
    private boolean isImpulseAtStart(int term) {
        boolean isTransform = tokens.stream().anyMatch(token -> token.role() == Role.POLE);
        return isTransform ? tokens.stream().noneMatch(token -> token.term() == term && token.role() == Role.POLE)
                : tokens.stream().anyMatch(token -> token.term() == term && token.plain().equals("delta(k)"));
    }

    /** A z is lost, or there twice, in all of a sum or not at all. */
    private boolean hasZInEveryTerm() {
        return tokens.stream().map(Token::term).distinct()
                .allMatch(term -> tokens.stream().anyMatch(token -> token.term() == term && token.role() == Role.Z));
    }

    /** All amplitudes of the one pair there is; a pair of pairs is left alone. */
    private Optional<List<Token>> amplitudesTimes(Rational factor) {
        List<Token> edited = new ArrayList<>();
        int changed = 0;
        int angles = (int) tokens.stream().filter(token -> token.role() == Role.ANGLE).map(Token::plain).distinct()
                .count();
        for (Token token : tokens) {
            if (token.role() == Role.COEFFICIENT && oscillates(token.term())) {
                Optional<Token> times = times(token, factor);
                if (times.isEmpty()) {
                    return Optional.empty();
                }
                edited.add(times.get());
                changed++;
            } else {
                edited.add(token);
            }
        }
        return changed > 0 && angles == 1 ? Optional.of(edited) : Optional.empty();
    }

    private static Optional<Token> times(Token token, Rational factor) {
        if (token.isDecimal() && token.number().isPresent()) {
            BigDecimal value = token.number().get().value().value()
                    .multiply(Modes.decimal(factor)).round(Near.CENTRE);
            return Optional.of(token.as(token.number().get().style().text(value)));
        }
        return token.plain().matches("[0-9]+(/[0-9]+)?")
                ? Optional.of(Token.number(token.role(), token.term(),
                        Real.of(Num.of(Rational.parse(token.plain()).times(factor)), Real.Radicals.APART), Style.EXACT))
                : Optional.empty();
    }

    private Optional<List<Token>> withoutDegrees() {
        List<Token> edited = tokens.stream().filter(token -> token.role() != Role.DEGREES).toList();
        return edited.size() < tokens.size() ? Optional.of(edited) : Optional.empty();
    }

    private Optional<List<Token>> asDegrees() {
        if (tokens.stream().anyMatch(token -> token.role() == Role.DEGREES || token.plain().contains("pi")
                || token.plain().contains("exp") || token.plain().contains("arccos"))) {
            return Optional.empty();
        }
        List<Token> edited = new ArrayList<>();
        for (Token token : tokens) {
            edited.add(token);
            if (token.role() == Role.ANGLE || token.role() == Role.PHASE) {
                edited.add(Token.of(Role.DEGREES, token.term(), " deg", "^\\circ"));
            }
        }
        return Optional.of(edited);
    }

    /** Every k one less or one more. */
    private Optional<List<Token>> shifted(int by) {
        List<Token> edited = new ArrayList<>();
        for (Token token : tokens) {
            edited.add(Token.of(token.role(), token.term(), shifted(token.plain(), by), shifted(token.latex(), by)));
        }
        return Optional.of(edited);
    }

    private static String shifted(String text, int by) {
        String other = text.replaceAll("(?<![A-Za-z\\\\])k(?![A-Za-z])", by < 0 ? "(k-1)" : "(k+1)");
        for (int n = 0; n <= 4; n++) {
            other = other.replace("(k-1)-" + n, "k-" + (n + 1)).replace("(k+1)-" + (n + 1), n == 0 ? "k" : "k-" + n)
                    .replace("(k-1)+1", "k").replace("(k+1)+1", "k+2");
        }
        return other.replace("((k-1))", "(k-1)").replace("((k+1))", "(k+1)").replace("{(k-1)}", "{k-1}")
                .replace("{(k+1)}", "{k+1}").replace("(k)", "k").replace("deltak", "delta(k)");
    }

    /** The coefficients of two poles exchanged, with their signs. */
    private Optional<List<Token>> swapped() {
        List<Integer> terms = tokens.stream().filter(token -> token.role() == Role.COEFFICIENT).map(Token::term)
                .distinct().filter(term -> !oscillates(term) && count(term, Role.COEFFICIENT) == 1
                        && count(term, Role.SIGN) == 1 && count(term, Role.IMPULSE) == 0
                        && !hasFactorInK(term)).collect(Collectors.toCollection(ArrayList::new));
        if (terms.size() < 2) {
            return Optional.empty();
        }
        Collections.shuffle(terms, random);
        int a = terms.get(0);
        int b = terms.get(1);
        if (only(a, Role.COEFFICIENT).plain().equals(only(b, Role.COEFFICIENT).plain())) {
            return Optional.empty();
        }
        List<Token> edited = new ArrayList<>();
        for (Token token : tokens) {
            boolean moves = token.role() == Role.COEFFICIENT || token.role() == Role.SIGN;
            edited.add(moves && token.term() == a ? only(b, token.role()).in(a)
                    : moves && token.term() == b ? only(a, token.role()).in(b) : token);
        }
        return Optional.of(edited);
    }

    private long count(int term, Role role) {
        return tokens.stream().filter(token -> token.term() == term && token.role() == role).count();
    }

    private Token only(int term, Role role) {
        return tokens.stream().filter(token -> token.term() == term && token.role() == role).findFirst().orElseThrow();
    }

    private Optional<List<Token>> withoutTerm(Predicate<Token> inTerm) {
        List<Integer> terms = tokens.stream().filter(inTerm).map(Token::term).distinct()
                .collect(Collectors.toCollection(ArrayList::new));
        long all = tokens.stream().map(Token::term).distinct().count();
        if (terms.isEmpty() || all < 2 || tokens.stream().anyMatch(token -> token.role() == Role.FRONT)) {
            return Optional.empty();
        }
        int dropped = terms.get(random.nextInt(terms.size()));
        return Optional.of(tokens.stream().filter(token -> token.term() != dropped).toList());
    }

    /** In z a power of a factor dropped; in k the factor k, with the exponent back at k. */
    private Optional<List<Token>> asSimple() {
        Optional<List<Token>> inZ = exchangedOne(token -> token.role() == Role.MULTIPLICITY,
                token -> Token.of(Role.MULTIPLICITY, token.term(), ""));
        if (inZ.isPresent()) {
            return inZ;
        }
        List<Integer> terms = tokens.stream().filter(token -> token.plain().equals("k") && token.role() == Role.K)
                .map(Token::term).filter(term -> count(term, Role.COEFFICIENT) == 1 && count(term, Role.BASE) == 1)
                .toList();
        if (terms.isEmpty()) {
            return Optional.empty();
        }
        int term = terms.get(random.nextInt(terms.size()));
        List<Token> edited = new ArrayList<>();
        for (int i = 0; i < tokens.size(); i++) {
            Token token = tokens.get(i);
            boolean isFactor = token.term() == term && token.role() == Role.K;
            boolean isTimesBefore = i + 1 < tokens.size() && tokens.get(i + 1).term() == term
                    && tokens.get(i + 1).role() == Role.K && token.role() == Role.TIMES;
            if (token.term() == term && token.role() == Role.EXPONENT) {
                edited.add(Token.of(Role.EXPONENT, term, "k", "{k}"));
            } else if (!isFactor && !isTimesBefore) {
                edited.add(token);
            }
        }
        return Optional.of(edited);
    }

    private Optional<List<Token>> onePieceLost() {
        List<Integer> places = new ArrayList<>();
        for (int i = 0; i < tokens.size(); i++) {
            boolean isProduct = i > 0 && tokens.get(i - 1).role() == Role.TIMES
                    || i + 1 < tokens.size() && tokens.get(i + 1).role() == Role.TIMES;
            if (tokens.get(i).plain().equals("z") && tokens.get(i).role() == Role.Z && isProduct) {
                places.add(i);
            }
        }
        if (places.isEmpty()) {
            return Optional.empty();
        }
        List<Token> edited = new ArrayList<>(tokens);
        boolean isEverywhere = places.size() > 1;
        for (int i = places.size() - 1; i >= 0; i--) {
            int place = places.get(i);
            boolean isBefore = place > 0 && tokens.get(place - 1).role() == Role.TIMES;
            edited.remove(place);
            edited.remove(isBefore ? place - 1 : place);
            if (!isEverywhere) {
                break;
            }
        }
        return Optional.of(edited);
    }

    // ---- digits

    /** Of 0.0500 nobody can tell whether it is 0.5000 with a digit transposed or with its point moved. */
    private static boolean hasTwoDigits(Token token) {
        return token.isDecimal() && token.plain().replaceAll("[0.]|e.*", "").length() >= 2;
    }

    private Token transposed(Token token) {
        String text = token.plain();
        List<Integer> places = new ArrayList<>();
        int end = text.indexOf('e') < 0 ? text.length() : text.indexOf('e');
        for (int i = text.indexOf('.') + 1; i + 1 < end; i++) {
            boolean hasBegun = !text.substring(0, i + 1).matches("[0.]*");
            if (hasBegun && text.charAt(i) != text.charAt(i + 1)) {
                places.add(i);
            }
        }
        if (places.isEmpty()) {
            return token;
        }
        int at = places.get(random.nextInt(places.size()));
        return token.as(text.substring(0, at) + text.charAt(at + 1) + text.charAt(at) + text.substring(at + 2));
    }

    private Token pointMoved(Token token) {
        if (token.plain().contains("e")) {
            return token;
        }
        BigDecimal value = new BigDecimal(token.plain());
        BigDecimal moved = value.scaleByPowerOfTen(random.nextBoolean() ? 1 : -1);
        return moved.scale() <= 0 ? token : token.as(moved.toPlainString());
    }

    private static Token roundedEarly(Token token) {
        if (token.plain().contains("e")) {
            return token;
        }
        BigDecimal value = new BigDecimal(token.plain());
        if (value.precision() < 4) {
            return token;
        }
        BigDecimal early = value.round(new java.math.MathContext(2, java.math.RoundingMode.HALF_EVEN));
        return early.compareTo(value) == 0 ? token : token.as(early.setScale(value.scale()).toPlainString());
    }

    /** Another number of the same size that no other slip makes of it. */
    private Token another(Token token) {
        String text = token.plain();
        if (text.contains("e")) {
            return token;
        }
        for (int attempt = 0; attempt < 20; attempt++) {
            BigDecimal value = new BigDecimal(text);
            BigDecimal factor = BigDecimal.valueOf(1_030 + random.nextInt(250), 3);
            String other = value.multiply(factor).setScale(value.scale(), java.math.RoundingMode.HALF_EVEN)
                    .toPlainString();
            if (!sameDigits(other, text) && new BigDecimal(other).precision() >= value.precision()
                    && new BigDecimal(other).subtract(value).abs().compareTo(value.ulp().multiply(BigDecimal.TEN)) > 0) {
                return token.as(other);
            }
        }
        return token;
    }

    private static boolean sameDigits(String a, String b) {
        return a.chars().sorted().boxed().toList().equals(b.chars().sorted().boxed().toList());
    }
}
