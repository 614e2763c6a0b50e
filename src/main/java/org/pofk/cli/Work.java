package org.pofk.cli;

import org.pofk.text.RefusedException;

/** What a command does once its options are understood. */
interface Work {
    /**
     * Does it: the answer goes to the answer stream or to the file asked for, everything else to the notes.
     *
     * @throws RefusedException when the input can't be accepted; nothing has been written then
     * @throws UsageException   when the options don't fit together or don't fit the input
     * @throws WritingException when a file couldn't be written
     */
    ExitCode run(Streams streams) throws RefusedException, UsageException, WritingException;
}
