package slantfall.bench.form;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import slantfall.bench.MemoryDisk;
import slantfall.bench.model.Desk;
import slantfall.bench.model.Pulse;
import slantfall.declare.Value;
import slantfall.session.Session;

/** Which liquid, and which word, without a window. */
class LiquidModelTest {

    private Desk desk;
    private RailModel rail;
    private LiquidModel liquid;

    @BeforeEach
    void open() {
        desk = new Desk(new Session(MemoryDisk.film()), Pulse.atOnce());
        rail = new RailModel(desk);
        liquid = new LiquidModel(desk, () -> List.of(MemoryDisk.water(), MemoryDisk.glycerol()));
    }

    @Test
    void anotherLiquidBringsItsStrength() {
        assertThat(rail.field("liquid.strength")).isEmpty();
        int before = rail.editionProperty().get();
        liquid.presetProperty().set(Optional.of(MemoryDisk.glycerol()));
        assertThat(rail.field("liquid.strength")).isPresent();
        assertThat(rail.editionProperty().get()).isGreaterThan(before);
        assertThat(desk.assessment().liquid().name()).isEqualTo("Glycerol in water");
    }

    @Test
    void anotherLiquidLetsGoWhatWasMeasuredOnTheFormerOne() {
        desk.session().set("liquid.viscosity", Value.typed(0.003, "3 mPa s"), null);
        desk.session().set("liquid.temperature", Value.typed(298.15, "25 degC"), null);
        liquid.presetProperty().set(Optional.of(MemoryDisk.glycerol()));
        assertThat(desk.setUp().touched("liquid.viscosity")).isFalse();
        assertThat(desk.setUp().touched("liquid.temperature")).isTrue();
        desk.session().undo();
        assertThat(desk.setUp().touched("liquid.viscosity")).isTrue();
        assertThat(liquid.presetProperty().get().orElseThrow().key()).isEqualTo("water");
    }

    @Test
    void measuredValuesAloneLeaveTheRestUnknown() {
        liquid.presetProperty().set(Optional.empty());
        assertThat(desk.assessment().value("thickness")).isNaN();
        desk.session().set("liquid.density", Value.of(1000), null);
        desk.session().set("liquid.viscosity", Value.of(0.01), null);
        assertThat(desk.assessment().value("thickness")).isPositive();
    }

    @Test
    void aWordIsChosenAndUndone() {
        ChoiceModel law = rail.choices().get(0);
        assertThat(law.badgeProperty().get()).isEqualTo("default");
        double before = desk.assessment().value("thickness");
        law.optionProperty().set(law.choice().options().stream()
                .filter(o -> o.key().contains("kapitza"))
                .findFirst()
                .orElseThrow());
        assertThat(desk.assessment().value("thickness")).isLessThan(before);
        assertThat(law.badgeProperty().get()).isEmpty();
        desk.session().undo();
        assertThat(law.optionProperty().get().key()).isEqualTo(law.choice().initial());
    }

    @Test
    void groupsHoldEverySettingOnce() {
        long shown = java.util.Arrays.stream(RailModel.Group.values()).mapToLong(g -> rail.fields(g).size()).sum();
        assertThat(shown).isEqualTo(rail.fields().size());
        assertThat(rail.fields()).extracting(f -> f.setting().key())
                .containsAll(desk.declaration().allSettings().stream().map(s -> s.key()).toList());
        assertThat(rail.essentials()).hasSizeBetween(1, 4);
    }
}
