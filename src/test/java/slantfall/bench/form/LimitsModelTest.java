package slantfall.bench.form;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import slantfall.bench.MemoryDisk;
import slantfall.bench.model.Desk;
import slantfall.bench.model.Pulse;
import slantfall.declare.HouseRule;
import slantfall.declare.Requirement;
import slantfall.declare.Verdict;
import slantfall.session.Session;

/** The user's own rules, without a window. */
class LimitsModelTest {

    private Desk desk;
    private LimitsModel limits;

    @BeforeEach
    void open() {
        desk = new Desk(new Session(MemoryDisk.film()), Pulse.atOnce());
        limits = new LimitsModel(desk);
    }

    @Test
    void showsWhatTheSetUpHolds() {
        assertThat(limits.requirements()).hasSize(1);
        assertThat(limits.requirements().get(0).atMostProperty().get()).isEqualTo("1 mm");
        assertThat(limits.requirements().get(0).reasonProperty().get()).isEqualTo("spray");
        assertThat(limits.free()).noneMatch(r -> r.key().equals("thickness"));
    }

    @Test
    void aNewBoundCountsAsSoonAsItIsTyped() {
        RequirementModel velocity = limits.add(desk.declaration().reading("meanVelocity").orElseThrow());
        assertThat(desk.setUp().requirements()).hasSize(1);
        velocity.atMostProperty().set("0.2 m/s");
        velocity.marginProperty().set("25 %");
        velocity.commit();
        Requirement made = desk.setUp().requirements().get(1);
        assertThat(made.atMost()).isEqualTo(0.2);
        assertThat(made.margin()).isCloseTo(0.25, within(1e-12));
        assertThat(desk.assessment().check("requirement.meanVelocity").orElseThrow().verdict())
                .isEqualTo(Verdict.CROSSED);
    }

    @Test
    void aWrongBoundStaysWithItsReason() {
        RequirementModel thickness = limits.requirements().get(0);
        thickness.atMostProperty().set("1 kg");
        thickness.commit();
        assertThat(thickness.problemProperty().get()).contains("1 kg");
        assertThat(thickness.atMostProperty().get()).isEqualTo("1 kg");
        assertThat(desk.setUp().requirements().get(0).atMost()).isEqualTo(1e-3);
        desk.session().change(desk.session().current().titled("other"), null);
        assertThat(thickness.atMostProperty().get()).isEqualTo("1 kg");
    }

    @Test
    void boundsThatExcludeEachOtherAreRefused() {
        RequirementModel thickness = limits.requirements().get(0);
        thickness.atLeastProperty().set("2 mm");
        thickness.commit();
        assertThat(thickness.problemProperty().get()).contains("atLeast");
    }

    @Test
    void aNegativeMarginIsRefused() {
        RequirementModel thickness = limits.requirements().get(0);
        thickness.marginProperty().set("-5");
        thickness.commit();
        assertThat(thickness.problemProperty().get()).isNotEmpty();
    }

    @Test
    void droppingOneIsUndone() {
        limits.remove(limits.requirements().get(0));
        assertThat(desk.setUp().requirements()).isEmpty();
        assertThat(limits.requirements()).isEmpty();
        desk.session().undo();
        assertThat(limits.requirements()).hasSize(1);
    }

    @Test
    void aHouseRuleIsChosenWithItsMargin() {
        HouseRuleModel rule = limits.houseRules().stream()
                .filter(h -> h.panel().key().equals("turbulence"))
                .findFirst()
                .orElse(limits.houseRules().get(0));
        rule.marginProperty().set("20");
        rule.ruleProperty().set(rule.options().get(1));
        HouseRule made = desk.setUp().houseRules().get(rule.panel().key());
        assertThat(made.rule()).isEqualTo(rule.options().get(1).orElseThrow().key());
        assertThat(made.margin()).isCloseTo(0.2, within(1e-12));
        assertThat(made.typedMargin()).isEqualTo("20 %");
        rule.ruleProperty().set(Optional.empty());
        assertThat(desk.setUp().houseRules()).isEmpty();
    }

    @Test
    void anotherArrangementHasOtherQuestions() {
        desk.open(MemoryDisk.slot(), null, null);
        assertThat(limits.requirements()).isEmpty();
        assertThat(limits.houseRules()).extracting(h -> h.panel().key())
                .containsExactlyElementsOf(desk.declaration().panels().stream().map(p -> p.key()).toList());
    }
}
