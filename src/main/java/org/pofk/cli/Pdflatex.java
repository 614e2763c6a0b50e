package org.pofk.cli;

import java.io.File;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

/**
 * The program {@code pdflatex} of the machine: makes a PDF of an article, in a folder of its own that is gone afterwards,
 * without running other programs or writing elsewhere, in bounded time. The same bytes for the same article and the same
 * installation.
 */
final class Pdflatex {
    /** What tells of no day and no file name in the PDF. */
    private static final String UNDATED = "\\pdfinfoomitdate=1 \\pdftrailerid{}\\input{article.tex}";
    /** References are right the second time; the widths of long tables may take one or two more. */
    private static final int RUNS_AT_LEAST = 2;
    private static final int RUNS_AT_MOST = 4;
    private static final String NOT_SETTLED = "Rerun LaTeX";
    private static final Duration LIMIT = Duration.ofMinutes(3);
    private static final Pattern ERROR = Pattern.compile("(?m)^(?:!|\\S+?:\\d+:) (.*)$");
    private static final Pattern LINE = Pattern.compile("(?m)^l\\.(\\d+)");

    private final Path program;

    private Pdflatex(Path program) {
        this.program = program;
    }

    /** The one that this machine would run. */
    static Optional<Pdflatex> installed() {
        return among(Optional.ofNullable(System.getenv("PATH")).orElse(""));
    }

    /** The first one in these folders, which are written as in {@code PATH}. */
    static Optional<Pdflatex> among(String folders) {
        return Arrays.stream(folders.split(Pattern.quote(File.pathSeparator))).filter(each -> !each.isBlank())
                .flatMap(Pdflatex::programs).filter(Files::isExecutable).findFirst().map(Pdflatex::new);
    }

    private static Stream<Path> programs(String folder) {
        try {
            return Stream.of(Path.of(folder, "pdflatex"), Path.of(folder, "pdflatex.exe"));
        } catch (InvalidPathException odd) {
            return Stream.of();
        }
    }

    /** An article as a PDF. */
    byte[] pdf(String article) throws WritingException {
        return pdf(article, RUNS_AT_LEAST);
    }

    /** A page without references as a PDF. */
    byte[] page(String page) throws WritingException {
        return pdf(page, 1);
    }

    private byte[] pdf(String article, int runsAtLeast) throws WritingException {
        try {
            Path folder = Files.createTempDirectory("pofk-");
            try {
                Files.writeString(folder.resolve("article.tex"), article, StandardCharsets.UTF_8);
                boolean isSettled = false;
                for (int run = 0; run < RUNS_AT_MOST && !isSettled; run++) {
                    isSettled = !run(folder).contains(NOT_SETTLED) && run + 1 >= runsAtLeast;
                }
                return Files.readAllBytes(folder.resolve("article.pdf"));
            } finally {
                delete(folder);
            }
        } catch (IOException failed) {
            throw new WritingException("pdflatex can't be run: " + failed.getMessage(), failed);
        }
    }

    /** What it wrote to its screen. */
    private String run(Path folder) throws IOException, WritingException {
        ProcessBuilder builder = new ProcessBuilder(program.toString(), "-interaction=nonstopmode", "-halt-on-error",
                "-no-shell-escape", "-jobname=article", UNDATED).directory(folder.toFile()).redirectErrorStream(true)
                .redirectOutput(folder.resolve("screen").toFile());
        builder.environment().put("openout_any", "p");
        builder.environment().put("openin_any", "p");
        builder.environment().put("max_print_line", "1000");
        Process process = builder.start();
        try {
            process.getOutputStream().close();
            if (!process.waitFor(LIMIT.toMillis(), TimeUnit.MILLISECONDS)) {
                throw failure("it took more than " + LIMIT.toMinutes() + " minutes");
            }
        } catch (InterruptedException interrupted) {
            Thread.currentThread().interrupt();
            throw failure("it was interrupted");
        } finally {
            process.destroyForcibly();
        }
        String screen = Files.readString(folder.resolve("screen"), StandardCharsets.ISO_8859_1);
        if (process.exitValue() != 0) {
            throw failure(said(screen));
        }
        return screen;
    }

    private static WritingException failure(String reason) {
        return new WritingException("pdflatex made no PDF: " + reason + "\nNothing is written; --save FILE.tex writes the"
                + " LaTeX itself");
    }

    /** Its first complaint, and the line that it is about. */
    private static String said(String screen) {
        Matcher error = ERROR.matcher(screen);
        if (!error.find()) {
            return screen.lines().reduce((before, last) -> last.isBlank() ? before : last)
                    .orElse("it ended without a word");
        }
        Matcher line = LINE.matcher(screen);
        boolean isMissing = error.group(1).toLowerCase(Locale.ROOT).contains("' not found");
        return error.group(1) + (line.find(error.end()) && !isMissing ? " (line " + line.group(1) + ")" : "")
                + (isMissing ? "\nThe package it belongs to has to be installed" : "");
    }

    private static void delete(Path folder) throws IOException {
        List<Path> files = new ArrayList<>();
        try (Stream<Path> found = Files.walk(folder)) {
            found.forEach(files::add);
        }
        for (int i = files.size() - 1; i >= 0; i--) {
            Files.deleteIfExists(files.get(i));
        }
    }
}
