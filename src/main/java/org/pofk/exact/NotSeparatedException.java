package org.pofk.exact;

/**
 * A number isn't known closely enough to tell it from zero: the caller asks again with more precision. Without a stack
 * trace, for it is part of how {@link Enclosed#raising} finds the precision it needs.
 */
public final class NotSeparatedException extends ArithmeticException {
    private static final long serialVersionUID = 1L;

    NotSeparatedException(String message) {
        super(message);
    }

    @Override
    public synchronized Throwable fillInStackTrace() {
        return this;
    }
}
