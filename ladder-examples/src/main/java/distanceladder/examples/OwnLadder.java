package distanceladder.examples;

import distanceladder.document.LadderFolder;
import distanceladder.ladder.Solution;
import distanceladder.relation.Rung;
import distanceladder.rung.Anchor;
import distanceladder.rung.VelocityDistance;
import java.io.PrintStream;
import java.nio.file.Path;

/** The main job on a folder of the user's own: its ladder, solved and explained. */
final class OwnLadder {
    private OwnLadder() {}

    static void run(Path folder, PrintStream out) {
        LadderFolder read = LadderFolder.read(folder);
        show(out, read.ladder());
        Solution solution = read.ladder().solve();
        show(out, solution);
        for (Rung<?> rung : read.rungs()) {
            if (!(rung instanceof Anchor)) {
                show(out, solution.distances(rung));
            }
        }
        for (Rung<?> rung : read.rungs()) {
            if (rung instanceof VelocityDistance flow) {
                show(out, solution.budget(flow.hubbleConstant()));
            }
        }
    }

    private static void show(PrintStream out, Object thing) {
        out.println(thing);
        out.println();
    }
}
