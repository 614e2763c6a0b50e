package org.pofk.input;

import java.nio.file.Path;
import org.pofk.claim.Claims;
import org.pofk.text.RefusedException;

/** Reads claims files and the models they are about. */
public final class ClaimsReader {
    private ClaimsReader() {
    }

    /** The claims in a file; the model it names lies beside it. Refused with every fault of both. */
    public static Claims read(Path file, Overrides overrides) throws RefusedException {
        throw new AssertionError("to come");
    }
}
