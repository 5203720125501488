package slantfall.numerics;

import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.MatrixUtils;
import org.apache.commons.math3.linear.QRDecomposition;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.RealVector;
import org.apache.commons.math3.linear.SingularMatrixException;

/**
 * Linear least squares by QR, with what bands need. A law that is not linear in its coefficients gets the same bands
 * from its gradients at the optimum, taken as the columns (N. R. Draper &amp; H. Smith, Applied Regression Analysis, 1998,
 * chapters 5 and 24, from memory).
 */
public final class LeastSquares {

    /** Sine of the angle between columns below which they count as one. */
    private static final double RANK = 1e-11;

    private LeastSquares() {
    }

    /**
     * The coefficients c that make |X c − y| least.
     *
     * @param rows the matrix X, one row per measurement
     * @param y the measurements
     * @return coefficients and statistics
     * @throws IllegalArgumentException if there are fewer rows than columns or the columns depend on each other
     */
    public static LeastSquaresFit linear(double[][] rows, double[] y) {
        requireShape(rows.length, y.length, rows.length == 0 ? 0 : rows[0].length);
        RealMatrix x = new Array2DRowRealMatrix(rows);
        RealVector measured = new ArrayRealVector(y, false);
        try {
            Scaled scaled = Scaled.of(x);
            double[] c = new QRDecomposition(scaled.matrix(), RANK).getSolver().solve(measured).toArray();
            for (int j = 0; j < c.length; j++) {
                c[j] /= scaled.lengths()[j];
            }
            double rss = squared(x.operate(new ArrayRealVector(c, false)).subtract(measured));
            return new LeastSquaresFit(c, inverseNormal(scaled), rss, y.length);
        } catch (SingularMatrixException singular) {
            throw new IllegalArgumentException("the measurements cannot tell the coefficients apart", singular);
        }
    }

    /** A matrix whose columns have length one, so that the units of the coefficients do not matter. */
    private record Scaled(RealMatrix matrix, double[] lengths) {
        static Scaled of(RealMatrix x) {
            RealMatrix scaled = x.copy();
            double[] lengths = new double[x.getColumnDimension()];
            for (int j = 0; j < lengths.length; j++) {
                lengths[j] = x.getColumnVector(j).getNorm();
                if (!(lengths[j] > 0)) {
                    throw new SingularMatrixException();
                }
                scaled.setColumnVector(j, x.getColumnVector(j).mapDivide(lengths[j]));
            }
            return new Scaled(scaled, lengths);
        }
    }

    /** (XᵀX)⁻¹ as (RᵀR)⁻¹ from the QR factors of the scaled columns. */
    private static double[][] inverseNormal(Scaled x) {
        int n = x.lengths().length;
        RealMatrix r = new QRDecomposition(x.matrix()).getR().getSubMatrix(0, n - 1, 0, n - 1);
        RealMatrix rInverse = new QRDecomposition(r, RANK).getSolver().solve(MatrixUtils.createRealIdentityMatrix(n));
        double[][] inverse = rInverse.multiply(rInverse.transpose()).getData();
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                inverse[i][j] /= x.lengths()[i] * x.lengths()[j];
            }
        }
        return inverse;
    }

    private static double squared(RealVector v) {
        return v.dotProduct(v);
    }

    private static void requireShape(int rows, int measurements, int columns) {
        if (rows != measurements || rows < columns || columns == 0) {
            throw new IllegalArgumentException("rows = " + rows + ", measurements = " + measurements
                    + ": as many rows as measurements are needed, and at least as many as the " + columns
                    + " coefficients");
        }
    }
}
