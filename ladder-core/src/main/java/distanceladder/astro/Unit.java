package distanceladder.astro;

import distanceladder.text.NameFault;
import distanceladder.text.Nearest;
import distanceladder.text.ValueFault;
import java.util.Arrays;
import java.util.List;

/**
 * The units of the trade. Units of one dimension convert by a factor; all numbers inside the library are in the base
 * unit of their dimension. Small units are divided by a whole number, which rounds once: 17 µas are 0.017 mas to the bit.
 */
public enum Unit {
    /** Angle of parallax, base. */
    MILLIARCSECOND("mas", "parallax", 1),
    /** A thousandth of a milliarcsecond. */
    MICROARCSECOND("µas", "parallax", 1000),
    /** Length, base. */
    MEGAPARSEC("Mpc", "length", 1),
    /** A thousandth of a megaparsec. */
    KILOPARSEC("kpc", "length", 1000),
    /** A millionth of a megaparsec. */
    PARSEC("pc", "length", 1e6),
    /** Magnitude, base. */
    MAGNITUDE("mag", "magnitude", 1),
    /** A thousandth of a magnitude. */
    MILLIMAGNITUDE("mmag", "magnitude", 1000),
    /** Velocity, base. */
    KILOMETRE_PER_SECOND("km/s", "velocity", 1),
    /** A thousandth of a kilometre per second. */
    METRE_PER_SECOND("m/s", "velocity", 1000),
    /** Redshift, a number. */
    REDSHIFT("z", "redshift", 1),
    /** Time, base. */
    DAY("d", "time", 1),
    /** Decimal logarithm of a period in days. */
    LOG_DAY("log d", "logarithm of time", 1),
    /** Velocity over length. */
    KILOMETRE_PER_SECOND_PER_MEGAPARSEC("km/s/Mpc", "expansion rate", 1),
    /** Decimal logarithm of an abundance. */
    DEX("dex", "abundance", 1),
    /** Magnitude for each factor of ten. */
    MAGNITUDE_PER_DEX("mag/dex", "magnitude per decade", 1),
    /** Angle on the sky. */
    DEGREE("deg", "angle", 1),
    /** No unit. */
    NONE("", "number", 1);

    private final String symbol;
    private final String dimension;
    private final double perBase;

    Unit(String symbol, String dimension, double perBase) {
        this.symbol = symbol;
        this.dimension = dimension;
        this.perBase = perBase;
    }

    /**
     * The unit of a symbol.
     *
     * @param symbol such as "mas"; "uas", the Greek letter in "\u03BCas" and "1" are understood too
     * @return the unit
     */
    public static Unit of(String symbol) {
        String wanted =
                switch (symbol) {
                    case "uas", "\u03BCas" -> MICROARCSECOND.symbol;
                    case "1" -> NONE.symbol;
                    default -> symbol;
                };
        for (Unit unit : values()) {
            if (unit.symbol.equals(wanted)) {
                return unit;
            }
        }
        List<String> known = Arrays.stream(values()).map(Unit::written).toList();
        throw new NameFault(
                "unit \"" + symbol + "\"", "units are written by their symbols", "", Nearest.hint(symbol, known));
    }

    /**
     * How it is written.
     *
     * @return its symbol, "" for no unit
     */
    public String symbol() {
        return symbol;
    }

    /**
     * What it measures.
     *
     * @return the dimension in a word
     */
    public String dimension() {
        return dimension;
    }

    /**
     * A number of this unit in the base unit of its dimension.
     *
     * @param x a number
     * @return x over the number of these units in a base unit
     */
    public double toBase(double x) {
        return x / perBase;
    }

    /**
     * A number of the base unit in this unit.
     *
     * @param x a number in the base unit
     * @return x times the number of these units in a base unit
     */
    public double fromBase(double x) {
        return x * perBase;
    }

    /**
     * A number of this unit in another unit of the same dimension.
     *
     * @param x a number
     * @param to the unit wanted
     * @return the converted number
     */
    public double convert(double x, Unit to) {
        if (!dimension.equals(to.dimension)) {
            throw new ValueFault(
                    x + " " + symbol,
                    "a " + dimension + " does not convert to " + to.symbol + " (" + to.dimension + ")",
                    "",
                    "give it in one of " + alike(to) + (isVelocity(to) ? ", or convert it by Redshifts" : ""));
        }
        double finer = to.perBase / perBase;
        return finer >= 1 ? x * finer : x / (perBase / to.perBase);
    }

    private static String alike(Unit unit) {
        return String.join(
                ", ",
                Arrays.stream(values())
                        .filter(u -> u.dimension.equals(unit.dimension))
                        .map(Unit::written)
                        .toList());
    }

    private String written() {
        return symbol.isEmpty() ? "1" : symbol;
    }

    /** Whether a redshift, or a velocity, is wanted where the other was given. */
    private boolean isVelocity(Unit to) {
        return (this == REDSHIFT && to.dimension.equals(METRE_PER_SECOND.dimension))
                || (to == REDSHIFT && dimension.equals(METRE_PER_SECOND.dimension));
    }
}
