package slantfall.flow.duct;

/**
 * Laplace or Poisson problem on a rectangle by finite differences and conjugate gradients, independent of any series. Gap
 * 1 with n cells, width 1/a; only the interior points are unknown.
 */
final class DuctGrid {

    private final int rows;
    private final int columns;
    private final double step;

    private DuctGrid(double aspect, int cells) {
        step = 1.0 / cells;
        rows = cells - 1;
        columns = (int) Math.round(cells / aspect) - 1;
    }

    /** 12 ⟨w⟩ for ∇²w = −1 with all walls at rest. */
    static double flowFactor(double aspect, int cells) {
        return 12 * extrapolated(aspect, cells, true);
    }

    /** 2 ⟨w⟩ for ∇²w = 0 with one long wall moving at 1. */
    static double dragFactor(double aspect, int cells) {
        return 2 * extrapolated(aspect, cells, false);
    }

    /** Richardson: the error falls as the step squared. */
    private static double extrapolated(double aspect, int cells, boolean driven) {
        double coarse = new DuctGrid(aspect, cells).mean(driven);
        double fine = new DuctGrid(aspect, 2 * cells).mean(driven);
        return fine + (fine - coarse) / 3;
    }

    private double mean(boolean driven) {
        double[] right = new double[rows * columns];
        for (int j = 0; j < columns; j++) {
            for (int i = 0; i < rows; i++) {
                right[j * rows + i] = driven ? step * step : i == rows - 1 ? 1 : 0;
            }
        }
        double[] w = solve(right);
        double sum = 0;
        for (double value : w) {
            sum += value;
        }
        double movingWall = driven ? 0 : columns / 2.0 + 0.5;
        double cellsAcross = (rows + 1.0) * (columns + 1.0);
        return (sum + movingWall) / cellsAcross;
    }

    private double[] solve(double[] right) {
        double[] x = new double[right.length];
        double[] residual = right.clone();
        double[] direction = right.clone();
        double old = dot(residual, residual);
        double enough = old * 1e-24;
        while (old > enough) {
            double[] applied = apply(direction);
            double alpha = old / dot(direction, applied);
            for (int k = 0; k < x.length; k++) {
                x[k] += alpha * direction[k];
                residual[k] -= alpha * applied[k];
            }
            double next = dot(residual, residual);
            for (int k = 0; k < x.length; k++) {
                direction[k] = residual[k] + next / old * direction[k];
            }
            old = next;
        }
        return x;
    }

    private double[] apply(double[] w) {
        double[] out = new double[w.length];
        for (int j = 0; j < columns; j++) {
            for (int i = 0; i < rows; i++) {
                int k = j * rows + i;
                double sum = 4 * w[k];
                sum -= i > 0 ? w[k - 1] : 0;
                sum -= i < rows - 1 ? w[k + 1] : 0;
                sum -= j > 0 ? w[k - rows] : 0;
                sum -= j < columns - 1 ? w[k + rows] : 0;
                out[k] = sum;
            }
        }
        return out;
    }

    private static double dot(double[] a, double[] b) {
        double sum = 0;
        for (int k = 0; k < a.length; k++) {
            sum += a[k] * b[k];
        }
        return sum;
    }
}
