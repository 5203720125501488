package slantfall.session;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import slantfall.declare.LiquidBase;
import slantfall.declare.SetUp;
import slantfall.declare.Value;
import slantfall.store.Presets;

class SessionTest {

    private Session session;

    @BeforeEach
    void open() {
        session = new Session(
                SetUp.blank("inclined-film", LiquidBase.of(Presets.load().find("water").orElseThrow())));
    }

    @Test
    void aChangeIsComputedCountedAndUndone() {
        double before = session.assess().value("thickness");
        AtomicInteger heard = new AtomicInteger();
        session.listen(s -> heard.incrementAndGet());
        session.set("feed", Value.of(0.2), null);
        assertThat(session.assess().value("thickness")).isGreaterThan(before);
        assertThat(session.dirty()).isTrue();
        session.undo();
        assertThat(session.assess().value("thickness")).isEqualTo(before);
        assertThat(session.dirty()).isFalse();
        assertThat(heard).hasValue(2);
        assertThat(session.version()).isEqualTo(2);
    }

    @Test
    void anImpossibleValueIsRefusedAndNothingChanges() {
        SetUp before = session.current();
        assertThatThrownBy(() -> session.set("width", Value.of(0), null))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("width")
                .hasMessageContaining("more than");
        assertThat(session.current()).isSameAs(before);
    }

    @Test
    void aMeasuredPropertyOverridesThePresetAndIsGivenBack() {
        session.set("liquid.viscosity", Value.of(0.05), null);
        assertThat(session.declaration().setting("liquid.viscosity")).isPresent();
        double thick = session.assess().value("thickness");
        session.release("liquid.viscosity");
        assertThat(session.declaration().setting("liquid.viscosity")).isEmpty();
        assertThat(session.assess().value("thickness")).isLessThan(thick);
    }

    @Test
    void settingTheSameValueAgainIsNoStep() {
        session.set("feed", Value.of(0.2), null);
        session.set("feed", Value.of(0.2), null);
        session.undo();
        assertThat(session.canUndo()).isFalse();
    }
}
