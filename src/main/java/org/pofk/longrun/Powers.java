package org.pofk.longrun;

import java.util.LinkedHashMap;
import java.util.Map;
import org.pofk.exact.Ball;

/** The powers of one number, the last {@value #KEPT} asked for kept: a search by halves asks for most of them twice. */
final class Powers {
    private static final int KEPT = 256;

    private final Ball base;
    private final Map<Long, Ball> kept = new LinkedHashMap<>(KEPT, 0.75f, true) {
        @Override
        protected boolean removeEldestEntry(Map.Entry<Long, Ball> eldest) {
            return size() > KEPT;
        }
    };

    Powers(Ball base) {
        this.base = base;
    }

    Ball base() {
        return base;
    }

    synchronized Ball at(long exponent) {
        return kept.computeIfAbsent(exponent, base::pow);
    }
}
