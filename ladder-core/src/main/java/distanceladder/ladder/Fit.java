package distanceladder.ladder;

import distanceladder.astro.Unit;
import distanceladder.information.Combination;
import distanceladder.relation.Definition;
import distanceladder.relation.Linearised;
import distanceladder.text.RankFault;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.TreeSet;

/** How well a settled set fits its data. */
final class Fit {
    private static final double ROUNDING = 1e-9;

    private final Settled settled;

    Fit(Settled settled) {
        this.settled = settled;
    }

    ChiSquare chiSquare(Kept kept) {
        List<ChiSquare.Line> lines = new ArrayList<>();
        double sum = 0;
        int degrees = 0;
        for (String rung : settled.ladder().upward()) {
            if (!settled.set().contains(rung)) {
                continue;
            }
            ChiSquare.Line line = rung(rung, kept);
            lines.add(line);
            sum += line.value();
            degrees += line.degreesOfFreedom();
        }
        ChiSquare.Line total = new ChiSquare.Line("whole", settled.chiSquare(), settled.degreesOfFreedom());
        return new ChiSquare(
                lines, new ChiSquare.Line("rejoining", total.value() - sum, total.degreesOfFreedom() - degrees), total);
    }

    private ChiSquare.Line rung(String name, Kept kept) {
        TreeSet<String> with = settled.ladder().downFrom(name);
        with.retainAll(settled.set());
        TreeSet<String> beneath = new TreeSet<>(with);
        beneath.remove(name);
        try {
            Settled upper = at(with, kept);
            if (beneath.isEmpty()) {
                return new ChiSquare.Line(name, upper.chiSquare(), upper.degreesOfFreedom());
            }
            Settled lower = at(beneath, kept);
            return new ChiSquare.Line(
                    name, upper.chiSquare() - lower.chiSquare(), upper.degreesOfFreedom() - lower.degreesOfFreedom());
        } catch (RankFault fault) {
            return new ChiSquare.Line(name, Double.NaN, 0);
        }
    }

    private Settled at(TreeSet<String> set, Kept kept) {
        if (set.equals(settled.set())) {
            return settled;
        }
        TreeMap<String, Decided> decided = new TreeMap<>(settled.decided());
        decided.keySet().retainAll(set);
        return new Solver(settled.ladder(), set, kept, Map.of()).at(decided);
    }

    Residuals residuals(String rung) {
        Whitened white = settled.assembly().rows(rung);
        Definition d = white.definition();
        Unit unit = d.data().unit(d.observable());
        double scale = unit.fromBase(1);
        List<Residuals.Line> lines = new ArrayList<>();
        for (int i = 0; i < d.data().size(); i++) {
            Stated fitted = fitted(white, i);
            double residual = right(white, i) - fitted.value();
            double variance = white.noise().total(i);
            double left = variance - fitted.variance();
            boolean checked = left > ROUNDING * variance;
            String object = d.data().objects().get(i);
            lines.add(new Residuals.Line(
                    d.data().names().get(i),
                    object,
                    scale * (checked ? residual : 0),
                    scale * Math.sqrt(variance),
                    checked ? residual / Math.sqrt(left) : Double.NaN));
        }
        return new Residuals(rung, unit, lines);
    }

    private static double right(Whitened white, int datum) {
        Linearised linear = white.linear();
        return linear.rows()[datum][linear.unknowns().size()];
    }

    /** Residual of a datum, its carried errors taken out as far as they are known. */
    double residual(Whitened white, int datum) {
        return right(white, datum) - fittedWithCarried(white, datum).value();
    }

    /** The left side of a datum's row at the solution. */
    private Stated fitted(Whitened white, int datum) {
        Linearised linear = white.linear();
        return fitted(white, datum, settled.solved().combination(linear.unknowns(), linear.rows()[datum]));
    }

    /** The same with the errors that are carried as private unknowns. */
    Stated fittedWithCarried(Whitened white, int datum) {
        return fitted(white, datum, settled.solved().combination(white.unknowns(), white.raw(datum)));
    }

    private Stated fitted(Whitened white, int datum, Combination parameters) {
        Linearised linear = white.linear();
        Combination sum = parameters;
        Map<String, Double> distances = new HashMap<>();
        String object = white.definition().data().objects().get(datum);
        if (!object.isEmpty() && linear.coefficients()[datum] != 0) {
            sum = plus(sum, object, linear.coefficients()[datum], distances);
        }
        for (Linearised.Tie tie : linear.ties(datum)) {
            sum = plus(sum, tie.object(), tie.coefficient(), distances);
        }
        return new Stated(settled, settled.solved().value(sum), sum, distances);
    }

    private Combination plus(Combination sum, String object, double factor, Map<String, Double> distances) {
        Stated distance = settled.distance(object);
        distance.distances().forEach((o, w) -> distances.merge(o, factor * w, Double::sum));
        return sum.plus(1, distance.combination(), factor);
    }
}
