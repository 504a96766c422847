/**
 * Pure formulas of astronomy with their units: constants, distances, redshifts, expansion, frames, directions.
 *
 * <p>Start from {@link distanceladder.astro.Unit}, {@link distanceladder.astro.Distances} and {@link
 * distanceladder.astro.Cosmography}. Units are in names ({@code megaparsecFromModulus}) or in {@link
 * distanceladder.astro.Unit}; inside the library numbers are in the base unit of their dimension (mas, Mpc, mag, km/s).
 *
 * <pre>{@code
 * double d = Distances.megaparsecFromModulus(31.5);                 // 19.95 Mpc
 * double f = Cosmography.f(0.0233, -0.55, 1);                       // 1.01791
 * double mas = Unit.MICROARCSECOND.convert(17, Unit.MILLIARCSECOND); // 0.017
 * double z = Frame.BACKGROUND.redshift(0.0233, 194.95, 27.98);      // 0.02422
 * }</pre>
 *
 * <p>Powers, logarithms and angles go through {@link java.lang.StrictMath}, so that bits are alike on every virtual
 * machine. Data, errors and fits do not belong here.
 */
@org.jspecify.annotations.NullMarked
package distanceladder.astro;
