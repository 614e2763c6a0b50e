package org.pofk.slip;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.pofk.chain.Model;
import org.pofk.claim.Truth;

/**
 * What is true of a model, and of the chains that somebody may have worked with in its place. Each chain's truth is
 * derived when it is first asked for and kept, for all derivations about the model.
 */
public final class ModelTruths {
    private final Model model;
    private final Variants variants;
    private final Truth truth;
    private final List<OtherChain> others = new ArrayList<>();
    private final Map<OtherChain, Truth> ofOthers = new LinkedHashMap<>();

    private ModelTruths(Model model, Variants variants) {
        this.model = model;
        this.variants = variants;
        this.truth = Truth.of(model.chain());
    }

    public static ModelTruths of(Model model, Variants variants) {
        return new ModelTruths(model, variants);
    }

    /** That of the model itself. */
    Truth truth() {
        return truth;
    }

    /** The other chains, simplest mistake first; they aren't made before something is wrong. */
    synchronized List<OtherChain> others() {
        if (others.isEmpty()) {
            others.addAll(OtherChain.allOf(model, variants));
        }
        return List.copyOf(others);
    }

    /** That of another chain. */
    synchronized Truth of(OtherChain other) {
        return ofOthers.computeIfAbsent(other, each -> Truth.of(each.chain()));
    }
}
