package org.pofk.formula;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import org.pofk.formula.Formula.Cases;
import org.pofk.formula.Token.Kind;
import org.pofk.text.RefusedException;

/** The branches of a formula in cases as they are read, in any order. Mutable; lives for one reading. */
final class BranchList {
    private static final String OTHERWISE = "otherwise";

    private record Branch(StepRange steps, ParsedFormula formula) {
    }

    private final Cursor cursor;
    private final List<Branch> branches = new ArrayList<>();
    private Optional<ParsedFormula> otherwise = Optional.empty();
    /** What stands behind the formula added last. */
    private Token last;

    BranchList(Cursor cursor) {
        this.cursor = cursor;
        this.last = cursor.peek();
    }

    /** Adds a formula and reads the steps that it is for. */
    void add(ParsedFormula formula) throws RefusedException {
        Token first = cursor.peek();
        last = first;
        if (otherwise.isPresent()) {
            throw cursor.refused(first, "cases-order", "no branch can follow the one for all other steps");
        }
        if (!first.is(Kind.FOR)) {
            throw cursor.refused(first, "cases-condition", cursor.rules().notation() == Notation.LATEX
                    ? "behind a formula in cases & and its steps are missing, as in 0.5^k & k \\ge 1"
                    : "braces hold a formula in cases, as in {1 for k = 0; 0.5^k for k >= 1}: behind the formula"
                            + " 'for' and its steps are missing");
        }
        boolean isRest = cursor.take().text().equals(OTHERWISE);
        if (cursor.sees(Kind.FOR) && cursor.peek().text().equals(OTHERWISE)) {
            cursor.take();
            isRest = true;
        }
        if (isRest) {
            otherwise = Optional.of(formula);
        } else {
            add(first, new Branch(StepRange.read(cursor), formula));
        }
    }

    private void add(Token at, Branch branch) throws RefusedException {
        branches.add(branch);
        branches.sort(Comparator.comparingLong(each -> each.steps.from()));
        for (int i = 1; i < branches.size(); i++) {
            OptionalLong end = branches.get(i - 1).steps.to();
            if (end.isEmpty() || end.getAsLong() >= branches.get(i).steps.from()) {
                throw cursor.refused(at, "cases-overlap", "two branches are for step k = "
                        + branches.get(i).steps.from());
            }
        }
    }

    /** The whole, with what is for all other steps put where no other branch is. */
    ParsedFormula whole(NodeBuilder nodes, Token open) throws RefusedException {
        List<Branch> all = new ArrayList<>();
        OptionalLong free = OptionalLong.of(0);
        for (Branch branch : branches) {
            if (otherwise.isPresent() && free.getAsLong() < branch.steps.from()) {
                all.add(new Branch(new StepRange(free.getAsLong(), OptionalLong.of(branch.steps.from() - 1)),
                        otherwise.get()));
            }
            all.add(branch);
            free = branch.steps.to().isPresent() ? OptionalLong.of(branch.steps.to().getAsLong() + 1)
                    : OptionalLong.empty();
        }
        if (otherwise.isPresent() && free.isPresent()) {
            all.add(new Branch(new StepRange(free.getAsLong(), OptionalLong.empty()), otherwise.get()));
        }
        if (otherwise.isPresent() && all.size() == branches.size()) {
            throw cursor.refused(last, "cases-no-step", "no step is left for the branch for all other steps");
        }
        return nodes.node(new Cases(all.stream().map(each -> new Cases.Branch(each.steps.from(), each.steps.to(),
                each.formula.formula())).toList()), all.stream().map(Branch::formula).toList(), cursor.spanFrom(open));
    }
}
