package org.pofk.slip;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.pofk.claim.Claim;

/** What a complete derivation states and a file of claims doesn't. */
final class NotStated {
    private final List<Claim> claims;
    private final List<String> missing = new ArrayList<>();

    private NotStated(List<Claim> claims) {
        this.claims = claims;
    }

    static List<String> in(List<Claim> claims) {
        NotStated stated = new NotStated(claims);
        stated.ofTheChain("start", "the start");
        stated.ofTheChain("matrix", "the transition matrix");
        Set<String> outputs = stated.outputs();
        for (String output : outputs) {
            stated.ofOutput(output);
        }
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

    private void ofOutput(String output) {
        boolean transform = has(output, "transform") || has(output, "transform over z");
        boolean expansion = has(output, "expansion") || has(output, "residues") || has(output, "transform over z");
        add(transform, "the transform of " + output);
        add(has(output, "poles"), "the poles of " + output);
        add(expansion, "the partial fractions of " + output);
        add(has(output, "formula"), "the formula of " + output);
        add(has(output, "long run"), "the long run of " + output);
    }

    private void add(boolean stated, String what) {
        if (!stated) {
            missing.add(what);
        }
    }

    /** Whether a claim of a kind speaks of an output: alone, among others, or by all states. */
    private boolean has(String output, String kind) {
        return claims.stream().anyMatch(claim -> claim.kind().equals(kind) && (claim.of().equals("all")
                || Outcomes.of(claim.statement()).stream().anyMatch(each -> each.name().equals(output))));
    }
}
