package soakline.numeric;

import java.util.Arrays;

/**
 * The upper triangle R of a QR factorisation, built up row block by row block, so that a least-squares problem of any length
 * needs no matrix of that length. Not safe for use by several threads at once.
 *
 * <p>Householder reflections (Golub and Van Loan, Matrix Computations, 4th ed., §5.2), each touching the current diagonal entry
 * and the new rows only. Put the residual in as the last column: then the first columns hold R, the last column holds Qᵀr above
 * its diagonal entry, and the diagonal entry's square is the sum of squares that no parameter can remove.
 *
 * <p>Accuracy: backward stable; on the sets of the tests the sum of squares agrees with a direct sum to 1e-14 relative.
 */
public final class Triangle {

    /** Rows a block may have: small enough to stay in the processor's first cache. */
    public static final int BLOCK = 256;

    private final int columns;
    private final double[][] r;

    /** @param columns number of columns, the residual's included */
    public Triangle(int columns) {
        this.columns = columns;
        this.r = new double[columns][columns];
    }

    public int columns() {
        return columns;
    }

    /** Forgets all rows. */
    public void clear() {
        for (double[] column : r) {
            Arrays.fill(column, 0);
        }
    }

    /** Entry of R; zero below the diagonal. */
    public double get(int row, int column) {
        return r[column][row];
    }

    /**
     * Takes in a block of rows.
     *
     * @param block one array per column, of at least {@code count} entries; overwritten
     */
    public void add(double[][] block, int count) {
        for (int j = 0; j < columns; j++) {
            double[] v = block[j];
            double below = 0;
            for (int i = 0; i < count; i++) {
                below += v[i] * v[i];
            }
            if (below == 0) {
                continue;
            }
            double diagonal = r[j][j];
            double norm = Math.sqrt(diagonal * diagonal + below);
            double image = diagonal > 0 ? -norm : norm;
            double v0 = diagonal - image;
            r[j][j] = image;
            double factor = 2 / (v0 * v0 + below);
            for (int k = j + 1; k < columns; k++) {
                reflect(v, v0, factor, block[k], r[k], j, count);
            }
        }
    }

    private static void reflect(
            double[] v, double v0, double factor, double[] column, double[] above, int j, int count) {
        double s0 = v0 * above[j];
        double s1 = 0;
        int i = 0;
        // two partial sums: the processor can then work on both at once
        for (; i + 1 < count; i += 2) {
            s0 += v[i] * column[i];
            s1 += v[i + 1] * column[i + 1];
        }
        if (i < count) {
            s0 += v[i] * column[i];
        }
        double s = (s0 + s1) * factor;
        above[j] -= s * v0;
        for (i = 0; i < count; i++) {
            column[i] -= s * v[i];
        }
    }
}
