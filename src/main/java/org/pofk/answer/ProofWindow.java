package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.exact.Rational;
import org.pofk.steps.ExactSteps;
import org.pofk.transform.Transform;

/**
 * One of the windows that prove a recurrence, to be repeated by hand: D_0 y(k) + … + D_d y(k+d) = 0. The terms come
 * from stepping the chain, not from what is proved. Exact.
 *
 * @param from         k
 * @param coefficients D_0 … D_d
 * @param terms        y(k) … y(k+d)
 */
public record ProofWindow(int from, List<Rational> coefficients, List<Rational> terms) {
    /** Nobody repeats a longer one by hand. */
    private static final int MOST_ORDER = 12;
    private static final int WINDOWS_LOOKED_AT = 4;

    public ProofWindow {
        coefficients = List.copyOf(coefficients);
        terms = List.copyOf(terms);
    }

    /** The one among the first with the shortest numbers that aren't all zero; empty for orders above twelve. */
    public static Optional<ProofWindow> of(Chain chain, Transform transform) {
        int order = transform.recurrence().degree();
        if (order > MOST_ORDER) {
            return Optional.empty();
        }
        int windows = Math.max(1, Math.min(WINDOWS_LOOKED_AT, transform.proof().order()));
        List<Rational> terms = ExactSteps.of(chain, List.of(transform.output()), windows - 1 + order).values().get(0);
        List<Rational> coefficients = IntStream.rangeClosed(0, order).mapToObj(transform.recurrence()::coefficient)
                .toList();
        List<ProofWindow> all = new ArrayList<>();
        for (int k = 0; k < windows; k++) {
            all.add(new ProofWindow(k, coefficients, terms.subList(k, k + order + 1)).summingToZero());
        }
        return all.stream().filter(window -> window.terms.stream().anyMatch(term -> !term.isZero()))
                .min((a, b) -> Integer.compare(a.characters(), b.characters())).or(() -> Optional.of(all.get(0)));
    }

    private ProofWindow summingToZero() {
        if (!sum().isZero()) {
            throw new AssertionError("a window of the proof adds up to " + sum() + ": " + this);
        }
        return this;
    }

    /** D_i y(k+i). */
    public List<Rational> products() {
        return IntStream.range(0, terms.size()).mapToObj(i -> coefficients.get(i).times(terms.get(i))).toList();
    }

    /** Zero. */
    public Rational sum() {
        return products().stream().reduce(Rational.ZERO, Rational::plus);
    }

    /** Of its longest number. */
    public int longestNumber() {
        return IntStream.range(0, terms.size()).map(i -> Math.max(terms.get(i).toString().length(),
                products().get(i).toString().length())).max().orElse(0);
    }

    private int characters() {
        return products().stream().mapToInt(product -> product.toString().length()).sum();
    }
}
