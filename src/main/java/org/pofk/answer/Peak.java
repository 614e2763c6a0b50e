package org.pofk.answer;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import java.util.PriorityQueue;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Ball;
import org.pofk.exact.Enclosed;
import org.pofk.exact.Rational;
import org.pofk.longrun.DecayBound;
import org.pofk.longrun.DecayingMode;
import org.pofk.longrun.DecayingSum;
import org.pofk.longrun.EventualSign;
import org.pofk.longrun.LongRun;
import org.pofk.longrun.LongRunValues;
import org.pofk.modes.ClosedForm;
import org.pofk.steps.ExactSteps;
import org.pofk.steps.StepValue;
import org.pofk.steps.StepValues;
import org.pofk.transform.Sequence;
import org.pofk.transform.Transform;
import org.pofk.transform.Transforms;

/**
 * The highest value an output ever has, or comes near to. Certified: stretches of steps that can't hold a higher one
 * are left out, all others halved down to single steps.
 *
 * @param value what is reached at {@code at}, or only approached as k grows
 * @param at    the first step that reaches it, or beyond step 200 one of them; empty where it is a value of the long run that is approached
 */
public record Peak(StepValue value, Optional<Long> at) {
    private static final int BITS = 256;
    private static final int ROUGH_BITS = 80;
    /** What rough values may differ by and yet be the same: else all of a long approach would be halved to single steps. */
    private static final Rational ROUGHLY_ALIKE = Rational.TWO.pow(-ROUGH_BITS / 2);
    private static final int MOST_STRETCHES = 100_000;
    private static final int MOST_DIGITS = 40;
    private static final long MOST_CLASSES = 120;
    private static final long STEPPED_UP_TO = 200;

    /** A stretch of one residue class with the most its values can be. */
    private record Stretch(long from, long to, long modulus, Rational atMost) {
    }

    /** Empty where the long run is none, or where the bounds on the work don't decide it. */
    public static Optional<Peak> highest(Chain chain, ClosedForm form, LongRun longRun) {
        List<Rational> limits = LongRunValues.of(longRun);
        return limits.isEmpty() ? Optional.empty() : new Search(chain, form, limits).highest();
    }

    /** The lowest, as the highest of the output with its sign turned. */
    public static Optional<Peak> lowest(Chain chain, Output output) {
        Output turned = new Output(output.name(), output.coefficients().stream().map(Rational::negate).toList(),
                output.constant().negate(), output.definition());
        Transform transform = Transforms.of(chain, List.of(turned)).get(0);
        return highest(chain, ClosedForm.of(transform), LongRun.of(chain, transform)).map(Peak::turned);
    }

    private Peak turned() {
        return new Peak(new StepValue(value.k(), value.exact().map(Rational::negate), value.enclosure().negate()), at);
    }

    /** The search for one output. */
    private static final class Search {
        private final Chain chain;
        private final ClosedForm form;
        private final List<Rational> limits;
        private final DecayingSum sum;
        private final DecayingSum rough;
        private final long modulus;
        private final Rational longRun;
        private Optional<Long> best = Optional.empty();
        private Ball bestValue;

        private Search(Chain chain, ClosedForm form, List<Rational> limits) {
            this.chain = chain;
            this.form = form;
            this.limits = limits;
            this.sum = DecayingSum.of(form, BITS);
            this.rough = DecayingSum.of(form, ROUGH_BITS);
            this.modulus = sum.stride(limits.size(), Math.max(2L * limits.size(), MOST_CLASSES));
            this.longRun = limits.stream().reduce(Rational::max).orElseThrow();
            this.bestValue = Ball.of(longRun, BITS);
        }

        private Optional<Peak> highest() {
            Optional<Sequence> exact = Optional.empty();
            for (long k = 0; k < form.withoutImpulsesFrom() + 1L; k++) {
                exact = Optional.of(exact.orElseGet(() -> Sequence.of(chain, form.transform())));
                Rational value = exact.get().at(k);
                offer(k, Ball.of(value, BITS));
                reached(k, value);
            }
            for (int digits = 4; digits <= MOST_DIGITS; digits *= 2) {
                Rational margin = Rational.of(10).pow(-digits);
                long from = DecayBound.of(DecayingMode.of(form), digits)
                        .settledFrom(BigInteger.valueOf(form.withoutImpulsesFrom())).longValueExact();
                if (!searched(from)) {
                    return Optional.empty();
                }
                if (bestValue.lower().compareTo(longRun.plus(margin)) > 0) {
                    return best.filter(k -> k <= Integer.MAX_VALUE).map(this::first).map(k -> new Peak(value(k),
                            Optional.of(k)));
                }
            }
            return approachedFromBelow() ? Optional.of(new Peak(new StepValue(0, Optional.of(longRun),
                    Enclosed.of(longRun)), best)) : Optional.empty();
        }

        /** An earlier step with the same value, which bounds can't tell apart, where stepping so far is quick. */
        private long first(long reached) {
            if (reached > STEPPED_UP_TO) {
                return reached;
            }
            List<Rational> values = ExactSteps.of(chain, List.of(form.transform().output()), (int) reached).values()
                    .get(0);
            return values.indexOf(values.get((int) reached));
        }

        private StepValue value(long k) {
            return StepValues.of(chain, List.of(form), List.of(Math.toIntExact(k))).get(0).get(0);
        }

        /** Every class that tends to the highest limit stays below it in the end. */
        private boolean approachedFromBelow() {
            ClassForms forms = new ClassForms(chain, form);
            for (long residue = 0; residue < modulus; residue++) {
                if (limits.get((int) (residue % limits.size())).equals(longRun)) {
                    EventualSign.Kind kind = forms.of(residue, modulus).map(each -> EventualSign.of(each).kind())
                            .orElse(EventualSign.Kind.UNDECIDED);
                    if (kind != EventualSign.Kind.NEGATIVE && kind != EventualSign.Kind.ZERO) {
                        return false;
                    }
                    if (kind == EventualSign.Kind.ZERO) {
                        reached(form.withoutImpulsesFrom()
                                + Math.floorMod(residue - form.withoutImpulsesFrom(), modulus), longRun);
                    }
                }
            }
            return true;
        }

        /** Whether the highest value of the long run is that of an early step itself. */
        private void reached(long k, Rational value) {
            if (value.equals(longRun) && bestValue.contains(longRun) && best.filter(earlier -> earlier <= k).isEmpty()) {
                best = Optional.of(k);
            }
        }

        private void offer(long k, Ball value) {
            if (value.lower().compareTo(bestValue.upper()) > 0
                    || value.isExact() && value.lower().equals(bestValue.upper()) && best.isEmpty()) {
                best = Optional.of(k);
                bestValue = value;
            }
        }

        private boolean searched(long to) {
            PriorityQueue<Stretch> open = new PriorityQueue<>((a, b) -> b.atMost.compareTo(a.atMost) != 0
                    ? b.atMost.compareTo(a.atMost) : Long.compare(a.from, b.from));
            for (long residue = 0; residue < modulus; residue++) {
                long from = form.withoutImpulsesFrom()
                        + Math.floorMod(residue - form.withoutImpulsesFrom(), modulus);
                if (from <= to) {
                    open.add(stretch(from, to - Math.floorMod(to - residue, modulus)));
                }
            }
            for (int looked = 0; !open.isEmpty(); looked++) {
                Stretch next = open.poll();
                if (next.atMost.compareTo(bestValue.upper()) <= 0) {
                    return true;
                }
                if (looked > MOST_STRETCHES) {
                    return false;
                }
                if (next.from < next.to) {
                    long middle = next.from + (next.to - next.from) / modulus / 2 * modulus;
                    open.add(stretch(next.from, middle));
                    open.add(stretch(middle + modulus, next.to));
                }
            }
            return true;
        }

        /** Looked at roughly first: most stretches hold nothing that comes near the best. */
        private Stretch stretch(long from, long to) {
            Ball limit = Ball.of(limits.get((int) (from % limits.size())), BITS);
            Ball first = limit.plus(rough.over(from, from, modulus));
            if (first.upper().compareTo(bestValue.lower()) > 0) {
                first = limit.plus(sum.over(from, from, modulus));
                offer(from, first);
            }
            Rational all = from == to ? first.upper() : limit.plus(rough.over(from, to, modulus)).upper();
            Rational above = all.minus(bestValue.upper());
            boolean isRoughlyAsHigh = above.signum() > 0 && above.compareTo(ROUGHLY_ALIKE) <= 0;
            return new Stretch(from, to, modulus, from < to && isRoughlyAsHigh
                    ? limit.plus(sum.over(from, to, modulus)).upper() : all);
        }
    }
}
