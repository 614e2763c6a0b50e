package org.pofk.patterns;

import java.util.Collection;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Predicate;
import java.util.stream.Stream;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Outputs;
import org.pofk.chain.Structure;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;
import org.pofk.exact.Roots;
import org.pofk.exact.UnitCircle;
import org.pofk.longrun.LongRun;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.Mode;
import org.pofk.transform.CharacteristicPolynomial;
import org.pofk.transform.Transforms;

/**
 * What a pattern shows, found again from the model itself: every feature by name, decided exactly.
 *
 * @param text  the model file as written
 * @param forms the closed forms of the outputs the model names
 */
record Features(String text, Model model, Structure structure, List<ClosedForm> forms) {
    /** Beyond this modulus a pole below one counts as slow: half-lives of some hundred thousand steps. */
    private static final Rational SLOW = Rational.of(99_999, 100_000);

    static final Map<String, Predicate<Features>> BY_NAME = new LinkedHashMap<>();

    static {
        BY_NAME.put("rational poles", each -> each.otherFactors().allMatch(q -> q.degree() == 1));
        BY_NAME.put("real poles", each -> each.otherRoots().anyMatch(Root::isReal));
        BY_NAME.put("negative pole", each -> each.otherFactors().anyMatch(q -> q.degree() == 1
                && q.coefficient(0).signum() > 0));
        BY_NAME.put("irrational poles", each -> each.otherFactors().anyMatch(q -> q.degree() == 2
                && Roots.of(q).all().get(0).isReal()));
        BY_NAME.put("complex pair", each -> each.otherRoots().anyMatch(root -> !root.isReal()));
        BY_NAME.put("irreducible cubic or higher", each -> each.otherFactors().anyMatch(q -> q.degree() > 2));
        BY_NAME.put("repeated real pole", each -> each.repeatedRoots().anyMatch(Root::isReal));
        BY_NAME.put("repeated complex pair", each -> each.repeatedRoots().anyMatch(root -> !root.isReal()));
        BY_NAME.put("zero pole", each -> each.forms.stream().anyMatch(form ->
                form.transform().y().denominator().lowestPower() > 0));
        BY_NAME.put("exact angles", each -> each.oscillations().allMatch(mode -> mode.angle().exact().isPresent()));
        BY_NAME.put("pole outside the unit circle", each -> each.forms.stream().anyMatch(form ->
                UnitCircle.count(form.transform().y().denominator()).outside() > 0));
        BY_NAME.put("limit", each -> each.longRuns().allMatch(run -> run instanceof LongRun.Limit));
        BY_NAME.put("cycle", each -> each.longRuns().anyMatch(run -> run instanceof LongRun.Cycle));
        BY_NAME.put("cycle of five", each -> each.longRuns().anyMatch(run ->
                run instanceof LongRun.Cycle cycle && cycle.period() == 5));
        BY_NAME.put("grows", each -> each.longRuns().anyMatch(run ->
                run instanceof LongRun.None none && none.reason() == LongRun.Reason.GROWS));
        BY_NAME.put("slow", each -> each.otherRoots().anyMatch(root ->
                root.enclose(64).modulus().lower().compareTo(SLOW) > 0
                        && root.enclose(64).modulus().upper().compareTo(Rational.ONE) < 0));
        BY_NAME.put("absorbing", each -> each.structure.classes().stream().anyMatch(one -> one.isAbsorbing()));
        BY_NAME.put("recurrent", each -> each.structure.classes().size() == 1);
        BY_NAME.put("reducible", each -> each.structure.classes().size() > 1);
        BY_NAME.put("long run depends on start", each -> each.structure.closedClasses().size() > 1);
        BY_NAME.put("unreached", each -> !each.structure.unreached().isEmpty());
        BY_NAME.put("cancelled", Features::hasCancelledEigenvalue);
        BY_NAME.put("lumped", each -> each.forms.stream().anyMatch(form ->
                form.transform().proof().order() < each.model.chain().size()));
        BY_NAME.put("recursion", each -> each.model.chain().kind() == Chain.Kind.RECURSION);
        BY_NAME.put("twelve states", each -> each.model.chain().size() == 12);
        BY_NAME.put("hundred states", each -> each.model.chain().size() == 100);
        BY_NAME.put("sparse", each -> each.model.chain().matrix().columns().stream().allMatch(column ->
                column.size() <= 10) && each.model.chain().size() > 50);
        BY_NAME.put("rest", each -> each.text.contains(": rest"));
        BY_NAME.put("sets", each -> !each.model.chain().sets().isEmpty());
        BY_NAME.put("parameters", each -> !each.model.parameters().isEmpty());
        BY_NAME.put("notes", each -> !each.model.notes().isEmpty());
    }

    static Features of(String text, Model model) {
        Chain chain = model.chain();
        return new Features(text, model, Structure.of(chain), Transforms.of(chain, Outputs.byDefault(chain)).stream()
                .map(ClosedForm::of).toList());
    }

    /** Factors of the denominators, without those of the poles 0 and 1. */
    private Stream<Polynomial<Rational>> otherFactors() {
        return forms.stream().flatMap(form -> form.transform().factors().factors().stream()).map(Factor::polynomial)
                .filter(q -> !q.equals(Polynomial.ofIntegers(0, 1)) && !q.equals(Polynomial.ofIntegers(-1, 1)));
    }

    private Stream<Root> otherRoots() {
        return otherFactors().map(Roots::of).map(Roots::all).flatMap(Collection::stream);
    }

    private Stream<Root> repeatedRoots() {
        return forms.stream().flatMap(form -> form.transform().factors().factors().stream())
                .filter(factor -> factor.multiplicity() > 1 && factor.polynomial().lowestPower() == 0)
                .flatMap(factor -> Roots.of(factor.polynomial()).all().stream());
    }

    private Stream<Mode.Oscillating> oscillations() {
        return forms.stream().flatMap(form -> form.modes().stream()).filter(Mode.Oscillating.class::isInstance)
                .map(Mode.Oscillating.class::cast);
    }

    private Stream<LongRun> longRuns() {
        return forms.stream().map(form -> LongRun.of(model.chain(), form.transform()));
    }

    /** An eigenvalue of A that is no pole of some output, though every state is reached. */
    private boolean hasCancelledEigenvalue() {
        Polynomial<Rational> characteristic = CharacteristicPolynomial.of(model.chain()).orElseThrow().polynomial();
        return structure.unreached().isEmpty() && forms.stream().anyMatch(form -> {
            Polynomial<Rational> left = characteristic;
            Polynomial<Rational> common = left.greatestCommonDivisor(form.transform().y().denominator());
            while (!common.isConstant()) {
                left = left.dividedExactlyBy(common);
                common = left.greatestCommonDivisor(common);
            }
            return left.degree() > left.lowestPower();
        });
    }
}
