package org.pofk.slip;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.pofk.claim.AuthorText;
import org.pofk.claim.FormulaText;
import org.pofk.exact.Ball;
import org.pofk.exact.Rational;

/**
 * Pairs of changes of one formula whose effects at a few points add up to what it is off by: changes in different terms
 * add, those in different factors multiply, and those within one term are tried out. Doubles order them; whether a pair
 * explains anything is judged.
 */
final class Pairs {
    private static final int BITS = 96;
    private static final int MOST_CHANGES = 500;
    private static final int MOST_TRIED = 4_000;
    private static final double NOISE = 1e-11;

    private final List<Optional<AuthorText>> texts;
    private final List<Optional<Screen>> screens;
    private final List<Change> changes;
    private final Budget budget;

    Pairs(List<Optional<AuthorText>> texts, List<Optional<Screen>> screens, List<Change> changes, Budget budget) {
        this.texts = texts;
        this.screens = screens;
        this.changes = changes;
        this.budget = budget;
    }

    private record Seen(Change change, List<Double> values) {
    }

    private record Scored(List<Change> pair, double miss, int order) {
    }

    /** Likely pairs, simplest first. */
    List<List<Change>> found() {
        List<List<Change>> pairs = new ArrayList<>();
        for (int part = 0; part < texts.size(); part++) {
            if (texts.get(part).isPresent() && screens.get(part).isPresent()) {
                pairs.addAll(ofPart(part, texts.get(part).get(), screens.get(part).get()));
            }
        }
        return pairs;
    }

    private List<List<Change>> ofPart(int part, AuthorText text, Screen screen) {
        Optional<List<Double>> own = text.read(text.text()).flatMap(read -> values(screen, read));
        if (own.isEmpty()) {
            return List.of();
        }
        List<Double> right = screen.probe().right().stream().map(value -> value.approximate()).toList();
        List<Double> open = open(screen, text);
        List<Seen> seen = new ArrayList<>();
        for (Change change : changes) {
            if (seen.size() < MOST_CHANGES && change.edits().size() == 1 && change.edits().containsKey(part)
                    && budget.screening()) {
                change.textOf(text, part).flatMap(changed -> values(screen, changed))
                        .ifPresent(values -> seen.add(new Seen(change, values)));
            }
        }
        List<Scored> scored = new ArrayList<>();
        for (int i = 0; i < seen.size(); i++) {
            for (int j = i + 1; j < seen.size(); j++) {
                double miss = miss(own.get(), seen.get(i).values(), seen.get(j).values(), right, open);
                if (miss < 1 && seen.get(i).change().isApartFrom(seen.get(j).change())) {
                    scored.add(new Scored(List.of(seen.get(i).change(), seen.get(j).change()), miss,
                            seen.get(i).change().kind().ordinal() + seen.get(j).change().kind().ordinal()));
                }
            }
        }
        scored.addAll(withinTerms(text, screen, seen));
        return scored.stream().sorted(Comparator.comparingInt(Scored::order).thenComparingDouble(Scored::miss))
                .map(Scored::pair).toList();
    }

    /** Pairs of changes within one term, as many as the work allows. */
    private static List<Scored> withinTerms(AuthorText text, Screen screen, List<Seen> seen) {
        List<FormulaSurvey.Term> terms = FormulaSurvey.of(text.tree()).summands();
        List<Scored> scored = new ArrayList<>();
        int left = MOST_TRIED;
        for (FormulaSurvey.Term term : terms) {
            List<Change> own = seen.stream().map(Seen::change).filter(change -> isWithin(term, change)).toList();
            for (int i = 0; i < own.size(); i++) {
                for (int j = i + 1; j < own.size() && left > 0; j++) {
                    Change a = own.get(i);
                    Change b = own.get(j);
                    if (a.isApartFrom(b)) {
                        left--;
                        boolean fits = a.with(b).textOf(text, a.edits().firstKey()).filter(screen::mayBeRight)
                                .isPresent();
                        if (fits) {
                            scored.add(new Scored(List.of(a, b), 0, a.kind().ordinal() + b.kind().ordinal()));
                        }
                    }
                }
            }
        }
        return scored;
    }

    private static boolean isWithin(FormulaSurvey.Term term, Change change) {
        int start = AuthorText.start(term.node());
        int end = AuthorText.end(term.node());
        // the sign of a term stands before it
        return change.edits().values().stream().flatMap(List::stream)
                .allMatch(each -> start - 2 <= each.start() && each.end() <= end);
    }

    /** How far both changes together leave the formula off, in units of what its decimals leave open; worst point. */
    private static double miss(List<Double> own, List<Double> a, List<Double> b, List<Double> right,
            List<Double> open) {
        double sums = 0;
        double products = 0;
        for (int i = 0; i < own.size(); i++) {
            double allowed = 4 * open.get(i) + NOISE * Math.max(1, Math.abs(right.get(i)));
            sums = Math.max(sums, Math.abs(a.get(i) + b.get(i) - own.get(i) - right.get(i)) / allowed);
            products = Math.max(products, Math.abs(a.get(i) * b.get(i) / own.get(i) - right.get(i)) / allowed);
        }
        return Math.min(sums, Double.isNaN(products) ? sums : products);
    }

    private static List<Double> open(Screen screen, AuthorText text) {
        return text.read(text.text()).stream().flatMap(read -> screen.open(read).stream())
                .map(open -> open.map(Rational::approximate).orElse(0.0)).toList();
    }

    private static Optional<List<Double>> values(Screen screen, FormulaText text) {
        List<Double> values = new ArrayList<>();
        for (int i = 0; i < screen.probe().points().size(); i++) {
            Optional<Ball> value = screen.probe().faceValue(text, i, BITS);
            if (value.isEmpty()) {
                return Optional.empty();
            }
            values.add(value.get().middle().approximate());
        }
        return Optional.of(values);
    }
}
