package org.pofk.report;

import java.util.List;
import java.util.Optional;
import org.pofk.answer.DerivedOutput;
import org.pofk.exact.Factorization;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.Roots;
import org.pofk.formula.Formula;
import org.pofk.formula.Latex;
import org.pofk.formula.PlainText;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.Expansion;
import org.pofk.steps.StepValue;
import org.pofk.transform.Transform;

/** One derived output as an object: transform, factors, modes, formula, long run, values, proof. */
final class JsonOutput {
    private final Json json;
    private final JsonNumbers numbers;
    private final JsonModes modes;

    JsonOutput(Json json, int digits) {
        this.json = json;
        this.numbers = new JsonNumbers(json, digits);
        this.modes = new JsonModes(json, numbers);
    }

    void write(DerivedOutput output) {
        json.object(() -> {
            json.text("name", output.output().name());
            json.text("word", word(output));
            json.optional("transform", output.transform(), this::transform);
            json.optional("factors", output.closedForm(), this::factors);
            json.optional("modes", output.closedForm(), form -> json.list(form.modes(), modes::write));
            json.optional("formula", output.closedForm().flatMap(this::formula), this::formula);
            json.optional("longRun", output.longRun(), found -> new JsonLongRun(json).write(found.byPoles()));
            json.list("values", output.values(), this::value);
            json.optional("proof", output.closedForm(), this::proof);
        });
    }

    private static String word(DerivedOutput output) {
        return !output.isDecided() ? "undecided"
                : output.closedForm().orElseThrow().isExactThroughout() ? "exact" : "certified";
    }

    private void transform(Transform transform) {
        json.object(() -> {
            numbers.polynomial("numerator", transform.y().numerator());
            numbers.polynomial("denominator", transform.y().denominator());
        });
    }

    private void factors(ClosedForm form) {
        List<Factorization.Factor<Rational>> factors = form.transform().factors().factors();
        json.list(factors, factor -> factor(factor, form.roots().get(factors.indexOf(factor)), form.expansion()));
    }

    private void factor(Factorization.Factor<Rational> factor, Roots roots, Expansion<Rational> expansion) {
        json.object(() -> {
            numbers.polynomial("polynomial", factor.polynomial());
            json.count("multiplicity", factor.multiplicity());
            json.text("irreducible",
                    factor.irreducible() == Factorization.Irreducible.PROVED ? "proved" : "not proved");
            json.list("roots", roots.all(), numbers::root);
            json.optional("coefficients", expansion.parts().stream()
                    .filter(part -> part.factor().equals(factor) && isReduced(part)).findFirst(), this::coefficients);
        });
    }

    static boolean isReduced(Expansion.Part<Rational> part) {
        return part.coefficients().stream().allMatch(coefficient -> coefficient.denominator().isConstant());
    }

    private void coefficients(Expansion.Part<Rational> part) {
        List<Polynomial<Rational>> reduced = part.coefficients().stream().map(coefficient ->
                coefficient.numerator().times(coefficient.denominator().coefficient(0).inverse())).toList();
        json.list(reduced, numbers::polynomial);
    }

    /** Exact where it is exact throughout, otherwise in decimals that give p(k) to the digits for every k. */
    private Optional<Formula> formula(ClosedForm form) {
        return form.exactFormula().or(() -> form.decimalForm(numbers.digits()).formula());
    }

    private void formula(Formula formula) {
        json.object(() -> {
            json.text("text", PlainText.ASCII.write(formula));
            json.text("latex", Latex.write(formula));
        });
    }

    private void value(StepValue value) {
        json.object(() -> {
            json.count("k", value.k());
            json.text("exact", value.exact().map(Rational::toString));
            json.text("decimal", ValueText.number(value, numbers.digits()));
        });
    }

    private void proof(ClosedForm form) {
        json.object(() -> {
            json.count("order", form.transform().proof().order());
            json.count("comparedSteps", form.transform().proof().comparedSteps());
            json.count("holdsFrom", 0);
            json.count("withoutImpulsesFrom", form.withoutImpulsesFrom());
        });
    }
}
