package slantfall.bench.form;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import slantfall.bench.MemoryDisk;
import slantfall.bench.model.Desk;
import slantfall.bench.model.Pulse;
import slantfall.declare.Tolerance;
import slantfall.quantity.EntryContext;
import slantfall.quantity.EntryReader;
import slantfall.quantity.Kind;
import slantfall.quantity.UnitSystem;
import slantfall.session.Session;

/** A number as slider and field, without a window. */
class FieldModelTest {

    private Desk desk;
    private RailModel rail;

    @BeforeEach
    void open() {
        desk = new Desk(new Session(MemoryDisk.film()), Pulse.atOnce());
        rail = new RailModel(desk);
    }

    private FieldModel field(String key) {
        return rail.field(key).orElseThrow();
    }

    private void type(String key, String text) {
        field(key).textProperty().set(text);
        field(key).commit();
    }

    @Test
    void aBareNumberTakesTheUnitShown() {
        type("angle", "30");
        assertThat(desk.setUp().values().get("angle").si()).isEqualTo(Math.toRadians(30));
        assertThat(field("angle").problemProperty().get()).isEmpty();
    }

    @Test
    void anotherUnitIsReadAndEchoedAndThenShown() {
        type("length", "32 in");
        assertThat(desk.setUp().values().get("length").si()).isCloseTo(32 * 0.0254, within(1e-12));
        assertThat(field("length").unitProperty().get().symbol()).isEqualTo("in");
        assertThat(field("length").textProperty().get()).isEqualTo("32");
        assertThat(field("length").echoProperty().get()).startsWith("understood: ").contains("32");
    }

    @Test
    void aVolumeFeedIsConvertedWithTheDensityAndSaysSo() {
        type("feed", "1 L/(m s)");
        double density = desk.assessment().liquid().properties().get(0).value();
        assertThat(desk.setUp().values().get("feed").si()).isCloseTo(1e-3 * density, within(1e-9));
        assertThat(field("feed").echoProperty().get()).contains("understood");
        assertThat(desk.setUp().values().get("feed").typed()).isEqualTo("1 L/(m s)");
    }

    @Test
    void aWrongEntryStaysWithTheReasonAndChangesNothing() {
        double before = field("feed").si();
        type("feed", "plenty");
        assertThat(field("feed").textProperty().get()).isEqualTo("plenty");
        assertThat(field("feed").problemProperty().get()).contains("plenty");
        assertThat(field("feed").si()).isEqualTo(before);
        assertThat(desk.session().canUndo()).isFalse();
    }

    @Test
    void aWrongEntrySurvivesChangesElsewhere() {
        type("feed", "plenty");
        type("angle", "45");
        assertThat(field("feed").textProperty().get()).isEqualTo("plenty");
        assertThat(field("feed").problemProperty().get()).isNotEmpty();
    }

    @Test
    void escapeRestores() {
        type("feed", "plenty");
        field("feed").restore();
        assertThat(field("feed").textProperty().get()).isEqualTo("0.1");
        assertThat(field("feed").problemProperty().get()).isEmpty();
    }

    @Test
    void whatIsImpossibleIsRefusedWithTheBound() {
        type("angle", "120");
        assertThat(field("angle").problemProperty().get()).contains("at most").contains("90");
        assertThat(desk.setUp().value(field("angle").setting())).isEqualTo(Math.toRadians(60));
    }

    @Test
    void beyondTheUsualRangeIsTakenAndTheSliderStandsAtItsEnd() {
        type("feed", "50");
        assertThat(desk.setUp().values().get("feed").si()).isEqualTo(50);
        assertThat(field("feed").positionProperty().get()).isEqualTo(1);
    }

    @Test
    void sliderAndFieldAgreeToTheLastBit() {
        for (double position = 0.013; position < 1; position += 0.0371) {
            for (FieldModel f : rail.fields()) {
                if (f.setting().key().equals("liquid.contactAngle")) {
                    continue;
                }
                f.slide(position, null);
                String typed = desk.session().current().values().get(f.setting().key()).typed();
                double read = EntryReader.read(typed, f.setting().kind(), EntryContext.none()).si();
                assertThat(desk.session().current().values().get(f.setting().key()).si())
                        .as(f.setting().key() + " at " + position + " typed " + typed)
                        .isEqualTo(read);
                String shown = f.textProperty().get() + (f.setting().kind().dimensionless() ? "" : " "
                        + f.unitProperty().get().symbol());
                assertThat(EntryReader.read(shown, f.setting().kind(), EntryContext.none()).si())
                        .as(f.setting().key() + " shown " + shown)
                        .isEqualTo(read);
            }
        }
    }

    @Test
    void committingWhatStandsThereChangesNothing() {
        field("liquid.viscosity").commit();
        field("angle").commit();
        assertThat(desk.session().canUndo()).isFalse();
        assertThat(desk.setUp().touched("liquid.viscosity")).isFalse();
    }

    @Test
    void arrowsStepSensibly() {
        type("feed", "0.1");
        field("feed").nudge(1, 1, "k");
        assertThat(field("feed").textProperty().get()).isEqualTo("0.102");
        field("feed").nudge(-1, 1, "k");
        assertThat(field("feed").textProperty().get()).isEqualTo("0.1");
        field("angle").nudge(1, 10, "k");
        assertThat(field("angle").textProperty().get()).isEqualTo("65");
        field("angle").nudge(-1, 0.1, "k");
        assertThat(field("angle").textProperty().get()).isEqualTo("64.95");
    }

    @Test
    void aRunOfArrowsIsOneUndo() {
        for (int i = 0; i < 5; i++) {
            field("angle").nudge(1, 1, "run");
        }
        field("angle").endGesture();
        desk.session().undo();
        assertThat(field("angle").textProperty().get()).isEqualTo("60");
        assertThat(desk.session().canUndo()).isFalse();
    }

    @Test
    void aDragIsOneUndo() {
        Object gesture = new Object();
        field("feed").slide(0.4, gesture);
        field("feed").slide(0.5, gesture);
        field("feed").slide(0.6, gesture);
        field("feed").endGesture();
        desk.session().undo();
        assertThat(field("feed").textProperty().get()).isEqualTo("0.1");
    }

    @Test
    void showInKeepsTheQuantityAndMeantKeepsTheNumber() {
        FieldModel length = field("length");
        length.showIn(Kind.LENGTH.unit("ft"));
        assertThat(length.si()).isEqualTo(1);
        assertThat(length.textProperty().get()).startsWith("3.280");
        length.restore();
        length.meant(Kind.LENGTH.unit("m"));
        assertThat(length.si()).isCloseTo(3.28084, within(1e-5));
        assertThat(desk.setUp().touched("length")).isTrue();
    }

    @Test
    void unitSystemChangesWhatIsShownAndNoValue() {
        desk.unitsProperty().set(UnitSystem.US);
        assertThat(field("length").unitProperty().get().symbol()).isEqualTo("ft");
        assertThat(field("length").si()).isEqualTo(1);
        assertThat(desk.session().canUndo()).isFalse();
    }

    @Test
    void plusMinusIsKeptAsTyped() {
        type("feed", "0.2 ± 10 %");
        Tolerance known = desk.setUp().values().get("feed").known();
        assertThat(known.low()).isCloseTo(0.18, within(1e-12));
        assertThat(known.high()).isCloseTo(0.22, within(1e-12));
        assertThat(known.typed()).containsExactly("10 %");
        assertThat(field("feed").textProperty().get()).isEqualTo("0.2 ± 10 %");
    }

    @Test
    void plusMinusTakesTheUnitOfItsNumber() {
        type("liquid.temperature", "20 +/- 2");
        Tolerance known = desk.setUp().values().get("liquid.temperature").known();
        assertThat(known.high() - known.low()).isCloseTo(4, within(1e-9));
    }

    @Test
    void aQuestionMarkIsTheUsualRange() {
        type("feed", "?");
        Tolerance known = desk.setUp().values().get("feed").known();
        assertThat(known.shape()).isEqualTo(Tolerance.Shape.UNKNOWN);
        assertThat(known.low()).isEqualTo(1e-4);
        assertThat(known.high()).isEqualTo(10);
        assertThat(field("feed").textProperty().get()).isEqualTo("?");
        assertThat(field("feed").badgeProperty().get()).isEqualTo("unknown in a range");
        assertThat(field("feed").echoProperty().get()).contains("unknown between");
    }

    @Test
    void aQuestionMarkTakesARangeOfItsOwn() {
        type("angle", "? 40 to 75 deg");
        Tolerance known = desk.setUp().values().get("angle").known();
        assertThat(List.of(known.low(), known.high())).containsExactly(Math.toRadians(40), Math.toRadians(75));
    }

    @Test
    void untouchedGivenMeasuredAndCorrelatedAreTold() {
        assertThat(field("length").standingProperty().get()).isEqualTo(Standing.DEFAULT);
        assertThat(field("angle").standingProperty().get()).isEqualTo(Standing.GIVEN);
        assertThat(field("liquid.viscosity").standingProperty().get()).isEqualTo(Standing.CORRELATED);
        assertThat(field("liquid.contactAngle").standingProperty().get()).isEqualTo(Standing.MISSING);
        type("liquid.viscosity", "3 mPa s");
        assertThat(field("liquid.viscosity").standingProperty().get()).isEqualTo(Standing.MEASURED);
        assertThat(field("liquid.viscosity").badgeProperty().get()).isEqualTo("measured");
    }

    @Test
    void aMeasuredPropertyCanBeGivenBack() {
        double correlated = field("liquid.viscosity").si();
        type("liquid.viscosity", "3 mPa s");
        field("liquid.viscosity").release();
        assertThat(field("liquid.viscosity").si()).isEqualTo(correlated);
        assertThat(field("liquid.viscosity").standingProperty().get()).isEqualTo(Standing.CORRELATED);
    }

    @Test
    void kinematicViscosityIsConvertedAndTheTypingIsKept() {
        type("liquid.viscosity", "2 cSt");
        assertThat(field("liquid.viscosity").si()).isCloseTo(2e-6 * 998.2, within(1e-7));
        assertThat(desk.setUp().values().get("liquid.viscosity").typed()).isEqualTo("2 cSt");
        assertThat(field("liquid.viscosity").unitProperty().get().symbol()).isEqualTo("mPa s");
    }

    @Test
    void everyFieldSaysItselfToAScreenReader() {
        for (FieldModel f : rail.fields()) {
            assertThat(f.spokenProperty().get()).startsWith(f.setting().name());
        }
        assertThat(field("length").spokenProperty().get()).contains("default");
    }

    @Test
    void anOpenedFileIsShownInTheUnitsItWasTypedIn() {
        type("length", "32 in");
        desk.open(desk.session().current(), null, null);
        assertThat(field("length").unitProperty().get().symbol()).isEqualTo("in");
        assertThat(field("length").textProperty().get()).isEqualTo("32");
    }
}
