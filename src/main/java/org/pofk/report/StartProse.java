package org.pofk.report;

import java.util.List;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.exact.Rational;

/** Where a chain starts: the state it starts in for certain, or those it may start in with their probabilities. */
final class StartProse {
    private static final int SHOWN = 6;
    private static final int LONGEST_FRACTION = 24;
    private static final int DIGITS = 6;

    private StartProse() {
    }

    /** {@code both}, {@code V1 4/5, V2 1/5}. */
    static Prose of(Chain chain) {
        List<Integer> all = IntStream.range(0, chain.size()).filter(i -> !chain.start().get(i).isZero()).boxed().toList();
        List<Prose> shown = all.stream().limit(SHOWN).map(i -> {
            Rational chance = chain.start().get(i);
            Prose state = Prose.name(chain.states().get(i));
            return chance.isOne() ? state : state.and(" " + text(chance));
        }).toList();
        return Prose.joined(shown, ", ").and(all.size() > SHOWN ? " and " + (all.size() - SHOWN) + " more" : "");
    }

    /** The fraction, or its decimals where it is too long to be read. */
    private static String text(Rational chance) {
        String fraction = chance.toString();
        return fraction.length() <= LONGEST_FRACTION ? fraction : "≈ " + ValueText.of(chance, DIGITS);
    }
}
