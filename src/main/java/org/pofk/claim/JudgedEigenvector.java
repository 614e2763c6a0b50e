package org.pofk.claim;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.Root;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;
import org.pofk.meaning.Written;
import org.pofk.text.RefusedException;

/**
 * An eigenvector up to scale: A v = λ v, which for an author who writes rows is v P = λ v. Components that can be chosen
 * in the eigenspace are taken as stated, or where some component is stated exactly the scale is taken from it; the
 * others follow, and are held against what is stated. States without a number have zero.
 */
final class JudgedEigenvector {
    /** How many eigenvalues a remark lists. */
    private static final int MOST_TOLD = 12;

    private final Statement.Eigenvector stated;
    private final Truth truth;
    private final Holding holding;
    private final Map<Integer, StatedNumber> components = new TreeMap<>();

    private JudgedEigenvector(Statement.Eigenvector stated, Claim claim, Truth truth) {
        this.stated = stated;
        this.truth = truth;
        this.holding = new Holding(claim);
    }

    static Judgement of(Statement.Eigenvector stated, Claim claim, Truth truth) throws RefusedException {
        return new JudgedEigenvector(stated, claim, truth).judgement();
    }

    private Judgement judgement() throws RefusedException {
        StatedNumber eigenvalue = holding.number(stated.eigenvalue());
        for (Statement.Component component : stated.components()) {
            components.put(component.state(), holding.number(component.is()));
        }
        if (components.values().stream().allMatch(each -> each.value().isZero() == Decision.YES)) {
            holding.wrong("a vector of zeros is no eigenvector");
        }
        Polynomial<Rational> annihilating = truth.minimalPolynomial();
        List<Root> eigenvalues = EigenvaluesOf.roots(annihilating);
        Root nearest = eigenvalues.get(Matching.nearest(eigenvalue.value(),
                eigenvalues.stream().map(Quantity::of).toList()));
        Held meant = new Held(eigenvalue, Quantity.of(nearest));
        if (meant.isRight() == Decision.NO) {
            String sentence = eigenvalue.text().text() + " is no eigenvalue; " + told(eigenvalues);
            if (RightNumber.isReal(meant.right()) != RightNumber.isReal(eigenvalue.value())) {
                holding.wrong(sentence);
                return holding.judgement(texts -> "");
            }
            holding.remark(sentence);
        }
        holding.hold(meant);
        Optional<Eigenspace> space = Eigenspace.of(truth.chain().matrix(), nearest);
        if (space.isEmpty()) {
            holding.undecided("the eigenspace isn't worked out: a polynomial isn't known to be irreducible");
            return holding.judgement(texts -> "");
        }
        List<Quantity> right = right(space.get());
        hold(right);
        return holding.judgement(texts -> String.join(", ", texts(right, texts.areRight())));
    }

    private static String told(List<Root> eigenvalues) {
        return (eigenvalues.size() > MOST_TOLD ? "some eigenvalues are " : "the eigenvalues are ")
                + eigenvalues.stream().limit(MOST_TOLD).map(each -> RightNumber.of(Quantity.of(each), List.of()))
                .collect(Collectors.joining(", "));
    }

    private Quantity at(int state) {
        return components.containsKey(state) ? components.get(state).value() : Quantity.ZERO;
    }

    /** The eigenvector meant: in decimals of the components that were taken as stated. */
    private List<Quantity> right(Eigenspace space) {
        if (space.free().size() == 1) {
            List<Quantity> vector = space.vectors().get(0);
            for (int state : components.keySet()) {
                Quantity own = at(state);
                if (own.decimals().isEmpty() && own.isZero() == Decision.NO
                        && vector.get(state).isZero() == Decision.NO) {
                    Quantity scale = own.dividedBy(vector.get(state));
                    return vector.stream().map(scale::times).toList();
                }
            }
        }
        List<Quantity> right = new ArrayList<>(Collections.nCopies(truth.chain().size(), Quantity.ZERO));
        for (int i = 0; i < space.free().size(); i++) {
            Quantity weight = at(space.free().get(i));
            for (int state = 0; state < right.size(); state++) {
                right.set(state, right.get(state).plus(weight.times(space.vectors().get(i).get(state))));
            }
        }
        return right;
    }

    private void hold(List<Quantity> right) {
        for (int state = 0; state < right.size(); state++) {
            Quantity wanted = right.get(state);
            if (!components.containsKey(state)) {
                if (wanted.isZero() != Decision.YES) {
                    holding.wrong("the component of " + truth.chain().states().get(state) + " isn't zero");
                }
            } else if (wanted.decimals().isEmpty()) {
                holding.hold(components.get(state), wanted);
            } else if (wanted != at(state)) {
                holding.hold(new StatedNumber(components.get(state).text(), at(state).minus(wanted)), Quantity.ZERO);
            }
        }
    }

    /** Components as stated where all are right, or this one is to its digits; else as they should be. */
    private List<String> texts(List<Quantity> right, boolean areRight) {
        List<Written> decimals = components.values().stream().flatMap(each -> each.value().decimals().stream()).toList();
        List<String> texts = new ArrayList<>();
        for (int state = 0; state < right.size(); state++) {
            Quantity wanted = AtFaceValue.of(right.get(state));
            boolean isStated = components.containsKey(state);
            if (isStated && (areRight || new Held(components.get(state), wanted).isRight() == Decision.YES)) {
                texts.add(truth.chain().states().get(state) + ": " + components.get(state).text().text());
            } else if (isStated || wanted.isZero() != Decision.YES) {
                texts.add(truth.chain().states().get(state) + ": " + RightNumber.of(wanted, decimals));
            }
        }
        return texts;
    }
}
