package org.pofk.input;

import java.nio.file.Path;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.claim.Claims;
import org.pofk.exact.Rational;
import org.pofk.slip.Variants;
import org.pofk.text.RefusedException;

/** The model of a claims file, read again with another value for one of its parameters. */
public final class ModelVariants implements Variants {
    private final Path model;
    private final Overrides overrides;

    private ModelVariants(Path model, Overrides overrides) {
        this.model = model;
        this.overrides = overrides;
    }

    /** Those of the model that claims were read with, and of what the command line put in place of its own words. */
    public static Variants of(Claims claims, Overrides overrides) {
        return claims.model().parameters().isEmpty() ? Variants.NONE
                : new ModelVariants(Path.of(claims.model().origin().file()), overrides);
    }

    @Override
    public Optional<Chain> with(String parameter, Rational value) {
        Map<String, String> values = new LinkedHashMap<>(overrides.parameters());
        values.put(parameter, value.toString());
        try {
            return Optional.of(ModelReader.read(model, new Overrides(values, overrides.start())).chain());
        } catch (RefusedException noChain) {
            return Optional.empty();
        }
    }
}
