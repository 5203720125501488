package slantfall.declare;

/**
 * Computes all readings and margins of one structure. One per thread: it owns its workspace and allocates nothing that
 * grows with the work.
 */
public interface Evaluator {

    /**
     * Evaluates one point.
     *
     * @param in values in the order of {@code Declaration.coordinates()} [SI]
     * @param out receives the readings, then the margins, in declared order; NaN where unknown
     */
    void at(double[] in, double[] out);
}
