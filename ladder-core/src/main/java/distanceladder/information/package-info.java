/**
 * Rows, readings and triangles: square-root information by Householder reflections.
 *
 * <p>Start from {@link distanceladder.information.Triangle} (rows folded into an upper triangular square root of their
 * information), {@link distanceladder.information.Elimination} (an object's own unknown taken out of its rows) and {@link
 * distanceladder.information.Solved} (priors put beneath, and solved). Rows are divided by their standard deviation before
 * they come here, or stand in a {@link distanceladder.information.Coupled} component with their covariance.
 *
 * <pre>{@code
 * Unknowns names = Unknowns.of(List.of("slope", "zero point"));
 * Triangle triangle = Triangle.of(names, rows);        // each row: slope, zero point, right side; over its sigma
 * Solved solved = Solved.of(triangle, List.of());
 * Combination q = solved.combination(names, new double[] {1, 0});
 * double slope = solved.value(q);
 * double sigma = Math.sqrt(q.covariance(q));           // |R^-T c|, never read off an inverse
 * }</pre>
 *
 * <p>Order comes from names: columns are sorted, parts are merged in the order that the caller fixed by names. No normal
 * equations are formed and no variance is read off an inverse; gains are found by running the reflections backwards.
 * Nothing of astronomy belongs here, nor what an unknown means.
 */
@org.jspecify.annotations.NullMarked
package distanceladder.information;
