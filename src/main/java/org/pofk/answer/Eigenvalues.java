package org.pofk.answer;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.exception.MathRuntimeException;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.EigenDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.pofk.chain.SparseMatrix;
import org.pofk.exact.Guess;

/** The eigenvalues of a matrix as Commons Math finds them in doubles. Approximate; n³ steps. */
public final class Eigenvalues {
    private Eigenvalues() {
    }

    /** All n, multiple ones repeated; a {@link MathRuntimeException} when the iteration doesn't converge. */
    static List<Guess> inDoubles(SparseMatrix matrix) {
        EigenDecomposition found = new EigenDecomposition(dense(matrix));
        double[] real = found.getRealEigenvalues();
        double[] imaginary = found.getImagEigenvalues();
        List<Guess> eigenvalues = new ArrayList<>();
        for (int i = 0; i < real.length; i++) {
            eigenvalues.add(new Guess(real[i], imaginary[i]));
        }
        return eigenvalues;
    }

    /** As guesses at poles: none for large matrices or where the iteration doesn't converge. */
    public static List<Guess> guesses(SparseMatrix matrix) {
        if (matrix.size() > PoleCheck.STATES_AT_MOST) {
            return List.of();
        }
        try {
            return inDoubles(matrix);
        } catch (MathRuntimeException failure) {
            return List.of();
        }
    }

    private static RealMatrix dense(SparseMatrix matrix) {
        double[][] entries = new double[matrix.size()][matrix.size()];
        for (int j = 0; j < matrix.size(); j++) {
            for (SparseMatrix.Entry entry : matrix.columns().get(j)) {
                entries[entry.row()][j] = entry.value().approximate();
            }
        }
        return new Array2DRowRealMatrix(entries, false);
    }
}
