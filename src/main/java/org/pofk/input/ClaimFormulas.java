package org.pofk.input;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.pofk.claim.FormulaText;
import org.pofk.claim.FormulaText.Notation;
import org.pofk.formula.FormulaParser;
import org.pofk.formula.FormulaReading;
import org.pofk.formula.FormulaReading.Subject;
import org.pofk.formula.LatexReader;
import org.pofk.formula.ParsedFormula;
import org.pofk.meaning.ExponentialSum;
import org.pofk.meaning.Precision;
import org.pofk.meaning.RationalForm;
import org.pofk.meaning.WrittenPolynomial;
import org.pofk.text.RefusedException;

/** Formulas of claims: parsed at their place in the file, in the variable that belongs there. */
final class ClaimFormulas {
    private final Set<String> names;
    private final Reading reading;

    /** {@code names} are those of the model, which may stand left of an equals sign. */
    ClaimFormulas(Set<String> names, Reading reading) {
        this.names = names;
        this.reading = reading;
    }

    /** What a formula is read as, or refused as. */
    private interface Meaning {
        Object of(ParsedFormula formula) throws RefusedException;
    }

    /** A number, without a variable. */
    Optional<FormulaText> number(Content content, String what) {
        return formula(content, Subject.NUMBER, what).filter(this::isNumber);
    }

    /** A word in the place of a number. */
    Optional<FormulaText> word(Content content, String what) {
        return formula(content, Subject.NUMBER, what);
    }

    /** A formula in k. */
    Optional<FormulaText> inK(Content content, String what) {
        return formula(content, Subject.OF_K, what)
                .filter(formula -> means(formula, parsed -> ExponentialSum.of(parsed, Precision.AS_WRITTEN)));
    }

    /** A formula in z, for Y(z) or for Y(z)/z. */
    Optional<FormulaText> inZ(Content content, Subject subject, String what) {
        return formula(content, subject, what)
                .filter(formula -> means(formula, parsed -> RationalForm.of(parsed, "z", Precision.AS_WRITTEN)));
    }

    /** A polynomial in one variable, whatever its name. */
    Optional<FormulaText> polynomial(Content content, String what) {
        return formula(content, Subject.NUMBER, what)
                .filter(formula -> means(formula, parsed -> WrittenPolynomial.of(parsed, Precision.AS_WRITTEN)));
    }

    /** Reads what a text says at its places, after parts of it were read otherwise. */
    Optional<FormulaText> numberIn(String text, Content.Text source) {
        return parsed(text, source, Subject.NUMBER).filter(this::isNumber);
    }

    private Optional<FormulaText> formula(Content content, Subject subject, String what) {
        return text(content, what).flatMap(source -> parsed(source.text(), source, subject));
    }

    /** The text that a formula is read from, or a fault. */
    Optional<Content.Text> text(Content content, String what) {
        Optional<Node.Scalar> scalar = reading.scalar(content.node(), what);
        if (scalar.isEmpty()) {
            return Optional.empty();
        }
        if (scalar.get().isEscaped()) {
            reading.fault(content.node().position(), "backslash-in-quotes", "inside double quotes YAML changes what a"
                    + " backslash begins; use single quotes");
            return Optional.empty();
        }
        return Optional.of(new Content.Text(scalar.get().text(), scalar.get().places(), content.notation()));
    }

    private Optional<FormulaText> parsed(String text, Content.Text source, Subject subject) {
        FormulaReading how = FormulaReading.of(subject).with(FormulaReading.ImaginaryUnit.I_OR_J);
        try {
            ParsedFormula parsed = source.notation() == Notation.LATEX
                    ? LatexReader.parse(text, source.places(), how)
                    : FormulaParser.parse(text, source.places(), names, how);
            return Optional.of(new FormulaText(text.strip(), source.notation(), parsed));
        } catch (RefusedException refused) {
            reading.faults().addAll(refused.faults());
            return Optional.empty();
        }
    }

    /** Whether a formula holds no name but that of the number e, and is the value of something. */
    private boolean isNumber(FormulaText formula) {
        List<ParsedFormula> names = formula.parsed().symbols().stream()
                .filter(symbol -> !Expressions.name(symbol).equals("e")).toList();
        names.forEach(symbol -> reading.fault(symbol.position(), "not-a-number", "'"
                + Words.shortened(Expressions.name(symbol)) + "' has no value here, where a number belongs"));
        return names.isEmpty() && means(formula, parsed -> ExponentialSum.of(parsed, Precision.AS_WRITTEN).valueAt(0));
    }

    private boolean means(FormulaText formula, Meaning meaning) {
        try {
            meaning.of(formula.parsed());
            return true;
        } catch (RefusedException refused) {
            reading.faults().addAll(refused.faults());
            return false;
        }
    }
}
