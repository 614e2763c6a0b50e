package org.pofk.answer;

import java.util.List;
import java.util.Optional;
import org.pofk.chain.Chain;
import org.pofk.chain.Model;
import org.pofk.chain.Structure;
import org.pofk.longrun.RecursionPoles;

/**
 * A model as a reviewer looks at it before any formula: its structure, and what one would ask its author.
 *
 * @param states       how many
 * @param moves        how many entries of A are not zero
 * @param structure    classes, periods, what is never reached
 * @param nearlyClosed what makes a chain settle late; none for a recursion
 * @param poles        of a recursion; empty for a chain
 * @param questions    in the order of {@link Question.Kind}
 */
public record Inspection(int states, int moves, Structure structure, List<NearlyClosed> nearlyClosed,
        Optional<RecursionPoles> poles, List<Question> questions) {

    public Inspection {
        nearlyClosed = List.copyOf(nearlyClosed);
        questions = List.copyOf(questions);
    }

    public static Inspection of(Model model) {
        Chain chain = model.chain();
        Structure structure = Structure.of(chain);
        boolean isChain = chain.kind() == Chain.Kind.CHAIN;
        List<NearlyClosed> nearlyClosed = isChain ? NearlyClosed.of(chain, structure) : List.of();
        int moves = chain.matrix().columns().stream().mapToInt(List::size).sum();
        return new Inspection(chain.size(), moves, structure, nearlyClosed,
                isChain ? Optional.empty() : Optional.of(RecursionPoles.of(chain)),
                ReviewQuestions.of(model, structure, nearlyClosed));
    }
}
