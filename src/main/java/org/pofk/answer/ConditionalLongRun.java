package org.pofk.answer;

import java.util.List;
import java.util.Optional;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.modes.RealValue;

/**
 * What a conditional value does as k grows. Exact in what it is; its values exact where they have a short form,
 * certified elsewhere.
 *
 * @param values what it tends to: one for {@code LIMIT}; for {@code CYCLE} in place j for k ≡ j modulo their number,
 *               empty where what is known is impossible at those steps; none otherwise
 */
public record ConditionalLongRun(Kind kind, List<Optional<RealValue>> values) {
    private static final int TOLD_APART_BITS = 2_048;
    private static final int NEAR_BITS = 192;
    /** {@link #near} is no farther away than this. */
    public static final Rational NEAR_WITHIN = Rational.TWO.pow(4 - NEAR_BITS);

    /** What it may be. */
    public enum Kind {
        LIMIT, CYCLE,
        /** Values by residue of k, of which nobody tells whether they are all equal. */
        CYCLE_OR_LIMIT,
        /** What is known is impossible from some step on. */
        IMPOSSIBLE_IN_THE_END,
        /** The moves go through cycles whose common period is too long. */
        PERIOD_TOO_LONG,
        /** The formulas over the cycles of a schedule would need numbers that are too long, or too many of them. */
        FORMULAS_TOO_LONG
    }

    public ConditionalLongRun {
        values = List.copyOf(values);
    }

    public static ConditionalLongRun without(Kind kind) {
        return new ConditionalLongRun(kind, List.of());
    }

    /** The value that k tends to; empty where there is none. */
    public Optional<RealValue> at(int k) {
        return values.isEmpty() ? Optional.empty() : values.get(Math.floorMod(k, values.size()));
    }

    /** The value itself where it is a fraction, one near to it elsewhere. */
    public static Rational near(RealValue value) {
        return value.rational().orElseGet(() -> {
            int whole = value.enclosure().enclose(0).abs().upper().floor().bitLength();
            return value.enclosure().enclose(NEAR_BITS + whole).middle();
        });
    }

    /** The largest of them by size, or nearly so; zero where there is none. */
    public Rational largest() {
        return values.stream().flatMap(Optional::stream).map(value -> near(value).abs())
                .reduce(Rational.ZERO, Rational::max);
    }

    /** With the least period that the values are proved to have. */
    public static ConditionalLongRun of(List<Optional<RealValue>> values) {
        if (values.stream().allMatch(Optional::isEmpty)) {
            return without(Kind.IMPOSSIBLE_IN_THE_END);
        }
        boolean toldApart = true;
        for (int period = 1; period <= values.size(); period++) {
            if (values.size() % period == 0) {
                Equal equal = repeat(values, period);
                if (equal == Equal.YES) {
                    return new ConditionalLongRun(period == 1 ? Kind.LIMIT
                            : toldApart ? Kind.CYCLE : Kind.CYCLE_OR_LIMIT, values.subList(0, period));
                }
                toldApart &= equal == Equal.NO;
            }
        }
        throw new AssertionError("values don't repeat after all of them: " + values);
    }

    private enum Equal { YES, NO, NOT_TOLD }

    private static Equal repeat(List<Optional<RealValue>> values, int period) {
        Equal all = Equal.YES;
        for (int i = period; i < values.size(); i++) {
            Equal here = equal(values.get(i), values.get(i - period));
            if (here == Equal.NO) {
                return Equal.NO;
            }
            all = here == Equal.YES ? all : here;
        }
        return all;
    }

    private static Equal equal(Optional<RealValue> a, Optional<RealValue> b) {
        if (a.isEmpty() || b.isEmpty()) {
            return a.isEmpty() && b.isEmpty() ? Equal.YES : Equal.NO;
        }
        return a.get().exact().isPresent() && a.get().exact().equals(b.get().exact()) ? Equal.YES
                : areDisjoint(a.get().enclosure(), b.get().enclosure()) ? Equal.NO : Equal.NOT_TOLD;
    }

    private static boolean areDisjoint(Enclosed a, Enclosed b) {
        for (int bits = 64; bits <= TOLD_APART_BITS; bits *= 2) {
            if (!a.enclose(bits).overlaps(b.enclose(bits))) {
                return true;
            }
        }
        return false;
    }
}
