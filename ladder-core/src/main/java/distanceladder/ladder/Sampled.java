package distanceladder.ladder;

import distanceladder.astro.Unit;
import distanceladder.text.Figures;
import distanceladder.text.Grid;
import distanceladder.text.Shown;
import java.util.Arrays;
import java.util.List;

/**
 * Values propagated by Monte Carlo, in the terms of JCGM 101:2008.
 *
 * <p>A draw depends on (seed, k, source or datum name) alone: the same seed gives the same draws on any machine, with any
 * number of threads, in one run or in parts. Draws that a relation refuses are counted and shown; the summaries are of the
 * others.
 */
public final class Sampled implements Shown {
    private final Road road;
    private final long seed;
    private final List<Summary> summaries;
    private final int count;
    private final int refused;

    Sampled(Road road, long seed, List<Summary> summaries, int count, int refused) {
        this.road = road;
        this.seed = seed;
        this.summaries = List.copyOf(summaries);
        this.count = count;
        this.refused = refused;
    }

    /** The draws of one value. */
    public static final class Summary {
        private final String name;
        private final Unit unit;
        private final Estimate analytic;
        private final double[] sorted;
        private final double mean;
        private final double sigma;

        Summary(Estimate analytic, double[] draws) {
            this.name = analytic.name();
            this.unit = analytic.unit();
            this.analytic = analytic;
            this.sorted =
                    Arrays.stream(draws).filter(x -> !Double.isNaN(x)).sorted().toArray();
            double sum = 0;
            for (double x : sorted) {
                sum += (x - analytic.value()) / sorted.length;
            }
            this.mean = analytic.value() + sum;
            double squares = 0;
            for (double x : sorted) {
                squares += (x - mean) * (x - mean);
            }
            this.sigma = Math.sqrt(squares / (sorted.length - 1));
        }

        /**
         * The value's name.
         *
         * @return name
         */
        public String name() {
            return name;
        }

        /**
         * The analytic estimate beside the draws.
         *
         * @return first order, normal or Student
         */
        public Estimate analytic() {
            return analytic;
        }

        /**
         * The mean of the draws.
         *
         * @return in the value's unit
         */
        public double mean() {
            return mean;
        }

        /**
         * The standard deviation of the draws.
         *
         * @return in the value's unit
         */
        public double sigma() {
            return sigma;
        }

        /**
         * The Monte Carlo error of the mean.
         *
         * @return sigma over the root of the number of draws
         */
        public double errorOfMean() {
            return sigma / Math.sqrt(sorted.length);
        }

        /**
         * A quantile of the draws.
         *
         * @param probability between 0 and 1
         * @return in the value's unit
         */
        public double quantile(double probability) {
            double at = probability * sorted.length - 0.5;
            int i = (int) Math.floor(at);
            if (i < 0) {
                return sorted[0];
            }
            if (i >= sorted.length - 1) {
                return sorted[sorted.length - 1];
            }
            return sorted[i] + (at - i) * (sorted[i + 1] - sorted[i]);
        }

        /**
         * The probabilistically symmetric coverage interval.
         *
         * @param probability coverage
         * @return its ends
         */
        public Estimate.Interval interval(double probability) {
            return new Estimate.Interval(quantile((1 - probability) / 2), quantile((1 + probability) / 2));
        }

        /**
         * The shortest coverage interval (JCGM 101:2008, 7.7.4).
         *
         * @param probability coverage
         * @return its ends
         */
        public Estimate.Interval shortest(double probability) {
            int q = (int) Math.floor(probability * sorted.length + 0.5);
            int best = 0;
            for (int r = 0; r + q < sorted.length; r++) {
                if (sorted[r + q] - sorted[r] < sorted[best + q] - sorted[best]) {
                    best = r;
                }
            }
            return new Estimate.Interval(sorted[best], sorted[Math.min(best + q, sorted.length - 1)]);
        }

        /**
         * Whether the analytic interval is good to some digits of its standard deviation (JCGM 101:2008, clause 8).
         *
         * @param probability coverage, such as 0.95
         * @param digits significant digits of sigma that are quoted
         * @return true when both ends agree within half a unit of the last digit
         */
        public boolean agrees(double probability, int digits) {
            return distance(probability) <= tolerance(analytic.sigma(), digits);
        }

        /** The larger of the distances between the ends of both intervals. */
        private double distance(double probability) {
            Estimate.Interval first = analytic.interval(probability);
            Estimate.Interval drawn = interval(probability);
            return Math.max(Math.abs(first.lower() - drawn.lower()), Math.abs(first.upper() - drawn.upper()));
        }

        /** To how many digits the analytic interval is good, in words, as far as the draws can tell. */
        String verdict(double probability) {
            // Standard error of a quantile of the normal distribution at 2.5 %: 2.67 sigma over the root of n.
            double noise = 2 * 2.67 * sigma / Math.sqrt(sorted.length);
            String good = "";
            for (int digits = 1; digits <= 2; digits++) {
                double tolerance = tolerance(analytic.sigma(), digits);
                double off = distance(probability);
                String word = digits == 1 ? "one digit" : "two digits";
                if (off > tolerance + noise) {
                    return good.isEmpty() ? "no digit" : good;
                }
                if (off > tolerance || noise > tolerance) {
                    return (good.isEmpty() ? "" : good + "; ") + word + " with more draws?";
                }
                good = word;
            }
            return good;
        }

        /** Half a unit of the last of some significant digits (JCGM 101:2008, 7.9.2). */
        static double tolerance(double sigma, int digits) {
            int power = (int) Math.floor(StrictMath.log10(sigma)) - digits + 1;
            return 0.5 * StrictMath.pow(10, power);
        }
    }

    /**
     * The summaries.
     *
     * @return in the order in which the values were asked for
     */
    public List<Summary> summaries() {
        return summaries;
    }

    /**
     * The road that ran.
     *
     * @return by gains, relinearised or repeated
     */
    public Road road() {
        return road;
    }

    /**
     * How many draws there are.
     *
     * @return with the refused ones
     */
    public int count() {
        return count;
    }

    /**
     * How many draws were refused.
     *
     * @return draws without a value
     */
    public int refused() {
        return refused;
    }

    @Override
    public String text() {
        Grid.Builder grid = Grid.with(
                "value", "analytic", "drawn", "unit", "95 % analytic", "95 % drawn", "95 % shortest", "good to");
        for (Summary s : summaries) {
            grid.row(
                    s.name,
                    Figures.pair(s.analytic.value(), s.analytic.sigma()),
                    Figures.pair(s.mean, s.sigma),
                    s.unit.symbol(),
                    ends(s.analytic.interval(0.95), s.sigma),
                    ends(s.interval(0.95), s.sigma),
                    ends(s.shortest(0.95), s.sigma),
                    s.verdict(0.95));
        }
        return grid.titled(count + " draws, seed " + seed + ", " + road.words()
                        + (refused == 0 ? "" : "; " + refused + " draws were refused and are not in the summaries"))
                .build()
                .text();
    }

    private static String ends(Estimate.Interval i, double sigma) {
        return "[" + Figures.value(i.lower(), sigma) + ", " + Figures.value(i.upper(), sigma) + "]";
    }

    @Override
    public String toString() {
        return text();
    }
}
