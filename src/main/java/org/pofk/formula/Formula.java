package org.pofk.formula;

import java.util.List;
import java.util.OptionalLong;
import org.pofk.exact.Rational;

/**
 * A formula as a tree, without a meaning of its own: what users write, what is shown to them. Exact unless it holds a
 * {@link WrittenDecimal}. What must be done per variant is a {@link Visitor}, so that a new variant does not compile
 * until every writer handles it.
 */
public sealed interface Formula {

    <R> R accept(Visitor<R> visitor);

    /** One method per variant. */
    interface Visitor<R> {
        R number(Number number);

        R decimal(WrittenDecimal decimal);

        R symbol(Symbol symbol);

        R constant(Constant constant);

        R negation(Negation negation);

        R sum(Sum sum);

        R product(Product product);

        R quotient(Quotient quotient);

        R power(Power power);

        R call(Call call);

        R rootSum(RootSum rootSum);

        R cases(Cases cases);
    }

    /** An exact rational number, any sign. */
    record Number(Rational value) implements Formula {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.number(this);
        }
    }

    /** A decimal as written or to be written, {@code 0.4508} or {@code 7.281e-4}: rounded in its last place. */
    record WrittenDecimal(String text) implements Formula {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.decimal(this);
        }
    }

    /** A name: k, z, a parameter, a state, an output. */
    record Symbol(String name) implements Formula {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.symbol(this);
        }
    }

    /** A constant of mathematics; {@code DEGREE} is π/180. */
    enum Constant implements Formula {
        PI, I, DEGREE;

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.constant(this);
        }
    }

    record Negation(Formula operand) implements Formula {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.negation(this);
        }
    }

    /** Terms added up, at least two; a subtracted term is a {@link Negation}. */
    record Sum(List<Formula> terms) implements Formula {
        public Sum {
            terms = List.copyOf(terms);
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.sum(this);
        }
    }

    /** Factors multiplied, at least two. */
    record Product(List<Formula> factors) implements Formula {
        public Product {
            factors = List.copyOf(factors);
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.product(this);
        }
    }

    record Quotient(Formula numerator, Formula denominator) implements Formula {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.quotient(this);
        }
    }

    record Power(Formula base, Formula exponent) implements Formula {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.power(this);
        }
    }

    /** The functions a formula may use; {@code DELTA} is one where its argument is zero and zero elsewhere. */
    enum Function {
        SQRT(1), COS(1), SIN(1), EXP(1), ARCTAN(1), ARCCOS(1), BINOMIAL(2), DELTA(1);

        private final int arity;

        Function(int arity) {
            this.arity = arity;
        }

        public int arity() {
            return arity;
        }
    }

    record Call(Function function, List<Formula> arguments) implements Formula {
        public Call {
            arguments = List.copyOf(arguments);
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.call(this);
        }
    }

    /** The sum of {@code body} over all roots {@code variable} of {@code polynomial} (a formula in that variable). */
    record RootSum(Symbol variable, Formula polynomial, Formula body) implements Formula {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.rootSum(this);
        }
    }

    /**
     * A formula that reads differently at different steps k: {@code a} at k = 0, {@code b} from k = 1 on. Canonical
     * form: at least one branch, in the order of steps, none overlapping, only the last without an end. At steps that
     * no branch is for nothing is said.
     */
    record Cases(List<Branch> branches) implements Formula {

        /** The formula for the steps {@code from} … {@code to}, both included, or from a step on. */
        public record Branch(long from, OptionalLong to, Formula formula) {
            public Branch {
                if (from < 0 || to.isPresent() && to.getAsLong() < from) {
                    throw new AssertionError("a branch for no step: " + from + " to " + to);
                }
            }

            public boolean holdsAt(long k) {
                return k >= from && (to.isEmpty() || k <= to.getAsLong());
            }
        }

        public Cases {
            branches = List.copyOf(branches);
            if (branches.isEmpty()) {
                throw new AssertionError("cases without a branch");
            }
            for (int i = 1; i < branches.size(); i++) {
                OptionalLong end = branches.get(i - 1).to();
                if (end.isEmpty() || end.getAsLong() >= branches.get(i).from()) {
                    throw new AssertionError("branches not in the order of steps: " + branches);
                }
            }
        }

        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.cases(this);
        }
    }
}
