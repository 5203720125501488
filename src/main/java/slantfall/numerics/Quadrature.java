package slantfall.numerics;

import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/** Gauss–Legendre quadrature. */
public final class Quadrature {

    private static final GaussIntegratorFactory FACTORY = new GaussIntegratorFactory();

    private Quadrature() {}

    /**
     * Nodes and weights on (0, 1).
     *
     * @param points number of nodes, 1 or more
     * @return nodes in the first row, weights in the second
     */
    public static double[][] unitGauss(int points) {
        GaussIntegrator rule = FACTORY.legendre(points, 0, 1);
        double[][] table = new double[2][points];
        for (int i = 0; i < points; i++) {
            table[0][i] = rule.getPoint(i);
            table[1][i] = rule.getWeight(i);
        }
        return table;
    }
}
