package org.pofk.input;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalInt;
import org.pofk.chain.Model.Adjustment;
import org.pofk.chain.Model.Adjustment.Reason;
import org.pofk.chain.SparseMatrix.Entry;
import org.pofk.exact.Rational;
import org.pofk.text.Position;

/**
 * Shares that must add up to one: the moves out of a state, or the start. Exact.
 *
 * @param from     where they come from, in words: {@code from 'both'}
 * @param link     the word before a receiving state: {@code to}
 * @param position where a sum that is off is shown
 * @param diagonal the state that stays, for {@code give to diagonal}; none for a start
 */
record Distribution(String from, String link, Position position, List<Share> shares, OptionalInt diagonal,
        States states) {

    Distribution {
        shares = List.copyOf(shares);
    }

    /** The moves out of a state. */
    static Distribution ofMoves(String from, Position position, List<Share> shares, int state, States states) {
        return new Distribution(from, "to", position, shares, OptionalInt.of(state), states);
    }

    static Distribution ofStart(Position position, List<Share> shares, States states) {
        return new Distribution("at the start", "in", position, shares, OptionalInt.empty(), states);
    }

    /** The shares made to add up to one; faults, and what there is, when they can't. */
    List<Entry> complete(Sums sums, Reading reading) {
        if (!eachIsSound(reading)) {
            return entries();
        }
        diagonal.ifPresent(from -> shares.forEach(share -> reading.written().add(share.from(from))));
        return shares.stream().filter(Share::isRest).findFirst()
                .map(rest -> withRest(rest, reading)).orElseGet(() -> withoutRest(sums, reading));
    }

    /** Whether each share is a probability and {@code rest} stands at most once; faults otherwise. */
    boolean eachIsSound(Reading reading) {
        boolean sound = true;
        for (Share share : shares) {
            sound &= isProbability(share, reading);
        }
        List<Share> rests = shares.stream().filter(Share::isRest).toList();
        for (Share again : rests.subList(Math.min(1, rests.size()), rests.size())) {
            sound = false;
            reading.fault(again.position(), "rest-twice", from + " 'rest' stands twice; it stands at line "
                    + rests.get(0).position().line() + ", column " + rests.get(0).position().column() + " already");
        }
        return sound;
    }

    private boolean isProbability(Share share, Reading reading) {
        Rational value = share.amount();
        if (value.signum() < 0) {
            reading.fault(share.position(), "negative-probability", from + toward(share) + " the probability "
                    + share.inWords() + " is negative; it must lie between 0 and 1");
            return false;
        }
        if (value.compareTo(Rational.ONE) > 0) {
            reading.fault(share.position(), "probability-above-one", from + toward(share) + " the probability "
                    + share.inWords() + " is above 1; it must lie between 0 and 1");
            return false;
        }
        return true;
    }

    private String toward(Share share) {
        return toward(share.state());
    }

    private String toward(int state) {
        return " " + link + " '" + states.names().get(state) + "'";
    }

    private List<Entry> withRest(Share rest, Reading reading) {
        Rational others = sum();
        Rational left = Rational.ONE.minus(others);
        if (left.signum() < 0) {
            reading.fault(rest.position(), "negative-rest", from + " the other probabilities add up to "
                    + Numbers.shown(others) + ", above 1, so nothing is left for 'rest'");
        } else {
            reading.changes().add(new Adjustment(diagonal.isPresent() ? Reason.REST_OF_MOVES : Reason.REST_OF_START,
                    from + toward(rest) + ": rest came to " + Numbers.shown(left)));
        }
        List<Entry> entries = new ArrayList<>(entries());
        entries.add(new Entry(rest.state(), left));
        return entries;
    }

    private List<Entry> withoutRest(Sums sums, Reading reading) {
        Rational sum = sum();
        if (sum.isOne()) {
            return entries();
        }
        if (sums == Sums.RESCALE && sum.signum() > 0) {
            return rescaled(sum, reading);
        }
        if (sums == Sums.GIVE_TO_DIAGONAL && diagonal.isPresent()) {
            return givenToDiagonal(sum, diagonal.getAsInt(), reading);
        }
        reading.fault(position, "sum-not-one",
                from + " the probabilities add up to " + Numbers.shown(sum) + ", not 1");
        return entries();
    }

    private List<Entry> rescaled(Rational sum, Reading reading) {
        List<Entry> scaled = new ArrayList<>();
        for (Entry entry : entries()) {
            Rational value = entry.value().dividedBy(sum);
            scaled.add(new Entry(entry.row(), value));
            if (!entry.value().isZero()) {
                reading.changes().add(new Adjustment(Reason.SUM, from + toward(entry.row()) + ": "
                        + Numbers.shown(entry.value()) + " became " + Numbers.shown(value)
                        + ", rescaled because the sum was " + Numbers.shown(sum) + beyondRounding(sum)));
            }
        }
        return scaled;
    }

    private List<Entry> givenToDiagonal(Rational sum, int staying, Reading reading) {
        Rational before = shares.stream().filter(share -> share.state() == staying).map(Share::amount)
                .reduce(Rational.ZERO, Rational::plus);
        Rational after = before.plus(Rational.ONE).minus(sum);
        if (after.signum() < 0) {
            reading.fault(position, "negative-diagonal", from + " the probabilities add up to " + Numbers.shown(sum)
                    + ", and staying has only " + Numbers.shown(before) + " to give");
        }
        reading.changes().add(new Adjustment(Reason.SUM, from + toward(staying) + ": " + Numbers.shown(before)
                + " became " + Numbers.shown(after) + ", given to the diagonal because the sum was "
                + Numbers.shown(sum) + beyondRounding(sum)));
        List<Entry> entries = new ArrayList<>(entries().stream().filter(entry -> entry.row() != staying).toList());
        entries.add(new Entry(staying, after));
        return entries;
    }

    /** A warning when the written places can't explain how far the sum is off. */
    private String beyondRounding(Rational sum) {
        Rational most = shares.stream().map(share -> Numerals.lastPlace(share.written()))
                .reduce(Rational.ZERO, Rational::plus);
        return Rational.ONE.minus(sum).abs().compareTo(most) > 0 ? ", further from 1 than rounding explains" : "";
    }

    private Rational sum() {
        return shares.stream().map(Share::amount).reduce(Rational.ZERO, Rational::plus);
    }

    private List<Entry> entries() {
        return shares.stream().filter(share -> !share.isRest())
                .map(share -> new Entry(share.state(), share.amount())).toList();
    }
}
