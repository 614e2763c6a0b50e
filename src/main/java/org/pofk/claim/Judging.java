package org.pofk.claim;

import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import org.pofk.text.Fault;
import org.pofk.text.RefusedException;

/** Holds one claim against what is true. */
public final class Judging implements Statement.Visitor<Judgement> {
    private final Claim claim;
    private final Truth truth;

    private Judging(Claim claim, Truth truth) {
        this.claim = claim;
        this.truth = truth;
    }

    /** The judgement; {@code truth} is that of the model, or of another one when a slip or an earlier step is tried. */
    public static Judgement of(Claim claim, Truth truth) {
        return claim.statement().accept(new Judging(claim, truth));
    }

    /** Whether it is right, at less cost than the judgement where it is not. */
    public static boolean isRight(Claim claim, Truth truth) {
        if (claim.statement() instanceof Statement.PofK formula) {
            return JudgedFormula.isRight(formula, claim, truth);
        }
        if (claim.statement() instanceof Statement.Pair pair) {
            return JudgedPair.isRight(pair, claim, truth);
        }
        return claim.statement() instanceof Statement.TransformOf transform
                ? JudgedTransform.isRight(transform, claim, truth)
                : of(claim, truth).isRight();
    }

    @Override
    public Judgement start(Statement.Start start) {
        return judged(() -> JudgedStart.of(start, claim, truth));
    }

    @Override
    public Judgement matrix(Statement.Matrix matrix) {
        return judged(() -> JudgedMatrix.of(matrix, claim, truth));
    }

    @Override
    public Judgement polynomial(Statement.MatrixPolynomial polynomial) {
        return judged(() -> JudgedPolynomial.of(polynomial, claim, truth));
    }

    @Override
    public Judgement transform(Statement.TransformOf transform) {
        return judged(() -> JudgedTransform.of(transform, claim, truth));
    }

    @Override
    public Judgement poles(Statement.Poles poles) {
        return judged(() -> JudgedPoles.of(poles, claim, truth));
    }

    @Override
    public Judgement residues(Statement.Residues residues) {
        return judged(() -> JudgedResidues.of(residues, claim, truth));
    }

    @Override
    public Judgement formula(Statement.PofK formula) {
        return judged(() -> JudgedFormula.of(formula, claim, truth));
    }

    @Override
    public Judgement pair(Statement.Pair pair) {
        return judged(() -> JudgedPair.of(pair, claim, truth));
    }

    @Override
    public Judgement longRun(Statement.LongRunOf longRun) {
        return judged(() -> JudgedLongRun.of(longRun, claim, truth));
    }

    @Override
    public Judgement eigenvector(Statement.Eigenvector eigenvector) {
        return judged(() -> JudgedEigenvector.of(eigenvector, claim, truth));
    }

    @Override
    public Judgement value(Statement.Value value) {
        return judged(() -> JudgedValue.of(value, claim, truth));
    }

    @Override
    public Judgement bound(Statement.Bound bound) {
        return judged(() -> JudgedBound.of(bound, claim, truth));
    }

    @Override
    public Judgement answer(AnswerOf answer) {
        return judged(() -> JudgedAnswer.of(answer, claim, truth));
    }

    @Override
    public Judgement noNumber(Statement.NoNumber noNumber) {
        return JudgedAbsence.of(noNumber, truth);
    }

    /** A way to a judgement that ends where the claim means nothing. */
    private interface Way {
        Judgement judgement() throws RefusedException;
    }

    private static Judgement judged(Way way) {
        try {
            return way.judgement();
        } catch (RefusedException meaningless) {
            return new Judgement(Verdict.WRONG, Optional.empty(), OptionalLong.empty(), List.of(),
                    meaningless.faults().stream().map(Fault::message).toList(), "");
        }
    }
}
