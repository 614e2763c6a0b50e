package org.pofk.answer;

import org.pofk.exact.Rational;

/** What the two outputs of a {@link SummedChain} are called, and what they are in words. */
public record SummedName(String step, String ofStep, String total, String ofTotal) {

    public static SummedName of(Increment increment, Rational factor) {
        String name = increment.name();
        return switch (increment.kind()) {
            case VALUES -> new SummedName(name, increment.definition(), "total " + name, sum(name));
            case STEPS -> new SummedName(name, increment.definition(), "steps in " + name, sum(name));
            case ENTRIES -> new SummedName("new entries into " + name, "moves into " + name + " from outside in step k",
                    "entries into " + name, "moves into " + name + " from outside in steps 1 … k");
            case COSTS -> factor.isOne() ? costs("cost", "due in step k")
                    : costs("discounted cost", "due in step k, times (" + factor + ")^k");
        };
    }

    private static SummedName costs(String name, String definition) {
        return new SummedName(name, definition, "total " + name, sum(name));
    }

    private static String sum(String name) {
        return name + "(0) + … + " + name + "(k)";
    }
}
