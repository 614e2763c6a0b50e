package org.pofk.transform;

import java.util.ArrayList;
import java.util.List;
import org.pofk.chain.SparseMatrix;
import org.pofk.chain.SparseMatrix.Entry;

/** A matrix turned round. Exact; cost linear in the number of entries. */
final class Transposition {
    private Transposition() {
    }

    /** The rows of a matrix, each entry's place being its column. */
    static List<List<Entry>> rows(SparseMatrix matrix) {
        List<List<Entry>> rows = new ArrayList<>(matrix.size());
        for (int i = 0; i < matrix.size(); i++) {
            rows.add(new ArrayList<>());
        }
        for (int j = 0; j < matrix.size(); j++) {
            for (Entry entry : matrix.columns().get(j)) {
                rows.get(entry.row()).add(new Entry(j, entry.value()));
            }
        }
        return rows;
    }
}
