package org.pofk.input;

import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.pofk.claim.FormulaText;
import org.pofk.claim.FormulaText.Notation;
import org.pofk.formula.FormulaParser;
import org.pofk.formula.ParsedFormula;
import org.pofk.text.Places;
import org.pofk.text.RefusedException;

/** Formulas of claims: parsed at their place in the file, in the variable that belongs there. */
final class ClaimFormulas {
    /** Longest formula of a claim, in UTF-16 units. */
    static final int LONGEST = 10_000;

    private final Reading reading;

    ClaimFormulas(Reading reading) {
        this.reading = reading;
    }

    /** A number, without a variable. */
    Optional<FormulaText> number(Content content, String what) {
        return formula(content, what).filter(formula -> hasOnly(Set.of(), formula, "a number belongs here"));
    }

    /** A formula in k. */
    Optional<FormulaText> inK(Content content, String what) {
        return formula(content, what).filter(formula -> hasOnly(Set.of("k"), formula, "a formula in k belongs here"));
    }

    /** A formula in z. */
    Optional<FormulaText> inZ(Content content, String what) {
        return formula(content, what).filter(formula -> hasOnly(Set.of("z"), formula, "a formula in z belongs here"));
    }

    /** A formula in one variable, whatever its name. */
    Optional<FormulaText> inOneVariable(Content content, String what) {
        Optional<FormulaText> formula = formula(content, what);
        if (formula.isPresent() && formula.get().parsed().symbols().isEmpty()) {
            reading.fault(content.node().position(), "variable-missing",
                    what + " needs a variable, as z or λ; here is none");
            return Optional.empty();
        }
        return formula.filter(found -> hasOnly(Set.of(Expressions.symbols(found.parsed()).get(0)), found,
                "one variable belongs here"));
    }

    /** Reads what a text says at its places, after parts of it were read otherwise. */
    Optional<FormulaText> numberIn(String text, Content.Text source, String what) {
        return parsed(text, source.places(), source.notation())
                .filter(formula -> hasOnly(Set.of(), formula, "a number belongs here"));
    }

    private Optional<FormulaText> formula(Content content, String what) {
        return text(content, what)
                .flatMap(source -> parsed(source.text(), source.places(), source.notation()));
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
        if (scalar.get().text().length() > LONGEST) {
            reading.fault(content.node().position(), "formula-too-long", "the formula has "
                    + scalar.get().text().length() + " characters, more than " + LONGEST);
            return Optional.empty();
        }
        return Optional.of(new Content.Text(scalar.get().text(), scalar.get().places(), content.notation()));
    }

    private Optional<FormulaText> parsed(String text, Places places, Notation notation) {
        if (notation == Notation.LATEX) {
            reading.fault(places.at(0), "latex-later", "LaTeX can't be read yet; write the formula in ordinary"
                    + " notation under 'is'");
            return Optional.empty();
        }
        try {
            ParsedFormula parsed = FormulaParser.parse(text, places, Set.of());
            return Optional.of(new FormulaText(text.strip(), notation, parsed));
        } catch (RefusedException refused) {
            reading.faults().addAll(refused.faults());
            return Optional.empty();
        }
    }

    private boolean hasOnly(Set<String> variables, FormulaText formula, String expected) {
        List<ParsedFormula> others = formula.parsed().symbols().stream()
                .filter(symbol -> !variables.contains(Expressions.name(symbol))).toList();
        others.forEach(symbol -> reading.fault(symbol.position(), "unknown-variable", "'"
                + Words.shortened(Expressions.name(symbol)) + "' has no meaning here; " + expected));
        return others.isEmpty();
    }
}
