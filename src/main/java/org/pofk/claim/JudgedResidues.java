package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.Written;
import org.pofk.text.RefusedException;

/** Coefficients of p(k) by pole. Poles that aren't listed are not claimed to have none; that they aren't is said. */
final class JudgedResidues {
    private final Holding holding;
    private final List<AllPoles.Place> places;
    /** How many numbers of each entry are held: its pole and its coefficients. */
    private final List<Integer> counts = new ArrayList<>();
    private final List<List<String>> missing = new ArrayList<>();

    private JudgedResidues(Holding holding, List<AllPoles.Place> places) {
        this.holding = holding;
        this.places = places;
    }

    static Judgement of(Statement.Residues stated, Claim claim, Truth truth) throws RefusedException {
        return new JudgedResidues(new Holding(claim), AllPoles.withImpulses(truth.about(stated.output())))
                .judgement(stated);
    }

    private Judgement judgement(Statement.Residues stated) throws RefusedException {
        List<StatedNumber> poles = new ArrayList<>();
        for (Statement.Residues.AtPole entry : stated.coefficients()) {
            poles.add(holding.number(entry.pole()));
        }
        List<Quantity> first = new ArrayList<>();
        for (Statement.Residues.AtPole entry : stated.coefficients()) {
            first.add(entry.coefficients().isEmpty() ? Quantity.ZERO
                    : holding.number(entry.coefficients().get(0)).value());
        }
        Matching matching = Matching.of(poles.stream().map(StatedNumber::value).toList(),
                places.stream().map(AllPoles.Place::value).toList(),
                (i, j) -> Guesses.distance(first.get(i), places.get(j).coefficients().get(0)));
        for (int i = 0; i < poles.size(); i++) {
            int partner = matching.partners().get(i);
            if (partner < 0) {
                holding.wrong(poles.get(i).text().text() + " is no pole of " + stated.output().name());
                counts.add(0);
                missing.add(List.of());
            } else {
                holding.hold(poles.get(i), places.get(partner).value());
                hold(stated.coefficients().get(i), places.get(partner));
            }
        }
        matching.unmatched().stream().map(places::get).filter(place -> !isConjugateOfListed(place, matching))
                .forEach(place -> holding.remark("nothing is stated for the pole "
                        + RightNumber.of(place.value(), List.of())));
        return holding.judgement(texts -> right(texts.all()));
    }

    private boolean isConjugateOfListed(AllPoles.Place place, Matching matching) {
        return place.value().conjugate() != place.value() && matching.partners().stream().filter(p -> p >= 0)
                .anyMatch(p -> places.get(p).value().minus(place.value().conjugate()).isZero() == Decision.YES);
    }

    private void hold(Statement.Residues.AtPole entry, AllPoles.Place place) throws RefusedException {
        List<Written> digits = new ArrayList<>();
        for (int power = 0; power < entry.coefficients().size(); power++) {
            StatedNumber number = holding.number(entry.coefficients().get(power));
            digits.addAll(number.value().decimals());
            holding.hold(number, power < place.multiplicity() ? place.coefficients().get(power) : Quantity.ZERO);
        }
        List<String> absent = new ArrayList<>();
        for (int power = entry.coefficients().size(); power < place.multiplicity(); power++) {
            Quantity coefficient = place.coefficients().get(power);
            if (coefficient.isZero() != Decision.YES) {
                absent.add(RightNumber.of(coefficient, digits));
                holding.wrong("at the pole " + entry.pole().text() + " the coefficient " + absent.get(absent.size() - 1)
                        + " of binomial(k, " + power + ") is missing");
            }
        }
        counts.add(1 + entry.coefficients().size());
        missing.add(absent);
    }

    private String right(List<String> texts) {
        List<String> entries = new ArrayList<>();
        int next = 0;
        for (int i = 0; i < counts.size(); i++) {
            if (counts.get(i) > 0) {
                List<String> values = new ArrayList<>(texts.subList(next + 1, next + counts.get(i)));
                values.addAll(missing.get(i));
                entries.add(texts.get(next) + ": "
                        + (values.size() == 1 ? values.get(0) : "[" + String.join(", ", values) + "]"));
                next += counts.get(i);
            }
        }
        return String.join(", ", entries);
    }
}
