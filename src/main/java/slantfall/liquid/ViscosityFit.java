package slantfall.liquid;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import slantfall.numerics.LeastSquares;
import slantfall.numerics.LeastSquaresFit;
import slantfall.numerics.LinearFit;
import slantfall.numerics.Minimum;

/**
 * A law through two to ten measured viscosities against temperature.
 *
 * <p>Andrade: ln μ = A + B/T (E. N. da C. Andrade, Nature 125 (1930) 309). Vogel–Fulcher–Tammann: ln μ = A + B/(T − T₀) (H.
 * Vogel, Phys. Z. 22 (1921) 645), T₀ found by golden section over 0 to 10 K below the coldest point, A and B by least
 * squares. Where nobody chose, VFT is taken only if it lowers the corrected Akaike criterion (N. Sugiura, Commun. Stat. A7
 * (1978) 13); with three points or fewer it cannot be told and Andrade stands.
 *
 * @param kind the law
 * @param points the measured points, coldest first
 * @param t0 T₀ [K], 0 for Andrade
 * @param line ln μ against 1/(T − T₀)
 */
public record ViscosityFit(Kind kind, List<Point> points, double t0, LinearFit line) {

    private static final double CONFIDENCE = 0.95;

    /** A T₀ nearer to an end of its interval than this was stopped by it [K]. */
    private static final double T0_END = 1e-3;

    public ViscosityFit {
        points = List.copyOf(points);
    }

    /** Which law. */
    public enum Kind {
        ANDRADE("andrade"),
        VFT("vft");

        private final String key;

        Kind(String key) {
            this.key = key;
        }

        /** The word in files. */
        public String key() {
            return key;
        }
    }

    /**
     * A measured point.
     *
     * @param temperature [K]
     * @param viscosity dynamic [Pa s]
     */
    public record Point(double temperature, double viscosity) {}

    /** Fits the law that the points themselves prefer. */
    public static ViscosityFit automatic(List<Point> points) {
        ViscosityFit andrade = of(Kind.ANDRADE, points);
        if (points.size() < 5) {
            return andrade;
        }
        ViscosityFit vft = of(Kind.VFT, points);
        return vft.akaike(3) < andrade.akaike(2) ? vft : andrade;
    }

    /**
     * Fits a law.
     *
     * @throws IllegalArgumentException naming the point: fewer than two (VFT: three) or more than ten, not positive, or two
     *     at one temperature
     */
    public static ViscosityFit of(Kind kind, List<Point> points) {
        List<Point> sorted = checked(kind, points);
        if (kind == Kind.ANDRADE) {
            return new ViscosityFit(kind, sorted, 0, line(sorted, 0));
        }
        double coldest = sorted.get(0).temperature();
        double t0 = Minimum.golden(t -> squares(sorted, t), 0, coldest - 10, 1e-6);
        return new ViscosityFit(kind, sorted, t0, line(sorted, t0));
    }

    private static List<Point> checked(Kind kind, List<Point> points) {
        int least = kind == Kind.VFT ? 3 : 2;
        if (points.size() < least || points.size() > 10) {
            throw new IllegalArgumentException("viscosityPoints: " + kind.key() + " needs " + least + " to 10 points, had "
                    + points.size());
        }
        List<Point> sorted = new ArrayList<>(points);
        sorted.sort(Comparator.comparingDouble(Point::temperature));
        for (int i = 0; i < sorted.size(); i++) {
            Point p = sorted.get(i);
            if (!(p.temperature() > 0) || !(p.viscosity() > 0) || Double.isInfinite(p.viscosity())) {
                throw new IllegalArgumentException("viscosityPoints: the point at " + p.temperature()
                        + " K needs a positive temperature and viscosity, had " + p.viscosity() + " Pa s");
            }
            if (i > 0 && p.temperature() - sorted.get(i - 1).temperature() < 1e-6) {
                throw new IllegalArgumentException("viscosityPoints: two points at " + p.temperature() + " K; keep one");
            }
        }
        return sorted;
    }

    private static LinearFit line(List<Point> points, double t0) {
        double[] x = points.stream().mapToDouble(p -> 1 / (p.temperature() - t0)).toArray();
        double[] y = points.stream().mapToDouble(p -> Math.log(p.viscosity())).toArray();
        return LinearFit.of(x, y);
    }

    private static double squares(List<Point> points, double t0) {
        LinearFit line = line(points, t0);
        return points.stream()
                .mapToDouble(p -> Math.log(p.viscosity()) - line.at(1 / (p.temperature() - t0)))
                .map(r -> r * r)
                .sum();
    }

    /** Corrected Akaike criterion with so many parameters; the error's own variance counts as one more. */
    private double akaike(int parameters) {
        int n = points.size();
        int k = parameters + 1;
        double sum = Math.max(squares(points, t0), 1e-24);
        return n * Math.log(sum / n) + 2 * k + 2.0 * k * (k + 1) / Math.max(n - k - 1, 1e-9);
    }

    /** Viscosity [Pa s] at a temperature [K]; NaN at T₀ and below, where the law says nothing. */
    public double at(double temperature) {
        return temperature > t0 ? Math.exp(line.at(1 / (temperature - t0))) : Double.NaN;
    }

    /**
     * Factor by which a new measurement may lie above or below, at 95 %, with the uncertainty of every coefficient in it.
     *
     * @param temperature [K]
     * @return the factor; NaN with no more points than coefficients, at T₀ and below, and where T₀ ran into an end of its
     *     interval, so that the points do not determine it
     */
    public double bandFactor(double temperature) {
        if (!(temperature > t0)) {
            return Double.NaN;
        }
        if (kind == Kind.ANDRADE) {
            return Math.exp(line.band(1 / temperature, CONFIDENCE));
        }
        double highest = points.get(0).temperature() - 10;
        if (t0 < T0_END || t0 > highest - T0_END) {
            return Double.NaN;
        }
        return Math.exp(atOptimum().prediction(gradient(temperature), CONFIDENCE));
    }

    /** The VFT law made linear at its optimum: its columns are the gradients, what is left to fit are the residuals. */
    private LeastSquaresFit atOptimum() {
        double[][] rows = points.stream().map(p -> gradient(p.temperature())).toArray(double[][]::new);
        double[] residuals = points.stream().mapToDouble(p -> Math.log(p.viscosity() / at(p.temperature()))).toArray();
        return LeastSquares.linear(rows, residuals);
    }

    /** Slope of ln μ in A, B and T₀. */
    private double[] gradient(double temperature) {
        double x = 1 / (temperature - t0);
        return new double[] {1, x, line.slope() * x * x};
    }

    /** Temperatures that were measured [K]. */
    public Range range() {
        return new Range(points.get(0).temperature(), points.get(points.size() - 1).temperature());
    }

    /** Whether a temperature lies outside the measured ones. */
    public boolean extrapolated(double temperature) {
        return !range().contains(temperature);
    }

    /** Whether the liquid gets thicker as it warms, which is unusual. */
    public boolean rising() {
        return line.slope() < 0;
    }

    /** The law in words. */
    public String words() {
        String law = kind == Kind.ANDRADE ? "Andrade, ln μ = A + B/T" : "Vogel, Fulcher and Tammann, ln μ = A + B/(T − T₀)";
        return "fit through " + points.size() + " measured points (" + law + ")";
    }
}
