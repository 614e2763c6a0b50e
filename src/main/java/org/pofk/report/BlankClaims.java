package org.pofk.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Output;
import org.pofk.chain.Outputs;
import org.pofk.text.Columns;

/**
 * An empty claims file for a model: every kind of step stands in it as a comment, with the model's states and outputs,
 * so that somebody who checks a derivation only uncomments the steps it has and fills in its numbers.
 */
public final class BlankClaims {
    /** What is to be filled in. */
    public static final String GAP = "…";

    private static final int MATRIX_AT_MOST = 12;
    private static final int STATES_UNASKED = 12;

    private final Model model;
    private final List<String> lines = new ArrayList<>();

    private BlankClaims(Model model) {
        this.model = model;
    }

    /**
     * The text of the file.
     *
     * @param file the model's file as the claims file is to name it
     */
    public static String of(Model model, String file) {
        BlankClaims blank = new BlankClaims(model);
        blank.head(file);
        blank.chain();
        blank.outputs().forEach(blank::output);
        return blank.lines.stream().map(line -> line + "\n").collect(Collectors.joining());
    }

    private void head(String file) {
        lines.add("pofk-claims: 1");
        lines.add("model: " + Yaml.name(file));
        lines.add("");
        says("Where the derivation states a step, take the '# ' off and put what it says in");
        says("place of each " + GAP + "; where: says where it stands, as \"eq. (3)\". Leave out the other");
        says("steps; the order is that of the derivation. Then:  pofk check THIS-FILE");
        lines.add("review:");
        List.of("document: " + GAP, "revision: " + GAP, "author: " + GAP, "reviewer: " + GAP, "date: " + GAP)
                .forEach(this::open);
        open("convention: " + (model.convention() == Model.Convention.COLUMNS ? "columns" : "rows")
                + "       # columns: x(k+1) = A x(k); rows: p(k+1) = p(k) P");
        open("carried: 4 significant    # how many digits the author carries; or: 4 decimals");
        lines.add("");
        lines.add("claims:");
    }

    private void says(String comment) {
        lines.add("## " + comment);
    }

    private void open(String line) {
        lines.add("  # " + line);
    }

    private Chain states() {
        return model.chain();
    }

    private void chain() {
        lines.add("");
        says("The chain itself");
        byState("start: all");
        if (states().size() <= MATRIX_AT_MOST) {
            open("- matrix: all");
            open("  are:                  # the rows as written; states in the order "
                    + states().states().stream().map(Yaml::name).collect(Collectors.joining(", ")));
            String row = states().states().stream().map(state -> GAP).collect(Collectors.joining(", ", "[", "]"));
            states().states().forEach(state -> open("    - " + row));
        }
        open("- {characteristic polynomial: all, is: '" + GAP + "', where: " + GAP + "}");
        open("- {minimal polynomial: all, is: '" + GAP + "', where: " + GAP + "}");
        open("- eigenvector: all");
        open("  at: 1                 # the eigenvalue");
        each();
        byState("long run: all");
        byState("formula: all");
        if (states().kind() == Chain.Kind.CHAIN) {
            open("- {mean passage: all, into: " + set() + ", is: " + GAP + "}    # or infinite, never; from the start, or from: STATE");
        }
    }

    /** A name for a set to put another one in the place of: the last state whose name stands for nothing else. */
    private String set() {
        return states().states().stream().filter(name -> !states().sets().containsKey(name)
                && states().outputs().stream().noneMatch(output -> output.name().equals(name)))
                .reduce((first, last) -> last).map(Yaml::name).orElse(GAP);
    }

    /** A set within which the output varies; a single state leaves nothing to ask. */
    private Optional<String> given(Output output) {
        return states().sets().entrySet().stream().filter(set -> set.getValue().stream()
                .map(output.coefficients()::get).distinct().count() > 1)
                .map(Map.Entry::getKey).findFirst().map(Yaml::name);
    }

    /** A claim with one number, or one formula, for each state. */
    private void byState(String claim) {
        open("- " + claim);
        each();
    }

    private void each() {
        open("  are:");
        states().states().forEach(state -> open("    " + Yaml.name(state) + ": " + GAP));
    }

    /** Those the model names, every state of a small one without; the first of a large one. */
    private List<Output> outputs() {
        List<Output> outputs = Outputs.byDefault(states());
        return states().outputs().isEmpty() && outputs.size() > STATES_UNASKED ? outputs.subList(0, 1) : outputs;
    }

    private void output(Output output) {
        String of = Yaml.name(output.name());
        lines.add("");
        says("About " + output.name().replaceAll("\\s+", " ")
                + (outputs().size() < Outputs.byDefault(states()).size() ? ", and likewise about any other state" : ""));
        String formula = ", is: '" + GAP + "'}";
        List<Step> steps = new ArrayList<>(List.of(
                new Step("{transform: " + of + formula, "Y(z), in any form"),
                new Step("{transform over z: " + of + formula, "Y(z)/z"),
                new Step("{expansion: " + of + formula, "Y(z) as a sum of partial fractions"),
                new Step("{poles: " + of + ", are: [" + GAP + "]}", "as 1, 0.45 (twice), 0.4 ± 0.33 i"),
                new Step("{residues: " + of + ", are: {1: " + GAP + "}}", "by pole; [R0, R1] at a double one"),
                new Step("{formula: " + of + formula, "in k; with for: k >= 1 where it begins later"),
                new Step("{long run: " + of + ", is: " + GAP + "}", "or none, or are: [" + GAP + ", " + GAP
                        + "] for a cycle"),
                new Step("{value: " + of + ", at: 5, is: " + GAP + "}", "an estimate: within: 2%, safe side: above"),
                new Step("{bound: " + of + ", at most: " + GAP + "}", "or at least; for: k >= 0"),
                new Step("{settling step: " + of + ", within: 1%, is: " + GAP + "}", "or never; of the long run, for ever"),
                new Step("{sum: " + of + ", to: 12, is: " + GAP + "}", "of k = 0 to 12; from: 1 to begin later"),
                new Step("{mean: " + of + ", from: 1, to: 12, is: " + GAP + "}", "over these steps, both counted")));
        Optional<String> given = given(output);
        given.ifPresent(set -> steps.add(new Step("{value: " + of + ", given: " + set + ", at: 5, is: " + GAP + "}",
                "given that set then")));
        aligned(steps);
        open("- {pair: " + of + ", radius: " + GAP + ", angle: " + GAP + ", amplitude: " + GAP + ", phase: " + GAP
                + "}");
        if (states().sets().isEmpty()) {
            says("A value given a set then, as given: up, needs one of several states in the model,");
            says("as sets: {up: {not: down}}");
        }
    }

    /** A claim on one line and what helps to fill it in. */
    private record Step(String claim, String help) {
    }

    private void aligned(List<Step> steps) {
        int widest = steps.stream().mapToInt(step -> Columns.width(step.claim)).max().orElse(0);
        steps.forEach(step -> open("- " + Columns.left(step.claim, widest) + "  # " + step.help));
    }
}
