package org.pofk.cli;

import java.io.PrintStream;
import java.time.Duration;
import java.util.Optional;

/** Tells somebody who waits that the work goes on. */
public interface Progress {
    /** For what nobody watches: a file, a program, a test. */
    Progress UNSEEN = new Progress() {
        @Override
        public void told(Duration elapsed, Optional<Duration> limit, String soFar) {
        }

        @Override
        public void ended() {
        }
    };

    /** Called about once a second while the work goes on. */
    void told(Duration elapsed, Optional<Duration> limit, String soFar);

    /** Called once, when it is over. */
    void ended();

    /** One line of a terminal that is written over and over, and is gone at the end. */
    static Progress onTerminal(PrintStream terminal) {
        return new Progress() {
            private int shown;

            @Override
            public void told(Duration elapsed, Optional<Duration> limit, String soFar) {
                String line = line(elapsed, limit, soFar);
                write(line);
                shown = line.length();
            }

            @Override
            public void ended() {
                if (shown > 0) {
                    write("");
                }
            }

            private void write(String line) {
                terminal.print("\r" + line + " ".repeat(Math.max(0, shown - line.length())) + (line.isEmpty() ? "\r" : ""));
                terminal.flush();
            }
        };
    }

    /** {@code 3 s of 60 s, 2 of 5 outputs}; what can be done about it where there is no limit. In eighty columns. */
    static String line(Duration elapsed, Optional<Duration> limit, String soFar) {
        return "at work: " + elapsed.toSeconds() + " s" + limit.map(most -> " of " + most.toSeconds() + " s").orElse("")
                + (soFar.isEmpty() ? "" : ", " + soFar)
                + (limit.isEmpty() ? "; Ctrl-C stops it, --budget limits it" : "");
    }
}
