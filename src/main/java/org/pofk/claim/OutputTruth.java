package org.pofk.claim;

import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.function.IntFunction;
import java.util.stream.IntStream;
import org.pofk.chain.Chain;
import org.pofk.chain.Output;
import org.pofk.exact.Factoring;
import org.pofk.exact.Polynomial;
import org.pofk.exact.Rational;
import org.pofk.exact.RationalField;
import org.pofk.longrun.LongRun;
import org.pofk.modes.ClosedForm;
import org.pofk.modes.KnownPoles;
import org.pofk.transform.RecurrenceProof;
import org.pofk.transform.Sequence;
import org.pofk.transform.TransferFunction;
import org.pofk.transform.Transform;
import org.pofk.transform.Transforms;

/**
 * What is true of one sequence p(k), exact, each part worked out when first asked for and kept: its values cost only
 * stepping, its transform no factoring, and only what asks for poles has them found.
 */
public final class OutputTruth {
    /** The last step whose value is worth a fraction; later ones are enclosed. */
    public static final long EXACT = 4_000;
    /** Values up to here are found by stepping; beyond, each by itself. */
    static final int STEPPED = 400;

    private final Output output;
    private final boolean isOfChain;
    private final Kept<Chain> chain;
    private final IntFunction<Rational> steps;
    private final Kept<TransferFunction<Rational>> y;
    private final Kept<Transform> transform;
    private final Kept<Sequence> sequence;
    private final Kept<LongRun> longRun;
    private final Kept<ClosedForm> closedForm;
    private final Kept<List<TruePole>> poles;
    private final Kept<OutputTruth> sums = new Kept<>(this::summed);
    private final Map<Claim.Within, Answer> settled = new ConcurrentHashMap<>();

    private OutputTruth(Output output, boolean isOfChain, Kept<Chain> chain, IntFunction<Rational> steps,
            Kept<TransferFunction<Rational>> y, Kept<Transform> transform, Kept<Sequence> sequence,
            Kept<LongRun> longRun, KnownPoles known) {
        this.output = output;
        this.isOfChain = isOfChain;
        this.chain = chain;
        this.steps = steps;
        this.y = y;
        this.transform = transform;
        this.sequence = sequence;
        this.longRun = longRun;
        this.closedForm = new Kept<>(() -> ClosedForm.of(transform.get(), known));
        this.poles = new Kept<>(() -> TruePole.allOf(closedForm.get()));
    }

    /** An output of a chain. */
    static OutputTruth of(Truth truth, Output output) {
        List<Output> alone = List.of(output);
        Kept<Transform> transform = new Kept<>(() -> Transforms.of(truth.chain(), alone).get(0));
        return new OutputTruth(output, true, new Kept<>(truth::chain), k -> output.of(truth.stateAt(k)),
                new Kept<>(() -> Transforms.inLowestTerms(truth.chain(), alone).get(0)), transform,
                new Kept<>(() -> Sequence.of(truth.chain(), transform.get())),
                new Kept<>(() -> LongRun.of(truth.chain(), transform.get())), truth.poles());
    }

    /**
     * A sequence that is known by its transform alone, whatever chain it may come from; the numerator's degree is at
     * most that of the denominator, so that nothing happens before k = 0. {@code output} says what it is about.
     */
    public static OutputTruth of(Output output, TransferFunction<Rational> y) {
        Kept<Transform> transform = new Kept<>(() -> defining(output, y));
        SteppedValues values = new SteppedValues(y);
        Kept<Chain> chain = new Kept<>(() -> Companion.of(recurrence(y),
                IntStream.range(0, recurrence(y).degree()).mapToObj(values::at).toList()));
        return new OutputTruth(output, false, chain, values::at, new Kept<>(() -> y), transform,
                new Kept<>(() -> Sequence.of(transform.get())), new Kept<>(() -> LongRun.of(transform.get())),
                new KnownPoles());
    }

    /** The transform as its own ground: what it defines satisfies its recurrence from k = 0 on. */
    private static Transform defining(Output output, TransferFunction<Rational> y) {
        Polynomial<Rational> recurrence = recurrence(y);
        int order = recurrence.degree();
        return new Transform(output, recurrence, y, Factoring.of(y.denominator()),
                new RecurrenceProof(RecurrenceProof.Method.WINDOWS, order, 2 * order, 0, 0));
    }

    /** The shortest recurrence: the denominator of Y(z)/z. */
    private static Polynomial<Rational> recurrence(TransferFunction<Rational> y) {
        return y.numerator().coefficient(0).isZero() ? y.denominator() : y.denominator().shiftedUp(1);
    }

    public Output output() {
        return output;
    }

    /** Whether it is an output of {@link #chain()}; otherwise that is a recursion whose first state is p(k). */
    boolean isOfChain() {
        return isOfChain;
    }

    /** What it comes from. */
    Chain chain() {
        return chain.get();
    }

    /** p(k), exactly; for a large k with log k products of polynomials. */
    public Rational valueAt(long k) {
        return k <= STEPPED ? steps.apply((int) k) : sequence.get().at(k);
    }

    /** Any p(k), for enclosing those whose fraction is too long. */
    public Sequence sequence() {
        return sequence.get();
    }

    /** Y(z), not factored. */
    public TransferFunction<Rational> y() {
        return y.get();
    }

    /** d, the order of the shortest recurrence that holds from k = 0 on: its first d values determine p(k). */
    public int order() {
        return recurrence(y.get()).degree();
    }

    /** Y(z) factored, with its recurrence. */
    public Transform transform() {
        return transform.get();
    }

    public ClosedForm closedForm() {
        return closedForm.get();
    }

    /** S(k) = p(0) + … + p(k): its transform is Y(z) z/(z − 1). */
    OutputTruth sums() {
        return sums.get();
    }

    private OutputTruth summed() {
        Polynomial<Rational> lessOne = new Polynomial<>(RationalField.Q, List.of(Rational.ONE.negate(), Rational.ONE));
        return of(output, new TransferFunction<>(y.get().numerator().shiftedUp(1),
                y.get().denominator().times(lessOne)));
    }

    /** The least step from which p(k) stays within a distance of its long run for ever. */
    Answer settledFrom(Claim.Within distance) {
        return settled.computeIfAbsent(distance, each -> SettledFrom.of(this, each));
    }

    public LongRun longRun() {
        return longRun.get();
    }

    /** What is added at k = 0, 1, … besides powers of the poles; the last one isn't zero. */
    public List<Rational> impulses() {
        return closedForm.get().expansion().impulses();
    }

    /** The poles of Y(z) but zero: real ones, and one of each conjugate pair, that of the upper half-plane. */
    public List<TruePole> poles() {
        return poles.get();
    }

    /** The multiplicity of zero as a pole of Y(z); 0 where it is none. */
    public int poleAtZero() {
        return y.get().denominator().lowestPower();
    }
}
