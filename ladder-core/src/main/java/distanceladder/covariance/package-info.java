/**
 * Symmetric positive semidefinite operators with structure, and their split into what is whitened and what is carried.
 *
 * <p>Start from {@link distanceladder.covariance.Covariance} (the closed family: diagonal, dense, blocks, low-rank
 * update, sum), {@link distanceladder.covariance.Split} (whitened part and carried columns) and
 * {@link distanceladder.covariance.Root} (a factor L with C = L L<sup>T</sup>).
 *
 * <p>Conventions: indices count from 0; factories say what the numbers are (standard deviations, variances,
 * covariances, correlations); a matrix is checked once, in its factory, relative to its own diagonal, so the unit of
 * the numbers does not matter. Structure is declared, or found by exact zeros, never by a threshold. Everything is
 * immutable, arrays are copied in and out, and two covariances are equal when their structure and all bits are.
 *
 * <pre>{@code
 * Covariance noise = Diagonal.fromStandardDeviations(0.10, 0.12, 0.09);
 * double[][] calibration = {{0.02}, {0.02}, {0.03}};           // one systematic, common to all three
 * Covariance all = LowRankUpdate.of(noise, calibration);
 * double variance = all.quadratic(new double[] {1, -1, 0});   // of a difference: the common part cancels
 * Split split = all.split();                                   // three variances and one carried column
 * double[][] root = Root.of(all.part(0, 2));
 * }</pre>
 *
 * <p>What does not belong here: astronomy, names of data, files, and the solution of linear systems.
 */
@NullMarked
package distanceladder.covariance;

import org.jspecify.annotations.NullMarked;
