package distanceladder.chance;

import org.hipparchus.special.Beta;

/**
 * The quantile of Student's t distribution, by Newton steps on its distribution function.
 *
 * <p>With t = x^2/dof and a = dof/2, P(X &lt; -x) = I_y(a, 1/2)/2 with y = 1/(1 + t), by the continued fraction of the
 * incomplete beta function (DLMF 8.17.22), in logarithms where p is small. Both functions that are solved are convex or
 * concave, so the steps converge from where they start. The Student distribution of the numerical library rounds y, and
 * with many degrees of freedom loses half of the digits by it.
 */
final class StudentQuantile {
    private static final double MANY = 2000;
    private static final double EXPANSION = 4e-3;
    private static final double CENTRE = 0.25;
    private static final double TINY = 1e-300;
    private static final double EPSILON = 0x1p-52;
    private static final int STEPS = 100;
    /** A step below this leaves an error of its square. */
    private static final double LAST_STEP = 1e-9;

    private static final int FRACTION_STEPS = 10_000;

    private final double dof;
    private final double a;
    private final double logBeta;

    private StudentQuantile(double dof) {
        this.dof = dof;
        this.a = dof / 2;
        this.logBeta = Beta.logBeta(a, 0.5);
    }

    /** The quantile at p in (0, 1); the upper half mirrors the lower, where small p are exact. */
    static double at(double p, double dof) {
        if (p == 0.5) {
            return 0;
        }
        double normal = NormalQuantile.at(p);
        if (dof > MANY && normal * normal < EXPANSION * dof) {
            return expanded(normal, dof);
        }
        double tail = Math.min(p, 1 - p);
        StudentQuantile student = new StudentQuantile(dof);
        double size = tail < CENTRE ? student.far(tail) : student.near(1 - 2 * tail);
        return p < 0.5 ? -size : size;
    }

    /** Abramowitz and Stegun (1964), equation 26.7.5; the next term is below 1e-16 where this is used. */
    private static double expanded(double x, double dof) {
        double s = x * x;
        double first = (s + 1) / 4;
        double second = ((5 * s + 16) * s + 3) / 96;
        double third = (((3 * s + 19) * s + 17) * s - 15) / 384;
        double fourth = ((((79 * s + 776) * s + 1482) * s - 1920) * s - 945) / 92160;
        return x * (1 + (first + (second + (third + fourth / dof) / dof) / dof) / dof);
    }

    /** x with P(X &lt; -x) = tail, in the logarithms of both. */
    private double far(double tail) {
        double target = StrictMath.log(tail);
        double u = StrictMath.log(-NormalQuantile.at(tail));
        for (int step = 0; step < STEPS; step++) {
            double logTail = logTail(u);
            double slope = StrictMath.exp(u + logDensity(u) - logTail);
            double change = (logTail - target) / slope;
            u += change;
            if (Math.abs(change) <= LAST_STEP) {
                break;
            }
        }
        return StrictMath.exp(u);
    }

    /** x with P(-x &lt; X &lt; x) = centre. */
    private double near(double centre) {
        double x = 0.5 * centre * StrictMath.exp(0.5 * StrictMath.log(dof) + logBeta);
        for (int step = 0; step < STEPS; step++) {
            double u = StrictMath.log(x);
            double change = (centre - StrictMath.exp(logCentre(u))) / (2 * StrictMath.exp(logDensity(u)));
            x += change;
            if (Math.abs(change) <= LAST_STEP * x) {
                break;
            }
        }
        return x;
    }

    private double logDensity(double u) {
        return -(a + 0.5) * logOnePlus(u) - 0.5 * StrictMath.log(dof) - logBeta;
    }

    private double logT(double u) {
        return 2 * u - StrictMath.log(dof);
    }

    /** log(1 + t), also where t overflows. */
    private double logOnePlus(double u) {
        double logT = logT(u);
        return logT > 40 ? logT : StrictMath.log1p(StrictMath.exp(logT));
    }

    private double logTail(double u) {
        double y = 1 / (1 + StrictMath.exp(logT(u)));
        if (y > (a + 1) / (a + 2.5)) {
            return StrictMath.log(0.5 - 0.5 * StrictMath.exp(logCentre(u)));
        }
        return logFront(u) - StrictMath.log(2 * a * fraction(y, a, 0.5));
    }

    private double logCentre(double u) {
        double t = StrictMath.exp(logT(u));
        return logFront(u) - StrictMath.log(0.5 * fraction(t / (1 + t), 0.5, a));
    }

    /** The logarithm of y^a (1 - y)^(1/2) / B(a, 1/2). */
    private double logFront(double u) {
        double logOnePlus = logOnePlus(u);
        return -a * logOnePlus + 0.5 * (logT(u) - logOnePlus) - logBeta;
    }

    /** The continued fraction 1 + d1/(1 + d2/(1 + ...)), by the method of Lentz (1976) and Thompson and Barnett (1986). */
    private static double fraction(double y, double a, double b) {
        double value = 1;
        double c = 1;
        double d = 0;
        for (int n = 1; n < FRACTION_STEPS; n++) {
            int m = n / 2;
            double term = n % 2 == 0
                    ? m * (b - m) * y / ((a + 2 * m - 1) * (a + 2 * m))
                    : -(a + m) * (a + b + m) * y / ((a + 2 * m) * (a + 2 * m + 1));
            d = 1 + term * d;
            d = 1 / (d == 0 ? TINY : d);
            c = 1 + term / c;
            c = c == 0 ? TINY : c;
            value *= c * d;
            if (Math.abs(c * d - 1) <= EPSILON) {
                break;
            }
        }
        return value;
    }
}
