package org.pofk.cli;

import java.util.Map;
import org.pofk.exact.Rational;
import org.pofk.formula.FormulaParser;
import org.pofk.formula.LinearForm;
import org.pofk.text.Position;
import org.pofk.text.RefusedException;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/**
 * A number as typed, exact: {@code 0.99}, {@code 1/1000}, {@code 1%}.
 *
 * @param isPercent whether it was given in per cent
 */
record Amount(Rational value, boolean isPercent) {

    /** For the option parser. */
    static final class Converter implements ITypeConverter<Amount> {
        @Override
        public Amount convert(String text) {
            try {
                return new Amount(LinearForm.value(
                        FormulaParser.parse(text, Position.ofWhole("number")), Map.of()), text.strip().endsWith("%"));
            } catch (RefusedException wrong) {
                throw new TypeConversionException(text.strip().matches("-?[0-9]*,[0-9]+ ?%?")
                        ? "'" + text + "' has a decimal comma; write " + text.strip().replace(',', '.')
                        : "'" + text + "' is no number such as 0.99, 1/1000 or 1%");
            }
        }
    }
}
