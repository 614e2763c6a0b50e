package org.pofk.slip;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.pofk.claim.AnswerOf;
import org.pofk.claim.AuthorText;
import org.pofk.claim.AuthorText.Replacement;
import org.pofk.claim.Claim;
import org.pofk.claim.Judgement;
import org.pofk.claim.Statement;
import org.pofk.claim.Truth;
import org.pofk.formula.Formula;
import org.pofk.meaning.Fit;
import org.pofk.modes.Mode;
import org.pofk.slip.FormulaSurvey.Constant;

/** Every change of a statement's texts that may undo a slip; most are soon refuted. */
final class Changes {
    /** Above so many modes no missing term is tried. */
    private static final int MOST_MODES = 40;
    private static final int MOST_SWAPS = 400;
    private static final int LEAST_DIGITS = 3;

    private final Claim claim;
    private final Judgement judgement;
    private final Truth truth;
    private final List<StatementPart> parts;
    private final List<Optional<AuthorText>> texts;
    private final List<Optional<Screen>> screens;
    private final TrueNumber.Precisions digits;

    Changes(Claim claim, Judgement judgement, Truth truth, List<Optional<AuthorText>> texts,
            List<Optional<Screen>> screens) {
        this.claim = claim;
        this.judgement = judgement;
        this.truth = truth;
        this.parts = StatementPart.of(claim.statement());
        this.texts = texts;
        this.screens = screens;
        this.digits = digits();
    }

    private TrueNumber.Precisions digits() {
        int significant = 0;
        int places = 0;
        for (Optional<AuthorText> text : texts) {
            for (Formula formula : text.stream().flatMap(each -> each.tree().nodes())
                    .map(node -> node.formula()).toList()) {
                if (formula instanceof Formula.WrittenDecimal decimal) {
                    BigDecimal value = new BigDecimal(decimal.text());
                    significant = Math.max(significant, value.precision());
                    places = Math.max(places, value.scale());
                }
            }
        }
        return new TrueNumber.Precisions(significant, places);
    }

    /** Those within one text and those that concern two. */
    List<Change> all() {
        List<Change> changes = new ArrayList<>();
        for (int part = 0; part < parts.size(); part++) {
            changes.addAll(of(part));
        }
        changes.addAll(swaps());
        return changes;
    }

    /** Those within one text. */
    List<Change> of(int part) {
        if (texts.get(part).isEmpty()) {
            return List.of();
        }
        AuthorText text = texts.get(part).get();
        FormulaSurvey survey = FormulaSurvey.of(text.tree());
        // the sign of a pair's angle turned is that of its phase turned
        boolean isAngle = claim.statement() instanceof Statement.Pair && parts.get(part).name().equals("angle");
        List<Edit> edits = new ArrayList<>(isAngle ? List.of() : new SignEdits(text).of(survey));
        edits.addAll(ofKind(part, text, survey));
        claim.safeSide().filter(side -> Digits.isNumber(text.text())).ifPresent(side ->
                edits.addAll(toTheSafeSide(text, side)));
        edits.addAll(new NumberEdits(text).of(survey, constant -> right(part, text, survey, constant)));
        return edits.stream().map(edit -> change(part, edit)).toList();
    }

    private List<Edit> ofKind(int part, AuthorText text, FormulaSurvey survey) {
        List<Edit> edits = new ArrayList<>();
        if (claim.statement() instanceof Statement.PofK formula) {
            edits.addAll(new WaveEdits(text).of(survey));
            edits.addAll(new PolarEdits(text).of(survey));
            edits.addAll(new StepEdits(text).of(survey));
            edits.addAll(new SwapEdits(text).of(survey));
            List<Mode> modes = truth.about(formula.parts().get(part).output()).closedForm().modes();
            edits.addAll(modes.size() > MOST_MODES ? List.of() : new MissingEdits(text, digitsAdded()).ofSteps(modes));
        } else if (claim.statement() instanceof Statement.TransformOf transform) {
            edits.addAll(new ZEdits(text).of(survey));
            edits.addAll(new SwapEdits(text).of(survey));
            List<Mode> modes = truth.about(transform.output()).closedForm().modes();
            int powerOfZ = transform.form() == Statement.TransformOf.Form.TRANSFORM_OVER_Z ? 0 : 1;
            edits.addAll(modes.size() > MOST_MODES ? List.of()
                    : new MissingEdits(text, digitsAdded()).ofTransform(modes, powerOfZ));
        } else if (claim.statement() instanceof Statement.MatrixPolynomial) {
            edits.addAll(new SwapEdits(text).of(survey));
        } else if (claim.statement() instanceof Statement.Pair) {
            String name = parts.get(part).name();
            edits.addAll(ofPair(name, text));
        } else if (claim.statement() instanceof AnswerOf asked) {
            edits.addAll(new AnswerEdits(text).of(asked));
        } else if (!(claim.statement() instanceof Statement.Poles)) {
            edits.add(complement(text));
        }
        return edits;
    }

    private static List<Edit> ofPair(String name, AuthorText text) {
        PolarEdits polar = new PolarEdits(text);
        List<Edit> edits = new ArrayList<>(switch (name) {
            case "amplitude" -> new WaveEdits(text).ofAmplitude();
            case "radius" -> polar.ofRadius();
            case "angle" -> polar.ofAngle();
            default -> polar.ofPhase();
        });
        edits.addAll(name.equals("angle") || name.equals("phase") ? new WaveEdits(text).ofAngle() : List.of());
        return edits;
    }

    /** A decimal one unit of its last place further to the safe side, or less where more digits are needed. */
    private List<Edit> toTheSafeSide(AuthorText text, Claim.SafeSide side) {
        BigDecimal found = new BigDecimal(text.text());
        BigDecimal next = side == Claim.SafeSide.ABOVE ? found.add(found.ulp()) : found.subtract(found.ulp());
        return Stream.of(next.toPlainString(), judgement.right()).filter(Digits::isNumber)
                .filter(right -> isBetween(new BigDecimal(right), found, next))
                .map(right -> new Edit(SlipKind.ROUNDED_TO_THE_UNSAFE_SIDE,
                        List.of(new Replacement(0, text.text().length(), right)), text.place(), text.text(), right))
                .toList();
    }

    private static boolean isBetween(BigDecimal value, BigDecimal first, BigDecimal last) {
        return value.compareTo(first.min(last)) >= 0 && value.compareTo(first.max(last)) <= 0;
    }

    /** Significant digits for numbers put in; 0 where the author writes no decimals. */
    private int digitsAdded() {
        return digits.significant() == 0 ? 0 : Math.max(LEAST_DIGITS, digits.significant());
    }

    static Edit complement(AuthorText text) {
        String found = text.text();
        String right = Digits.isNumber(found)
                ? BigDecimal.ONE.subtract(new BigDecimal(found)).toPlainString()
                : "1 - " + AuthorNotation.of(text.notation()).enclosed(found);
        return new Edit(SlipKind.COMPLEMENT_QUOTED, List.of(new Replacement(0, found.length(), right)), text.place(),
                found, right);
    }

    /** Right numbers for a place: what the judgement found, what the right statement is made of, what would solve it. */
    private List<String> right(int part, AuthorText text, FormulaSurvey survey, Constant constant) {
        String found = text.text(constant.node());
        AuthorNotation notation = AuthorNotation.of(text.notation());
        Set<String> right = new LinkedHashSet<>();
        judgement.numbers().stream().filter(each -> each.fit() == Fit.WRONG
                && each.written().span().equals(text.place(constant.node()))).forEach(each -> right.add(each.right()));
        for (TrueNumber number : TrueNumbers.of(claim.statement(), part, constant.role(), truth)) {
            right.addAll(number.absolute().inPlaceOf(found, digits, notation));
            if (number.isNegative() && parts.size() > 1) {
                right.addAll(number.inPlaceOf(found, digits, notation));
            }
        }
        screens.get(part).ifPresent(screen -> SolvedNumbers.of(text, constant.node(), screen)
                .forEach(number -> right.addAll(number.inPlaceOf(found, digits, notation))));
        boolean partOfFraction = constant.isLiteral() && survey.fractions().stream()
                .anyMatch(fraction -> fraction.node().nodes().anyMatch(node -> node == constant.node()));
        return right.stream().filter(number -> !partOfFraction || !number.contains("/")).toList();
    }

    /** The change of one text; where two poles are written as one with ±, of both. */
    private Change change(int part, Edit edit) {
        Change change = Change.of(part, named(part, edit));
        if (claim.statement() instanceof Statement.Poles) {
            for (int other = 0; other < parts.size(); other++) {
                if (other != part && parts.get(other).text().parsed().span()
                        .equals(parts.get(part).text().parsed().span())) {
                    Map<Integer, List<Replacement>> both = new TreeMap<>(change.edits());
                    both.put(other, edit.replacements());
                    return new Change(change.kind(), new TreeMap<>(both), change.span(), change.found(),
                            change.right());
                }
            }
        }
        return change;
    }

    /** What a slip is called in this part of the statement. */
    private Edit named(int part, Edit edit) {
        String name = parts.get(part).name();
        SlipKind kind = edit.kind();
        boolean pole = claim.statement() instanceof Statement.Poles || name.equals("pole")
                || name.equals("radius") || name.equals("angle") || name.equals("eigenvalue");
        // 0.1 may be 1/7 rounded early, but 7/10 of it is told by all of its digits
        boolean isMerelyOff = kind == SlipKind.WRONG_COEFFICIENT || kind == SlipKind.ROUNDED_TOO_EARLY;
        if (isMerelyOff && claim.statement() instanceof Statement.Residues residues && !pole
                && ResidueFactors.isOneLeftOut(claim, residues, part, truth)) {
            kind = SlipKind.RESIDUE_WITHOUT_A_FACTOR;
        } else if (kind == SlipKind.WRONG_COEFFICIENT && pole) {
            kind = SlipKind.WRONG_POLE;
        } else if (kind == SlipKind.SIGN_OF_A_TERM && name.equals("phase")) {
            kind = SlipKind.SIGN_OF_THE_PHASE;
        }
        return new Edit(kind, edit.replacements(), edit.span(), edit.found(), edit.right());
    }

    /** Two texts of a list exchanged. */
    private List<Change> swaps() {
        List<Change> swaps = new ArrayList<>();
        if (!(claim.statement() instanceof Statement.Residues)) {
            return swaps;
        }
        for (int i = 0; i < parts.size(); i++) {
            for (int j = i + 1; j < parts.size() && swaps.size() < MOST_SWAPS; j++) {
                boolean poles = isPole(i) == isPole(j);
                if (poles && texts.get(i).isPresent() && texts.get(j).isPresent()) {
                    AuthorText a = texts.get(i).get();
                    AuthorText b = texts.get(j).get();
                    if (!a.text().equals(b.text())) {
                        swaps.add(swap(i, a, j, b));
                    }
                }
            }
        }
        return swaps;
    }

    private boolean isPole(int part) {
        return parts.get(part).name().equals("pole") || parts.get(part).name().equals("eigenvalue");
    }

    private static Change swap(int i, AuthorText a, int j, AuthorText b) {
        return new Change(SlipKind.COEFFICIENTS_SWAPPED, new TreeMap<>(Map.of(
                i, List.of(new Replacement(0, a.text().length(), b.text())),
                j, List.of(new Replacement(0, b.text().length(), a.text())))), a.place(),
                a.text() + " and " + b.text(), b.text() + " and " + a.text());
    }
}
