package org.pofk.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.MatchResult;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.pofk.page.Installed;

/**
 * Every pattern's full report and derivation in LaTeX, set by pdflatex in one go. What is read back of a report holds
 * every decimal of the formulas, the long run and the values that derive shows as text.
 */
class LatexPatternsTest {
    private static final Pattern OVERFULL = Pattern.compile("Overfull .hbox \\(([0-9]+)\\.[0-9]+pt too wide\\)[^\\n]*");
    private static final Pattern DECIMAL = Pattern.compile("[0-9]+\\.[0-9]+");
    private static final int WIDEST_OVER = 5;
    private static final String MARK = "MARKEDPATTERN";

    @TempDir
    private Path folder;

    private String run(String... command) throws IOException, InterruptedException {
        ProcessBuilder builder = new ProcessBuilder(command).directory(folder.toFile()).redirectErrorStream(true);
        builder.environment().put("max_print_line", "1000");
        Process process = builder.start();
        String said = new String(process.getInputStream().readAllBytes(), StandardCharsets.ISO_8859_1);
        assertEquals(0, process.waitFor(), said);
        return said;
    }

    /** Each report as a part of one article, which so is also what a host document does with them. */
    private static String article(List<String> patterns) {
        return "\\documentclass[11pt,a4paper]{article}\n\\usepackage[utf8]{inputenc}\n\\usepackage[T1]{fontenc}\n"
                + "\\usepackage{lmodern}\n\\usepackage[margin=25mm]{geometry}\n\\usepackage{amsmath,array,booktabs,longtable,"
                + "tikz}\n\\allowdisplaybreaks\n\\setlength{\\parindent}{0pt}\n\\setlength{\\parskip}{6pt plus 2pt}\n"
                + "\\setlength{\\emergencystretch}{4em}\n\\begin{document}\n"
                + patterns.stream().map(name -> "\\clearpage " + MARK + "\n\n\\input{" + name + ".tex}\n")
                        .collect(Collectors.joining()) + "\\clearpage " + MARK + "\n"
                + patterns.stream().map(name -> "\\clearpage\\input{derived-" + name + ".tex}\n")
                        .collect(Collectors.joining())
                + "\\end{document}\n";
    }

    @Test
    void everyPatternsReportIsSetWithoutAFaultAndSaysWhatTheTextSays() throws Exception {
        Installed.require("pdflatex", "the patterns' reports aren't set");
        Installed.require("pdftotext", "the patterns' reports aren't read back");
        List<String> patterns = Patterns.names();
        List<Set<String>> said = new ArrayList<>();
        for (String pattern : patterns) {
            String model = "test-data/models/" + pattern + ".yaml";
            part(pattern, "report", model);
            part("derived-" + pattern, "derive", model, "--show", "all", "--angles", "degrees");
            said.add(decimals(Run.of("derive", model, "--at", "0..10,20,50").answer()));
        }
        Files.writeString(folder.resolve("all.tex"), article(patterns));
        String log = "";
        for (int i = 0; i < 2; i++) {
            log = run("pdflatex", "-interaction=nonstopmode", "-halt-on-error", "all.tex");
        }
        assertEquals(List.of(), OVERFULL.matcher(log).results()
                .filter(found -> Integer.parseInt(found.group(1)) >= WIDEST_OVER).map(MatchResult::group).toList());
        assertFalse(log.contains("undefined") || log.contains("multiply defined"), log);
        run("pdftotext", "-layout", "all.pdf", "all.txt");
        String[] read = Files.readString(folder.resolve("all.txt")).split(MARK, -1);
        assertEquals(patterns.size() + 2, read.length);
        int compared = 0;
        for (int i = 0; i < patterns.size(); i++) {
            Set<String> missing = new TreeSet<>(said.get(i));
            missing.removeAll(decimals(read[i + 1]));
            assertEquals(Set.of(), missing, patterns.get(i));
            compared += said.get(i).size();
        }
        assertTrue(compared > 500, compared + " numbers");
    }

    private void part(String name, String... command) {
        List<String> arguments = new ArrayList<>(List.of(command));
        arguments.addAll(List.of("--fragment", "--save", folder.resolve(name + ".tex").toString()));
        Run latex = Run.of(arguments);
        assertEquals(0, latex.exitCode(), name + ": " + latex.notes());
    }

    private static Set<String> decimals(String text) {
        return DECIMAL.matcher(text).results().map(MatchResult::group).collect(Collectors.toCollection(TreeSet::new));
    }
}
