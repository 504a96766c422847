/**
 * A ladder described by a document beside its tables, read strictly.
 *
 * <p>Start from {@link distanceladder.document.LadderFolder}: a folder with one file {@code ladder.json} and the CSV tables
 * that it names. Nothing is guessed: columns, units and what rests on what are said in the document. Unknown fields, wrong
 * types, repeated keys and paths that leave the folder are refused, with file, line and column.
 *
 * <pre>{@code
 * Ladder ladder = LadderFolder.read(Path.of("my-ladder")).ladder();
 * Solution solution = ladder.solve();
 * VelocityDistance flow = ladder.rung("flow", VelocityDistance.class);
 * System.out.println(solution.of(flow.hubbleConstant()));
 * }</pre>
 *
 * <p>This is the only package that touches the JSON library. A relation given by a lambda cannot be written down and has no
 * place here.
 */
@org.jspecify.annotations.NullMarked
package distanceladder.document;
