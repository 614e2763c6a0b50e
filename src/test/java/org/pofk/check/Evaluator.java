package org.pofk.check;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;

/**
 * Values of formula text by naive recursive descent, to some sixty digits. A decimal is every number within so many
 * units of its last place; a whole number is exact. What a formula means here is read off its text alone, by code that
 * shares nothing with the tool.
 */
final class Evaluator {
    /** A part of a formula; one without the variable in it is worked out once. */
    private record Node(UnaryOperator<Near> value, boolean varies) {
        Near apply(Near x) {
            return value.apply(x);
        }
    }

    private static Node node(UnaryOperator<Near> value, Node... parts) {
        boolean varies = false;
        for (Node part : parts) {
            varies |= part.varies();
        }
        if (varies) {
            return new Node(value, true);
        }
        Near constant = value.apply(Near.ZERO);
        return new Node(x -> constant, false);
    }

    private final String text;
    private final BigDecimal units;
    private int at;

    private Evaluator(String text, BigDecimal units) {
        this.text = text;
        this.units = units;
    }

    /** A formula as a function of its variable. */
    static UnaryOperator<Near> of(String text, String units) {
        Evaluator evaluator = new Evaluator(text, new BigDecimal(units));
        Node whole = evaluator.sum();
        if (evaluator.peek() != '\0') {
            throw new IllegalStateException("not read from " + evaluator.at + ": " + text);
        }
        return whole.value();
    }

    static Near constant(String text, String units) {
        return of(text, units).apply(Near.ZERO);
    }

    private char peek() {
        while (at < text.length() && text.charAt(at) == ' ') {
            at++;
        }
        return at < text.length() ? text.charAt(at) : '\0';
    }

    private boolean takes(char sign) {
        if (peek() == sign) {
            at++;
            return true;
        }
        return false;
    }

    private void require(char sign) {
        if (!takes(sign)) {
            throw new IllegalStateException(sign + " wanted at " + at + ": " + text);
        }
    }

    private Node sum() {
        Node left = takes('-') ? negated(product()) : product();
        while (peek() == '+' || peek() == '-') {
            boolean isMinus = text.charAt(at++) == '-';
            Node before = left;
            Node term = isMinus ? negated(product()) : product();
            left = node(x -> before.apply(x).plus(term.apply(x)), before, term);
        }
        return left;
    }

    private static Node negated(Node operand) {
        return node(x -> operand.apply(x).negate(), operand);
    }

    private Node product() {
        Node left = power();
        while (true) {
            Node before = left;
            if (takes('/')) {
                Node divisor = signedPower();
                left = node(x -> before.apply(x).over(divisor.apply(x)), before, divisor);
            } else if (takes('*')) {
                Node factor = signedPower();
                left = node(x -> before.apply(x).times(factor.apply(x)), before, factor);
            } else if (peek() == '(' || Character.isLetterOrDigit(peek())) {
                Node factor = power();
                left = node(x -> before.apply(x).times(factor.apply(x)), before, factor);
            } else {
                return left;
            }
        }
    }

    private Node signedPower() {
        return takes('-') ? negated(signedPower()) : power();
    }

    private Node power() {
        Node base = atom();
        if (!takes('^')) {
            return base;
        }
        Node exponent = signedPower();
        if (base.varies()) {
            return node(x -> base.apply(x).pow(exponent.apply(x).whole()), base, exponent);
        }
        List<Near> squares = new ArrayList<>(List.of(base.apply(Near.ZERO)));
        return node(x -> power(squares, exponent.apply(x).whole()), base, exponent);
    }

    /** A power of a constant, whose powers to 1, 2, 4, … are kept. */
    private static Near power(List<Near> squares, int exponent) {
        if (exponent < 0) {
            return power(squares, -exponent).inverse();
        }
        Near result = Near.ONE;
        for (int i = 0; exponent >> i != 0; i++) {
            if (i == squares.size()) {
                squares.add(squares.get(i - 1).times(squares.get(i - 1)));
            }
            if ((exponent >> i & 1) == 1) {
                result = result.times(squares.get(i));
            }
        }
        return result;
    }

    private Node atom() {
        char next = peek();
        if (takes('(')) {
            Node inner = sum();
            require(')');
            return inner;
        }
        return Character.isDigit(next) ? number() : named(word());
    }

    private String word() {
        int start = at;
        while (at < text.length() && Character.isLetter(text.charAt(at))) {
            at++;
        }
        if (start == at) {
            throw new IllegalStateException("a name wanted at " + at + ": " + text);
        }
        return text.substring(start, at);
    }

    private Node number() {
        int start = at;
        while (at < text.length() && (Character.isDigit(text.charAt(at)) || text.charAt(at) == '.')) {
            at++;
        }
        if (at + 1 < text.length() && text.charAt(at) == 'e'
                && (text.charAt(at + 1) == '-' || Character.isDigit(text.charAt(at + 1)))) {
            at += 2;
            while (at < text.length() && Character.isDigit(text.charAt(at))) {
                at++;
            }
        }
        String digits = text.substring(start, at);
        BigDecimal value = new BigDecimal(digits);
        boolean isDecimal = digits.indexOf('.') >= 0 || digits.indexOf('e') >= 0;
        Near number = isDecimal ? Near.exactly(value).widened(value.ulp().multiply(units)) : Near.exactly(value);
        return new Node(x -> number, false);
    }

    private Node named(String name) {
        return switch (name) {
            case "k", "z", "s" -> new Node(x -> x, true);
            case "i" -> new Node(x -> Near.I, false);
            case "pi" -> new Node(x -> Elementary.piNear(), false);
            case "deg" -> new Node(x -> Elementary.piNear().over(Near.exactly(180)), false);
            default -> call(name);
        };
    }

    private Node call(String name) {
        require('(');
        Node first = sum();
        Node second = takes(',') ? sum() : first;
        require(')');
        return switch (name) {
            case "sqrt" -> node(x -> Elementary.sqrt(first.apply(x)), first, second);
            case "cos" -> node(x -> Elementary.cos(first.apply(x)), first, second);
            case "sin" -> node(x -> Elementary.sin(first.apply(x)), first, second);
            case "exp" -> node(x -> Elementary.exp(first.apply(x)), first, second);
            case "arctan" -> node(x -> Elementary.arctan(first.apply(x)), first, second);
            case "arccos" -> node(x -> Elementary.arccos(first.apply(x)), first, second);
            case "delta" -> node(x -> first.apply(x).whole() == 0 ? Near.ONE : Near.ZERO, first, second);
            case "binomial" -> node(x -> Near.binomial(first.apply(x), second.apply(x).whole()), first, second);
            default -> throw new IllegalStateException("no function " + name + ": " + text);
        };
    }
}
