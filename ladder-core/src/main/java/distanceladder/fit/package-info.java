/**
 * What a fit decides from its own data: how steps are damped, intrinsic scatter, effective degrees of freedom.
 *
 * <p>Start from {@link distanceladder.fit.Scatter}, {@link distanceladder.fit.EffectiveDegrees} and {@link
 * distanceladder.fit.Damping}. Plain numbers in, plain numbers out; every decision is a function of the data at hand and
 * of nothing remembered from another fit.
 *
 * <pre>{@code
 * double next = Scatter.next(variance, sumOfSquares, trace, traceOfSquare);
 * double degrees = EffectiveDegrees.of(total, List.of(new EffectiveDegrees.Part(share, variance)));
 * }</pre>
 *
 * <p>Nothing of astronomy belongs here, and nothing of how rows are solved.
 */
@org.jspecify.annotations.NullMarked
package distanceladder.fit;
