package org.pofk.cli;

import java.util.Arrays;

import java.util.Optional;

/** Commands that have a name and are not built yet: typing one says so, instead of guessing another. */
enum Planned {
    DEPENDABILITY("says availability, mean time to failure and repair, and their kin"),
    COMPARE("sets two models side by side"),
    FIND("finds the parameter value that meets a target"),
    SWEEP("runs a parameter over a range");

    private final String purpose;

    Planned(String purpose) {
        this.purpose = purpose;
    }

    static Optional<Planned> of(String word) {
        return Arrays.stream(values()).filter(name -> name.word().equals(word)).findFirst();
    }

    String word() {
        return Words.lowerCase(this);
    }

    /** What it will do, to follow its name. */
    String purpose() {
        return purpose;
    }
}
