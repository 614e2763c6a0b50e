package org.pofk.formula;

import org.pofk.formula.Token.Kind;
import org.pofk.text.RefusedException;
import org.pofk.text.Suggestion;

/** Which factors may stand side by side without a sign: those that can only be meant as a product. */
final class Juxtaposition {

    private Juxtaposition() {
    }

    /**
     * Refuses the next token, which begins an operand, when it may not stand behind a factor that ends so. In LaTeX
     * names and exponents have their own ends, so that less is ambiguous.
     */
    static void require(Cursor cursor, Ending ending) throws RefusedException {
        Token token = cursor.peek();
        if (token.is(Kind.NUMBER) && !(cursor.rules().notation() == Notation.LATEX && isApart(cursor, ending))) {
            throw signMissing(cursor, "");
        }
        boolean beginsCall = cursor.peekBehind().is(Kind.OPEN) && token.is(Kind.NAME)
                && Words.function(token.text()).isPresent();
        if (beginsCall) {
            return;
        }
        if (cursor.rules().notation() == Notation.LATEX && !(ending == Ending.NAME && token.is(Kind.OPEN))) {
            return;
        }
        switch (ending) {
            case NUMBER, CONSTANT, CLOSED -> { }
            case LETTER -> requireProduct(cursor, token.is(Kind.OPEN) || isConstant(token));
            case NAME -> requireProduct(cursor, isConstant(token));
            case NUMBER_EXPONENT -> requireClear(cursor, token.is(Kind.OPEN));
            case NAME_EXPONENT -> requireClear(cursor, false);
            case ROOT -> throw cursor.refused(token, "ambiguous-root", "what stands behind √" + cursor.before().text()
                    + " can be read in two ways: write * for a product, or all under the root in parentheses");
        }
    }

    /** In LaTeX a number may stand behind braces and parentheses, and a decimal behind a letter: no index has a point. */
    private static boolean isApart(Cursor cursor, Ending ending) {
        boolean isDecimal = cursor.peek().text().contains(".");
        return ending == Ending.CLOSED && !cursor.before().text().isEmpty() || ending == Ending.LETTER && isDecimal;
    }

    private static boolean isConstant(Token token) {
        return token.is(Kind.DEGREE) || token.is(Kind.NAME) && Words.constant(token.text()).isPresent();
    }

    private static void requireClear(Cursor cursor, boolean isClear) throws RefusedException {
        if (!isClear) {
            throw cursor.refused(cursor.peek(), "ambiguous-power", "what stands behind the exponent "
                    + Words.shortened(cursor.before().text())
                    + " can be read in two ways: write * for a product, or the whole exponent in parentheses");
        }
    }

    private static void requireProduct(Cursor cursor, boolean isProduct) throws RefusedException {
        if (!isProduct) {
            throw cursor.sees(Kind.OPEN) ? unknownFunction(cursor) : namesSideBySide(cursor);
        }
    }

    private static RefusedException unknownFunction(Cursor cursor) {
        Token name = cursor.before();
        String suggestion = Suggestion.didYouMean(Words.FUNCTION_NAMES, name.text());
        return cursor.refused(name, "function-unknown", "no function is called '" + Words.shortened(name.text()) + "'"
                + suggestion + (suggestion.isEmpty() ? "; a product is written with *" : ""));
    }

    private static RefusedException namesSideBySide(Cursor cursor) {
        String names = cursor.shown(cursor.before().start(), cursor.peek().end());
        return signMissing(cursor,
                names.contains("'") ? "" : "; a name with spaces is written in quotes: '" + names + "'");
    }

    private static RefusedException signMissing(Cursor cursor, String wayOut) {
        return cursor.refused(cursor.peek(), "operator-missing", "between '" + Words.shortened(cursor.before().text())
                + "' and '" + Words.shortened(cursor.peek().text()) + "' a sign is missing" + wayOut);
    }
}
