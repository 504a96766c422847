/**
 * Distributions, draws that depend on their name and number alone, and running means and covariances.
 *
 * <p>Start from {@link distanceladder.chance.Distribution} (the closed family of distributions that a source may have),
 * {@link distanceladder.chance.Draws} (a counter-based stream of random numbers) and
 * {@link distanceladder.chance.Accumulator} (mean and covariance of vectors that stream by).
 *
 * <p>Conventions: the analytic value and variance of a source are the mean and variance of its distribution, whatever
 * it was given by. A draw is the quantile of a uniform number, so it moves with its distribution and not with the
 * neighbours'. A random number is a function of (seed, k, name, index): never of threads, machines or history.
 *
 * <pre>{@code
 * Distribution offset = new Distribution.SplitNormal(-0.017, 0.004, 0.006);
 * Draws draws = Draws.of(20240101L, "parallax offset");
 * Accumulator summary = Accumulator.of(1);
 * for (long k = 0; k < 10_000; k++) {
 *     summary.add(new double[] {offset.drawn(draws, k, 0)});
 * }
 * }</pre>
 *
 * <p>What does not belong here: astronomy, relations, intervals of a whole ladder.
 */
@NullMarked
package distanceladder.chance;

import org.jspecify.annotations.NullMarked;
