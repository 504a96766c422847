/**
 * The families of rungs: parallaxes, period-luminosity, secondary indicator, velocity-distance, geometric anchor, a
 * published design, and a relation of your own.
 *
 * <p>Start from {@link distanceladder.rung.Parallaxes}, {@link distanceladder.rung.PeriodLuminosity} and {@link
 * distanceladder.rung.VelocityDistance}; a single distance is an {@link distanceladder.rung.Anchor}.
 *
 * <p>Conventions: a family reads named columns of one table, and refuses a missing column, a wrong unit or an error that
 * is not above zero when it is made. Observable x has its standard deviations in column "{@code x error}". A parameter is
 * a source: made by the rung under its own name ("{@code rung} slope"), or handed in and then shared with every rung that
 * is handed the same. Offsets are observed minus true. Column "offset" (mag), where a family reads it, is the modulus of a
 * datum less that of its object. Rungs are immutable; each method gives another one, and handles hold names alone.
 *
 * <pre>{@code
 * Source offset = Source.normal("parallax offset", milliarcseconds(-0.017).plusMinus(0.005));
 * Parallaxes nearby = Parallaxes.of("nearby", stars).withOffset(offset);
 * Anchor anchor = Anchor.of("ring galaxy", modulus(29.40).plusMinus(0.03)).withSystematic(modulus(0.02));
 * PeriodLuminosity pulsators = PeriodLuminosity.of("pulsators", pulsating).calibratedBy(nearby, anchor);
 * VelocityDistance flow = VelocityDistance.of("flow", galaxies).inMagnitudes().calibratedBy(pulsators);
 * Derived hubble = flow.hubbleConstant();
 * }</pre>
 *
 * <p>What does not belong here: solving, which is the ladder's; files; and what several families share, which belongs in the
 * floors beneath. No family knows another. A new kind of rung is one class that implements {@link
 * distanceladder.relation.Rung}, in any package.
 */
@NullMarked
package distanceladder.rung;

import org.jspecify.annotations.NullMarked;
