package org.pofk.report;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.stream.Collectors;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;

/** Values and tools as Python text. */
final class Python {
    private static final int WIDTH = 100;

    private Python() {
    }

    /** A string literal; what can't be seen is written by its code. */
    static String text(String value) {
        return value.codePoints().mapToObj(c -> c == '"' || c == '\\' ? "\\" + (char) c
                : Character.isISOControl(c) || Character.getType(c) == Character.FORMAT || c == 0x2028 || c == 0x2029
                || Character.getType(c) == Character.SURROGATE ? String.format("\\U%08x", c) : Character.toString(c))
                .collect(Collectors.joining("", "\"", "\""));
    }

    /** {@code numbers("1/2 0 3")}, over several lines where it is long. */
    static String numbers(List<Rational> values) {
        String joined = values.stream().map(Rational::toString).collect(Collectors.joining(" "));
        if (joined.length() <= WIDTH) {
            return "numbers(\"" + joined + "\")";
        }
        StringBuilder lines = new StringBuilder("numbers(\"\"\"");
        int used = WIDTH;
        for (Rational value : values) {
            String text = value.toString();
            boolean isFull = used + text.length() >= WIDTH;
            lines.append(isFull ? "\n    " : " ").append(text);
            used = isFull ? text.length() : used + 1 + text.length();
        }
        return lines.append("\n\"\"\")").toString();
    }

    /** The coefficients by ascending power. */
    static String numbers(Polynomial<Rational> polynomial) {
        return numbers(polynomial.coefficients());
    }

    /** Tools that are the same in every notebook. */
    static String tools(String name) {
        try (InputStream file = Python.class.getResourceAsStream("/org/pofk/notebook/" + name + ".py")) {
            return new String(file.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException broken) {
            throw new UncheckedIOException("tools for notebooks: " + name, broken);
        }
    }
}
