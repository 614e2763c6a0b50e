package org.pofk.claim;

import java.util.List;
import java.util.Optional;

/** A wrong number beside the right one, both with the sign before them where that turns with it. */
public record FoundAndRight(String found, String right) {

    /** As a number of these texts is told. */
    public static FoundAndRight of(Judgement.JudgedNumber number, List<FormulaText> texts) {
        return Optional.of(number).filter(each -> each.right().startsWith("-"))
                .flatMap(each -> texts.stream().flatMap(text -> signed(each, text).stream()).findFirst())
                .orElse(new FoundAndRight(number.written().text(), number.right()));
    }

    private static Optional<FoundAndRight> signed(Judgement.JudgedNumber number, FormulaText written) {
        return AuthorText.of(written).flatMap(text -> text.tree().nodes()
                .filter(node -> node.parts().isEmpty() && text.place(node).equals(number.written().span())).findFirst()
                .flatMap(node -> SignBefore.of(text.text(), AuthorText.start(node), AuthorText.end(node))
                        .map(sign -> new FoundAndRight(text.text().substring(sign.at(), AuthorText.end(node)),
                                sign.turned(text.text(), AuthorText.start(node), AuthorText.end(node),
                                        number.right().substring(1)).text()))));
    }
}
