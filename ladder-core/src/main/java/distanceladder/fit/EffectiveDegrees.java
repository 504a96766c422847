package distanceladder.fit;

import java.util.List;

/**
 * Effective degrees of freedom of a variance that rests on estimated ones (Satterthwaite 1946, equation 16; JCGM
 * 100:2008, equation G.2b).
 *
 * <pre>nu = 2 V^2 / Var(V),   Var(V) = sum_k (dV / ds_k^2)^2 Var(s_k^2)</pre>
 *
 * An interval is then V^(1/2) times a quantile of Student's distribution with nu degrees of freedom.
 */
public final class EffectiveDegrees {
    private EffectiveDegrees() {}

    /**
     * One estimated variance in a total.
     *
     * @param slope dV / ds^2
     * @param variance Var(s^2)
     */
    public record Part(double slope, double variance) {}

    /**
     * The effective degrees of freedom.
     *
     * @param total the variance V
     * @param parts the estimated variances in it
     * @return nu; infinite when nothing was estimated
     */
    public static double of(double total, List<Part> parts) {
        double sum = 0;
        for (Part part : parts) {
            sum += part.slope * part.slope * part.variance;
        }
        return sum == 0 ? Double.POSITIVE_INFINITY : 2 * total * total / sum;
    }
}
