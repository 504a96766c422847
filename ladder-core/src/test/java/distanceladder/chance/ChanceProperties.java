package distanceladder.chance;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.Combinators;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Scale;

class ChanceProperties {
    @Provide
    Arbitrary<Distribution> distributions() {
        Arbitrary<Double> centre = Arbitraries.doubles().between(-100, 100);
        Arbitrary<Double> width = Arbitraries.doubles().between(0.001, 3).ofScale(6);
        Arbitrary<Double> dof = Arbitraries.doubles().between(1.1, 300_000);
        return Arbitraries.oneOf(
                Combinators.combine(centre, width).as(Distribution.Normal::new),
                Combinators.combine(centre, width, dof).as(Distribution.StudentT::new),
                Combinators.combine(centre, width).as((c, w) -> new Distribution.Uniform(c, c + w)),
                Combinators.combine(centre, width, width).as((c, v, w) -> new Distribution.Triangular(c - v, c, c + w)),
                Combinators.combine(centre, width, width).as(Distribution.SplitNormal::new),
                Combinators.combine(centre, width).as(Distribution.LogNormal::new));
    }

    @Property
    void quantilesAscend(
            @ForAll("distributions") Distribution distribution,
            @ForAll @Scale(12) @DoubleRange(min = 1e-9, max = 0.499) double p,
            @ForAll @Scale(12) @DoubleRange(min = 0.501, max = 0.999999999) double q) {
        double low = distribution.quantile(p);
        double middle = distribution.quantile(0.5);
        double high = distribution.quantile(q);
        assertTrue(low <= middle && middle <= high, () -> low + ", " + middle + ", " + high);
    }

    /** 400 quantiles at the middles of equal steps: the mean of what they leave out is small beside the width. */
    @Property(tries = 100)
    void theMeanIsThatOfTheQuantiles(@ForAll("distributions") Distribution distribution) {
        if (!(distribution instanceof Distribution.LogNormal) && distribution.hasFiniteVariance()) {
            double sum = 0;
            for (int k = 0; k < 400; k++) {
                sum += distribution.quantile((k + 0.5) / 400);
            }
            assertEquals(distribution.mean(), sum / 400, 0.01 * Math.sqrt(distribution.variance()));
        }
    }
}
