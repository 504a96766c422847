package distanceladder.relation;

import distanceladder.astro.Unit;
import distanceladder.text.Figures;
import distanceladder.text.Shown;
import distanceladder.text.ValueFault;

/**
 * A number with a unit and a standard deviation in the same unit.
 *
 * @param value the number
 * @param sigma its standard deviation, 0 for an exact number
 * @param unit the unit of both
 */
public record Amount(double value, double sigma, Unit unit) implements Shown {
    /**
     * Checks that both numbers are finite and the standard deviation is not negative.
     *
     * @param value the number
     * @param sigma its standard deviation
     * @param unit the unit of both
     */
    public Amount {
        if (!Double.isFinite(value)) {
            throw new ValueFault(
                    "value = " + value + " " + unit.symbol(), "an amount is a finite number", "", "give a number");
        }
        if (!(sigma >= 0) || Double.isInfinite(sigma)) {
            throw new ValueFault(
                    "standard deviation = " + sigma + " " + unit.symbol(),
                    "a standard deviation is finite and not negative",
                    "",
                    "give a standard deviation of 0 or more");
        }
    }

    /**
     * An exact number.
     *
     * @param value the number
     * @param unit its unit
     * @return the amount
     */
    public static Amount of(double value, Unit unit) {
        return new Amount(value, 0, unit);
    }

    /**
     * A parallax or parallax offset in milliarcseconds.
     *
     * @param value mas
     * @return the amount, exact
     */
    public static Amount milliarcseconds(double value) {
        return of(value, Unit.MILLIARCSECOND);
    }

    /**
     * A parallax or parallax offset in microarcseconds.
     *
     * @param value µas
     * @return the amount, exact
     */
    public static Amount microarcseconds(double value) {
        return of(value, Unit.MICROARCSECOND);
    }

    /**
     * A distance modulus in magnitudes.
     *
     * @param value mag
     * @return the amount, exact
     */
    public static Amount modulus(double value) {
        return of(value, Unit.MAGNITUDE);
    }

    /**
     * A magnitude or difference of magnitudes.
     *
     * @param value mag
     * @return the amount, exact
     */
    public static Amount magnitudes(double value) {
        return of(value, Unit.MAGNITUDE);
    }

    /**
     * A distance in megaparsecs.
     *
     * @param value Mpc
     * @return the amount, exact
     */
    public static Amount megaparsecs(double value) {
        return of(value, Unit.MEGAPARSEC);
    }

    /**
     * A velocity in kilometres per second.
     *
     * @param value km/s
     * @return the amount, exact
     */
    public static Amount kilometresPerSecond(double value) {
        return of(value, Unit.KILOMETRE_PER_SECOND);
    }

    /**
     * The same number with a standard deviation.
     *
     * @param standardDeviation in the same unit
     * @return the amount
     */
    public Amount plusMinus(double standardDeviation) {
        return new Amount(value, standardDeviation, unit);
    }

    /**
     * The same amount in another unit of the same dimension.
     *
     * @param other the unit wanted
     * @return the converted amount
     */
    public Amount in(Unit other) {
        return other == unit
                ? this
                : new Amount(unit.convert(value, other), Math.abs(unit.convert(sigma, other)), other);
    }

    @Override
    public String text() {
        String symbol = unit.symbol().isEmpty() ? "" : " " + unit.symbol();
        return Figures.pair(value, sigma) + symbol;
    }

    @Override
    public String toString() {
        return text();
    }
}
