package distanceladder.text;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * Numbers with the digits that their uncertainty allows.
 *
 * <p>A standard deviation is given to two significant digits and its value to the same place (common practice).
 * Rounding is of the exact decimal value of the double, half to even, so the text is alike on every virtual machine.
 */
public final class Figures {
    private static final int DIGITS = 2;
    private static final int DOUBLE_DIGITS = 17;
    private static final int PLAIN_FROM = -5;
    private static final int PLAIN_TO = 7;

    private Figures() {}

    /**
     * Value and standard deviation.
     *
     * @param value a number
     * @param sigma its standard deviation
     * @return such as {@code 71.3 ± 1.4} or {@code (7.131 ± 0.014)e-13}; for a sigma of 0 the value alone
     */
    public static String pair(double value, double sigma) {
        if (!Double.isFinite(value) || !Double.isFinite(sigma)) {
            return significant(value, 6) + " ± " + significant(sigma, DIGITS);
        }
        if (sigma == 0) {
            return significant(value, 6);
        }
        int place = place(sigma);
        int power = power(value, place);
        if (power - place >= DOUBLE_DIGITS) {
            return significant(value, DOUBLE_DIGITS) + " ± " + sigma(sigma);
        }
        if (power > PLAIN_TO || power < PLAIN_FROM) {
            return "(" + plain(value, place, power) + " ± " + plain(sigma, place, power) + ")e" + power;
        }
        return plain(value, place, 0) + " ± " + plain(sigma, place, 0);
    }

    /**
     * A value rounded to the place of its standard deviation.
     *
     * @param value a number
     * @param sigma its standard deviation
     * @return the rounded value alone
     */
    public static String value(double value, double sigma) {
        if (!Double.isFinite(value) || !(sigma > 0) || Double.isInfinite(sigma)) {
            return significant(value, 6);
        }
        int place = place(sigma);
        int power = power(value, place);
        if (power - place >= DOUBLE_DIGITS) {
            return significant(value, DOUBLE_DIGITS);
        }
        boolean plain = power <= PLAIN_TO && power >= PLAIN_FROM;
        return plain ? plain(value, place, 0) : plain(value, place, power) + "e" + power;
    }

    /**
     * A standard deviation.
     *
     * @param sigma not negative
     * @return two significant digits
     */
    public static String sigma(double sigma) {
        return significant(sigma, DIGITS);
    }

    /**
     * A number to some significant digits.
     *
     * @param x a number
     * @param digits how many
     * @return plain, or with an exponent when very large or small
     */
    public static String significant(double x, int digits) {
        if (!Double.isFinite(x)) {
            return word(x);
        }
        if (x == 0) {
            return "0";
        }
        BigDecimal rounded = new BigDecimal(x).round(new MathContext(digits, RoundingMode.HALF_EVEN));
        int magnitude = rounded.precision() - rounded.scale() - 1;
        if (magnitude < PLAIN_FROM || magnitude > PLAIN_TO) {
            return rounded.movePointLeft(magnitude)
                            .setScale(digits - 1, RoundingMode.HALF_EVEN)
                            .toPlainString() + "e" + magnitude;
        }
        int scale = Math.max(0, digits - 1 - magnitude);
        return rounded.setScale(scale, RoundingMode.HALF_EVEN).toPlainString();
    }

    /**
     * A number with its sign.
     *
     * @param x a number
     * @param digits significant digits
     * @return with + or -, "0" for zero
     */
    public static String signed(double x, int digits) {
        String text = significant(x, digits);
        return x > 0 ? "+" + text : text;
    }

    /**
     * A signed number with fixed decimals.
     *
     * @param x a number
     * @param decimals digits behind the point
     * @return with + or -; "0" and the decimals without a sign where it rounds to zero
     */
    public static String fixed(double x, int decimals) {
        if (!Double.isFinite(x)) {
            return word(x);
        }
        BigDecimal rounded = new BigDecimal(x).setScale(decimals, RoundingMode.HALF_EVEN);
        if (rounded.signum() == 0) {
            return rounded.abs().toPlainString();
        }
        return (rounded.signum() > 0 ? "+" : "") + rounded.toPlainString();
    }

    /**
     * A small move of a value: signed, to one place beyond those of its standard deviation.
     *
     * @param move a difference
     * @param sigma the standard deviation of the value that moved
     * @return the move
     */
    public static String move(double move, double sigma) {
        if (!Double.isFinite(move) || !(sigma > 0) || Double.isInfinite(sigma)) {
            return signed(move, 3);
        }
        int decimals = 1 - place(sigma);
        return decimals < 0 || decimals > 12 ? signed(move, 3) : fixed(move, decimals);
    }

    /**
     * A count with its noun.
     *
     * @param n how many
     * @param one the noun for one
     * @param more the noun for any other number
     * @return such as {@code 3 data}
     */
    public static String count(long n, String one, String more) {
        return n + " " + (n == 1 ? one : more);
    }

    /**
     * A share in per cent.
     *
     * @param fraction 1 for all
     * @return with one decimal
     */
    public static String percent(double fraction) {
        if (!Double.isFinite(fraction)) {
            return word(fraction);
        }
        return new BigDecimal(100 * fraction)
                        .setScale(1, RoundingMode.HALF_EVEN)
                        .toPlainString() + " %";
    }

    private static String word(double x) {
        return Double.isNaN(x) ? "not a number" : x > 0 ? "infinite" : "-infinite";
    }

    /** Power of ten of the last digit that is shown. */
    private static int place(double sigma) {
        BigDecimal rounded = new BigDecimal(sigma).round(new MathContext(DIGITS, RoundingMode.HALF_EVEN));
        return rounded.precision() - rounded.scale() - DIGITS;
    }

    /** Power of ten of the first digit that is shown, of value or standard deviation. */
    private static int power(double value, int place) {
        BigDecimal rounded = new BigDecimal(value).setScale(-place, RoundingMode.HALF_EVEN);
        int ofSigma = place + DIGITS - 1;
        return rounded.signum() == 0 ? ofSigma : Math.max(ofSigma, rounded.precision() - rounded.scale() - 1);
    }

    private static String plain(double x, int place, int power) {
        BigDecimal shifted = new BigDecimal(x).movePointLeft(power);
        int scale = power - place;
        BigDecimal rounded = shifted.setScale(scale, RoundingMode.HALF_EVEN);
        if (scale < 0) {
            rounded = rounded.setScale(0, RoundingMode.UNNECESSARY);
        }
        return rounded.signum() == 0 ? rounded.abs().toPlainString() : rounded.toPlainString();
    }
}
