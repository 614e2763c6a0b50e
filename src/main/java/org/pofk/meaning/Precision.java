package org.pofk.meaning;

import java.util.Optional;

/** How precise the decimals of a text are: as their last place says, or finer where zeros were left off. */
public record Precision(Optional<Carried> carried) {
    public static final Precision AS_WRITTEN = new Precision(Optional.empty());

    /** That of angles in degrees: decimals are carried for the numbers of a derivation, not for degrees of its angles. */
    Precision inDegrees() {
        return carried.filter(each -> each.unit() == Carried.Unit.DECIMALS).isPresent() ? AS_WRITTEN : this;
    }
}
