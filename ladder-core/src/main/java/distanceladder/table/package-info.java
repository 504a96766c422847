/**
 * Tables of text read strictly, and turned into observations.
 *
 * <p>Start from {@link distanceladder.table.Table} and {@link distanceladder.table.TableReading}. A table is read whole
 * and checked at once; what does not fit is refused with file, line and column. Nothing is guessed: neither units nor
 * what a column means.
 *
 * <pre>{@code
 * Observations stars = Table.read(Path.of("stars.csv"))
 *         .observations("star")
 *         .number("parallax", Unit.MILLIARCSECOND, "plx")
 *         .error("parallax error", Unit.MILLIARCSECOND, "plx_error")
 *         .build();
 * }</pre>
 *
 * <p>This is the only package that touches the CSV library; it does not belong here to know rungs or ladders.
 */
@org.jspecify.annotations.NullMarked
package distanceladder.table;
