package distanceladder.ladder;

import distanceladder.text.ValueFault;
import org.hipparchus.linear.Array2DRowRealMatrix;
import org.hipparchus.linear.ArrayRealVector;
import org.hipparchus.linear.EigenDecompositionSymmetric;
import org.hipparchus.linear.RealMatrix;
import org.hipparchus.linear.SingularValueDecomposition;

/** Square roots L of small covariances, used to carry gains from one to another. */
final class Factor {
    private Factor() {}

    /** The gain per unit of the source's numbers, from that along the directions of L: A L = h in least squares. */
    static double[] gain(double[] h, double[][] l) {
        if (h.length == 0) {
            return new double[l.length];
        }
        if (l.length == 1) {
            return new double[] {h[0] / l[0][0]};
        }
        RealMatrix transposed = new Array2DRowRealMatrix(l).transpose();
        return new SingularValueDecomposition(transposed)
                .getSolver()
                .solve(new ArrayRealVector(h))
                .toArray();
    }

    /** A L. */
    static double[] along(double[] gain, double[][] l) {
        double[] h = new double[l[0].length];
        for (int i = 0; i < l.length; i++) {
            for (int k = 0; k < h.length; k++) {
                h[k] += gain[i] * l[i][k];
            }
        }
        return h;
    }

    static double product(double[] x, double[] y) {
        double sum = 0;
        for (int i = 0; i < x.length; i++) {
            sum += x[i] * y[i];
        }
        return sum;
    }

    /** Refuses an update whose covariance is not within the old one. */
    static void requireSmaller(double[][] now, double[][] old, String name) {
        int n = old.length;
        double[][] difference = new double[n][n];
        double scale = 0;
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                difference[i][j] = product(old[i], old[j]) - product(now[i], now[j]);
            }
            scale = Math.max(scale, product(old[i], old[i]));
        }
        double least = new EigenDecompositionSymmetric(new Array2DRowRealMatrix(difference)).getEigenvalues()[n - 1];
        if (least < -1e-12 * scale) {
            throw new ValueFault(
                    "old less new covariance of " + name + " has the eigenvalue " + least,
                    "an update contains the old measurement, so its covariance is nowhere larger",
                    "source \"" + name + "\"",
                    "call it remeasured if it is independent of the old one");
        }
    }
}
