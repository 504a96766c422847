package distanceladder.information;

import java.util.List;

/**
 * What is known of some unknowns beforehand: {@code s = mean + L v}, v independent with unit variance.
 *
 * <p>L has one row for each unknown and one column for each independent direction; with no column the unknowns are
 * certain, with fewer columns than rows their covariance {@code L LT} is semidefinite. Both are legal: the unknowns are
 * replaced by v, never divided by their standard deviation.
 */
public final class Prior {
    private final String name;
    private final List<String> unknowns;
    private final double[] mean;
    private final double[][] root;

    private Prior(String name, List<String> unknowns, double[] mean, double[][] root) {
        this.name = name;
        this.unknowns = unknowns;
        this.mean = mean;
        this.root = root;
    }

    /**
     * A prior.
     *
     * @param name its name, by which its share of a variance is known
     * @param unknowns the unknowns that it speaks of
     * @param mean their means
     * @param root L, one row for each unknown, all of one length
     * @return the prior
     */
    public static Prior of(String name, List<String> unknowns, double[] mean, double[][] root) {
        if (mean.length != unknowns.size() || root.length != unknowns.size()) {
            throw new IllegalArgumentException("prior " + name + ": lengths differ");
        }
        double[][] copy = new double[root.length][];
        for (int i = 0; i < root.length; i++) {
            copy[i] = root[i].clone();
        }
        return new Prior(name, List.copyOf(unknowns), mean.clone(), copy);
    }

    /**
     * The name.
     *
     * @return name of the source
     */
    public String name() {
        return name;
    }

    /**
     * The unknowns.
     *
     * @return their names
     */
    public List<String> unknowns() {
        return unknowns;
    }

    /**
     * How many independent directions it has.
     *
     * @return columns of L
     */
    public int rank() {
        return root.length == 0 ? 0 : root[0].length;
    }

    double mean(int i) {
        return mean[i];
    }

    double root(int i, int k) {
        return root[i][k];
    }
}
