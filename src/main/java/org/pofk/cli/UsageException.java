package org.pofk.cli;

/** A command line that can't be done: what is wrong with it and what would be right. */
final class UsageException extends Exception {
    private static final long serialVersionUID = 1L;

    UsageException(String message) {
        super(message);
    }
}
