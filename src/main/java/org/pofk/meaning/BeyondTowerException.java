package org.pofk.meaning;

/** A number isn't written in a way that a {@link Tower} of bearable size takes. Part of how that is found out. */
final class BeyondTowerException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    @Override
    public synchronized Throwable fillInStackTrace() {
        return this;
    }
}
