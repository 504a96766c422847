package distanceladder.bench;

import distanceladder.text.Figures;
import distanceladder.text.Grid;
import java.util.Collection;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.OptionsBuilder;

/** Runs the benchmarks and prints each with its ratio to the rival in the same run. */
public final class Ratios {
    private Ratios() {}

    /**
     * Runs them.
     *
     * @param args none
     * @throws RunnerException when a benchmark fails
     */
    public static void main(String[] args) throws RunnerException {
        Collection<RunResult> results = new Runner(new OptionsBuilder()
                        .include(RelationBench.class.getSimpleName())
                        .build())
                .run();
        double hand = time(results, "byHand");
        Grid.Builder grid = Grid.with("rows of a relation", "µs for 10,000", "to partials by hand");
        for (String way : new String[] {"byHand", "ours", "byHipparchus"}) {
            grid.row(
                    way, Figures.significant(time(results, way), 3), Figures.significant(time(results, way) / hand, 3));
        }
        System.out.println(grid.titled(System.getProperty("java.vm.name") + " " + System.getProperty("java.version"))
                .build());
    }

    private static double time(Collection<RunResult> results, String way) {
        return results.stream()
                .filter(r -> r.getParams().getBenchmark().endsWith("." + way))
                .mapToDouble(r -> r.getPrimaryResult().getScore())
                .findFirst()
                .orElse(Double.NaN);
    }
}
