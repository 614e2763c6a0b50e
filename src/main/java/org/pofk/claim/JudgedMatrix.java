package org.pofk.claim;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.Model.Convention;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Rational;
import org.pofk.meaning.Decision;
import org.pofk.meaning.Quantity;
import org.pofk.text.RefusedException;

/** A transition matrix held against that of the chain, entry by entry, in the author's convention. */
final class JudgedMatrix {
    private static final int MOST_REMARKS = 12;

    private final Statement.Matrix stated;
    private final Truth truth;
    private final Holding holding;
    private final List<List<StatedNumber>> entries = new ArrayList<>();

    private JudgedMatrix(Statement.Matrix stated, Claim claim, Truth truth) {
        this.stated = stated;
        this.truth = truth;
        this.holding = new Holding(claim);
    }

    static Judgement of(Statement.Matrix stated, Claim claim, Truth truth) throws RefusedException {
        return new JudgedMatrix(stated, claim, truth).judgement();
    }

    private Judgement judgement() throws RefusedException {
        int size = truth.chain().size();
        if (stated.rows().size() != size || stated.rows().stream().anyMatch(row -> row.size() != size)) {
            holding.wrong("the matrix has " + size + " rows and columns, one for each state");
            return holding.judgement(texts -> rightWithout());
        }
        for (List<FormulaText> row : stated.rows()) {
            List<StatedNumber> numbers = new ArrayList<>();
            for (FormulaText entry : row) {
                numbers.add(holding.number(entry));
            }
            entries.add(numbers);
        }
        int wrong = 0;
        for (int i = 0; i < size; i++) {
            for (int j = 0; j < size; j++) {
                Held held = new Held(entries.get(i).get(j), Quantity.of(right(i, j)));
                holding.hold(held);
                if (held.isRight() == Decision.NO && ++wrong <= MOST_REMARKS) {
                    remark(i, j);
                }
            }
        }
        if (wrong > 0 && isTransposed()) {
            holding.remark("it is the matrix turned: its rows stand in the columns");
        }
        return holding.judgement(texts -> inRows(texts.all(), size));
    }

    private void remark(int i, int j) {
        int from = stated.convention() == Convention.COLUMNS ? j : i;
        int to = stated.convention() == Convention.COLUMNS ? i : j;
        holding.remark("row " + (i + 1) + ", column " + (j + 1) + " (from " + name(from) + " to " + name(to) + ") is "
                + right(i, j) + ", written " + entries.get(i).get(j).text().text());
    }

    private String name(int state) {
        return truth.chain().states().get(state);
    }

    /** The entry in row i and column j as the author writes it. */
    private Rational right(int i, int j) {
        SparseMatrix matrix = truth.chain().matrix();
        return stated.convention() == Convention.COLUMNS ? matrix.at(i, j) : matrix.at(j, i);
    }

    private boolean isTransposed() {
        int size = entries.size();
        for (int i = 0; i < size; i++) {
            for (int j = 0; j < size; j++) {
                if (new Held(entries.get(i).get(j), Quantity.of(right(j, i))).isExact() != Decision.YES) {
                    return false;
                }
            }
        }
        return true;
    }

    private String inRows(List<String> texts, int size) {
        List<List<String>> rows = new ArrayList<>();
        for (int i = 0; i < size; i++) {
            rows.add(texts.subList(i * size, (i + 1) * size));
        }
        return MatrixText.of(rows, stated.notation());
    }

    private String rightWithout() {
        int size = truth.chain().size();
        List<String> all = new ArrayList<>();
        for (int i = 0; i < size; i++) {
            for (int j = 0; j < size; j++) {
                all.add(right(i, j).toString());
            }
        }
        return inRows(all, size);
    }
}
