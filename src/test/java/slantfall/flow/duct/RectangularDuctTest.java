package slantfall.flow.duct;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.data.Offset.offset;
import static org.assertj.core.data.Percentage.withPercentage;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Side-wall factors against a finite-difference solution and known values. */
class RectangularDuctTest {

    @ParameterizedTest
    @ValueSource(doubles = {0.125, 0.5, 1, 2})
    void flowFactorAgreesWithAGrid(double aspect) {
        assertThat(RectangularDuct.flowFactor(aspect)).isCloseTo(DuctGrid.flowFactor(aspect, 32), offset(1e-5));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.125, 0.5, 1, 2})
    void dragFactorAgreesWithAGrid(double aspect) {
        assertThat(RectangularDuct.dragFactor(aspect)).isCloseTo(DuctGrid.dragFactor(aspect, 32), offset(1e-5));
    }

    /** Well known for wide slots: F = 1 − 0.630 a, each side wall takes 0.315 gaps of width. */
    @Test
    void aWideSlotLosesAFixedWidthAtTheSides() {
        double a = 1e-3;
        assertThat((1 - RectangularDuct.flowFactor(a)) / a).isCloseTo(0.63, withPercentage(0.1));
        assertThat(RectangularDuct.flowFactor(1e-9)).isCloseTo(1, offset(1e-8));
    }

    /** Turning a duct by 90° changes gap and width but not the flow: W b³ F(b/W) is symmetric. */
    @ParameterizedTest
    @ValueSource(doubles = {0.07, 0.3, 0.99, 1})
    void turningTheDuctChangesNothing(double aspect) {
        double upright = RectangularDuct.flowFactor(1 / aspect) / (aspect * aspect * aspect);
        assertThat(upright * aspect).isCloseTo(RectangularDuct.flowFactor(aspect), withPercentage(1e-10));
    }

    /** One moving wall of a square duct carries a quarter of what four moving walls carry, which is a rigid block. */
    @Test
    void fourMovingWallsMoveABlock() {
        assertThat(RectangularDuct.dragFactor(1)).isCloseTo(0.5, offset(1e-12));
        for (double a : new double[] {0.1, 0.4, 0.8}) {
            assertThat(RectangularDuct.dragFactor(a) + RectangularDuct.dragFactor(1 / a)).isCloseTo(1, offset(1e-12));
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.02, 0.1, 0.25, 0.5, 0.9, 1})
    void shahAndLondonsPolynomialStaysWithinATenthOfAPerCent(double aspect) {
        assertThat(RectangularDuct.fanningReynoldsFit(aspect))
                .isCloseTo(RectangularDuct.fanningReynolds(aspect), withPercentage(0.1));
    }

    /** Printed by Shah and London 1978 as quoted: 0.826 (0.1), 0.992 (0.2), 1.381 (0.5), 1.529 (1). */
    @Test
    void entryLossNumberByAspect() {
        assertThat(RectangularDuct.entryLossNumber(0.1)).isCloseTo(0.826, offset(5e-4));
        assertThat(RectangularDuct.entryLossNumber(0.2)).isCloseTo(0.992, offset(5e-4));
        assertThat(RectangularDuct.entryLossNumber(0.5)).isCloseTo(1.381, offset(5e-4));
        assertThat(RectangularDuct.entryLossNumber(1)).isCloseTo(1.529, offset(5e-4));
        assertThat(RectangularDuct.entryLossNumber(2)).isEqualTo(RectangularDuct.entryLossNumber(0.5));
    }
}
