package distanceladder.covariance;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import distanceladder.text.ValueFault;
import org.junit.jupiter.api.Test;

/** What every kind of covariance must do. */
abstract class CovarianceContract {
    /** A covariance of four values or more, the same on every call, in arrays of its own. */
    abstract Covariance covariance();

    @Test
    void entriesAreSymmetricAndAgreeWithTheArray() {
        Covariance c = covariance();
        double[][] array = c.toArray();
        for (int i = 0; i < c.size(); i++) {
            for (int j = 0; j < c.size(); j++) {
                assertEquals(array[i][j], array[j][i]);
                assertEquals(c.entry(i, j), c.entry(j, i));
                assertEquals(array[i][j], c.entry(i, j));
            }
        }
    }

    @Test
    void isPositiveSemidefinite() {
        Dense.fromCovariance(covariance().toArray());
    }

    @Test
    void bilinearAgreesWithTheArray() {
        Covariance c = covariance();
        double[] a = Matrices.ramp(c.size(), 0.7);
        double[] b = Matrices.ramp(c.size(), -1.3);
        double[][] array = c.toArray();
        double scale = Math.sqrt(Matrices.bilinear(array, a, a) * Matrices.bilinear(array, b, b));
        assertEquals(Matrices.bilinear(array, a, b), c.bilinear(a, b), 1e-13 * scale);
        assertEquals(Matrices.bilinear(array, a, a), c.quadratic(a), 1e-13 * c.quadratic(a));
    }

    @Test
    void aPartSelectsAndReordersAndKeepsItsKind() {
        Covariance c = covariance();
        int last = c.size() - 1;
        Covariance part = c.part(last, 0, 2);
        int[] from = {last, 0, 2};
        assertSame(c.getClass(), part.getClass());
        assertEquals(3, part.size());
        for (int i = 0; i < 3; i++) {
            for (int j = 0; j < 3; j++) {
                assertEquals(c.entry(from[i], from[j]), part.entry(i, j));
            }
        }
        Matrices.assertReassembles(part);
        assertEquals(0, c.part().size());
        assertEquals(0, c.part().split().columnCount());
        assertEquals(c.entry(2, 2), part.part(2).entry(0, 0));
    }

    @Test
    void theSplitReassembles() {
        Matrices.assertReassembles(covariance());
    }

    @Test
    void theRootReassembles() {
        Matrices.assertRoot(covariance());
    }

    @Test
    void arraysAreCopiedOut() {
        Covariance c = covariance();
        double[][] array = c.toArray();
        double[][] before = c.toArray();
        for (double[] row : array) {
            row[0] = Double.NaN;
        }
        assertArrayEquals(before, c.toArray());
        Split split = c.split();
        Matrices.spoil(split);
        assertArrayEquals(before, c.toArray());
        Matrices.assertReassembles(c);
    }

    @Test
    void scalingMultipliesEveryEntry() {
        Covariance c = covariance();
        Covariance quarter = c.scaled(0.25);
        assertSame(c.getClass(), quarter.getClass());
        for (int i = 0; i < c.size(); i++) {
            for (int j = 0; j < c.size(); j++) {
                assertEquals(0.25 * c.entry(i, j), quarter.entry(i, j), 1e-15 * Math.abs(c.entry(i, j)));
            }
        }
        Covariance none = c.scaled(0);
        assertEquals(0, none.quadratic(Matrices.ramp(c.size(), 1)));
        assertEquals(0, Root.of(none)[0].length);
        assertEquals(0, none.split().columnCount());
    }

    @Test
    void equalityIsOfStructureAndBits() {
        assertEquals(covariance(), covariance());
        assertEquals(covariance().hashCode(), covariance().hashCode());
        assertNotEquals(covariance(), covariance().scaled(1 + 0x1p-52));
        assertNotEquals(covariance(), Sum.of(covariance()));
        assertFalse(covariance().toString().isBlank());
    }

    @Test
    void refusesWhatIsOutside() {
        Covariance c = covariance();
        int n = c.size();
        refused("index = " + n, () -> c.entry(n, 0));
        refused("index = -1", () -> c.entry(0, -1));
        refused("index = " + n, () -> c.part(0, n));
        refused("index 1 twice", () -> c.part(1, 0, 1));
        refused("a vector of 1 numbers", () -> c.bilinear(new double[1], new double[n]));
        refused("a vector of " + (n + 1) + " numbers", () -> c.quadratic(new double[n + 1]));
        refused("factor = -1.0", () -> c.scaled(-1));
        refused("factor = NaN", () -> c.scaled(Double.NaN));
        refused("factor = Infinity", () -> c.scaled(Double.POSITIVE_INFINITY));
    }

    static void refused(String what, org.junit.jupiter.api.function.Executable call) {
        ValueFault fault = assertThrows(ValueFault.class, call);
        String message = fault.what() + ", " + fault.rule();
        assertTrue(message.contains(what), () -> "\"" + message + "\" does not say \"" + what + "\"");
    }
}
