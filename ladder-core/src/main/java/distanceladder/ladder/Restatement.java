package distanceladder.ladder;

import distanceladder.relation.Value;
import distanceladder.text.Fault;
import java.util.ArrayList;
import java.util.List;

/** Finds for each rung of a revised solution the value that moved most. */
final class Restatement {
    private Restatement() {}

    static List<Log.Restated> between(Solution origin, Solution revised) {
        List<Log.Restated> out = new ArrayList<>();
        for (String rung : revised.upward()) {
            String largest = "";
            double sigmas = 0;
            for (Value value : Calibration.values(revised, rung)) {
                double move = move(origin, revised, value);
                if (Math.abs(move) > Math.abs(sigmas)) {
                    sigmas = move;
                    largest = value.name();
                }
            }
            if (!largest.isEmpty()) {
                out.add(new Log.Restated(rung, largest, sigmas));
            }
        }
        return out;
    }

    private static double move(Solution origin, Solution revised, Value value) {
        Stated after = new Evaluation(revised.settled()).stated(value);
        if (after.sigma() == 0) {
            return 0;
        }
        try {
            return (after.value()
                            - new Evaluation(origin.settled()).stated(value).value())
                    / after.sigma();
        } catch (Fault notThere) {
            return 0;
        }
    }
}
