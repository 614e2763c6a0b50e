package org.pofk.input;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.pofk.chain.Model;
import org.pofk.text.Fault;
import org.pofk.text.RefusedException;

/** The model that a claims file names: a file beside it. */
final class ModelBeside {
    private ModelBeside() {
    }

    /** The model; a fault of its file as a whole is shown where the claims name it. */
    static Model read(Node.Scalar named, Optional<Path> folder, Overrides overrides) throws RefusedException {
        String file = named.text().strip();
        try {
            return ModelReader.read(folder.orElse(Path.of("")).resolve(file), overrides);
        } catch (InvalidPathException noPath) {
            throw new RefusedException(List.of(new Fault(named.position(), "missing-file",
                    "'" + Words.shortened(file) + "' can't be the name of a file")));
        } catch (RefusedException refused) {
            throw new RefusedException(refused.faults().stream().map(fault -> located(fault, named, file)).toList());
        }
    }

    private static Fault located(Fault fault, Node named, String file) {
        boolean isOfFile = fault.position().isWhole() && !fault.position().source().startsWith("--");
        return isOfFile ? new Fault(named.position(), fault.code(), "'" + Words.shortened(file) + "': "
                + fault.message()) : fault;
    }
}
