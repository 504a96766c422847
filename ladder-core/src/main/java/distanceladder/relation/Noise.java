package distanceladder.relation;

import distanceladder.covariance.Covariance;
import distanceladder.covariance.Diagonal;
import distanceladder.text.ValueFault;
import java.util.Optional;

/**
 * The errors of a rung's data.
 *
 * <p>{@code C + s^2 I (+ a part of a joint noise)}, in the base unit of the observable squared; rows in the order of the
 * table. The covariance C is known; the intrinsic scatter s is given, or estimated by the set that is solved. Errors that
 * are equal but unknown are C = 0 with an estimated s: an unweighted fit, its error taken from the residuals. Data
 * declared exact have no error at all.
 */
public final class Noise {
    /** Where the intrinsic scatter comes from. */
    public enum Scatter {
        /** It is a number that the user gave (0 for none). */
        GIVEN,
        /** The set that is solved estimates it by restricted maximum likelihood. */
        ESTIMATED,
        /** There is no error at all. */
        EXACT
    }

    private final Covariance covariance;
    private final double scatter;
    private final Scatter mode;
    private final Optional<JointNoise> joint;

    private Noise(Covariance covariance, double scatter, Scatter mode, Optional<JointNoise> joint) {
        this.covariance = covariance;
        this.scatter = scatter;
        this.mode = mode;
        this.joint = joint;
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
        return new Noise(covariance, 0, Scatter.GIVEN, Optional.empty());
    }

    /**
     * Independent errors, all equal, of a size that the residuals tell.
     *
     * @param size number of data
     * @return the noise
     */
    public static Noise equalUnknown(int size) {
        return of(Diagonal.fromVariances(new double[size])).withEstimatedScatter();
    }

    /**
     * No error at all: the data are constraints, each of which fixes its object's distance.
     *
     * @param size number of data
     * @return the noise
     */
    public static Noise exact(int size) {
        return new Noise(Diagonal.fromVariances(new double[size]), 0, Scatter.EXACT, Optional.empty());
    }

    /**
     * The same errors with a given intrinsic scatter.
     *
     * @param sigma standard deviation of the scatter in base units, 0 or more
     * @return the noise
     */
    public Noise withScatter(double sigma) {
        if (!(sigma >= 0) || Double.isInfinite(sigma)) {
            throw new ValueFault(
                    "intrinsic scatter = " + sigma, "a scatter is finite and not negative", "", "give 0 or more");
        }
        requireError();
        return new Noise(covariance, sigma, Scatter.GIVEN, joint);
    }

    /**
     * The same errors with an intrinsic scatter that the set estimates.
     *
     * @return the noise
     */
    public Noise withEstimatedScatter() {
        requireError();
        return new Noise(covariance, 0, Scatter.ESTIMATED, joint);
    }

    private void requireError() {
        if (mode == Scatter.EXACT) {
            throw new ValueFault(
                    "a scatter on exact data", "exact data have no error", "", "give the data errors instead");
        }
    }

    /**
     * The same errors with a part in a joint noise.
     *
     * @param other the joint noise
     * @return the noise
     */
    public Noise with(JointNoise other) {
        requireError();
        return new Noise(covariance, scatter, mode, Optional.of(other));
    }

    /**
     * The same noise with another known covariance.
     *
     * @param other covariance in base units squared
     * @return the noise
     */
    public Noise withCovariance(Covariance other) {
        requireError();
        return new Noise(other, scatter, mode, joint);
    }

    /**
     * The known covariance, without the scatter and without joint noise.
     *
     * @return covariance of the data
     */
    public Covariance covariance() {
        return covariance;
    }

    /**
     * The given intrinsic scatter.
     *
     * @return its standard deviation; 0 when it is estimated
     */
    public double scatter() {
        return scatter;
    }

    /**
     * Where the scatter comes from.
     *
     * @return given, estimated, or none at all
     */
    public Scatter mode() {
        return mode;
    }

    /**
     * Errors in common with other rungs.
     *
     * @return the joint noise, if there is one
     */
    public Optional<JointNoise> joint() {
        return joint;
    }

    /**
     * The noise of some of the data.
     *
     * @param rows indices of data
     * @return their noise, in that order
     */
    public Noise part(int... rows) {
        return new Noise(covariance.part(rows), scatter, mode, joint);
    }
}
