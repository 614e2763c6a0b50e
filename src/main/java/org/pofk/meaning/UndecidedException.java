package org.pofk.meaning;

/** A number can't be enclosed because what it hangs on isn't decided within the bounds on the work. */
public final class UndecidedException extends ArithmeticException {
    private static final long serialVersionUID = 1L;

    UndecidedException(String what) {
        super("not decided " + what);
    }
}
