package org.pofk.meaning;

/** A formula would take too much work; {@link Reading} makes it a fault at the part it is reading. No stack trace. */
final class TooLargeException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    TooLargeException() {
        super("too large", null, false, false);
    }
}
