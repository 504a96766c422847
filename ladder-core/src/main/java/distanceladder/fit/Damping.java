package distanceladder.fit;

/**
 * The length of the next step of an iteration: shorter while the quantity that moves most swings to and fro, longer again
 * while it creeps one way.
 *
 * <p>With the error's ratio r from one step to the next (negative when it swings), a step shortened by the factor f has
 * the ratio {@code 1 - f (1 - r)}, so a swing is damped and even one that grows (r below -1) converges.
 */
public final class Damping {
    private static final double SWING = 0.5;
    private static final double LEAST = 1.0 / 64;
    private static final double LONGER = 1.5;

    private double factor = 1;
    private String worst = "";
    private double last;

    /** Full steps at first. */
    public Damping() {}

    /**
     * Takes note of a step.
     *
     * @param name what moved most
     * @param move by how much, with its sign, in its own unit of error
     */
    public void note(String name, double move) {
        if (name.equals(worst) && last != 0) {
            double ratio = move / last;
            if (ratio < -SWING) {
                factor = Math.max(LEAST, factor / 2);
            } else if (ratio > SWING) {
                factor = Math.min(1, factor * LONGER);
            }
        }
        worst = name;
        last = move;
    }

    /**
     * The factor of the next step.
     *
     * @return between 1/64 and 1
     */
    public double factor() {
        return factor;
    }
}
