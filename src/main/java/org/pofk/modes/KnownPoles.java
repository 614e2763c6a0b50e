package org.pofk.modes;

import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.Supplier;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Guess;
import org.pofk.exact.Rational;
import org.pofk.exact.Roots;

/** The poles of factors met so far: outputs of one chain share most of theirs, which are then found once. */
public final class KnownPoles {
    private final Map<Factor<Rational>, FactorPoles> byFactor = new ConcurrentHashMap<>();
    private final Supplier<List<Guess>> guesses;

    public KnownPoles() {
        this(List::of);
    }

    /** @param guesses approximate eigenvalues, asked for only where the poles are hard to find without them */
    public KnownPoles(Supplier<List<Guess>> guesses) {
        this.guesses = guesses;
    }

    FactorPoles of(Factor<Rational> factor) {
        return byFactor.computeIfAbsent(factor, each -> new FactorPoles(each, Roots.of(each.polynomial(), guesses)));
    }
}
