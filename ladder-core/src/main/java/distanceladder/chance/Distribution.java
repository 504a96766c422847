package distanceladder.chance;

/**
 * What is known of a number: a probability distribution with a mean.
 *
 * <p>Analytic propagation takes {@link #mean()} and {@link #variance()}, whatever the distribution was given by; Monte
 * Carlo draws its {@link #quantile} at a uniform number. Numbers have the unit of what they describe. All functions use
 * strict arithmetic alone: the same bits on every Java. ({@link StudentT} also takes the logarithm of the beta function
 * from Hipparchus, which is strict too: the same bits for the same version of that library.)
 */
public sealed interface Distribution {
    /**
     * The mean.
     *
     * @return finite
     */
    double mean();

    /**
     * The variance.
     *
     * @return 0 or more, perhaps infinite
     */
    double variance();

    /**
     * Whether the variance is finite, so that analytic propagation is possible.
     *
     * @return false for heavy tails
     */
    default boolean hasFiniteVariance() {
        return Double.isFinite(variance());
    }

    /**
     * The number below which the probability is p.
     *
     * @param p in (0, 1)
     * @return the quantile
     * @throws distanceladder.text.ValueFault if p is not between 0 and 1
     */
    double quantile(double p);

    /**
     * The distribution in words.
     *
     * @return one line, such as "normal, mean 3.0, sigma 0.1"
     */
    String describe();

    /**
     * One draw: the quantile at a uniform number.
     *
     * @param draws the stream of the source's name
     * @param k number of the draw
     * @param index which number of this draw, 0 or more
     * @return a number with this distribution
     */
    default double drawn(Draws draws, long k, int index) {
        return quantile(draws.uniform(k, index));
    }

    /**
     * A number without error.
     *
     * @param value the number, finite
     */
    record Exact(double value) implements Distribution {
        /**
         * Checks the number.
         *
         * @param value the number, finite
         * @throws distanceladder.text.ValueFault if a number breaks its rule
         */
        public Exact {
            Limits.finite(value, "value", "exact number");
        }

        @Override
        public double mean() {
            return value;
        }

        @Override
        public double variance() {
            return 0;
        }

        @Override
        public double quantile(double p) {
            Limits.probability(p, this);
            return value;
        }

        @Override
        public String describe() {
            return "exactly " + value;
        }
    }

    /**
     * The normal distribution.
     *
     * @param mean finite
     * @param sigma standard deviation, finite, more than 0
     */
    record Normal(double mean, double sigma) implements Distribution {
        /**
         * Checks the numbers.
         *
         * @param mean finite
         * @param sigma standard deviation, finite, more than 0
         * @throws distanceladder.text.ValueFault if a number breaks its rule
         */
        public Normal {
            Limits.finite(mean, "mean", "normal distribution");
            Limits.positive(sigma, "sigma", "normal distribution");
        }

        @Override
        public double variance() {
            return sigma * sigma;
        }

        @Override
        public double quantile(double p) {
            Limits.probability(p, this);
            return mean + sigma * NormalQuantile.at(p);
        }

        @Override
        public String describe() {
            return "normal, mean " + mean + ", sigma " + sigma;
        }
    }

    /**
     * Student's t distribution, moved and stretched; the variance is {@code scale^2 dof / (dof - 2)}, infinite for 2
     * degrees of freedom and fewer.
     *
     * <p>The quantile is solved for in the incomplete beta function (DLMF 8.17.22), and with many degrees of
     * freedom expanded about the normal one (Abramowitz and Stegun 1964, 26.7.5): correct to about 2e-14. Cost: some
     * microseconds.
     *
     * @param location the mean and median, finite
     * @param scale finite, more than 0
     * @param dof degrees of freedom, more than 1 (with fewer there is no mean)
     */
    record StudentT(double location, double scale, double dof) implements Distribution {
        /**
         * Checks the numbers.
         *
         * @param location the mean and median, finite
         * @param scale finite, more than 0
         * @param dof degrees of freedom, more than 1 (with fewer there is no mean)
         * @throws distanceladder.text.ValueFault if a number breaks its rule
         */
        public StudentT {
            Limits.finite(location, "location", "Student's distribution");
            Limits.positive(scale, "scale", "Student's distribution");
            Limits.degrees(dof);
        }

        @Override
        public double mean() {
            return location;
        }

        @Override
        public double variance() {
            return dof > 2 ? scale * scale * (dof / (dof - 2)) : Double.POSITIVE_INFINITY;
        }

        @Override
        public double quantile(double p) {
            Limits.probability(p, this);
            return location + scale * StudentQuantile.at(p, dof);
        }

        @Override
        public String describe() {
            return "Student's t, location " + location + ", scale " + scale + ", " + dof + " degrees of freedom";
        }
    }

    /**
     * The uniform distribution between two limits.
     *
     * @param lower finite
     * @param upper finite, more than lower
     */
    record Uniform(double lower, double upper) implements Distribution {
        /**
         * Checks the numbers.
         *
         * @param lower finite
         * @param upper finite, more than lower
         * @throws distanceladder.text.ValueFault if a number breaks its rule
         */
        public Uniform {
            Limits.range(lower, upper, "uniform distribution");
        }

        @Override
        public double mean() {
            return lower + 0.5 * (upper - lower);
        }

        @Override
        public double variance() {
            double width = upper - lower;
            return width * width / 12;
        }

        @Override
        public double quantile(double p) {
            Limits.probability(p, this);
            return p < 0.5 ? lower + p * (upper - lower) : upper - (1 - p) * (upper - lower);
        }

        @Override
        public String describe() {
            return "uniform from " + lower + " to " + upper;
        }
    }

    /**
     * The triangular distribution: mean {@code (a + c + b)/3}, variance {@code (a^2 + b^2 + c^2 - ab - ac - bc)/18} for
     * limits a, b and mode c.
     *
     * @param lower finite
     * @param mode from lower to upper
     * @param upper finite, more than lower
     */
    record Triangular(double lower, double mode, double upper) implements Distribution {
        /**
         * Checks the numbers.
         *
         * @param lower finite
         * @param mode from lower to upper
         * @param upper finite, more than lower
         * @throws distanceladder.text.ValueFault if a number breaks its rule
         */
        public Triangular {
            Limits.range(lower, upper, "triangular distribution");
            Limits.between(mode, lower, upper);
        }

        @Override
        public double mean() {
            return mode + ((upper - mode) - (mode - lower)) / 3;
        }

        @Override
        public double variance() {
            double below = mode - lower;
            double above = upper - mode;
            return (below * below + below * above + above * above) / 18;
        }

        @Override
        public double quantile(double p) {
            Limits.probability(p, this);
            double width = upper - lower;
            double below = mode - lower;
            return p * width < below
                    ? lower + Math.sqrt(p * width * below)
                    : upper - Math.sqrt((1 - p) * width * (upper - mode));
        }

        @Override
        public String describe() {
            return "triangular from " + lower + " to " + upper + ", mode " + mode;
        }
    }

    /**
     * Two halves of normal distributions that meet in the mode: an asymmetric error given as {@code mode -s1 +s2}.
     *
     * <p>Density proportional to {@code exp(-(x - mode)^2 / 2 s^2)} with s1 below and s2 above the mode. Mean
     * {@code mode + sqrt(2/pi) (s2 - s1)}, variance {@code (1 - 2/pi)(s2 - s1)^2 + s1 s2} (John 1982, Communications in
     * Statistics A 11, 879). The mode is not the mean, and not the median.
     *
     * @param mode finite
     * @param sigmaBelow s1, finite, more than 0
     * @param sigmaAbove s2, finite, more than 0
     */
    record SplitNormal(double mode, double sigmaBelow, double sigmaAbove) implements Distribution {
        /**
         * Checks the numbers.
         *
         * @param mode finite
         * @param sigmaBelow s1, finite, more than 0
         * @param sigmaAbove s2, finite, more than 0
         * @throws distanceladder.text.ValueFault if a number breaks its rule
         */
        public SplitNormal {
            Limits.finite(mode, "mode", "split normal distribution");
            Limits.positive(sigmaBelow, "sigma below", "split normal distribution");
            Limits.positive(sigmaAbove, "sigma above", "split normal distribution");
        }

        @Override
        public double mean() {
            return mode + Math.sqrt(2 / Math.PI) * (sigmaAbove - sigmaBelow);
        }

        @Override
        public double variance() {
            double difference = sigmaAbove - sigmaBelow;
            return (1 - 2 / Math.PI) * difference * difference + sigmaBelow * sigmaAbove;
        }

        @Override
        public double quantile(double p) {
            Limits.probability(p, this);
            double half = 0.5 * (1 + sigmaAbove / sigmaBelow) * p;
            if (half <= 0.5) {
                return mode + sigmaBelow * NormalQuantile.at(half);
            }
            double tail = 0.5 * (1 + sigmaBelow / sigmaAbove) * (1 - p);
            return mode - sigmaAbove * NormalQuantile.at(Math.min(tail, 0.5));
        }

        @Override
        public String describe() {
            return "split normal, mode " + mode + ", sigma " + sigmaBelow + " below and " + sigmaAbove + " above";
        }
    }

    /**
     * The distribution of a number whose natural logarithm is normal: median {@code exp(m)}, mean
     * {@code exp(m + s^2/2)}, variance {@code mean^2 (exp(s^2) - 1)}.
     *
     * @param logMean m, mean of the natural logarithm, finite
     * @param logSigma s, standard deviation of the natural logarithm, finite, more than 0
     */
    record LogNormal(double logMean, double logSigma) implements Distribution {
        /**
         * Checks the numbers.
         *
         * @param logMean m, mean of the natural logarithm, finite
         * @param logSigma s, standard deviation of the natural logarithm, finite, more than 0
         * @throws distanceladder.text.ValueFault if a number breaks its rule
         */
        public LogNormal {
            Limits.finite(logMean, "mean of the logarithm", "log-normal distribution");
            Limits.positive(logSigma, "sigma of the logarithm", "log-normal distribution");
            Limits.finite(StrictMath.exp(logMean + 0.5 * logSigma * logSigma), "mean", "log-normal distribution");
        }

        @Override
        public double mean() {
            return StrictMath.exp(logMean + 0.5 * logSigma * logSigma);
        }

        @Override
        public double variance() {
            return mean() * mean() * StrictMath.expm1(logSigma * logSigma);
        }

        @Override
        public double quantile(double p) {
            Limits.probability(p, this);
            return StrictMath.exp(logMean + logSigma * NormalQuantile.at(p));
        }

        @Override
        public String describe() {
            return "log-normal, logarithm of mean " + logMean + " and sigma " + logSigma;
        }
    }
}
