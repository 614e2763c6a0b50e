package org.pofk.schedule;

/** What an output does once the cycles of a schedule have run long enough. */
public sealed interface PeriodicRegime {

    <R> R accept(Visitor<R> visitor);

    /** One method per variant. */
    interface Visitor<R> {
        R recurring(Recurring recurring);

        R none(None none);
    }

    /**
     * The values tend to values that recur.
     *
     * @param cycles how many cycles it takes until they recur: more than one where the cycles alternate
     * @param course over all of them
     */
    record Recurring(int cycles, CycleCourse course) implements PeriodicRegime {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.recurring(this);
        }
    }

    /** They don't, and why. */
    record None(String explanation) implements PeriodicRegime {
        @Override
        public <R> R accept(Visitor<R> visitor) {
            return visitor.none(this);
        }
    }
}
