package slantfall.numerics;

import org.apache.commons.math3.distribution.TDistribution;

/**
 * Straight line by least squares, y = a + b x, with its prediction band (ordinary theory of the linear model).
 *
 * @param intercept a
 * @param slope b
 * @param residual residual standard deviation s, NaN with two points
 * @param count number of points
 * @param mean mean of x
 * @param spread Σ(x − mean)²
 */
public record LinearFit(double intercept, double slope, double residual, int count, double mean, double spread) {

    /**
     * Fits a line.
     *
     * @param x abscissas, two or more, not all equal
     * @param y ordinates, as many
     */
    public static LinearFit of(double[] x, double[] y) {
        int n = x.length;
        if (n < 2 || y.length != n) {
            throw new IllegalArgumentException("a line needs two points or more, had " + n + " and " + y.length);
        }
        double meanX = 0;
        double meanY = 0;
        for (int i = 0; i < n; i++) {
            meanX += x[i] / n;
            meanY += y[i] / n;
        }
        double xx = 0;
        double xy = 0;
        for (int i = 0; i < n; i++) {
            xx += (x[i] - meanX) * (x[i] - meanX);
            xy += (x[i] - meanX) * (y[i] - meanY);
        }
        if (!(xx > 0)) {
            throw new IllegalArgumentException("all points lie at x = " + meanX);
        }
        double slope = xy / xx;
        double intercept = meanY - slope * meanX;
        return new LinearFit(intercept, slope, residual(x, y, intercept, slope), n, meanX, xx);
    }

    private static double residual(double[] x, double[] y, double intercept, double slope) {
        if (x.length < 3) {
            return Double.NaN;
        }
        double sum = 0;
        for (int i = 0; i < x.length; i++) {
            double r = y[i] - intercept - slope * x[i];
            sum += r * r;
        }
        return Math.sqrt(sum / (x.length - 2));
    }

    /** The line at x. */
    public double at(double x) {
        return intercept + slope * x;
    }

    /**
     * Half-width of the band in which a new measurement at x lies.
     *
     * @param confidence such as 0.95
     * @return half-width in y, NaN with two points
     */
    public double band(double x, double confidence) {
        if (count < 3) {
            return Double.NaN;
        }
        double t = new TDistribution(null, count - 2).inverseCumulativeProbability((1 + confidence) / 2);
        return t * residual * Math.sqrt(1 + 1.0 / count + (x - mean) * (x - mean) / spread);
    }
}
