package org.pofk.check;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Rational;
import org.pofk.slip.SlipKind;

/** Claims that rest on answers, right ones and the same with their slips: what they state is found by stepping. */
final class AnswerClaims {
    private static final int SEEN = 190;

    private final Subject subject;
    private final Random random;
    private final Author author;
    private final List<Claimed> right = new ArrayList<>();
    private final List<Claimed> wrong = new ArrayList<>();

    private AnswerClaims(Subject subject, Random random) {
        this.subject = subject;
        this.random = random;
        this.author = new Author(subject, random);
        subject.outputs().forEach(output -> {
            sum(output);
            mean(output);
            conditional(output);
            settling(output);
        });
        if (subject.chain().kind() == Chain.Kind.CHAIN) {
            passage();
            passage();
        }
    }

    static List<Claimed> right(Subject subject, Random random) {
        return new AnswerClaims(subject, random).right;
    }

    static List<Claimed> wrong(Subject subject, Random random) {
        return new AnswerClaims(subject, random).wrong;
    }

    /** A fraction while it is a short one. */
    private String text(Rational value) {
        boolean isLong = value.denominator().bitLength() + value.numerator().abs().bitLength() > 60;
        return author.written(value, isLong || random.nextBoolean() ? rounded() : Style.EXACT);
    }

    private Style rounded() {
        return Style.significant(5 + random.nextInt(4));
    }

    /** One claim with the right number, and others with what somebody may take for it. */
    private final class Asked {
        private final String shape;
        private final List<String> keys;
        private final Rational truth;

        private Asked(String shape, Rational truth, String... keys) {
            this.shape = shape;
            this.truth = truth;
            this.keys = List.of(keys);
        }

        private Claimed stating(String text) {
            List<String> all = new ArrayList<>(keys);
            all.addAll(List.of("is", Claimed.quoted(text)));
            return new Claimed(subject, shape, Claimed.line(all.toArray(String[]::new)), List.of(),
                    Claimed.Truly.RIGHT, Arbiter.number(text, Near.of(truth)));
        }

        private void rightly() {
            right.add(stating(text(truth)));
        }

        private void wrongly(Rational value, SlipKind kind) {
            wrong.add(stating(author.written(value, rounded())).wrongBy(kind));
        }
    }

    private Rational total(Output output, int first, int last) {
        return IntStream.rangeClosed(first, last).mapToObj(k -> subject.steps().value(output, k))
                .reduce(Rational.ZERO, Rational::plus);
    }

    private void sum(Output output) {
        int first = random.nextInt(3) == 0 ? 1 + random.nextInt(4) : 0;
        int last = first + 2 + random.nextInt(12);
        String name = Claimed.quoted(output.name());
        Asked asked = first == 0 && random.nextBoolean()
                ? new Asked("sum", total(output, first, last), "sum", name, "to", "" + last)
                : new Asked("sum", total(output, first, last), "sum", name, "from", "" + first, "to", "" + last);
        asked.rightly();
        asked.wrongly(total(output, first, last - 1), SlipKind.TERM_MISSING);
    }

    private void mean(Output output) {
        int first = random.nextInt(3);
        int last = first + 2 + random.nextInt(12);
        Asked asked = new Asked("mean", total(output, first, last).dividedBy(Rational.of(last - first + 1)), "mean",
                Claimed.quoted(output.name()), "from", "" + first, "to", "" + last);
        asked.rightly();
        asked.wrongly(subject.steps().value(output, last), SlipKind.END_VALUE_FOR_THE_MEAN);
    }

    /** Given that the chain is in one of two states. */
    private void conditional(Output output) {
        int n = subject.chain().size();
        int at = 1 + random.nextInt(9);
        List<String> sets = subject.chain().sets().keySet().stream().sorted().collect(Collectors.toList());
        if (sets.isEmpty()) {
            return;
        }
        String name = sets.get(random.nextInt(sets.size()));
        List<Integer> set = subject.chain().sets().get(name);
        Output given = new Output(name, IntStream.range(0, n).mapToObj(i -> set.contains(i) ? Rational.ONE
                : Rational.ZERO).toList(), Rational.ZERO, name);
        Output both = new Output(name, IntStream.range(0, n).mapToObj(i -> set.contains(i)
                ? output.coefficients().get(i).plus(output.constant()) : Rational.ZERO).toList(), Rational.ZERO, name);
        Rational below = subject.steps().value(given, at);
        Rational joint = subject.steps().value(both, at);
        if (!below.isZero()) {
            Asked asked = new Asked("value given", joint.dividedBy(below), "value", Claimed.quoted(output.name()),
                    "given", Claimed.quoted(name), "at", "" + at);
            asked.rightly();
            asked.wrongly(joint, SlipKind.JOINT_FOR_CONDITIONAL);
        }
    }

    /** Where two hundred steps tell all: by the last of them that is too far off. */
    private void settling(Output output) {
        List<Rational> limits = subject.longRun(output);
        if (limits.size() != 1 || !Approximations.settlesSoon(subject.modes(output))) {
            return;
        }
        boolean isRelative = random.nextBoolean() && !limits.get(0).isZero();
        BigDecimal share = BigDecimal.valueOf(1 + random.nextInt(5), 2);
        BigDecimal distance = isRelative ? share.multiply(Near.of(limits.get(0)).real().abs()) : share;
        int from = SEEN;
        while (from > 0 && subject.values(output).get(from - 1).minus(Near.of(limits.get(0))).real().abs()
                .compareTo(distance) <= 0) {
            from--;
        }
        if (from < SEEN / 2) {
            Asked asked = new Asked("settling step", Rational.of(from), "settling step",
                    Claimed.quoted(output.name()), "within",
                    isRelative ? share.movePointRight(2).toPlainString() + "%" : share.toPlainString());
            asked.rightly();
            int off = from == 0 || random.nextBoolean() ? from + 1 : from - 1;
            wrong.add(asked.stating("" + off).wrongBy(SlipKind.INDEX_SHIFTED));
        }
    }

    private void passage() {
        Chain chain = subject.chain();
        int into = random.nextInt(chain.size());
        int from = random.nextInt(chain.size());
        if (into == from || !hasOneMeaning(chain.states().get(into))) {
            return;
        }
        boolean fromStart = random.nextInt(3) == 0;
        Passages passages = Passages.of(chain, Set.of(into));
        List<Rational> start = IntStream.range(0, chain.size()).mapToObj(i -> i == from ? Rational.ONE : Rational.ZERO)
                .toList();
        Rational entered = Passages.from(fromStart ? chain.start() : start, passages.entered());
        Rational steps = Passages.from(fromStart ? chain.start() : start, passages.steps());
        if (entered.isZero() || steps.isZero()) {
            return;
        }
        List<String> keys = new ArrayList<>(List.of("mean passage", "all", "into",
                Claimed.quoted(chain.states().get(into))));
        if (!fromStart) {
            keys.addAll(List.of("from", Claimed.quoted(chain.states().get(from))));
        }
        Rational mean = steps.dividedBy(entered);
        if (!entered.isOne()) {
            // there is no number that would be right
            String text = author.written(mean, rounded());
            List<String> wrongly = new ArrayList<>(keys);
            wrongly.addAll(List.of("is", Claimed.quoted(text)));
            wrong.add(new Claimed(subject, "mean passage", Claimed.line(wrongly.toArray(String[]::new)), List.of(),
                    Claimed.Truly.WRONG, units -> true).wrongBy(SlipKind.NEVER_IS_AVERAGED));
            keys.addAll(List.of("given", "entered"));
        }
        Asked asked = new Asked("mean passage", mean, keys.toArray(String[]::new));
        asked.rightly();
        asked.wrongly(mean.compareTo(Rational.TWO) > 0 && random.nextBoolean() ? mean.minus(Rational.ONE)
                : mean.plus(Rational.ONE), SlipKind.MEAN_OFF_BY_A_STEP);
    }

    private boolean hasOneMeaning(String state) {
        return !subject.chain().sets().containsKey(state)
                && subject.chain().outputs().stream().noneMatch(output -> output.name().equals(state));
    }
}
