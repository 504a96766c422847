package distanceladder.bench;

import distanceladder.relation.Linearised;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** Rows of a ten-parameter relation for 10,000 data: ours, partial derivatives by hand, Hipparchus's gradients. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Fork(1)
@Warmup(iterations = 4, time = 1)
@Measurement(iterations = 6, time = 1)
public class RelationBench {
    private final TenParameters relation = new TenParameters(10_000);

    /** For JMH. */
    public RelationBench() {}

    /**
     * By our differentiable number.
     *
     * @return rows
     */
    @Benchmark
    public Linearised ours() {
        return relation.ours();
    }

    /**
     * By hand.
     *
     * @return rows
     */
    @Benchmark
    public double[][] byHand() {
        return relation.byHand();
    }

    /**
     * By Hipparchus.
     *
     * @return rows
     */
    @Benchmark
    public double[][] byHipparchus() {
        return relation.byHipparchus();
    }
}
