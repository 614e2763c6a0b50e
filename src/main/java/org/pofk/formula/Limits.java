package org.pofk.formula;

import java.util.List;
import org.pofk.exact.Rational;
import org.pofk.text.Fault;
import org.pofk.text.Places;
import org.pofk.text.RefusedException;

/** How much of a text is taken on, by where it comes from; what goes beyond is refused before any work is done. */
enum Limits {
    /** Expressions of a model. */
    MODEL(FormulaParser.LONGEST, FormulaParser.DEEPEST) {
        @Override
        boolean allowsPower(Rational exponent) {
            return true;
        }
    },
    /** Formulas handed in by others. */
    CLAIM(10_000, 100) {
        @Override
        boolean allowsPower(Rational exponent) {
            return exponent.abs().compareTo(Rational.of(LARGEST_POWER)) <= 0;
        }
    };

    static final int LARGEST_POWER = 100_000;

    private final int longest;
    private final int deepest;

    Limits(int longest, int deepest) {
        this.longest = longest;
        this.deepest = deepest;
    }

    /** Refuses a text that is too long, at its beginning. */
    void require(String text, Places places) throws RefusedException {
        if (text.length() > longest) {
            throw new RefusedException(List.of(new Fault(places.at(0), "formula-too-long",
                    "the formula has " + text.length() + " characters, more than " + longest)));
        }
    }

    /** Deepest nesting. */
    int deepest() {
        return deepest;
    }

    /** Whether a number may stand as an exponent. */
    abstract boolean allowsPower(Rational exponent);
}
