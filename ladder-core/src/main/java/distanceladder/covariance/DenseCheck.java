package distanceladder.covariance;

import distanceladder.text.ValueFault;

/** Whether an array is a covariance matrix, relative to its own diagonal. */
final class DenseCheck {
    private static final double ASYMMETRY = 1e-10;

    private final String kind;
    private final double[][] entries;
    private final double[] sigmas;

    private DenseCheck(double[][] given, String kind) {
        this.kind = kind;
        int n = given.length;
        entries = new double[n][];
        sigmas = new double[n];
        for (int i = 0; i < n; i++) {
            entries[i] = given[i].clone();
            if (entries[i].length != n) {
                throw fault(
                        "row " + i + " of " + entries[i].length + " numbers",
                        "a matrix of " + n + " rows has " + n + " columns",
                        "give a square matrix");
            }
            for (int j = 0; j < n; j++) {
                Border.finite(entries[i][j], entry(i, j), kind);
            }
        }
    }

    /** A checked and symmetric copy. */
    static double[][] covariance(double[][] given, String kind) {
        DenseCheck check = new DenseCheck(given, kind);
        for (int i = 0; i < given.length; i++) {
            check.sigmas[i] = Math.sqrt(Border.variance(check.entries[i][i], i, kind));
        }
        check.symmetric();
        check.definite();
        return check.entries;
    }

    /** A checked and symmetric copy, with exact ones on the diagonal. */
    static double[][] correlations(double[][] given, String kind) {
        DenseCheck check = new DenseCheck(given, kind);
        for (int i = 0; i < given.length; i++) {
            if (Math.abs(check.entries[i][i] - 1) > ASYMMETRY) {
                throw check.fault(
                        entry(i, i) + " = " + check.entries[i][i],
                        "a value's correlation with itself is 1",
                        "give correlations, or use fromCovariance");
            }
            check.entries[i][i] = 1;
            check.sigmas[i] = 1;
        }
        check.symmetric();
        check.definite();
        return check.entries;
    }

    private void symmetric() {
        for (int i = 0; i < sigmas.length; i++) {
            for (int j = 0; j < i; j++) {
                double above = entries[j][i];
                double below = entries[i][j];
                if ((sigmas[i] == 0 || sigmas[j] == 0) && (above != 0 || below != 0)) {
                    int certain = sigmas[i] == 0 ? i : j;
                    throw fault(
                            entry(i, j) + " = " + (below != 0 ? below : above) + " with variance " + certain + " = 0",
                            "a certain value has no covariance with another",
                            "give value " + certain + " a variance, or set its row and column to 0");
                }
                double defect = Math.abs(above / sigmas[i] / sigmas[j] - below / sigmas[i] / sigmas[j]);
                if (defect > ASYMMETRY) {
                    throw fault(
                            entry(i, j) + " = " + below + " and " + entry(j, i) + " = " + above + ", "
                                    + Border.brief(defect) + " of sqrt(c_ii c_jj) apart",
                            "a covariance is symmetric within " + ASYMMETRY,
                            "correct one of the two");
                }
                double mean = 0.5 * above + 0.5 * below + 0.0;
                entries[i][j] = mean;
                entries[j][i] = mean;
            }
        }
    }

    private void definite() {
        if (Definite.overwriting(unit(entries, sigmas))) {
            return;
        }
        PivotedCholesky.Remainder remainder =
                PivotedCholesky.of(unit(entries, sigmas)).remainder();
        if (remainder.pivot() < -PivotedCholesky.tolerance(sigmas.length)) {
            throw fault(
                    "smallest pivot " + Border.brief(remainder.pivot()) + " of the largest, at "
                            + entry(remainder.i(), remainder.j()),
                    "a covariance is positive semidefinite: no combination of the values has a negative variance",
                    "give the entries with more digits, or the low-rank part as a low-rank update");
        }
    }

    /** The matrix scaled to unit diagonal; rows of certain values are zero. */
    static double[][] unit(double[][] entries, double[] sigmas) {
        int n = sigmas.length;
        double[][] unit = new double[n][n];
        for (int i = 0; i < n; i++) {
            if (sigmas[i] > 0) {
                for (int j = 0; j < i; j++) {
                    double correlation = sigmas[j] > 0 ? entries[i][j] / sigmas[i] / sigmas[j] : 0;
                    unit[i][j] = correlation;
                    unit[j][i] = correlation;
                }
                unit[i][i] = 1;
            }
        }
        return unit;
    }

    private static String entry(int i, int j) {
        return "entry (" + i + ", " + j + ")";
    }

    private ValueFault fault(String what, String rule, String repair) {
        return new ValueFault(what, rule, kind, repair);
    }
}
