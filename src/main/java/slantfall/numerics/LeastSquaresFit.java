package slantfall.numerics;

import org.apache.commons.math3.distribution.TDistribution;

/**
 * Coefficients found by least squares, with what is needed for bands. Equal weights, independent normal errors.
 */
public final class LeastSquaresFit {

    private final double[] coefficients;
    private final double[][] inverseNormal;
    private final double residualSumOfSquares;
    private final int points;

    LeastSquaresFit(double[] coefficients, double[][] inverseNormal, double residualSumOfSquares, int points) {
        this.coefficients = coefficients;
        this.inverseNormal = inverseNormal;
        this.residualSumOfSquares = residualSumOfSquares;
        this.points = points;
    }

    /** One coefficient. */
    public double coefficient(int index) {
        return coefficients[index];
    }

    /** How many coefficients. */
    public int coefficientCount() {
        return coefficients.length;
    }

    /** Sum of the squared residuals [square of the measurement's unit]. */
    public double residualSumOfSquares() {
        return residualSumOfSquares;
    }

    /** Points less coefficients. */
    public int degreesOfFreedom() {
        return points - coefficients.length;
    }

    /** Estimate of the standard deviation of one measurement, NaN without a degree of freedom. */
    public double standardError() {
        return degreesOfFreedom() > 0 ? Math.sqrt(residualSumOfSquares / degreesOfFreedom()) : Double.NaN;
    }

    /** Covariance of two coefficients, NaN without a degree of freedom. */
    public double covariance(int i, int j) {
        double s = standardError();
        return s * s * inverseNormal[i][j];
    }

    /**
     * Half-width of the band in which the fitted curve itself lies.
     *
     * @param gradient of the model in its coefficients, at the place asked for
     * @param level two-sided probability, such as 0.95 [1]
     * @return half-width, NaN without a degree of freedom [unit of the measurement]
     */
    public double confidence(double[] gradient, double level) {
        return halfWidth(spread(gradient), level);
    }

    /** Half-width of the band in which one more measurement would lie; arguments as for {@link #confidence}. */
    public double prediction(double[] gradient, double level) {
        return halfWidth(1 + spread(gradient), level);
    }

    private double halfWidth(double variance, double level) {
        if (!(level > 0 && level < 1)) {
            throw new IllegalArgumentException("level = " + level + " must lie between 0 and 1");
        }
        if (degreesOfFreedom() <= 0) {
            return Double.NaN;
        }
        double t = new TDistribution(null, degreesOfFreedom()).inverseCumulativeProbability(0.5 + 0.5 * level);
        return t * standardError() * Math.sqrt(variance);
    }

    private double spread(double[] gradient) {
        double sum = 0;
        for (int i = 0; i < gradient.length; i++) {
            for (int j = 0; j < gradient.length; j++) {
                sum += gradient[i] * inverseNormal[i][j] * gradient[j];
            }
        }
        return Math.max(0, sum);
    }
}
