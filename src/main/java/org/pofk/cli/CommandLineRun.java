package org.pofk.cli;

import java.util.List;
import org.pofk.text.RefusedException;
import picocli.CommandLine;
import picocli.CommandLine.ParameterException;

/** A command line as a function from arguments and streams to an exit code. */
public final class CommandLineRun {
    private static final String TRACE = "--trace";

    private final List<String> arguments;
    private final Streams streams;

    private CommandLineRun(List<String> arguments, Streams streams) {
        this.arguments = arguments;
        this.streams = streams;
    }

    /** Runs one command line; ends nothing, and writes only to the streams and the files it is told to write. */
    public static int of(List<String> arguments, Streams streams) {
        ExitCode code = new CommandLineRun(arguments, streams).answeredOrExplained();
        boolean arrived = streams.flush();
        return (arrived ? code : ExitCode.WRITING_FAILED).number();
    }

    private ExitCode answeredOrExplained() {
        try {
            return answered();
        } catch (UsageException wrong) {
            return explained(ExitCode.USAGE, wrong.getMessage(), wrong);
        } catch (RefusedException refused) {
            refused.faults().forEach(streams.notes()::println);
            return traced(ExitCode.REFUSED, refused);
        } catch (WritingException failed) {
            return explained(ExitCode.WRITING_FAILED, failed.getMessage(), failed);
        } catch (OutOfMemoryError full) {
            return explained(ExitCode.NOT_DECIDED, "not decided within the memory Java was given; for more:"
                    + " POFK_JAVA_OPTIONS=-Xmx8g pofk …", full);
        } catch (RuntimeException | Error fault) {
            return explained(ExitCode.OUR_FAULT, "a fault of pofk, not of your model: " + fault
                    + "\nPlease report it with this command line and its files; --trace shows where it happened.",
                    fault);
        }
    }

    private ExitCode answered() throws UsageException, RefusedException, WritingException {
        Asked asked = Asked.of(arguments);
        CommandLine command = asked.command().commandLine();
        try {
            if (command.parseArgs(asked.options().toArray(String[]::new)).isUsageHelpRequested()) {
                command.usage(streams.answer());
                return ExitCode.ANSWERED;
            }
        } catch (ParameterException misunderstood) {
            throw Misunderstood.of(misunderstood);
        }
        Work work = command.getCommand();
        return work.run(streams);
    }

    private ExitCode explained(ExitCode code, String message, Throwable cause) {
        streams.notes().println("pofk: " + message);
        return traced(code, cause);
    }

    private ExitCode traced(ExitCode code, Throwable cause) {
        if (arguments.contains(TRACE)) {
            cause.printStackTrace(streams.notes());
        }
        return code;
    }
}
