package org.pofk.slip;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.pofk.claim.Claim;

/** What a complete derivation states and a file of claims doesn't. */
final class NotStated {
    private static final int MOST_NAMED = 6;

    private final List<Claim> claims;
    private final List<String> missing = new ArrayList<>();

    private NotStated(List<Claim> claims) {
        this.claims = claims;
    }

    static List<String> in(List<Claim> claims) {
        NotStated stated = new NotStated(claims);
        stated.ofTheChain("start", "the start");
        stated.ofTheChain("matrix", "the transition matrix");
        stated.ofOutputs();
        if (claims.stream().noneMatch(claim -> claim.kind().equals("formula") && claim.steps().to().isEmpty())) {
            stated.missing.add("a formula that is claimed for every k");
        }
        return stated.missing;
    }

    private void ofTheChain(String kind, String inWords) {
        if (claims.stream().noneMatch(claim -> claim.kind().equals(kind))) {
            missing.add(inWords);
        }
    }

    /** The outputs that some formula, transform, value or bound is about, in order. */
    private Set<String> outputs() {
        Set<String> names = new LinkedHashSet<>();
        claims.forEach(claim -> Outcomes.only(claim.statement()).ifPresent(output -> names.add(output.name())));
        return names;
    }

    /** One entry for all outputs that lack the same. */
    private void ofOutputs() {
        Map<List<String>, List<String>> outputs = new LinkedHashMap<>();
        outputs().forEach(output -> outputs.computeIfAbsent(lacking(output), none -> new ArrayList<>()).add(output));
        outputs.forEach((lacking, names) -> {
            if (!lacking.isEmpty()) {
                missing.add("of " + inWords(names) + ": " + String.join(", ", lacking));
            }
        });
    }

    private static String inWords(List<String> names) {
        return names.size() > MOST_NAMED ? String.join(", ", names.subList(0, MOST_NAMED)) + " and "
                + (names.size() - MOST_NAMED) + " more"
                : String.join(", ", names.subList(0, names.size() - 1)) + (names.size() > 1 ? " and " : "")
                + names.get(names.size() - 1);
    }

    private List<String> lacking(String output) {
        boolean transform = has(output, "transform") || has(output, "transform over z");
        boolean expansion = has(output, "expansion") || has(output, "residues") || has(output, "transform over z");
        Map<String, Boolean> stated = new LinkedHashMap<>();
        stated.put("the transform", transform);
        stated.put("the poles", has(output, "poles"));
        stated.put("the partial fractions", expansion);
        stated.put("the formula", has(output, "formula"));
        stated.put("the long run", has(output, "long run"));
        return stated.entrySet().stream().filter(step -> !step.getValue()).map(Map.Entry::getKey).toList();
    }

    /** Whether a claim of a kind speaks of an output: alone, among others, or by all states. */
    private boolean has(String output, String kind) {
        return claims.stream().anyMatch(claim -> claim.kind().equals(kind) && (claim.of().equals("all")
                || Outcomes.of(claim.statement()).stream().anyMatch(each -> each.name().equals(output))));
    }
}
