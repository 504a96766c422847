package distanceladder.relation;

import distanceladder.covariance.Covariance;
import distanceladder.covariance.Diagonal;
import distanceladder.text.ValueFault;

/**
 * The errors of a rung's data: a known covariance, and an intrinsic scatter added to each variance.
 *
 * <p>{@code C + s^2 I}, in the base unit of the observable squared; rows in the order of the table.
 */
public final class Noise {
    private final Covariance covariance;
    private final double scatter;

    private Noise(Covariance covariance, double scatter) {
        this.covariance = covariance;
        this.scatter = scatter;
    }

    /**
     * Independent errors.
     *
     * @param sigmas standard deviations in base units, each above zero
     * @return the noise
     */
    public static Noise of(double... sigmas) {
        return of(Diagonal.fromStandardDeviations(sigmas));
    }

    /**
     * Correlated errors.
     *
     * @param covariance in base units squared, one row for each datum
     * @return the noise
     */
    public static Noise of(Covariance covariance) {
        return new Noise(covariance, 0);
    }

    /**
     * The same errors with an intrinsic scatter.
     *
     * @param sigma standard deviation of the scatter in base units, 0 or more
     * @return the noise
     */
    public Noise withScatter(double sigma) {
        if (!(sigma >= 0) || Double.isInfinite(sigma)) {
            throw new ValueFault(
                    "intrinsic scatter = " + sigma, "a scatter is finite and not negative", "", "give 0 or more");
        }
        return new Noise(covariance, sigma);
    }

    /**
     * The known covariance, without the scatter.
     *
     * @return covariance of the data
     */
    public Covariance covariance() {
        return covariance;
    }

    /**
     * The intrinsic scatter.
     *
     * @return its standard deviation
     */
    public double scatter() {
        return scatter;
    }

    /**
     * The noise of some of the data.
     *
     * @param rows indices of data
     * @return their noise, in that order
     */
    public Noise part(int... rows) {
        return new Noise(covariance.part(rows), scatter);
    }
}
