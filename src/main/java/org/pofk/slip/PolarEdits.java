package org.pofk.slip;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.pofk.claim.AuthorText;
import org.pofk.claim.AuthorText.Replacement;
import org.pofk.formula.Formula;
import org.pofk.formula.ParsedFormula;
import org.pofk.slip.FormulaSurvey.Constant;
import org.pofk.slip.FormulaSurvey.Role;

/** What goes wrong on the way from x + iy to radius and angle: the square root, and the quadrant of the arctangent. */
final class PolarEdits {
    private static final BigDecimal HALF_TURN = BigDecimal.valueOf(180);

    private final AuthorText text;
    private final AuthorNotation notation;

    PolarEdits(AuthorText text) {
        this.text = text;
        this.notation = AuthorNotation.of(text.notation());
    }

    /** In a formula with cosines or sines, each base and each angle. */
    List<Edit> of(FormulaSurvey survey) {
        List<Edit> edits = new ArrayList<>();
        if (!survey.waves().isEmpty()) {
            survey.powers().stream().map(power -> power.parts().get(0)).filter(base -> !AuthorText.varies(base))
                    .forEach(base -> edits.add(root(base)));
            Stream.concat(survey.literals().stream(), survey.fractions().stream())
                    .filter(constant -> constant.role() == Role.ANGLE).map(Constant::node)
                    .forEach(angle -> edits.add(besideHalfTurn(angle)));
        }
        return edits;
    }

    /** A text that is a radius. */
    List<Edit> ofRadius() {
        return List.of(root(text.tree()));
    }

    /** A text that is the angle of a pole, in (0, π). */
    List<Edit> ofAngle() {
        return List.of(besideHalfTurn(text.tree()));
    }

    /** A text that is a phase. */
    List<Edit> ofPhase() {
        String half = halfTurn(text.tree());
        return Stream.of(" - ", " + ").map(sign -> edit(SlipKind.ANGLE_IN_ANOTHER_QUADRANT, text.tree(),
                text.text() + sign + half)).toList();
    }

    private Edit root(ParsedFormula node) {
        return edit(SlipKind.SQUARE_ROOT_FORGOTTEN, node, notation.root(text.text(node)));
    }

    /** Of a number of degrees the number is what changes. */
    private Edit besideHalfTurn(ParsedFormula angle) {
        ParsedFormula number = angle.formula() instanceof Formula.Product && angle.parts().size() == 2
                && angle.parts().get(1).formula() == Formula.Constant.DEGREE ? angle.parts().get(0) : angle;
        String found = text.text(number);
        return edit(SlipKind.ANGLE_IN_ANOTHER_QUADRANT, number, number != angle && Digits.isNumber(found)
                ? HALF_TURN.subtract(new BigDecimal(found)).toPlainString() : halfTurn(number) + " - " + found);
    }

    /** π in the unit of an angle; a number before the sign of degrees is one of them. */
    private String halfTurn(ParsedFormula angle) {
        boolean isBare = angle.nodes().noneMatch(node -> node.formula() == Formula.Constant.DEGREE);
        boolean isInDegrees = text.tree().nodes().anyMatch(node -> node.formula() == Formula.Constant.DEGREE);
        return !isInDegrees ? notation.write(Formula.Constant.PI)
                : isBare && angle != text.tree() ? "180" : "180" + notation.degrees();
    }

    private Edit edit(SlipKind kind, ParsedFormula node, String right) {
        boolean isAlone = node == text.tree();
        return new Edit(kind, List.of(new Replacement(AuthorText.start(node), AuthorText.end(node),
                isAlone || kind == SlipKind.SQUARE_ROOT_FORGOTTEN ? right : notation.enclosed(right))),
                text.place(node), text.text(node), right);
    }
}
