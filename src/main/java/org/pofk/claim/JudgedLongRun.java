package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.pofk.exact.Rational;
import org.pofk.longrun.LongRun;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.Written;
import org.pofk.text.RefusedException;

/** Long runs: limits, cycles in their order, or that there is none. */
final class JudgedLongRun {
    private final Holding holding;
    private final List<Right> rights = new ArrayList<>();

    /** What stands for one part in the right statement: texts of numbers held, or a text. */
    private record Right(String name, int held, String otherwise) {
    }

    private JudgedLongRun(Holding holding) {
        this.holding = holding;
    }

    static Judgement of(Statement.LongRunOf stated, Claim claim, Truth truth) throws RefusedException {
        JudgedLongRun judged = new JudgedLongRun(new Holding(claim));
        for (Statement.LongRunOf.Part part : stated.parts()) {
            List<StatedNumber> numbers = new ArrayList<>();
            for (FormulaText value : part.values()) {
                numbers.add(judged.holding.number(value));
            }
            truth.about(part.output()).longRun().accept(judged.new Against(part.output().name(), numbers));
        }
        return judged.holding.judgement(texts -> judged.right(texts.all()));
    }

    private String right(List<String> texts) {
        List<String> parts = new ArrayList<>();
        int next = 0;
        for (Right right : rights) {
            List<String> own = texts.subList(next, next + right.held);
            next += right.held;
            parts.add(right.name + ": " + (right.held == 0 ? right.otherwise : listed(own)));
        }
        return String.join(", ", parts);
    }

    private static String listed(List<String> values) {
        return values.size() == 1 ? values.get(0) : "[" + String.join(", ", values) + "]";
    }

    /** What is stated of one output, against each thing it may do. */
    private final class Against implements LongRun.Visitor<Boolean> {
        private final String name;
        private final List<StatedNumber> numbers;

        Against(String name, List<StatedNumber> numbers) {
            this.name = name;
            this.numbers = numbers;
        }

        @Override
        public Boolean limit(LongRun.Limit limit) {
            if (numbers.isEmpty()) {
                return wrong(name + " has a limit: " + limit.value(), text(limit.value()));
            }
            if (numbers.size() > 1) {
                holding.remark(name + " doesn't cycle: it has a limit");
            }
            numbers.forEach(number -> holding.hold(number, Quantity.of(limit.value())));
            return rights.add(new Right(name, numbers.size(), ""));
        }

        @Override
        public Boolean cycle(LongRun.Cycle cycle) {
            String all = listed(cycle.values().stream().map(this::text).toList());
            if (numbers.isEmpty()) {
                holding.remark(name + " has no limit; it goes through " + all + " for ever");
                return rights.add(new Right(name, 0, all));
            }
            if (numbers.size() % cycle.period() != 0) {
                return wrong(numbers.size() == 1 ? name + " has no limit: it goes through a cycle of " + cycle.period()
                        + " steps" + (isAverage(cycle.average()) ? ", whose average is stated" : "")
                        : name + " repeats after " + cycle.period() + " steps, not after " + numbers.size(), all);
            }
            for (int j = 0; j < numbers.size(); j++) {
                holding.hold(numbers.get(j), Quantity.of(cycle.values().get(j % cycle.period())));
            }
            if (!isRight(cycle.values(), 0)) {
                for (int turn = 1; turn < cycle.period(); turn++) {
                    if (isRight(cycle.values(), turn)) {
                        holding.remark("the values of " + name + " are those for k = " + turn + ", " + (turn + 1)
                                + ", …, not for k = 0, 1, …");
                    }
                }
            }
            return rights.add(new Right(name, numbers.size(), ""));
        }

        @Override
        public Boolean none(LongRun.None none) {
            if (none.reason() == LongRun.Reason.CYCLE_TOO_LONG) {
                holding.undecided("the cycle of " + name + " is too long to list");
                return rights.add(new Right(name, 0, "not listed"));
            }
            if (!numbers.isEmpty()) {
                return wrong(name + " has no long run: it " + none.explanation()
                        + (none.average().filter(this::isAverage).isPresent() ? "; its average is stated" : ""),
                        "none");
            }
            return rights.add(new Right(name, 0, "none"));
        }

        private Boolean wrong(String why, String right) {
            holding.wrong(why);
            return rights.add(new Right(name, 0, right));
        }

        private boolean isAverage(Rational average) {
            return numbers.size() == 1 && isMeant(numbers.get(0), average);
        }

        /** Whether the stated values are those of the cycle from a step on. */
        private boolean isRight(List<Rational> values, int turn) {
            for (int j = 0; j < numbers.size(); j++) {
                if (!isMeant(numbers.get(j), values.get((j + turn) % values.size()))) {
                    return false;
                }
            }
            return true;
        }

        private boolean isMeant(StatedNumber number, Rational value) {
            return new Held(number, Quantity.of(value)).isRight() == Decision.YES;
        }

        private String text(Rational value) {
            List<Written> digits =
                    numbers.stream().flatMap(number -> number.value().decimals().stream()).collect(Collectors.toList());
            return RightNumber.of(Quantity.of(value), digits);
        }
    }
}
