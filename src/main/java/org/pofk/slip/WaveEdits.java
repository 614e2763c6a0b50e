package org.pofk.slip;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.pofk.claim.AuthorText;
import org.pofk.claim.AuthorText.Replacement;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula;
import org.pofk.formula.ParsedFormula;
import org.pofk.slip.FormulaSurvey.Constant;
import org.pofk.slip.FormulaSurvey.Role;
import org.pofk.slip.FormulaSurvey.Term;

/** What goes wrong with a conjugate pair: its amplitude, sine and cosine, degrees and radians. */
final class WaveEdits {
    private static final int BITS = 128;
    /** A little more than 2π. */
    private static final Rational FULL_TURN = Rational.of(64, 10);

    private final AuthorText text;
    private final AuthorNotation notation;

    WaveEdits(AuthorText text) {
        this.text = text;
        this.notation = AuthorNotation.of(text.notation());
    }

    List<Edit> of(FormulaSurvey survey) {
        List<Edit> edits = new ArrayList<>();
        for (ParsedFormula wave : survey.waves()) {
            edits.add(otherFunction(wave));
            edits.addAll(units(survey, wave));
        }
        if (survey.waves().size() > 1) {
            edits.addAll(units(List.of(survey.waves().stream().flatMap(wave -> Stream.concat(
                    parts(survey, wave, Role.ANGLE).stream(), parts(survey, wave, Role.PHASE).stream())).toList()),
                    text.tree()));
        }
        List<Term> waving = survey.summands().stream().filter(term -> !(term.unsigned().formula() instanceof Formula.Sum)
                && survey.waves().stream().anyMatch(wave -> isWithin(term.node(), wave))).toList();
        waving.forEach(term -> edits.addAll(amplitude(term)));
        if (waving.size() > 1) {
            edits.add(all(SlipKind.PAIR_NOT_DOUBLED, waving, "2" + notation.times()));
            edits.add(all(SlipKind.PAIR_DOUBLED_TWICE, waving, notation.half()));
        }
        return edits;
    }

    /** The cosine and the sine of one pair together. */
    private Edit all(SlipKind kind, List<Term> terms, String prefix) {
        List<Replacement> replacements = terms.stream().map(term -> AuthorText.start(term.unsigned()))
                .map(start -> new Replacement(start, start, prefix)).toList();
        return new Edit(kind, replacements, text.place(), text.text(), text.edited(text.tree(), replacements));
    }

    private Edit otherFunction(ParsedFormula wave) {
        boolean sine = ((Formula.Call) wave.formula()).function() == Formula.Function.SIN;
        String found = text.text(wave);
        int at = found.indexOf(sine ? "sin" : "cos");
        String right = found.substring(0, at) + (sine ? "cos" : "sin") + found.substring(at + 3);
        int start = AuthorText.start(wave) + at;
        return new Edit(sine ? SlipKind.SINE_FOR_COSINE : SlipKind.COSINE_FOR_SINE,
                List.of(new Replacement(start, start + 3, sine ? "cos" : "sin")), text.place(wave), found, right);
    }

    private List<Edit> amplitude(Term term) {
        List<Edit> edits = new ArrayList<>();
        ParsedFormula inner = term.unsigned();
        leadingDecimal(inner).ifPresent(number -> {
            BigDecimal value = new BigDecimal(text.text(number));
            edits.add(number(SlipKind.PAIR_NOT_DOUBLED, number, value.multiply(BigDecimal.valueOf(2)).toPlainString()));
            edits.add(number(SlipKind.PAIR_DOUBLED_TWICE, number,
                    value.divide(BigDecimal.valueOf(2)).toPlainString()));
        });
        edits.add(prefixed(SlipKind.PAIR_NOT_DOUBLED, inner, "2" + notation.times()));
        edits.add(prefixed(SlipKind.PAIR_DOUBLED_TWICE, inner, notation.half()));
        return edits;
    }

    private Edit prefixed(SlipKind kind, ParsedFormula node, String prefix) {
        int start = AuthorText.start(node);
        return new Edit(kind, List.of(new Replacement(start, start, prefix)), text.place(node), text.text(node),
                prefix + text.text(node));
    }

    private Edit number(SlipKind kind, ParsedFormula number, String right) {
        return new Edit(kind, List.of(new Replacement(AuthorText.start(number), AuthorText.end(number), right)),
                text.place(number), text.text(number), right);
    }

    private Optional<ParsedFormula> leadingDecimal(ParsedFormula node) {
        ParsedFormula first = node;
        while (first.formula() instanceof Formula.Product || first.formula() instanceof Formula.Quotient) {
            first = first.parts().get(0);
        }
        return Optional.of(first).filter(part -> isPlainNumber(text.text(part)));
    }

    private static boolean isPlainNumber(String text) {
        return text.matches("[0-9]+([.][0-9]+)?([eE][-+]?[0-9]+)?");
    }

    /** A text that is an angle taken from degrees to radians or back. */
    List<Edit> ofAngle() {
        ParsedFormula angle = text.tree();
        while (angle.formula() instanceof Formula.Negation) {
            angle = angle.parts().get(0);
        }
        return units(List.of(List.of(angle)), angle);
    }

    /** A text that is an amplitude doubled and halved. */
    List<Edit> ofAmplitude() {
        return amplitude(new Term(text.tree(), Optional.empty(), 0, Role.COEFFICIENT));
    }

    /** Angle, phase or both taken from degrees to radians or back. */
    private List<Edit> units(FormulaSurvey survey, ParsedFormula wave) {
        List<ParsedFormula> angles = parts(survey, wave, Role.ANGLE);
        List<ParsedFormula> phases = parts(survey, wave, Role.PHASE);
        List<List<ParsedFormula>> choices = new ArrayList<>();
        angles.forEach(angle -> choices.add(List.of(angle)));
        phases.forEach(phase -> choices.add(List.of(phase)));
        if (angles.size() == 1 && phases.size() == 1) {
            choices.add(List.of(angles.get(0), phases.get(0)));
        }
        return units(choices, wave);
    }

    private List<Edit> units(List<List<ParsedFormula>> choices, ParsedFormula whole) {
        List<Edit> edits = new ArrayList<>();
        for (List<ParsedFormula> choice : choices) {
            for (Unit unit : Unit.values()) {
                List<Replacement> replacements = new ArrayList<>();
                choice.forEach(part -> unit.apply(this, part).ifPresent(replacements::add));
                if (replacements.size() == choice.size()) {
                    ParsedFormula place = choice.size() == 1 ? choice.get(0) : whole;
                    edits.add(new Edit(unit.kind, replacements, text.place(place), text.text(place),
                            text.edited(place, replacements)));
                }
            }
        }
        return edits;
    }

    /** The numbers of one role, each with its unit where it has one. */
    private List<ParsedFormula> parts(FormulaSurvey survey, ParsedFormula wave, Role role) {
        List<ParsedFormula> parts = new ArrayList<>();
        for (Constant each : survey.fractions()) {
            if (each.role() == role && isWithin(wave, each.node())) {
                parts.add(each.node());
            }
        }
        for (Constant each : survey.literals()) {
            if (each.role() == role && isWithin(wave, each.node())
                    && parts.stream().noneMatch(part -> isWithin(part, each.node()))) {
                parts.add(withUnit(wave, each.node()));
            }
        }
        return parts;
    }

    /** {@code 39.7 deg} in {@code 39.7 deg * k}, where the unit stands beside the number among the factors. */
    private ParsedFormula withUnit(ParsedFormula wave, ParsedFormula number) {
        return wave.nodes().filter(node -> node.formula() instanceof Formula.Product)
                .flatMap(product -> IntStream.range(0, product.parts().size() - 1)
                        .filter(i -> product.parts().get(i) == number
                                && product.parts().get(i + 1).formula() == Formula.Constant.DEGREE)
                        .mapToObj(i -> new ParsedFormula(new Formula.Product(List.of(number.formula(),
                                Formula.Constant.DEGREE)), number.span().to(product.parts().get(i + 1).span()),
                                List.of(number, product.parts().get(i + 1)))))
                .findFirst().orElse(number);
    }

    private static boolean isWithin(ParsedFormula whole, ParsedFormula part) {
        return AuthorText.start(whole) <= AuthorText.start(part) && AuthorText.end(part) <= AuthorText.end(whole);
    }

    /** The ways to take a number from one unit to the other. */
    private enum Unit {
        NUMBER_IS_DEGREES(SlipKind.DEGREES_AS_RADIANS) {
            @Override
            Optional<Replacement> apply(WaveEdits edits, ParsedFormula part) {
                boolean plain = isPlainNumber(edits.text.text(part));
                int end = AuthorText.end(part);
                boolean joined = end < edits.text.text().length()
                        && edits.text.text().substring(end).strip().startsWith("k");
                return plain ? Optional.of(new Replacement(end, end,
                        edits.notation.degrees() + (joined ? edits.notation.times() : ""))) : Optional.empty();
            }
        },
        UNIT_IS_RADIANS(SlipKind.RADIANS_AS_DEGREES) {
            @Override
            Optional<Replacement> apply(WaveEdits edits, ParsedFormula part) {
                boolean degrees = part.formula() instanceof Formula.Product product
                        && product.factors().get(product.factors().size() - 1) == Formula.Constant.DEGREE;
                return degrees ? Optional.of(new Replacement(AuthorText.end(part.parts().get(0)),
                        AuthorText.end(part), "")) : Optional.empty();
            }
        },
        TURNED_TO_RADIANS(SlipKind.DEGREES_AS_RADIANS) {
            @Override
            Optional<Replacement> apply(WaveEdits edits, ParsedFormula part) {
                return edits.scaled(part, Rational.ONE);
            }
        },
        TURNED_TO_DEGREES(SlipKind.RADIANS_AS_DEGREES) {
            @Override
            Optional<Replacement> apply(WaveEdits edits, ParsedFormula part) {
                return edits.scaled(part, Rational.ONE.negate());
            }
        };

        private final SlipKind kind;

        Unit(SlipKind kind) {
            this.kind = kind;
        }

        abstract Optional<Replacement> apply(WaveEdits edits, ParsedFormula part);
    }

    /** A decimal times π/180, or 180/π where {@code direction} is negative, to as many digits as it has. */
    private Optional<Replacement> scaled(ParsedFormula part, Rational direction) {
        ParsedFormula number = part.parts().isEmpty() ? part : part.parts().get(0);
        if (!isPlainNumber(text.text(number))) {
            return Optional.empty();
        }
        BigDecimal value = new BigDecimal(text.text(number));
        Ball factor = Ball.pi(BITS).dividedBy(Ball.of(180, BITS));
        Ball turn = direction.signum() > 0 ? factor : Ball.of(1, BITS).dividedBy(factor);
        Rational turned = turn.middle().times(Rational.of(value));
        if (direction.signum() < 0 && part.parts().isEmpty() && turned.compareTo(FULL_TURN) > 0) {
            // no one means an angle of many turns
            return Optional.empty();
        }
        MathContext digits = new MathContext(Math.max(value.precision(), 2));
        String rounded = new BigDecimal(turned.numerator()).divide(new BigDecimal(turned.denominator()), digits)
                .toPlainString();
        return Optional.of(new Replacement(AuthorText.start(number), AuthorText.end(number), rounded));
    }
}
