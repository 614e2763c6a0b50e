package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import org.pofk.chain.Model;
import org.pofk.exact.Rational;

/**
 * The totals asked for of one model, in the order in which they were asked for.
 *
 * @param wanted how many were asked for, found by now or not
 */
public record TotalModel(Model model, List<Total> totals, int wanted) {

    /**
     * A total that is asked for.
     *
     * @param factor with which each later step counts less; one where nothing is discounted
     */
    public record Asked(Increment increment, Rational factor) {

        public static Asked of(Increment increment) {
            return new Asked(increment, Rational.ONE);
        }
    }

    public TotalModel {
        totals = List.copyOf(totals);
    }

    /** One after the other, published after each. */
    public static TotalModel of(Model model, List<Asked> asked, List<Integer> steps, Consumer<TotalModel> published) {
        List<Total> totals = new ArrayList<>();
        for (Asked each : asked) {
            totals.add(Total.of(model.chain(), each.increment(), each.factor(), steps));
            published.accept(new TotalModel(model, totals, asked.size()));
        }
        return new TotalModel(model, totals, asked.size());
    }

    /** What the costs of a model ask for: their total, and the discounted one where there is a discount. */
    public static List<Asked> costs(Model model) {
        List<Asked> asked = new ArrayList<>();
        model.costs().ifPresent(costs -> {
            Increment increment = Increment.ofCosts(model.chain(), costs);
            asked.add(Asked.of(increment));
            costs.discount().ifPresent(rate ->
                    asked.add(new Asked(increment, Rational.ONE.plus(rate).inverse())));
        });
        return asked;
    }

    public boolean isComplete() {
        return totals.size() == wanted;
    }
}
