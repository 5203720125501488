package slantfall.flow.slot;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Offset.offset;
import static org.assertj.core.data.Percentage.withPercentage;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import slantfall.flow.duct.RectangularDuct;
import slantfall.flow.slot.TaperedSlot.Drive;
import slantfall.flow.slot.TaperedSlot.Shape;

/** The tapered slot against a numerical integration of dp/dx = ρg_s + 6μU/b² − 12μq/b³. */
class TaperedSlotTest {

    private static final int STEPS = 4000;

    @ParameterizedTest
    @CsvSource({
        "1.2e-3, 0.8e-3, 2000, 3000, 0.05",
        "0.8e-3, 1.2e-3, 0, 9000, 0",
        "0.5e-3, 1.5e-3, -4000, 5000, 0.2",
        "1.5e-3, 0.5e-3, 0, 0, 0.3",
        "0.5e-3, 1.5e-3, 100, 4000, -0.2"
    })
    void flowAndPressureAgreeWithAnIntegration(double inlet, double outlet, double drop, double weight, double wall) {
        Shape shape = new Shape(inlet, outlet, 0.5);
        double viscosity = 0.1;
        double flow = TaperedSlot.flow(drop + weight * 0.5, viscosity, shape, wall);
        double[] pressure = integrate(flow, viscosity, shape, new Drive(weight, wall));
        double scale = Math.abs(drop) + weight * 0.5 + 6 * viscosity * Math.abs(wall) * 0.5 / (inlet * outlet);
        assertThat(pressure[STEPS]).isCloseTo(-drop, offset(1e-6 * scale));
        double lowest = 0;
        for (int i = 0; i <= STEPS; i++) {
            lowest = Math.min(lowest, pressure[i]);
        }
        Drive drive = new Drive(weight, wall);
        assertThat(TaperedSlot.lowestPressure(flow, viscosity, shape, drive)).isCloseTo(lowest, offset(1e-6 * scale));
        assertThat(TaperedSlot.pressure(flow, viscosity, shape, drive, 0.2))
                .isCloseTo(pressure[STEPS * 2 / 5], offset(1e-6 * scale));
    }

    /** Vertical, 0.8 to 1.2 mm over 0.5 m, no pressure drop, water of 1000 kg/m³: −739 Pa from an independent script. */
    @Test
    void aWideningVerticalSlotPullsAVacuum() {
        Shape shape = new Shape(0.8e-3, 1.2e-3, 0.5);
        double weight = 1000 * 9.80665;
        double flow = TaperedSlot.flow(weight * 0.5, 1.0016e-3, shape, 0);
        assertThat(TaperedSlot.lowestPressure(flow, 1.0016e-3, shape, new Drive(weight, 0))).isCloseTo(-739, offset(0.5));
    }

    /** Whatever pushes and pulls, no place along the slot has less pressure than the lowest one (3.1 Pa were missed once). */
    @Test
    void noPlaceIsLowerThanTheLowest() {
        java.util.Random random = new java.util.Random(20260101);
        for (int i = 0; i < 2000; i++) {
            Shape shape = new Shape(1e-3 * Math.exp(random.nextDouble()), 1e-3 * Math.exp(2 * random.nextDouble()), 0.5);
            double weight = 1e4 * (random.nextDouble() - 0.4);
            double wall = (random.nextDouble() - 0.5) * Math.abs(weight) * 2e-5;
            double drop = (random.nextDouble() - 0.5) * Math.abs(weight);
            Drive drive = new Drive(weight, wall);
            double flow = TaperedSlot.flow(drop + weight * 0.5, 0.1, shape, wall);
            double lowest = TaperedSlot.lowestPressure(flow, 0.1, shape, drive);
            double sampled = 0;
            for (int k = 0; k <= 500; k++) {
                sampled = Math.min(sampled, TaperedSlot.pressure(flow, 0.1, shape, drive, 0.5 * k / 500));
            }
            double scale = Math.abs(weight) * 0.5 + 0.6 * Math.abs(wall) * 0.5 / 1e-6;
            assertThat(lowest).isBetween(sampled - 1e-3 * scale, sampled + 1e-9 * scale);
        }
    }

    /** A narrowing slot does not: its pressure rises above both ends. */
    @Test
    void aNarrowingVerticalSlotDoesNot() {
        Shape shape = new Shape(1.2e-3, 0.8e-3, 0.5);
        double weight = 998.2 * 9.80665;
        double flow = TaperedSlot.flow(weight * 0.5, 1.0016e-3, shape, 0);
        assertThat(TaperedSlot.lowestPressure(flow, 1.0016e-3, shape, new Drive(weight, 0))).isCloseTo(0, offset(1e-6));
    }

    @Test
    void aVanishingTaperIsAUniformSlot() {
        Shape shape = new Shape(1e-3, 1e-3 * (1 + 1e-9), 0.5);
        assertThat(TaperedSlot.flow(3000, 0.1, shape, 0.2))
                .isCloseTo(NewtonianSlot.flow(3000 / 0.5, 0.1, 1e-3, 0.2), withPercentage(1e-5));
        assertThat(TaperedSlot.equivalentGap(1e-3, 1e-3)).isCloseTo(1e-3, withPercentage(1e-10));
    }

    /** Side-wall integrals of the taper by a fine midpoint rule. */
    @ParameterizedTest
    @CsvSource({"1e-3, 2e-3, 0.02", "3e-3, 1e-3, 0.005", "1e-3, 1e-3, 0.4"})
    void sideWallIntegralsAgreeWithAFineSum(double inlet, double outlet, double width) {
        Shape shape = new Shape(inlet, outlet, 0.5);
        double resistance = 0;
        double drag = 0;
        for (int i = 0; i < STEPS; i++) {
            double b = inlet + (outlet - inlet) * (i + 0.5) / STEPS;
            double factor = RectangularDuct.flowFactor(b / width);
            resistance += 1 / (b * b * b * factor) / STEPS;
            drag += RectangularDuct.dragFactor(b / width) / (b * b * factor) / STEPS;
        }
        assertThat(TaperedSlot.resistance(shape, width)).isCloseTo(resistance, withPercentage(1e-4));
        assertThat(TaperedSlot.drag(shape, width)).isCloseTo(drag, withPercentage(1e-4));
    }

    /** Pressure above the inlet by Simpson's rule. */
    private static double[] integrate(double flow, double viscosity, Shape shape, Drive drive) {
        double[] pressure = new double[STEPS + 1];
        double step = shape.length() / STEPS;
        for (int i = 0; i < STEPS; i++) {
            double mean = (slope(flow, viscosity, shape, drive, i * step)
                            + 4 * slope(flow, viscosity, shape, drive, (i + 0.5) * step)
                            + slope(flow, viscosity, shape, drive, (i + 1) * step))
                    / 6;
            pressure[i + 1] = pressure[i] + mean * step;
        }
        return pressure;
    }

    private static double slope(double flow, double viscosity, Shape shape, Drive drive, double x) {
        double b = shape.inlet() + (shape.outlet() - shape.inlet()) * x / shape.length();
        return drive.weight() + 6 * viscosity * drive.wallSpeed() / (b * b) - 12 * viscosity * flow / (b * b * b);
    }
}
