package slantfall.liquid;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;

class LiquidTest {

    private static final Set<Property> USED = Set.of(Property.DENSITY, Property.VISCOSITY, Property.SURFACE_TENSION);

    private static Preset glycerol() {
        Map<Property, Provision> properties = new EnumMap<>(Property.class);
        properties.put(Property.VISCOSITY, new Provision.Correlated(Correlations.named("cheng-2008-viscosity")));
        properties.put(Property.DENSITY, new Provision.Correlated(Correlations.named("volk-kaehler-2018-density")));
        return new Preset("g", "Glycerol", "glycerol", properties, Range.celsius(0, 100), new Range(0, 1),
                new Preset.Words(List.of(), ""));
    }

    @Test
    void coordinatesAreWhatTheUsedPropertiesNeed() {
        assertThat(Liquid.of(glycerol(), Set.of(), null).coordinates(USED)).containsExactly("temperature", "strength");
        assertThat(Liquid.of(glycerol(), Set.of(Property.VISCOSITY, Property.SURFACE_TENSION), null).coordinates(USED))
                .containsExactly("temperature", "strength", "viscosity", "surfaceTension");
        assertThat(Liquid.of(null, Set.of(Property.DENSITY), null).coordinates(USED)).containsExactly("density");
    }

    @Test
    void theCachedEvaluatorEqualsTheLaws() {
        Liquid liquid = Liquid.of(glycerol(), Set.of(), null);
        Liquid.Evaluator evaluator = liquid.evaluator(USED);
        LiquidState state = new LiquidState();
        Random random = new Random(5);
        for (int i = 0; i < 500; i++) {
            double t = random.nextBoolean() ? 290 : 280 + 20 * random.nextDouble();
            double w = random.nextBoolean() ? 0.5 : random.nextDouble();
            evaluator.at(new double[] {9, t, w}, 1, state);
            assertThat(state.viscosity).isEqualTo(GlycerolWater.viscosity(t, w));
            assertThat(state.density).isEqualTo(GlycerolWater.density(t, w));
            assertThat(state.surfaceTension).isNaN();
        }
    }

    @Test
    void aMeasuredValueWinsOverTheFitAndTheFitOverThePreset() {
        ViscosityFit fit = ViscosityFit.automatic(
                List.of(new ViscosityFit.Point(290, 2), new ViscosityFit.Point(310, 1)));
        Liquid fitted = Liquid.of(glycerol(), Set.of(), fit);
        assertThat(fitted.origin(Property.VISCOSITY)).contains("2 measured points");
        Liquid measured = Liquid.of(glycerol(), Set.of(Property.VISCOSITY), fit);
        assertThat(measured.origin(Property.VISCOSITY)).isEqualTo("measured");
    }

    @Test
    void outsideTheRangeIsANoticeThatNamesAuthorAndRange() {
        Liquid liquid = Liquid.of(glycerol(), Set.of(), null);
        LiquidState state = new LiquidState();
        liquid.evaluator(USED).at(new double[] {273.15 + 60, 0.5}, 0, state);
        assertThat(liquid.notices(state))
                .singleElement()
                .satisfies(n -> assertThat(n).contains("density", "Volk", "15.0 to 30.0"));
        assertThat(state.density).isPositive();
    }

    @Test
    void liquidsObtainedAlikeAreEqual() {
        assertThat(Liquid.of(glycerol(), Set.of(Property.DENSITY), null))
                .isEqualTo(Liquid.of(glycerol(), Set.of(Property.DENSITY), null))
                .isNotEqualTo(Liquid.of(glycerol(), Set.of(), null));
    }

    @Test
    void everyCorrelationNamesItsSourceAndIsSmoothInItsRange() {
        assertThat(Correlations.all().stream().map(Correlation::key)).doesNotHaveDuplicates();
        for (Correlation c : Correlations.all()) {
            assertThat(c.source().citation()).isNotBlank();
            double high = Math.min(c.temperatureRange().high(), 640);
            double w = c.needsStrength() ? (c.strengthRange().low() + c.strengthRange().high()) / 2 : 0;
            double before = Double.NaN;
            for (double t = c.temperatureRange().low(); t <= high; t += (high - c.temperatureRange().low()) / 200) {
                double value = c.at(t, w);
                assertThat(value).as(c.key() + " at " + t).isFinite().isPositive();
                if (!Double.isNaN(before)) {
                    assertThat(Math.abs(value / before - 1)).as(c.key() + " at " + t).isLessThan(0.35);
                }
                before = value;
            }
        }
    }
}
