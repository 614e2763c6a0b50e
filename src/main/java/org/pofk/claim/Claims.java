package org.pofk.claim;

import java.util.List;
import java.util.Optional;
import org.pofk.chain.Model;
import org.pofk.meaning.Carried;

/** A derivation as its author states it, step by step, about one model: all that a claims file holds. */
public record Claims(Model model, Model.Origin origin, Review review, List<Claim> claims) {

    /**
     * Who reviews what, as the file says; never invented.
     *
     * @param convention which sum to one in the author's matrices, where the file says so
     * @param carried    how precisely the author carries numbers, where the file says so
     */
    public record Review(Optional<String> document, Optional<String> revision, Optional<String> author,
            Optional<String> reviewer, Optional<String> date, Optional<Model.Convention> convention,
            Optional<Carried> carried) {
        public static final Review NOTHING = new Review(Optional.empty(), Optional.empty(), Optional.empty(),
                Optional.empty(), Optional.empty(), Optional.empty(), Optional.empty());
    }

    public Claims {
        claims = List.copyOf(claims);
    }
}
