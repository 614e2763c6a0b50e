package org.pofk.slip;

import org.pofk.claim.FormulaText;
import org.pofk.formula.Formula;
import org.pofk.formula.Latex;
import org.pofk.formula.PlainText;

/** What an edit writes, in plain notation or in LaTeX. */
enum AuthorNotation {
    PLAIN("*", "(", ")", "(", ")", " deg", "1/2*") {
        @Override
        String write(Formula formula) {
            return PlainText.ASCII.write(formula);
        }

        @Override
        String root(String text) {
            return "sqrt(" + text + ")";
        }
    },
    LATEX(" \\cdot ", "\\left(", "\\right)", "{", "}", "^{\\circ}", "\\frac{1}{2} \\cdot ") {
        @Override
        String write(Formula formula) {
            return Latex.write(formula);
        }

        @Override
        String root(String text) {
            return "\\sqrt{" + text + "}";
        }
    };

    private final String times;
    private final String open;
    private final String close;
    private final String openExponent;
    private final String closeExponent;
    private final String degrees;
    private final String half;

    AuthorNotation(String times, String open, String close, String openExponent, String closeExponent, String degrees,
            String half) {
        this.times = times;
        this.open = open;
        this.close = close;
        this.openExponent = openExponent;
        this.closeExponent = closeExponent;
        this.degrees = degrees;
        this.half = half;
    }

    static AuthorNotation of(FormulaText.Notation notation) {
        return notation == FormulaText.Notation.LATEX ? LATEX : PLAIN;
    }

    abstract String write(Formula formula);

    /** The square root of what a text says. */
    abstract String root(String text);

    String times() {
        return times;
    }

    String enclosed(String text) {
        return open + text + close;
    }

    String exponent(String text) {
        return openExponent + text + closeExponent;
    }

    /** What makes degrees of the number before it. */
    String degrees() {
        return degrees;
    }

    /** One half, as a factor in front. */
    String half() {
        return half;
    }
}
