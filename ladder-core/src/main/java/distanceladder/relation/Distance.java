package distanceladder.relation;

import distanceladder.astro.Unit;
import java.util.List;

/**
 * The distance modulus of an object, {@code mu = 5 log10(d / 10 pc)}, in mag.
 *
 * @param object name of the object
 */
public record Distance(String object) implements Value {
    private static final String PREFIX = "distance of ";

    /**
     * The name of an object's distance among the unknowns of a solution.
     *
     * @param object name of the object
     * @return the unknown's name
     */
    public static String unknown(String object) {
        return PREFIX + object;
    }

    @Override
    public String name() {
        return PREFIX + object;
    }

    @Override
    public Unit unit() {
        return Unit.MAGNITUDE;
    }

    /**
     * The distance itself, {@code d = 10^((mu - 25)/5)} Mpc.
     *
     * @return a derived value in Mpc
     */
    public Derived inMegaparsecs() {
        return Derived.of(
                name() + " in Mpc",
                Unit.MEGAPARSEC,
                List.of(this),
                in -> in.get(0).subtract(25).divide(5).tenTo());
    }
}
