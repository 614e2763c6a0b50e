package org.pofk.claim;

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

    @Override
    public Judgement start(Statement.Start start) {
        throw new AssertionError("to come");
    }

    @Override
    public Judgement matrix(Statement.Matrix matrix) {
        throw new AssertionError("to come");
    }

    @Override
    public Judgement polynomial(Statement.MatrixPolynomial polynomial) {
        throw new AssertionError("to come");
    }

    @Override
    public Judgement transform(Statement.TransformOf transform) {
        return JudgedTransform.of(transform, claim, truth);
    }

    @Override
    public Judgement poles(Statement.Poles poles) {
        throw new AssertionError("to come");
    }

    @Override
    public Judgement residues(Statement.Residues residues) {
        throw new AssertionError("to come");
    }

    @Override
    public Judgement formula(Statement.PofK formula) {
        return JudgedFormula.of(formula, claim, truth);
    }

    @Override
    public Judgement pair(Statement.Pair pair) {
        throw new AssertionError("to come");
    }

    @Override
    public Judgement longRun(Statement.LongRunOf longRun) {
        throw new AssertionError("to come");
    }

    @Override
    public Judgement eigenvector(Statement.Eigenvector eigenvector) {
        throw new AssertionError("to come");
    }

    @Override
    public Judgement value(Statement.Value value) {
        throw new AssertionError("to come");
    }

    @Override
    public Judgement bound(Statement.Bound bound) {
        throw new AssertionError("to come");
    }
}
