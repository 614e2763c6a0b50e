package org.pofk.chain;

import java.util.List;
import org.pofk.exact.Rational;

/**
 * A quantity read off the state vector: y(k) = c x(k) + constant.
 *
 * @param name         output, set or state it stands for
 * @param coefficients c, one for each state
 * @param constant     zero for a chain, where a constant is spread over all states
 * @param definition   how the model file writes it, or the name itself for a state
 */
public record Output(String name, List<Rational> coefficients, Rational constant, String definition) {
    public Output {
        coefficients = List.copyOf(coefficients);
    }

    /** c x + constant. */
    public Rational of(List<Rational> vector) {
        Rational sum = constant;
        for (int i = 0; i < coefficients.size(); i++) {
            sum = sum.plus(coefficients.get(i).times(vector.get(i)));
        }
        return sum;
    }
}
