package org.pofk.slip;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.pofk.chain.Model;
import org.pofk.claim.Truth;

/**
 * What is true of a model, and of the chains that somebody may have worked with in its place. Each chain's truth is
 * derived when it is first asked for and kept, for all derivations about the model.
 */
public final class ModelTruths {
    private static final Pattern WHOLE = Pattern.compile("([0-9]{1,6})\\b(?![.,/])");

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

    /**
     * The steps that somebody may take for a step who counts time instead, or the other way about: as many times as the
     * number before the unit in what a step lasts.
     */
    List<Long> stepsTakenFor(long step) {
        Optional<Long> units = model.step().lasts().map(lasts -> WHOLE.matcher(lasts.strip())).filter(Matcher::lookingAt)
                .map(found -> Long.parseLong(found.group(1))).filter(count -> count > 1);
        return units.map(count -> step % count == 0 ? List.of(step * count, step / count) : List.of(step * count))
                .orElse(List.of());
    }

    /** That of another chain. */
    synchronized Truth of(OtherChain other) {
        return ofOthers.computeIfAbsent(other, each -> Truth.of(each.chain()));
    }
}
