/**
 * What a rung is made of: sources, observations, an equation, noise, and the definition that holds them.
 *
 * <p>Start from {@link distanceladder.relation.Source} (a named input or parameter), {@link
 * distanceladder.relation.Observations} (a table of data) and {@link distanceladder.relation.Rung} (what every kind of rung
 * offers). A relation is one equation over {@link distanceladder.relation.Dual} numbers, written once; value and
 * derivatives both come from it.
 *
 * <pre>{@code
 * Source offset = Source.normal("parallax offset", Amount.milliarcseconds(-0.017).plusMinus(0.005));
 * Observations stars = Observations.of("stars.csv", "star 1", "star 2")
 *         .with("parallax", Unit.MILLIARCSECOND, 0.52, -0.03)
 *         .with("parallax error", Unit.MILLIARCSECOND, 0.02, 0.11);
 * Equation line = (mu, s) -> mu.add(s.parameter("zero point")).add(s.parameter("slope").multiply(s.column("x")));
 * }</pre>
 *
 * <p>Everything is immutable. Data and objects are two things: many data may bear on one object, and an object is the same
 * in two rungs when its name is. How rungs are solved together does not belong here.
 */
@org.jspecify.annotations.NullMarked
package distanceladder.relation;
