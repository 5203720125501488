package slantfall.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import slantfall.declare.SetUp;
import slantfall.declare.Tolerance;
import slantfall.declare.Value;

/** Every form of a value, what it leans on, and what is written again. Expected numbers by hand from the definitions. */
class ValueFormsTest {

    private static SetUp film(String liquid, String settings) {
        return ProjectFile.read("{\"settings\": {" + settings + "}, \"liquid\": {" + liquid
                + "}, \"arrangement\": \"inclined-film\", \"slantfall\": 1}", "x").setUp();
    }

    private static Value setting(String key, String value) {
        return film("\"preset\": \"water\"", "\"" + key + "\": " + value).values().get(key);
    }

    @Test
    void aTotalLeansOnDensityAndWidthWhateverTheOrder() {
        SetUp setUp = film("\"viscosity\": \"45 cSt\", \"density\": \"1.05 g/cm3\"", "\"feed\": \"1.5 m3/h\", \"width\": \"0.8 m\"");
        assertThat(setUp.values().get("feed").si()).isCloseTo(1050 * 1.5 / 3600 / 0.8, within(1e-12));
        assertThat(setUp.values().get("liquid.viscosity").si()).isCloseTo(45e-6 * 1050, within(1e-15));
    }

    @Test
    void aPresetGivesItsDensityAtItsTemperature() {
        // Water at 80 °C: 971.8 kg/m3 (NIST Chemistry WebBook, read second-hand); at 20 °C it would be 998.2.
        SetUp setUp = film("\"temperature\": \"80 degC\", \"preset\": \"water\"", "\"feed\": \"3.6 m3/h\", \"width\": \"1 m\"");
        assertThat(setUp.values().get("feed").si()).isCloseTo(0.9718, within(1e-4));
    }

    @Test
    void aTotalOverAWidthNobodyGaveIsTold() {
        ProjectFile.Opened opened = ProjectFile.read("{\"slantfall\": 1, \"arrangement\": \"inclined-film\", \"liquid\": "
                + "{\"preset\": \"water\"}, \"settings\": {\"feed\": \"1 kg/s\"}}", "x");
        assertThat(opened.reports()).singleElement().asString().contains("settings.feed", "1.00 m", "nobody gave");
    }

    @Test
    void plusMinusIsAbsoluteOrAShare() {
        Tolerance share = setting("width", "{\"value\": \"2 m\", \"plusMinus\": \"10 %\", \"shape\": \"triangular\"}").known();
        assertThat(share.low()).isCloseTo(1.8, within(1e-12));
        assertThat(share.high()).isCloseTo(2.2, within(1e-12));
        assertThat(share.shape()).isEqualTo(Tolerance.Shape.TRIANGULAR);
        Tolerance absolute = setting("width", "{\"value\": \"2 m\", \"plusMinus\": \"3 mm\"}").known();
        assertThat(absolute.high()).isCloseTo(2.003, within(1e-12));
        assertThat(absolute.shape()).isEqualTo(Tolerance.Shape.UNIFORM);
    }

    @Test
    void aRangeStandsForItsMiddleOnTheSettingsScale() {
        Value linear = setting("angle", "{\"range\": [\"40 deg\", \"60 deg\"]}");
        assertThat(Math.toDegrees(linear.si())).isCloseTo(50, within(1e-9));
        assertThat(linear.known().shape()).isEqualTo(Tolerance.Shape.UNKNOWN);
        Value logarithmic = setting("width", "{\"range\": [\"0.1 m\", \"10 m\"], \"shape\": \"normal\"}");
        assertThat(logarithmic.si()).isCloseTo(1, within(1e-12));
        assertThat(logarithmic.known().shape()).isEqualTo(Tolerance.Shape.NORMAL);
        Value chosen = setting("width", "{\"value\": \"2 m\", \"range\": [\"0.1 m\", \"10 m\"]}");
        assertThat(chosen.si()).isEqualTo(2);
    }

    @Test
    void bareNumbersStandOnlyWithoutDimension() {
        assertThat(setting("inletDisturbance", "2e-3")).isEqualTo(Value.typed(2e-3, "2e-3"));
        assertThat(setting("inletDisturbance", "\"0.2 %\"").si()).isCloseTo(2e-3, within(1e-15));
    }

    @Test
    void typedTextIsWrittenWhileItMeansTheSame() {
        SetUp setUp = film("\"density\": \"1.05 g/cm3\", \"viscosity\": \"45 cSt\"", "\"angle\": \"1:12\"");
        assertThat(ProjectFile.write(setUp)).contains("\"45 cSt\"", "\"1:12\"", "\"1.05 g/cm3\"");
        SetUp denser = setUp.with("liquid.density", Value.of(2100));
        String text = ProjectFile.write(denser);
        assertThat(text).doesNotContain("cSt").contains("2100.0 kg/m3");
        assertThat(ProjectFile.read(text, "x").setUp().values().get("liquid.viscosity").si())
                .isEqualTo(setUp.values().get("liquid.viscosity").si());
    }

    @Test
    void pointsKeepTheirTextAndOrder() {
        String points = "[[\"60 degC\", \"0.3 Pa s\"], [\"20 degC\", \"7500 cP\"], [\"104 degF\", \"1.2 Pa s\"]]";
        SetUp setUp = film("\"density\": \"1300 kg/m3\", \"viscosityPoints\": " + points + ", \"viscosityFit\": \"andrade\"", "");
        assertThat(ProjectFile.write(setUp)).contains(points).contains("\"viscosityFit\": \"andrade\"");
        assertThat(ProjectFile.read(ProjectFile.write(setUp), "x").setUp()).isEqualTo(setUp);
        assertThat(setUp.base().points().points()).extracting(p -> p.viscosity()).containsExactly(7.5, 1.2, 0.3);
    }

    @Test
    void kinematicPointsThatNoLongerReadTheSameAreWrittenExactly() {
        SetUp setUp = film("\"density\": \"1000 kg/m3\", \"viscosityPoints\": [[\"20 degC\", \"100 cSt\"], [\"60 degC\", \"20 cSt\"]]", "");
        assertThat(setUp.base().points().points().get(0).viscosity()).isCloseTo(0.1, within(1e-15));
        SetUp denser = setUp.with("liquid.density", Value.of(1200));
        SetUp back = ProjectFile.read(ProjectFile.write(denser), "x").setUp();
        assertThat(back.base().points()).isEqualTo(setUp.base().points());
    }

    @Test
    void strengthOfAPureLiquidIsToldToBeIdle() {
        ProjectFile.Opened opened = ProjectFile.read("{\"slantfall\": 1, \"arrangement\": \"inclined-film\", \"liquid\": "
                + "{\"preset\": \"water\", \"strength\": \"20 %\"}}", "x");
        assertThat(opened.reports()).singleElement().asString().contains("liquid.strength has no effect");
    }

    @Test
    void numbersOfAFormerArrangementAreNotLost() {
        SetUp slot = film("\"preset\": \"water\"", "\"angle\": \"10 deg\"").with("gap", Value.typed(8e-4, "0.8 mm"));
        ProjectFile.Opened back = ProjectFile.read(ProjectFile.write(slot), "x");
        assertThat(back.setUp().remarks().unknown()).containsEntry("/settings/gap", "\"0.8 mm\"");
    }
}
