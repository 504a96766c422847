/** Benchmarks, each with a rival in the same run. */
@org.jspecify.annotations.NullMarked
package distanceladder.bench;
