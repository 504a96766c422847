/** To be written. */
@org.jspecify.annotations.NullMarked
package distanceladder.astro;
