package org.pofk.formula;

import java.util.List;
import org.apache.commons.math3.complex.Complex;

/**
 * The value of LaTeX at k = 3 by what it prints: spacing is struck out, then it is worked out from the left while it is
 * read. Knows nothing of the reader that it is held against. Approximate, in doubles; letters other than k and i stand
 * for numbers of their own.
 */
final class PrintedLatex {
    /** What can't be worked out this way. */
    static final class Unclear extends RuntimeException {
        private static final long serialVersionUID = 1L;

        Unclear(String what) {
            super(what);
        }
    }

    private final String text;
    private int at;

    private PrintedLatex(String text) {
        this.text = text;
    }

    static Complex value(String latex) {
        String text = latex.replaceFirst("^_*([A-Za-z]|\\\\pi|\\\\text\\s*(\\{[^}]*\\}|[a-z]))"
                        .concat("_*\\(_*[kz]_*\\)_*(=|\\\\approx(?![A-Za-z]))")
                        .replace("_", "(\\\\[,;:! ]|~|\\\\[bB]igg?[lr]?(?![A-Za-z])|\\s)"), "")
                .replaceAll("(?<=[0-9])(\\\\[,;: ]|~)\\s*(?=[0-9]{3}(?![0-9]))", "")
                .replaceAll("([0-9])\\{,\\}([0-9])", "$1.$2")
                .replaceAll("\\\\(left|right|[bB]igg?[lr]?|displaystyle|q?quad|textstyle)(?![A-Za-z])", "")
                .replaceAll("\\\\[,;:! ]|~", " ")
                .replaceAll("\\^\\s*(\\\\circ(?![A-Za-z])|\\{\\s*\\\\circ\\s*\\})", "°")
                .replaceAll("\\\\(cdot|times)(?![A-Za-z])", "*")
                .replaceAll("\\\\[dt]?frac(?![A-Za-z])", "\\\\frac ")
                .replaceAll("[.,;]\\s*$", "").strip();
        PrintedLatex printed = new PrintedLatex(text);
        Complex value = printed.sum();
        if (printed.at < text.length()) {
            throw new Unclear("left over: " + text.substring(printed.at));
        }
        return value;
    }

    private void blanks() {
        while (at < text.length() && Character.isWhitespace(text.charAt(at))) {
            at++;
        }
    }

    private char next() {
        blanks();
        return at < text.length() ? text.charAt(at) : '\0';
    }

    private boolean takes(String what) {
        blanks();
        boolean isThere = text.startsWith(what, at)
                && !(what.startsWith("\\") && Character.isLetter(what.charAt(what.length() - 1))
                        && at + what.length() < text.length() && Character.isLetter(text.charAt(at + what.length())));
        at += isThere ? what.length() : 0;
        return isThere;
    }

    private void require(String what) {
        if (!takes(what)) {
            throw new Unclear(what + " expected at " + at + " in " + text);
        }
    }

    private Complex sum() {
        Complex sum = takes("+") ? term() : term();
        while (next() == '+' || next() == '-') {
            sum = takes("+") ? sum.add(term()) : takes("-") ? sum.subtract(term()) : sum;
        }
        return sum;
    }

    private Complex term() {
        return takes("-") ? term().negate() : product(true);
    }

    private Complex product(boolean signs) {
        Complex product = power();
        while (true) {
            if (signs && takes("*")) {
                product = product.multiply(signed());
            } else if (signs && takes("/")) {
                product = product.divide(signed());
            } else if ("\0+-*/)]},&=".indexOf(next()) < 0 && !text.startsWith("\\}", at)) {
                product = product.multiply(power());
            } else {
                return product;
            }
        }
    }

    private Complex signed() {
        return takes("-") ? signed().negate() : power();
    }

    private Complex power() {
        Complex base = atom();
        return takes("^") ? raised(base, argument()) : base;
    }

    private static Complex raised(Complex base, Complex exponent) {
        boolean isWhole = exponent.getImaginary() == 0 && exponent.getReal() == Math.rint(exponent.getReal())
                && Math.abs(exponent.getReal()) < 1000;
        if (!isWhole) {
            return new Complex(base.getReal(), base.getImaginary() + 0.0).pow(exponent);
        }
        Complex power = Complex.ONE;
        for (int i = 0; i < Math.abs(exponent.getReal()); i++) {
            power = power.multiply(base);
        }
        return exponent.getReal() < 0 ? power.reciprocal() : power;
    }

    private Complex argument() {
        if (takes("{")) {
            return closed("}");
        }
        if (Character.isDigit(next())) {
            return new Complex(text.charAt(at++) - '0');
        }
        return atom();
    }

    private Complex closed(String by) {
        Complex value = sum();
        require(by);
        return value;
    }

    private Complex atom() {
        char c = next();
        if (Character.isDigit(c) || c == '.') {
            int start = at;
            while (at < text.length() && (Character.isDigit(text.charAt(at)) || text.charAt(at) == '.')) {
                at++;
            }
            double value = Double.parseDouble(text.substring(start, at));
            return new Complex(takes("\\%") ? value / 100 : value);
        }
        if (takes("\\{")) {
            return closed("\\}");
        }
        for (String pair : new String[] {"()", "[]", "{}"}) {
            if (takes(pair.substring(0, 1))) {
                return takes("}") && pair.equals("{}") ? Complex.ONE : closed(pair.substring(1));
            }
        }
        return c == '\\' ? command() : letter();
    }

    private Complex command() {
        if (takes("\\frac")) {
            return argument().divide(argument());
        }
        if (takes("\\sqrt")) {
            return argument().sqrt();
        }
        if (takes("\\binom")) {
            Complex n = argument();
            Complex p = argument();
            return binomial(n.getReal(), (int) p.getReal());
        }
        if (takes("\\cos")) {
            return functionArgument().cos();
        }
        if (takes("\\sin")) {
            return functionArgument().sin();
        }
        if (takes("\\exp")) {
            return functionArgument().exp();
        }
        if (takes("\\pi")) {
            return new Complex(Math.PI);
        }
        if (takes("\\mathrm") || takes("\\text")) {
            boolean isBraced = takes("{");
            Complex value = isBraced && next() == '}' ? Complex.ONE : letter();
            if (isBraced) {
                require("}");
            }
            return value;
        }
        for (String greek : List.of("theta:θ", "eta:η", "beta:β", "zeta:ζ")) {
            if (takes("\\" + greek.substring(0, greek.indexOf(':')))) {
                return letter(greek.charAt(greek.length() - 1));
            }
        }
        throw new Unclear(text.substring(at));
    }

    private Complex functionArgument() {
        return "([{".indexOf(next()) >= 0 || text.startsWith("\\{", at) ? atom() : product(false);
    }

    private static Complex binomial(double n, int p) {
        double value = 1;
        for (int i = 0; i < p; i++) {
            value *= (n - i) / (i + 1);
        }
        return new Complex(value);
    }

    private Complex letter() {
        char c = text.charAt(at);
        if (c == '°') {
            at++;
            return new Complex(Math.PI / 180);
        }
        if (!(c >= 'a' && c <= 'z' || c >= 'A' && c <= 'Z')) {
            throw new Unclear(text.substring(at));
        }
        at++;
        return letter(c);
    }

    static Complex letter(char c) {
        return switch (c) {
            case 'k' -> new Complex(3);
            case 'i' -> Complex.I;
            case 'e' -> new Complex(Math.E);
            default -> new Complex(1 + c % 29 / 31.0);
        };
    }
}
