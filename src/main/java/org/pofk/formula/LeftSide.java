package org.pofk.formula;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.pofk.formula.FormulaReading.Subject;
import org.pofk.formula.Token.Kind;
import org.pofk.text.RefusedException;

/**
 * What stands left of the equals sign of a formula: {@code p(k) =}, {@code lost(k) =}, {@code p_k =}, {@code Y(z)/z =}.
 * Dropped only when it says just what is expected: p(k + 1) = … read as p(k) would be another formula.
 */
final class LeftSide {
    /** Left sides with N for a name, K for a name with the index k. */
    private static final Map<Subject, Pattern> EXPECTED = Map.of(
            Subject.NUMBER, Pattern.compile("(?!)"),
            Subject.OF_K, Pattern.compile("N\\(k\\)|K"),
            Subject.OF_Z, Pattern.compile("N\\(z\\)"),
            Subject.OF_Z_OVER_Z, Pattern.compile("N\\(z\\)/z|\\(\\(N\\(z\\)\\)/\\(z\\)\\)"));
    private static final Pattern INDEXED_BY_K = Pattern.compile(".*[_,]k");

    private LeftSide() {
    }

    /** Moves the cursor behind the equals sign outside all parentheses, where there is one. */
    static void drop(Cursor cursor, Subject subject) throws RefusedException {
        List<Integer> signs = equalsSigns(cursor.tokens());
        if (signs.isEmpty()) {
            return;
        }
        if (signs.size() > 1) {
            throw cursor.refused(cursor.tokens().get(signs.get(1)), "equals-twice",
                    "only one equals sign can stand here: state what comes between as a claim of its own");
        }
        List<Token> left = cursor.tokens().subList(0, signs.get(0));
        String said = left.stream().map(LeftSide::symbol).collect(Collectors.joining());
        if (!EXPECTED.get(subject).matcher(said).matches()) {
            throw unexpected(cursor, left, subject);
        }
        cursor.beginAt(signs.get(0) + 1);
    }

    private static List<Integer> equalsSigns(List<Token> tokens) {
        List<Integer> signs = new ArrayList<>();
        int depth = 0;
        for (int i = 0; i < tokens.size(); i++) {
            Token token = tokens.get(i);
            depth += switch (token.kind()) {
                case OPEN, BRACE_OPEN -> 1;
                case CLOSE, BRACE_CLOSE -> -1;
                default -> 0;
            };
            if (depth == 0 && token.is(Kind.RELATION) && (token.text().equals("=") || token.text().equals("≈"))) {
                signs.add(i);
            }
        }
        return signs;
    }

    private static String symbol(Token token) {
        if (token.is(Kind.NAME) && Words.function(token.text()).isPresent()) {
            return "?";
        }
        return switch (token.kind()) {
            case NAME, QUOTED -> token.text().equals("k") || token.text().equals("z") ? token.text()
                    : INDEXED_BY_K.matcher(token.text()).matches() ? "K" : "N";
            case OPEN -> "(";
            case CLOSE -> ")";
            case DIVIDE -> "/";
            default -> "?";
        };
    }

    private static RefusedException unexpected(Cursor cursor, List<Token> left, Subject subject) {
        Token first = left.isEmpty() ? cursor.peek() : left.get(0);
        String said = left.isEmpty() ? "nothing"
                : "'" + cursor.shown(first.start(), left.get(left.size() - 1).end()) + "'";
        return cursor.refused(first, "left-side", switch (subject) {
            case NUMBER -> "a number is expected here: take out what stands left of the equals sign, " + said;
            case OF_K -> "left of the equals sign stands " + said + ", expected is a name at step k, as in p(k) = …";
            case OF_Z -> "left of the equals sign stands " + said + ", expected is a name of z, as in Y(z) = …";
            case OF_Z_OVER_Z -> "left of the equals sign stands " + said
                    + ", expected is a transform over z, as in Y(z)/z = …";
        });
    }
}
