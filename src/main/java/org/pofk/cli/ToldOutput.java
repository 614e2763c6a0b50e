package org.pofk.cli;

import java.io.FilterOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.PrintStream;

/** Standard output whose first failure is told in the notes; a print stream keeps the reason to itself. */
final class ToldOutput extends FilterOutputStream {
    private final PrintStream notes;
    private boolean isTold;

    ToldOutput(OutputStream bytes, PrintStream notes) {
        super(bytes);
        this.notes = notes;
    }

    @Override
    public void write(int value) throws IOException {
        write(new byte[] {(byte) value}, 0, 1);
    }

    @Override
    public void write(byte[] bytes, int from, int count) throws IOException {
        try {
            out.write(bytes, from, count);
        } catch (IOException failed) {
            tell(failed);
            throw failed;
        }
    }

    private void tell(IOException failed) {
        if (!isTold) {
            isTold = true;
            notes.println("pofk: standard output can't be written: " + failed.getMessage());
        }
    }
}
