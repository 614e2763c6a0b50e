package org.pofk.formula;

import java.text.Normalizer;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.pofk.formula.Formula.Constant;
import org.pofk.formula.Formula.Function;

/** The words of the formula language, and which words can stand for a name without quotes. */
final class Words {
    private static final Map<String, Constant> CONSTANTS = Map.of("pi", Constant.PI, "π", Constant.PI,
            "i", Constant.I, "deg", Constant.DEGREE, "degree", Constant.DEGREE, "degrees", Constant.DEGREE);
    private static final Map<String, Function> FUNCTIONS = Map.of("sqrt", Function.SQRT, "cos", Function.COS,
            "sin", Function.SIN, "exp", Function.EXP, "arctan", Function.ARCTAN, "atan", Function.ARCTAN,
            "arccos", Function.ARCCOS, "acos", Function.ARCCOS, "binomial", Function.BINOMIAL,
            "delta", Function.DELTA);
    static final List<String> FUNCTION_NAMES =
            List.of("sqrt", "cos", "sin", "exp", "arctan", "arccos", "binomial", "delta", "atan", "acos");
    /** The words between a branch of a formula in cases and its steps. */
    static final Set<String> OF_CASES = Set.of("for", "otherwise");

    private Words() {
    }

    static Optional<Constant> constant(String word) {
        return Optional.ofNullable(CONSTANTS.get(word));
    }

    static Optional<Function> function(String word) {
        return Optional.ofNullable(FUNCTIONS.get(word));
    }

    static String nameOf(Function function) {
        return FUNCTION_NAMES.get(function.ordinal());
    }

    static String nameOf(Constant constant) {
        return switch (constant) {
            case PI -> "pi";
            case I -> "i";
            case DEGREE -> "deg";
        };
    }

    static boolean beginsName(int codePoint) {
        return Character.isLetter(codePoint) || codePoint == '_';
    }

    static boolean continuesName(int codePoint) {
        int type = Character.getType(codePoint);
        return beginsName(codePoint) || Character.isDigit(codePoint) || type == Character.NON_SPACING_MARK
                || type == Character.COMBINING_SPACING_MARK;
    }

    static String normalized(String word) {
        return Normalizer.normalize(word, Normalizer.Form.NFC);
    }

    /** True when the name, written without quotes, is read as that name and nothing else. */
    static boolean isBareName(String name) {
        return !name.isEmpty() && beginsName(name.codePointAt(0))
                && name.codePoints().allMatch(Words::continuesName)
                && name.equals(normalized(name))
                && !CONSTANTS.containsKey(name) && !FUNCTIONS.containsKey(name) && !OF_CASES.contains(name);
    }

    /** The text at most 24 characters long, its end replaced by an ellipsis otherwise. */
    static String shortened(String text) {
        return text.codePointCount(0, text.length()) <= 24
                ? text : text.substring(0, text.offsetByCodePoints(0, 23)) + "…";
    }
}
