package org.pofk.bench;

import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.pofk.chain.Chain;
import org.pofk.exact.Rational;
import org.pofk.transform.TransferFunction;
import org.pofk.transform.Transforms;

/** The engine, warm: one output of a chain with ten moves out of every state, transform in lowest terms. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(1)
@Warmup(iterations = 4, time = 3)
@Measurement(iterations = 5, time = 2)
public class EngineBench {
    @Param({"100", "1000"})
    private int states;

    /** What the chances are whole multiples of: one part in so many. */
    @Param({"10", "1000"})
    private int denominator;

    private Chain chain;

    @Setup
    public void draw() {
        chain = SparseChains.of(states, denominator);
    }

    @Benchmark
    public List<TransferFunction<Rational>> transformInLowestTerms() {
        return Transforms.inLowestTerms(chain, chain.outputs());
    }
}
