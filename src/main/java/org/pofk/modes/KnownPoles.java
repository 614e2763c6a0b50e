package org.pofk.modes;

import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import org.pofk.exact.Factorization.Factor;
import org.pofk.exact.Rational;

/** The poles of factors met so far: outputs of one chain share most of theirs, which are then found once. */
public final class KnownPoles {
    private final Map<Factor<Rational>, FactorPoles> byFactor = new ConcurrentHashMap<>();

    FactorPoles of(Factor<Rational> factor) {
        return byFactor.computeIfAbsent(factor, FactorPoles::new);
    }
}
