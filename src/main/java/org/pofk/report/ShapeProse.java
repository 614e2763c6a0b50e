package org.pofk.report;

import java.util.stream.Collectors;
import org.pofk.modes.FormulaShape;

/** The shape of a formula in words: {@code a constant, 2 real powers of a factor of degree 2}. */
final class ShapeProse {
    private ShapeProse() {
    }

    static String of(FormulaShape shape) {
        return shape.parts().isEmpty() ? "zero" : shape.parts().stream().map(ShapeProse::part)
                .collect(Collectors.joining(", "));
    }

    private static String part(FormulaShape.Part part) {
        String times = part.power() == 0 ? "" : " times binomial(k, " + part.power() + ")";
        String of = part.degree() <= 1 ? "" : " of factors of degree " + part.degree();
        return switch (part.kind()) {
            case IMPULSE -> "an impulse at k = " + part.power();
            case CONSTANT -> "a constant" + times;
            case REAL_POWER -> (part.count() == 1 ? "1 real power" : part.count() + " real powers") + times + of;
            case PAIR -> (part.count() == 1 ? "1 oscillating pair" : part.count() + " oscillating pairs") + times + of;
        };
    }
}
