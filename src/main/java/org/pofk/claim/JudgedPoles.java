package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.Written;
import org.pofk.text.RefusedException;

/**
 * The poles of an output, all of them, each as often as it is one. Which pole a number means is guessed by nearness;
 * that it is that pole, to its digits, is proved.
 */
final class JudgedPoles {
    private final Truth truth;
    private final Holding holding;
    private final List<StatedNumber> stated = new ArrayList<>();

    private JudgedPoles(Claim claim, Truth truth) {
        this.truth = truth;
        this.holding = new Holding(claim);
    }

    static Judgement of(Statement.Poles poles, Claim claim, Truth truth) throws RefusedException {
        return new JudgedPoles(claim, truth).judgement(poles);
    }

    private Judgement judgement(Statement.Poles poles) throws RefusedException {
        for (Statement.Poles.Pole pole : poles.poles()) {
            StatedNumber number = holding.number(pole.value());
            for (int i = 0; i < pole.multiplicity(); i++) {
                stated.add(number);
            }
        }
        List<Quantity> right = AllPoles.repeated(truth.about(poles.output()));
        Matching matching = Matching.of(stated.stream().map(StatedNumber::value).toList(), right);
        boolean arePaired = matching.unmatched().isEmpty() && !matching.partners().contains(-1);
        for (int i = 0; i < stated.size(); i++) {
            int partner = matching.partners().get(i);
            if (partner >= 0) {
                holding.hold(stated.get(i), right.get(partner));
                Optional<String> other = other(i, partner, matching, right);
                other.ifPresent(holding::wrong);
                arePaired &= other.isEmpty();
            } else {
                holding.wrong(surplus(stated.get(i), right, poles.output().name()));
            }
        }
        List<Written> digits = stated.stream().flatMap(each -> each.value().decimals().stream()).toList();
        List<String> missing = matching.unmatched().stream().map(place -> RightNumber.of(right.get(place), digits))
                .toList();
        missing.forEach(text -> holding.wrong("the pole " + text + " is missing"));
        Judgement judgement = holding.judgement(texts -> Counted.of(texts.all(), missing));
        return arePaired ? judgement : judgement.withoutDifference();
    }

    /** What is to be said where a number stands for several poles that aren't the same. */
    private Optional<String> other(int place, int partner, Matching matching, List<Quantity> right) {
        return IntStream.range(0, place).filter(i -> stated.get(i) == stated.get(place))
                .map(matching.partners()::get)
                .filter(i -> i >= 0 && right.get(i).minus(right.get(partner)).isZero() == Decision.NO).mapToObj(i ->
                        stated.get(place).text().text() + " isn't one pole several times; two near ones are "
                                + told(right.get(i)) + " and " + told(right.get(partner))).findFirst();
    }

    private static String told(Quantity pole) {
        return RightNumber.of(pole, List.of());
    }

    /** What a number is that isn't one of the poles left. */
    private String surplus(StatedNumber number, List<Quantity> right, String output) {
        String text = number.text().text();
        if (right.stream().anyMatch(pole -> isMeant(number, pole))) {
            return text + " is a pole of lower multiplicity";
        }
        boolean isEigenvalue = truth.characteristicPolynomial()
                .map(EigenvaluesOf::distinct).orElse(List.of()).stream().anyMatch(value -> isMeant(number, value));
        return text + (isEigenvalue ? " is an eigenvalue of the matrix, but cancels: it is no pole of " + output
                : " is no pole of " + output);
    }

    private static boolean isMeant(StatedNumber number, Quantity value) {
        return new Held(number, value).isRight() == Decision.YES;
    }
}
