package org.pofk.claim;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.pofk.exact.Rational;
import org.pofk.meaning.Quantity;

/** The poles of an output one by one: both of a pair. */
final class AllPoles {
    private AllPoles() {
    }

    /** A pole with the coefficients R_p by ascending power. */
    record Place(Quantity value, int multiplicity, List<Quantity> coefficients) {
        Place {
            coefficients = List.copyOf(coefficients);
        }
    }

    /** All but zero. */
    static List<Place> of(OutputTruth truth) {
        List<Place> places = new ArrayList<>();
        for (TruePole pole : truth.poles()) {
            places.add(new Place(pole.value(), pole.multiplicity(), pole.coefficients()));
            if (!pole.isReal()) {
                places.add(new Place(pole.value().conjugate(), pole.multiplicity(),
                        pole.coefficients().stream().map(Quantity::conjugate).toList()));
            }
        }
        return places;
    }

    /** All, each as often as its multiplicity says, with zero as Y(z) has it. */
    static List<Quantity> repeated(OutputTruth truth) {
        List<Quantity> values = new ArrayList<>();
        of(truth).forEach(place -> values.addAll(Collections.nCopies(place.multiplicity(), place.value())));
        values.addAll(Collections.nCopies(truth.poleAtZero(), Quantity.ZERO));
        return values;
    }

    /** All that coefficients can stand at: besides the poles zero, where it has impulses for coefficients. */
    static List<Place> withImpulses(OutputTruth truth) {
        List<Place> places = new ArrayList<>(of(truth));
        List<Rational> impulses = truth.impulses();
        if (!impulses.isEmpty()) {
            places.add(new Place(Quantity.ZERO, impulses.size(), impulses.stream().map(Quantity::of).toList()));
        }
        return places;
    }
}
