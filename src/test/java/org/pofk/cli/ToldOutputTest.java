package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.PrintStream;
import org.junit.jupiter.api.Test;

class ToldOutputTest {
    @Test
    void theFirstFailureIsToldOnceWithItsReason() {
        OutputStream full = new OutputStream() {
            @Override
            public void write(int value) throws IOException {
                throw new IOException("No space left on device");
            }
        };
        ByteArrayOutputStream told = new ByteArrayOutputStream();
        PrintStream notes = new PrintStream(told);
        Streams streams = new Streams(new PrintStream(new ToldOutput(full, notes)), notes);
        streams.answer().println("lost");
        streams.answer().println("lost as well");
        assertFalse(streams.flush());
        assertEquals("pofk: standard output can't be written: No space left on device" + System.lineSeparator(),
                told.toString());
    }
}
