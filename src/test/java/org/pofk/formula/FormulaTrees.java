package org.pofk.formula;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalLong;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.Tuple;
import org.pofk.exact.Rational;
import org.pofk.formula.Formula.Call;
import org.pofk.formula.Formula.Cases;
import org.pofk.formula.Formula.Constant;
import org.pofk.formula.Formula.Function;
import org.pofk.formula.Formula.Negation;
import org.pofk.formula.Formula.Number;
import org.pofk.formula.Formula.Power;
import org.pofk.formula.Formula.Product;
import org.pofk.formula.Formula.Quotient;
import org.pofk.formula.Formula.RootSum;
import org.pofk.formula.Formula.Sum;
import org.pofk.formula.Formula.Symbol;
import org.pofk.formula.Formula.WrittenDecimal;

/** Formula trees of every shape for laws, and the form in which the parser gives them back. */
final class FormulaTrees {

    private FormulaTrees() {
    }

    /** Trees up to the depth given, of every variant but root sums. */
    static Arbitrary<Formula> upTo(int depth) {
        return upTo(depth, Arbitraries.oneOf(numbers(), decimals(), symbols(), Arbitraries.of(Constant.values())));
    }

    /** Trees up to the depth given over the leaves given. */
    static Arbitrary<Formula> upTo(int depth, Arbitrary<Formula> leaf) {
        if (depth == 0) {
            return leaf;
        }
        Arbitrary<Formula> part = upTo(depth - 1, leaf);
        Arbitrary<List<Formula>> several = part.list().ofMinSize(2).ofMaxSize(4);
        return Arbitraries.frequencyOf(
                Tuple.of(2, leaf),
                Tuple.of(1, part.map(Negation::new)),
                Tuple.of(2, several.map(Sum::new)),
                Tuple.of(3, several.map(Product::new)),
                Tuple.of(2, Combinators.combine(part, part).as(Quotient::new)),
                Tuple.of(2, Combinators.combine(part, part).as(Power::new)),
                Tuple.of(1, calls(part)),
                Tuple.of(1, cases(part)));
    }

    private static Arbitrary<Formula> calls(Arbitrary<Formula> part) {
        return Arbitraries.of(Function.values()).flatMap(function -> part.list().ofSize(function.arity())
                .map(arguments -> new Call(function, arguments)));
    }

    /** One to four branches with gaps of up to two steps, the last with or without an end. */
    private static Arbitrary<Formula> cases(Arbitrary<Formula> part) {
        Arbitrary<Integer> few = Arbitraries.integers().between(0, 2);
        return Combinators.combine(part, few, few).as(FormulaTrees::branch).list().ofMinSize(1).ofMaxSize(4)
                .flatMap(branches -> Arbitraries.of(true, false).map(ends -> cases(branches, ends)));
    }

    /** A formula for some steps, counted from the end of the branch before. */
    private static Cases.Branch branch(Formula formula, int gap, int more) {
        return new Cases.Branch(gap, OptionalLong.of(gap + more), formula);
    }

    private static Formula cases(List<Cases.Branch> relative, boolean ends) {
        List<Cases.Branch> branches = new ArrayList<>();
        long free = 0;
        for (Cases.Branch each : relative) {
            OptionalLong to = branches.size() + 1 < relative.size() || ends
                    ? OptionalLong.of(free + each.to().getAsLong()) : OptionalLong.empty();
            branches.add(new Cases.Branch(free + each.from(), to, each.formula()));
            free += each.to().getAsLong() + 1;
        }
        return new Cases(branches);
    }

    static Arbitrary<Formula> numbers() {
        return Combinators.combine(Arbitraries.integers().between(-40, 40), Arbitraries.of(1, 1, 1, 2, 3, 7, 40))
                .as((numerator, denominator) -> new Number(Rational.of(numerator, denominator)));
    }

    private static Arbitrary<Formula> decimals() {
        return Arbitraries.of("0.70", "0.4508", "7.281e-4", "1e3", "2E+5", ".5", "3.").map(WrittenDecimal::new);
    }

    private static Arbitrary<Formula> symbols() {
        return Arbitraries.of("k", "z", "e", "e3", "E", "both", "x_1", "both down", "5", "2k", "it's", "π", "i", "deg",
                "cos", "for", "otherwise", "θ", "Überlauf", "泵一", "a+b", "1/2", "''", "\"", "_").map(Symbol::new);
    }

    /** Negative numbers as negations, fractions as quotients: the tree that the printed text is read as. */
    static Formula asRead(Formula formula) {
        return formula.accept(new AsRead());
    }

    private static final class AsRead implements Formula.Visitor<Formula> {
        private List<Formula> all(List<Formula> parts) {
            return parts.stream().map(FormulaTrees::asRead).toList();
        }

        private static Formula whole(BigInteger value) {
            return new Number(Rational.of(value));
        }

        @Override
        public Formula number(Number number) {
            Rational absolute = number.value().abs();
            Formula unsigned = absolute.isInteger() ? new Number(absolute)
                    : new Quotient(whole(absolute.numerator()), whole(absolute.denominator()));
            return number.value().signum() < 0 ? new Negation(unsigned) : unsigned;
        }

        @Override
        public Formula decimal(WrittenDecimal decimal) {
            return decimal;
        }

        @Override
        public Formula symbol(Symbol symbol) {
            return symbol;
        }

        @Override
        public Formula constant(Constant constant) {
            return constant;
        }

        @Override
        public Formula negation(Negation negation) {
            return new Negation(asRead(negation.operand()));
        }

        @Override
        public Formula sum(Sum sum) {
            return new Sum(all(sum.terms()));
        }

        @Override
        public Formula product(Product product) {
            return new Product(all(product.factors()));
        }

        @Override
        public Formula quotient(Quotient quotient) {
            return new Quotient(asRead(quotient.numerator()), asRead(quotient.denominator()));
        }

        @Override
        public Formula power(Power power) {
            return new Power(asRead(power.base()), asRead(power.exponent()));
        }

        @Override
        public Formula call(Call call) {
            return new Call(call.function(), all(call.arguments()));
        }

        @Override
        public Formula rootSum(RootSum sum) {
            return new RootSum(sum.variable(), asRead(sum.polynomial()), asRead(sum.body()));
        }

        @Override
        public Formula cases(Cases cases) {
            return new Cases(cases.branches().stream()
                    .map(branch -> new Cases.Branch(branch.from(), branch.to(), asRead(branch.formula()))).toList());
        }
    }
}
