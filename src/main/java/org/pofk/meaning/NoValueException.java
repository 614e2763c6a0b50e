package org.pofk.meaning;

/** A formula has no value where it is evaluated, or none within the bounds; part of {@link DirectEvaluation} only. */
final class NoValueException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    NoValueException() {
        super("no value", null, false, false);
    }
}
