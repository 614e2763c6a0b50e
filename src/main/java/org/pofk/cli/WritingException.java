package org.pofk.cli;

/** An answer that couldn't be written where it was to go. */
final class WritingException extends Exception {
    private static final long serialVersionUID = 1L;

    WritingException(String message) {
        super(message);
    }

    WritingException(String message, Throwable cause) {
        super(message, cause);
    }
}
