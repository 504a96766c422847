/**
 * The ladder as a graph of rungs, its solution over any set of them, and what follows: budgets, revisions, comparisons,
 * draws.
 *
 * <p>Start from {@link distanceladder.ladder.Ladder}, {@link distanceladder.ladder.Solution} and {@link
 * distanceladder.ladder.Comparison}. A value is stated over a set of rungs: from below, from the whole, or over a set that
 * the user names; each set decides for itself what has to be decided. Ladders are immutable; a revision is another
 * solution, which looks up what it shares with its origin.
 *
 * <pre>{@code
 * Solution solution = Ladder.of(flow).solve();
 * Estimate h0 = solution.of(flow.hubbleConstant());
 * Budget budget = solution.budget(flow.hubbleConstant());
 * Solution revised = solution.with(offset.at(Amount.milliarcseconds(-0.025)));
 * System.out.println(revised.against(solution));
 * System.out.println(revised.log());
 * }</pre>
 *
 * <p>The floor knows rungs only by their definitions, and no file format. Threads: solutions may be shared.
 */
@org.jspecify.annotations.NullMarked
package distanceladder.ladder;
