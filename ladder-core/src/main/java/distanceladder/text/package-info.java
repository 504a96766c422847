/**
 * What a person reads: numbers with the digits that their errors allow, aligned tables, refusals that name the repair.
 *
 * <p>Start from {@link distanceladder.text.Grid}, {@link distanceladder.text.Figures} and {@link
 * distanceladder.text.Fault}. Everything that prints implements {@link distanceladder.text.Shown}, text for a terminal and
 * HTML for a notebook. All refusals of the library are one of five kinds of {@link distanceladder.text.Fault}, with what
 * was wrong, the rule, where, and the repair.
 *
 * <pre>{@code
 * Grid grid = Grid.with("value", "estimate")
 *         .row("Hubble constant", Figures.pair(71.32, 1.44)) // 71.3 ± 1.4
 *         .titled("What comes out")
 *         .build();
 * System.out.println(grid);
 * }</pre>
 *
 * <p>Text is the same in every locale and on every virtual machine. Nothing of astronomy or linear algebra belongs here.
 */
@org.jspecify.annotations.NullMarked
package distanceladder.text;
