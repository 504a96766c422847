/** An invented observatory's ladder, from its tables to its Hubble constant. */
@org.jspecify.annotations.NullMarked
package distanceladder.examples;
