package org.pofk.answer;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.pofk.answer.When.End;
import org.pofk.chain.Chain;
import org.pofk.exact.Rational;
import org.pofk.longrun.DecayBound;
import org.pofk.longrun.DecayingMode;
import org.pofk.longrun.DecayingSum;
import org.pofk.longrun.EventualSign;
import org.pofk.modes.ClosedForm;
import org.pofk.transform.Sequence;

/**
 * A sequence with a long run that has to lie in a band: where it does at a step or over stretches of steps, and how that
 * ends. What is left of it beside its long run decays, so that beyond a bound it stays where its limit is; where the
 * limit is an end of the band, the sign of what is left decides, looked at in units of its slowest part. Certified;
 * single steps in the end by exact values.
 */
final class ClosedFormConstraint implements Constraint {
    private static final int LEAST_BITS = 160;
    private static final int BITS_A_DIGIT = 4;
    private static final int[] CLOSER_BITS = {512, 2_048, 8_192};
    private static final long EXACT_UP_TO = 20_000;
    private static final long UNDECIDED_SEARCHED_UP_TO = EXACT_UP_TO;

    private final Chain chain;
    private final ClosedForm form;
    private final List<Rational> limits;
    private final Function<Rational, Band> aroundLimit;
    private final int digits;
    private final ClassForms classForms;
    private final DecayingSum sum;
    private final long firstWithoutImpulses;
    private Optional<Rational> unit = Optional.empty();
    private Optional<DecayingSum> sumInUnits = Optional.empty();
    private Optional<Sequence> exact = Optional.empty();

    /** @param aroundLimit the band for what is left beside a limit */
    ClosedFormConstraint(Chain chain, ClosedForm form, List<Rational> limits, Function<Rational, Band> aroundLimit) {
        this.chain = chain;
        this.form = form;
        this.limits = limits;
        this.aroundLimit = aroundLimit;
        this.classForms = new ClassForms(chain, form);
        this.digits = digits();
        this.sum = DecayingSum.of(form, bits());
        this.firstWithoutImpulses = form.withoutImpulsesFrom();
    }

    private int bits() {
        return LEAST_BITS + BITS_A_DIGIT * digits;
    }

    /** Places that tell the bound from every value of the long run that differs from it, with one to spare. */
    private int digits() {
        int needed = 2;
        for (Rational limit : limits) {
            Rational distance = aroundLimit.apply(limit).distanceFromZero();
            while (!distance.isZero() && distance.times(Rational.of(10).pow(needed - 1)).compareTo(Rational.ONE) < 0) {
                needed++;
            }
        }
        return needed;
    }

    @Override
    public int period() {
        return limits.size();
    }

    @Override
    public long stride(long least, long most) {
        return sum.stride(least, most);
    }

    private Rational limit(long residue) {
        return limits.get((int) (residue % limits.size()));
    }

    private Band band(long residue) {
        return aroundLimit.apply(limit(residue));
    }

    @Override
    public Ending ending(long residue, long modulus) throws TooMuchWorkException {
        Band band = band(residue);
        if (!band.distanceFromZero().isZero()) {
            BigInteger from = DecayBound.of(DecayingMode.of(form), digits)
                    .settledFrom(BigInteger.valueOf(firstWithoutImpulses));
            if (from.bitLength() > Long.SIZE - 8) {
                throw new TooMuchWorkException();
            }
            return new Ending(band.contains(Rational.ZERO) ? End.MET : End.FAILED, from.longValueExact());
        }
        Optional<EventualSign> sign = classForms.of(residue, modulus).map(EventualSign::of);
        long from = sign.map(known -> residue + modulus * known.from()).orElse(0L);
        return switch (sign.map(EventualSign::kind).orElse(EventualSign.Kind.UNDECIDED)) {
            case ZERO -> new Ending(End.MET, from);
            case POSITIVE -> new Ending(band.high().isPresent() ? End.FAILED : End.MET, from);
            case NEGATIVE -> new Ending(band.low().isPresent() ? End.FAILED : End.MET, from);
            case BOTH_FOR_EVER -> band.low().isPresent() && band.high().isPresent() ? undecided()
                    : new Ending(End.BOTH_FOR_EVER, from);
            case UNDECIDED -> undecided();
        };
    }

    private static Ending undecided() {
        return new Ending(End.APPROACH_NOT_DECIDED, UNDECIDED_SEARCHED_UP_TO);
    }

    @Override
    public Band.Relation over(long residue, long low, long high, long modulus) {
        return low < firstWithoutImpulses ? Band.Relation.EITHER
                : band(residue).of(sum(residue).over(low, high, modulus));
    }

    /** Where only the sign matters, in units of the slowest part's power: that is far above all rounding then. */
    private DecayingSum sum(long residue) {
        if (!band(residue).distanceFromZero().isZero()) {
            return sum;
        }
        if (sumInUnits.isEmpty()) {
            sumInUnits = Optional.of(DecayingSum.inUnits(form, unit(), bits()));
        }
        return sumInUnits.get();
    }

    private DecayingSum sum(long residue, int bits) {
        return band(residue).distanceFromZero().isZero() ? DecayingSum.inUnits(form, unit(), bits)
                : DecayingSum.of(form, bits);
    }

    private Rational unit() {
        if (unit.isEmpty()) {
            unit = Optional.of(DecayingSum.unitAbove(form));
        }
        return unit.get();
    }

    @Override
    public Band.Relation at(long residue, long k) throws TooMuchWorkException {
        if (k >= firstWithoutImpulses) {
            Band.Relation relation = band(residue).of(sum(residue).over(k, k, 1));
            for (int i = 0; relation == Band.Relation.EITHER && i < CLOSER_BITS.length
                    && CLOSER_BITS[i] < bitsOfValue(k); i++) {
                relation = band(residue).of(sum(residue, CLOSER_BITS[i]).over(k, k, 1));
            }
            if (relation != Band.Relation.EITHER) {
                return relation;
            }
        }
        if (k > EXACT_UP_TO) {
            throw new TooMuchWorkException();
        }
        return band(residue).contains(valueAt(k).minus(limit(residue))) ? Band.Relation.INSIDE : Band.Relation.OUTSIDE;
    }

    /** About how long the exact value is: where it is shorter than an enclosure, it is the quicker way. */
    private long bitsOfValue(long k) {
        return k * chain.matrix().commonDenominator().bitLength();
    }

    /** Exact. */
    Rational valueAt(long k) {
        if (exact.isEmpty()) {
            exact = Optional.of(Sequence.of(chain, form.transform()));
        }
        return exact.get().at(k);
    }
}
