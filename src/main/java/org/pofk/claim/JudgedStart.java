package org.pofk.claim;

import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.exact.Rational;
import org.pofk.meaning.Quantity;
import org.pofk.text.RefusedException;

/** A start vector held against that of the chain; states without a number have zero. */
final class JudgedStart {
    private JudgedStart() {
    }

    static Judgement of(Statement.Start stated, Claim claim, Truth truth) throws RefusedException {
        Chain chain = truth.chain();
        Holding holding = new Holding(claim);
        Map<Integer, Integer> places = new TreeMap<>();
        for (Statement.Component component : stated.components()) {
            places.put(component.state(), places.size());
            holding.hold(component.is(), Quantity.of(chain.start().get(component.state())));
        }
        for (int state = 0; state < chain.size(); state++) {
            Rational start = chain.start().get(state);
            if (!places.containsKey(state) && !start.isZero()) {
                holding.wrong("the start in " + chain.states().get(state) + " is " + start + ", not zero");
            }
        }
        return holding.judgement(texts -> right(chain, places, texts.all()));
    }

    private static String right(Chain chain, Map<Integer, Integer> places, List<String> texts) {
        return IntStream.range(0, chain.size())
                .filter(state -> places.containsKey(state) || !chain.start().get(state).isZero())
                .mapToObj(state -> chain.states().get(state) + ": " + (places.containsKey(state)
                        ? texts.get(places.get(state)) : chain.start().get(state).toString()))
                .collect(Collectors.joining(", "));
    }
}
