/** A kind of rung that the library does not know, in a package of its own: one file. */
@org.jspecify.annotations.NullMarked
package distanceladder.examples.stranger;
