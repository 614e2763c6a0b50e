package org.pofk.formula;

import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import org.pofk.formula.Token.Kind;
import org.pofk.text.RefusedException;

/**
 * The steps that one branch of a formula in cases is written for: {@code k = 0}, {@code k >= 1}, {@code 1 <= k < 4}.
 * From a first step to a last one, both included, or without end.
 */
record StepRange(long from, OptionalLong to) {
    private static final int MOST_DIGITS = 9;
    private static final String WAYS = "k = 0, k >= 1 or 1 <= k <= 3";

    /** Reads a condition on k; it must leave at least one step. */
    static StepRange read(Cursor cursor) throws RefusedException {
        Token first = cursor.peek();
        StepRange range;
        if (cursor.sees(Kind.NUMBER)) {
            long bound = step(cursor);
            range = relation(cursor).turned().than(bound);
            requireK(cursor);
            if (cursor.sees(Kind.RELATION)) {
                range = range.and(relation(cursor).than(step(cursor)));
            }
        } else {
            requireK(cursor);
            range = relation(cursor).than(step(cursor));
        }
        if (range.isEmpty()) {
            throw cursor.refused(first, "cases-no-step", "no step fulfils '"
                    + cursor.shown(first.start(), cursor.before().end()) + "'; steps count from 0");
        }
        return range;
    }

    private static void requireK(Cursor cursor) throws RefusedException {
        if (!cursor.sees(Kind.NAME) || !cursor.peek().text().equals("k")) {
            throw unreadable(cursor);
        }
        cursor.take();
    }

    private static Relation relation(Cursor cursor) throws RefusedException {
        if (!cursor.sees(Kind.RELATION)) {
            throw unreadable(cursor);
        }
        Relation relation = Relation.written(cursor.peek().text()).orElseThrow(() -> unreadable(cursor));
        cursor.take();
        return relation;
    }

    private static long step(Cursor cursor) throws RefusedException {
        String digits = cursor.peek().text();
        if (!cursor.sees(Kind.NUMBER) || !digits.matches("[0-9]+")) {
            throw unreadable(cursor);
        }
        if (digits.length() > MOST_DIGITS) {
            throw cursor.refused(cursor.peek(), "cases-step-too-large",
                    "a step in a condition has at most " + MOST_DIGITS + " digits");
        }
        cursor.take();
        return Long.parseLong(digits);
    }

    private static RefusedException unreadable(Cursor cursor) {
        return cursor.refused(cursor.peek(), "cases-condition",
                "the steps of a branch are written as " + WAYS);
    }

    private boolean isEmpty() {
        return to.isPresent() && to.getAsLong() < from;
    }

    private StepRange and(StepRange other) {
        long latest = Math.min(to.orElse(Long.MAX_VALUE), other.to.orElse(Long.MAX_VALUE));
        return new StepRange(Math.max(from, other.from),
                latest == Long.MAX_VALUE ? OptionalLong.empty() : OptionalLong.of(latest));
    }

    /** How k stands to a number. */
    private enum Relation {
        EQUAL, BELOW, AT_MOST, ABOVE, AT_LEAST, UNEQUAL;

        static Optional<Relation> written(String sign) {
            int index = List.of("=", "<", "<=", ">", ">=", "!=").indexOf(sign);
            return index < 0 ? Optional.empty() : Optional.of(values()[index]);
        }

        /** The same with both sides exchanged. */
        Relation turned() {
            return switch (this) {
                case BELOW -> ABOVE;
                case AT_MOST -> AT_LEAST;
                case ABOVE -> BELOW;
                case AT_LEAST -> AT_MOST;
                case EQUAL, UNEQUAL -> this;
            };
        }

        /** The steps that stand so to a number; other than a number is a range only for other than 0. */
        StepRange than(long bound) {
            return switch (this) {
                case EQUAL -> new StepRange(bound, OptionalLong.of(bound));
                case BELOW -> new StepRange(0, OptionalLong.of(bound - 1));
                case AT_MOST -> new StepRange(0, OptionalLong.of(bound));
                case ABOVE -> new StepRange(bound + 1, OptionalLong.empty());
                case AT_LEAST -> new StepRange(bound, OptionalLong.empty());
                case UNEQUAL -> bound == 0 ? new StepRange(1, OptionalLong.empty())
                        : new StepRange(0, OptionalLong.of(-1));
            };
        }
    }
}
