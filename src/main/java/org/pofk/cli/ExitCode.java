package org.pofk.cli;

/** What a run tells the shell. */
enum ExitCode {
    /** Answered; also "never" and "no limit", where that is proved. */
    ANSWERED(0),
    /** A claim is wrong. */
    CLAIM_WRONG(1),
    /** The command line can't be understood, or a file exists and --replace wasn't given. */
    USAGE(2),
    /** The input can't be accepted. */
    REFUSED(3),
    /** Not decided within the budget. */
    NOT_DECIDED(4),
    /** The answer couldn't be written. */
    WRITING_FAILED(5),
    /** A fault of ours. */
    OUR_FAULT(70);

    private final int number;

    ExitCode(int number) {
        this.number = number;
    }

    int number() {
        return number;
    }
}
