/**
 * The kinds of rung, one file each, none knowing another.
 *
 * <p>Start from {@link distanceladder.rung.Parallaxes}, {@link distanceladder.rung.PeriodLuminosity} and {@link
 * distanceladder.rung.VelocityDistance}; {@link distanceladder.rung.SecondaryIndicator} and {@link
 * distanceladder.rung.Anchor} complete a ladder, {@link distanceladder.rung.Given} takes a published design matrix and
 * covariance, {@link distanceladder.rung.Own} a lambda. Each reads columns of fixed names, and has a handle for each of its
 * parameters.
 *
 * <pre>{@code
 * var nearby = Parallaxes.of("nearby", parallaxTable).withOffset(offset);
 * var pulsators = PeriodLuminosity.of("pulsators", pulsatorTable).calibratedBy(nearby);
 * var flow = VelocityDistance.of("flow", flowTable).inMagnitudes().calibratedBy(pulsators);
 * Solution solution = Ladder.of(flow).solve();
 * System.out.println(solution.of(flow.hubbleConstant()));
 * }</pre>
 *
 * <p>A new kind of rung is one class that implements {@link distanceladder.relation.Rung}, in any package. What several
 * kinds share belongs in the floors beneath.
 */
@org.jspecify.annotations.NullMarked
package distanceladder.rung;
